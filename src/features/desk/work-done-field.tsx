import { controlClass, fieldId, FieldNotes } from '#src/components/field.tsx';
import { useBench, useFault } from '#src/blocks/bench.ts';
import { tall } from '#src/blocks/line-fields.tsx';
import { workUnits, type WorkDone } from '#src/blocks/pure.ts';
import { workUnitMenu } from './work-words.ts';

interface WorkDoneFieldProps {
  work: WorkDone | null;
  kinds: readonly { one: string; many: string }[];
  onWork: (work: WorkDone | null) => void;
}

const blank: WorkDone = { amount: '', unit: 'piece', kind: '' };
const control = `${controlClass} ${tall}`;

/** How much of which kind of work: what one takes is worked out from it. */
export function WorkDoneField({ work, kinds, onWork }: WorkDoneFieldProps) {
  const bench = useBench();
  const now = work ?? blank;
  const change = (part: Partial<WorkDone>) => {
    const next = { ...now, ...part };
    onWork(next.amount === '' && next.kind === '' && next.unit === 'piece' ? null : next);
  };
  const faults = { amount: useFault('work.amount'), kind: useFault('work.kind') };
  const ids = { amount: fieldId('work.amount'), kind: fieldId('work.kind') };
  return (
    <fieldset>
      <legend className="mb-[5px] text-small font-semibold">Work done</legend>
      <div className="flex flex-wrap gap-1">
        <input
          id={ids.amount} aria-label="How much work" aria-invalid={faults.amount ? true : undefined} aria-describedby={faults.amount ? `${ids.amount}-error` : undefined}
          inputMode="decimal" autoComplete="off" value={now.amount} maxLength={20} placeholder="e.g. 17" onChange={(event) => change({ amount: event.target.value })} onBlur={() => bench.touch('work.amount')}
          className={`${control} num w-22!`}
        />
        <select
          id={fieldId('work.unit')} aria-label="Unit of the work" value={now.unit} onChange={(event) => change({ unit: workUnits.find((unit) => unit === event.target.value) ?? 'piece' })}
          className={`${control} select-control w-auto! pr-8`}
        >
          {workUnits.map((unit) => <option key={unit} value={unit}>{workUnitMenu[unit]}</option>)}
        </select>
        <input
          id={ids.kind} aria-label="Kind of work, one of it" aria-invalid={faults.kind ? true : undefined} aria-describedby={faults.kind ? `${ids.kind}-error` : undefined}
          list="work-kinds" autoComplete="off" value={now.kind} maxLength={60} placeholder="e.g. steamed rib" onChange={(event) => change({ kind: event.target.value })} onBlur={() => bench.touch('work.kind')}
          className={`${control} w-40!`}
        />
        <datalist id="work-kinds">{kinds.map(({ one }) => <option key={one} value={one}>{one}</option>)}</datalist>
      </div>
      <FieldNotes id={ids.amount} error={faults.amount} />
      <FieldNotes id={ids.kind} error={faults.kind} />
    </fieldset>
  );
}
