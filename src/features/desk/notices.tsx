import { LiveRegion } from '#src/components/live-region.tsx';

export interface TookOutNotice {
  words: string;
  putBack: () => void;
}

export interface NoticesProps {
  said: string;
  tookOut: TookOutNotice | null;
  onClose: () => void;
}

const action = 'min-h-8 font-semibold text-zinc underline max-wide:min-h-11';

/** What was just done, said and shown; what was taken out can be put back from here. */
export function Notices({ said, tookOut, onClose }: NoticesProps) {
  return (
    <>
      <LiveRegion message={said} />
      <div role="status" aria-live="polite" className="desk-notice fixed bottom-4 left-1/2 z-20 -translate-x-1/2 max-wide:bottom-20">
        {tookOut && (
          <div className="on-deep flex items-center gap-5 px-4 py-2 text-control">
            <span>{tookOut.words}</span>
            <button type="button" onClick={() => { tookOut.putBack(); onClose(); }} className={action}>Put it back</button>
            <button type="button" onClick={onClose} className={action}>Close</button>
          </div>
        )}
      </div>
    </>
  );
}
