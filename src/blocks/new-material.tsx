import { useState, type FormEvent } from 'react';
import { Button } from '#src/components/button.tsx';
import { controlClass, Field } from '#src/components/field.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { unitsFor, type Dimension } from '#domain/units.ts';
import type { MaterialFacts } from './block.ts';
import { useBench } from './bench.ts';
import { tall } from './line-fields.tsx';

type Measured = Exclude<Dimension, 'time'>;
const ways: Readonly<Record<Measured, string>> = {
  count: 'By the piece', volume: 'By volume: litres, cups', mass: 'By weight', length: 'By length', area: 'By area', timber: 'Timber, by volume',
};

export interface NewMaterialProps {
  /** Prefix of its fields' ids: the block and line it was asked for from. */
  at: string;
  name: string;
  onAdded: (material: MaterialFacts) => void;
  onLeave: () => void;
}

/** Adds a material without leaving the line it is wanted on. */
export function NewMaterial({ at, name: asked, onAdded, onLeave }: NewMaterialProps) {
  const bench = useBench();
  const { measures } = bench.context;
  const [name, setName] = useState(asked);
  const [dimension, setDimension] = useState<Measured>('count');
  const [unit, setUnit] = useState('piece');
  const [pack, setPack] = useState({ name: '', amount: '' });
  const [pending, setPending] = useState(false);
  const [faults, setFaults] = useState<Readonly<Record<string, string>>>({});

  const measuredBy = (value: Measured) => {
    setDimension(value);
    setUnit(unitsFor(value, measures)[0]?.id ?? '');
  };
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (pending) return;
    setPending(true);
    const hasPack = pack.name.trim() !== '' || pack.amount.trim() !== '';
    const outcome = await bench.addMaterial({ name, dimension, unit, packs: hasPack ? [pack] : [] });
    setPending(false);
    if (outcome.ok) onAdded(outcome.material);
    else setFaults(Object.keys(outcome.fields).length > 0 ? outcome.fields : { name: outcome.problem });
  };
  const control = `${controlClass} ${tall}`;
  return (
    <form onSubmit={(event) => void submit(event)} aria-label="A new material" className="my-2 border-l-[3px] border-rule-strong bg-hover px-4 py-3">
      <div className="grid gap-3 wide:grid-cols-3">
        <Field name={`${at}.new-name`} label="What it is called" error={faults['name']}>
          {/* Opened by the writer's own key press, so the focus belongs here. */}
          {(props) => <input {...props} ref={focusOnce} value={name} onChange={(event) => setName(event.target.value)} autoComplete="off" className={control} />}
        </Field>
        <Field name={`${at}.new-dimension`} label="How it is measured" error={faults['dimension']}>
          {(props) => (
            <select {...props} value={dimension} onChange={(event) => measuredBy(event.target.value as Measured)} className={`${control} select-control pr-8`}>
              {Object.entries(ways).map(([value, label]) => <option key={value} value={value}>{label}</option>)}
            </select>
          )}
        </Field>
        <Field name={`${at}.new-unit`} label="Usually in" error={faults['unit']}>
          {(props) => (
            <select {...props} value={unit} onChange={(event) => setUnit(event.target.value)} className={`${control} select-control pr-8`}>
              {unitsFor(dimension, measures).map(({ id, many }) => <option key={id} value={id}>{many}</option>)}
            </select>
          )}
        </Field>
        <Field name={`${at}.new-pack`} label="Comes in a" optional hint="tin, box, roll, length" error={faults['packs.0.name']}>
          {(props) => <input {...props} value={pack.name} onChange={(event) => setPack({ ...pack, name: event.target.value })} autoComplete="off" className={control} />}
        </Field>
        <Field name={`${at}.new-pack-amount`} label="of" optional hint="500, 2.5 l, 50 m" error={faults['packs.0.amount']}>
          {(props) => <input {...props} value={pack.amount} onChange={(event) => setPack({ ...pack, amount: event.target.value })} autoComplete="off" className={control} />}
        </Field>
      </div>
      <div className="mt-3 flex flex-wrap gap-2.5">
        <SubmitButton size="small" pending={pending} pendingWord="Adding the material">Add the material</SubmitButton>
        <Button kind="quiet" size="small" onClick={onLeave}>Leave it</Button>
      </div>
    </form>
  );
}

function focusOnce(field: HTMLInputElement | null): void {
  field?.focus();
}
