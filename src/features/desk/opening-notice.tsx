import { Button } from '#src/components/button.tsx';

export interface OpeningNoticeProps {
  takenUp: Date | null;
  /** Two texts wait to be brought together. */
  newerWaits: boolean;
  onLook: () => void;
}

const times = (date: Date) => `${String(date.getHours()).padStart(2, '0')}:${String(date.getMinutes()).padStart(2, '0')}`;

/** What the writer should know of the text in front of them. */
export function OpeningNotice({ takenUp, newerWaits, onLook }: OpeningNoticeProps) {
  return (
    <>
      {takenUp && (
        <p role="status" className="mb-5 border border-l-[5px] border-verd bg-card px-4 py-3 text-control">
          What you typed here at {times(takenUp)} had not reached the server. It was kept in this browser and is taken up again below.
        </p>
      )}
      {newerWaits && (
        <div className="mb-5 flex flex-wrap items-center gap-4 border border-l-[5px] border-lead bg-card px-4 py-3 text-control">
          <p className="flex-1">Somebody saved a newer text. Yours is kept in this browser only, until the two are brought together.</p>
          <Button kind="plain" size="small" onClick={onLook}>Look at both</Button>
        </div>
      )}
    </>
  );
}
