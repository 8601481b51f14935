import type { ReactNode } from 'react';

export interface TallyPart {
  key: string;
  /** Prose, pictures, cautions: the reading column. */
  prose: ReactNode;
  /** What stands beside it: slips, the running tally. */
  slips: readonly ReactNode[];
}

/** Parts whose words run on without a gap; their slips stand one under the other. Most runs have one part. */
export interface TallyRun {
  key: string;
  parts: readonly TallyPart[];
  /** Slips that no words stand beside any more: laid two abreast under the words. */
  under?: readonly ReactNode[];
}

/**
 * Words on the left, what they cost on the right, top edges level. Each run is as tall as the taller of the two,
 * so that a long slip pushes the next words down and never runs over another slip.
 * On a phone the slips of each part come after its own words.
 */
export function TallyMargin({ runs }: { runs: readonly TallyRun[] }) {
  return (
    <div>
      {runs.map((run) => (
        <div key={run.key} className="tally-row flex flex-col wide:grid wide:grid-cols-[minmax(0,1fr)_300px] wide:items-start wide:gap-x-14">
          <div className="contents min-w-0 wide:block">
            {run.parts.map((part, at) => (
              <div key={part.key} style={{ order: at * 2 }} className="min-w-0 pb-6 [&>*+*]:mt-6">{part.prose}</div>
            ))}
            {run.under && run.under.length > 0 && (
              <div style={{ order: run.parts.length * 2 }} className="grid min-w-0 items-start gap-6 pb-[26px] wide:grid-cols-2">
                {run.under.map((slip, index) => <div key={index}>{slip}</div>)}
              </div>
            )}
          </div>
          <div className="tally-slips contents min-w-0 wide:block wide:pt-1">
            {run.parts.map((part, at) => part.slips.length > 0 && (
              <div key={part.key} style={{ order: at * 2 + 1 }} className="min-w-0 space-y-6 pb-[26px]">
                {part.slips.map((slip, index) => <div key={index}>{slip}</div>)}
              </div>
            ))}
          </div>
        </div>
      ))}
    </div>
  );
}
