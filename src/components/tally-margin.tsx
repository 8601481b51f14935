import type { ReactNode } from 'react';

export interface TallyRow {
  key: string;
  /** Prose, pictures, cautions: the reading column. */
  prose: ReactNode;
  /** What stands beside it, top edges level: slips, the running tally. */
  slips: ReactNode[];
}

/**
 * Words on the left, what they cost on the right. Each row is as tall as the taller of the two,
 * so that a long slip pushes the next words down and never runs over another slip.
 * On a phone the slips come after the words of their row.
 */
export function TallyMargin({ rows }: { rows: TallyRow[] }) {
  return (
    <div>
      {rows.map((row) => (
        <div key={row.key} className="tally-row wide:grid wide:grid-cols-[minmax(0,1fr)_300px] wide:items-start wide:gap-x-14">
          <div className="min-w-0 pb-6 [&>*+*]:mt-6">{row.prose}</div>
          {row.slips.length > 0 && (
            <div className="tally-slips min-w-0 space-y-6 pb-[26px] wide:pt-1">
              {row.slips.map((slip, index) => (
                <div key={index}>{slip}</div>
              ))}
            </div>
          )}
        </div>
      ))}
    </div>
  );
}
