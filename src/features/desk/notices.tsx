import { LiveRegion } from '#src/components/live-region.tsx';

export interface Notice {
  words: string;
  /** Where something was taken out. */
  putBack?: () => void;
}

export interface NoticesProps {
  /** What changed about saving, for a screen reader: the tally shows it. */
  saving: string;
  notice: Notice | null;
  onClose: () => void;
}

const action = 'min-h-8 font-semibold text-zinc underline max-wide:min-h-11';

/** What was just done, said and shown; what was taken out can be put back from here. */
export function Notices({ saving, notice, onClose }: NoticesProps) {
  return (
    <>
      <LiveRegion message={saving} />
      <div role="status" aria-live="polite" className="desk-notice fixed bottom-4 left-1/2 z-20 -translate-x-1/2 max-wide:bottom-20">
        {notice && (
          <div className="on-deep flex items-center gap-5 px-4 py-2 text-control">
            <span>{notice.words}</span>
            {notice.putBack && <button type="button" onClick={() => { notice.putBack?.(); onClose(); }} className={action}>Put it back</button>}
            <button type="button" onClick={onClose} className={action}>Close</button>
          </div>
        )}
      </div>
    </>
  );
}
