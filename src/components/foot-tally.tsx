import type { ReactNode } from 'react';
import { type TallyFact, TallyFacts } from './running-tally.tsx';

export interface FootTallyProps {
  label: string;
  figure: string;
  /** One line beside the figure: "this day, one rib £5.20". */
  words: string;
  groups: TallyFact[][];
  /** The one button that stays in view: "Sign off". */
  action?: ReactNode;
  /** More, above the line when it is opened: checks, what readers will see. */
  children?: ReactNode;
}

/** The tally on a phone: pinned at the foot, one line, opening upward. Shown below the wide layout only. */
export function FootTally({ label, figure, words, groups, action, children }: FootTallyProps) {
  return (
    <>
      <div aria-hidden="true" className="h-16 wide:hidden" />
      <section aria-label={label} className="foot-tally on-deep num fixed inset-x-0 bottom-0 z-30 flex items-center gap-3 px-[18px] py-2.5 wide:hidden">
        <details className="group min-w-0 flex-1">
          <summary className="flex min-h-9 items-center gap-2 text-control">
            <svg viewBox="0 0 12 8" width="12" height="8" aria-hidden="true" className="flex-none transition-transform group-open:rotate-180">
              <path d="M1 7l5-5 5 5" fill="none" stroke="currentColor" strokeWidth="2" />
            </svg>
            <span className="min-w-0">
              <b className="font-bold">{figure}</b> {words}
            </span>
          </summary>
          <div className="absolute inset-x-0 bottom-full max-h-[70vh] overflow-y-auto border-t border-deep-rule bg-scribe-deep px-[18px] py-3">
            {groups.filter((group) => group.length > 0).map((group, index) => (
              <TallyFacts key={index} facts={group} ruled={index > 0} />
            ))}
            {children}
          </div>
        </details>
        {action}
      </section>
    </>
  );
}
