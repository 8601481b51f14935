import { fieldId } from '#src/components/field.tsx';
import type { DeskFault } from './faults.ts';

export interface LookAtThisProps {
  faults: readonly DeskFault[];
  remarks: readonly string[];
}

/** What is worth a look before the day is signed off: faults lead to their field, remarks bar nothing. */
export function LookAtThis({ faults, remarks }: LookAtThisProps) {
  if (faults.length === 0 && remarks.length === 0) return null;
  return (
    <section data-kind="wrong" aria-label="Look at this" className="slip text-small">
      <h2 className="mb-[7px] font-head font-[740] text-[var(--kind-text)] font-stretch-[110%]">Look at this</h2>
      <ul className="space-y-1.5">
        {faults.map((fault) => (
          <li key={fault.path}><a href={`#${fieldId(fault.path)}`} className="text-inherit max-wide:inline-flex max-wide:min-h-11 max-wide:items-center">{fault.words}</a></li>
        ))}
        {remarks.map((remark) => <li key={remark}>{remark}</li>)}
      </ul>
    </section>
  );
}
