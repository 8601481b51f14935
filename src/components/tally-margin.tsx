import type { ReactNode } from 'react';

export interface TallyPart {
  key: string;
  /** Prose, pictures, cautions that the slips come after. */
  before: ReactNode;
  /** What stands in the margin, level with the words before: slips, the running tally. */
  slips: readonly ReactNode[];
  /** What was written after the slips, up to the next ones. */
  after: ReactNode;
}

/** Parts whose words run on without a gap; their slips stand one under the other. Most runs have one part. */
export interface TallyRun {
  key: string;
  parts: readonly TallyPart[];
  /** Slips that no words stand beside any more: laid two abreast under the words. */
  under?: readonly ReactNode[];
}

const grid = 'tally-row flex flex-col wide:grid wide:grid-cols-[minmax(0,1fr)_300px] wide:items-start wide:gap-x-14';
const words = 'min-w-0 pb-6 [overflow-wrap:anywhere] [&>*+*]:mt-6';

/**
 * Words on the left, what they cost on the right, top edges level. Each run is as tall as the taller of the two,
 * so that a long slip pushes the next words down and never runs over another slip.
 * On a phone the slips fall into the text where they were written.
 */
export function TallyMargin({ runs }: { runs: readonly TallyRun[] }) {
  return (
    <div>
      {runs.map((run) => {
        const [only] = run.parts;
        return only && run.parts.length === 1 ? <OnePart key={run.key} part={only} under={run.under ?? []} /> : <RunOn key={run.key} run={run} />;
      })}
    </div>
  );
}

function Slips({ slips }: { slips: readonly ReactNode[] }) {
  return <>{slips.map((slip, index) => <div key={index}>{slip}</div>)}</>;
}

/** One part, read in the order it was written on every width. */
function OnePart({ part, under }: { part: TallyPart; under: readonly ReactNode[] }) {
  return (
    <div className={`${grid} wide:grid-rows-[auto_1fr]`}>
      {part.before && <div className={`${words} wide:col-start-1 wide:row-start-1`}>{part.before}</div>}
      {part.slips.length > 0 && (
        <div className="tally-slips min-w-0 space-y-6 pb-[26px] wide:col-start-2 wide:row-span-2 wide:row-start-1 wide:pt-1"><Slips slips={part.slips} /></div>
      )}
      {(part.after || under.length > 0) && (
        <div className="min-w-0 wide:col-start-1 wide:row-start-2">
          {part.after && <div className={words}>{part.after}</div>}
          {under.length > 0 && <div className="grid min-w-0 items-start gap-6 pb-[26px] wide:grid-cols-2"><Slips slips={under} /></div>}
        </div>
      )}
    </div>
  );
}

/** Several parts: all their words, then all their slips; on a phone each slip after its own words again. */
function RunOn({ run }: { run: TallyRun }) {
  return (
    <div className={`${grid} wide:grid-rows-[auto_1fr]`}>
      <div className="contents wide:col-start-1 wide:row-start-1 wide:block">
        {run.parts.map((part, at) => [
          part.before && <div key={`${part.key}-before`} style={{ order: at * 3 }} className={words}>{part.before}</div>,
          part.after && <div key={`${part.key}-after`} style={{ order: at * 3 + 2 }} className={words}>{part.after}</div>,
        ])}
      </div>
      <div className="tally-slips contents wide:col-start-2 wide:row-span-2 wide:row-start-1 wide:block wide:pt-1">
        {run.parts.map((part, at) => part.slips.length > 0 && (
          <div key={part.key} style={{ order: at * 3 + 1 }} className="min-w-0 space-y-6 pb-[26px]"><Slips slips={part.slips} /></div>
        ))}
      </div>
      {run.under && run.under.length > 0 && (
        <div style={{ order: run.parts.length * 3 }} className="grid min-w-0 items-start gap-6 pb-[26px] wide:col-start-1 wide:row-start-2 wide:grid-cols-2"><Slips slips={run.under} /></div>
      )}
    </div>
  );
}
