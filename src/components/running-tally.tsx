import type { ReactNode } from 'react';

export interface TallyFact {
  label: string;
  value: string;
}

export interface RunningTallyProps {
  /** Names the box to a screen reader: "The day's tally". */
  label: string;
  figure: string;
  /** The figure's words: "this day: £88.34 used, £3.40 wasted". */
  words: string;
  /** Groups of rows, ruled off from one another. */
  groups: TallyFact[][];
  /** The desk's button and what it says about saving. */
  children?: ReactNode;
}

export function RunningTally({ label, figure, words, groups, children }: RunningTallyProps) {
  return (
    <section aria-label={label} className="running-tally on-deep num px-[18px] py-3.5">
      <p className="lettering-figure text-[1.6875rem]">{figure}</p>
      <p className="mt-1 text-small">{words}</p>
      {groups.filter((group) => group.length > 0).map((group, index) => (
        <TallyFacts key={index} facts={group} ruled={index > 0} />
      ))}
      {children && <div className="mt-3 border-t border-deep-rule pt-3">{children}</div>}
    </section>
  );
}

export function TallyFacts({ facts, ruled }: { facts: TallyFact[]; ruled: boolean }) {
  return (
    <dl className={ruled ? 'mt-2 border-t border-deep-rule pt-2' : 'mt-2'}>
      {facts.map((fact) => (
        <div key={fact.label} className="flex justify-between gap-4 py-[3px] text-small">
          <dt className="text-on-deep-soft">{fact.label}</dt>
          <dd className="text-right">{fact.value}</dd>
        </div>
      ))}
    </dl>
  );
}
