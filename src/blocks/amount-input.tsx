import type { KeyboardEvent } from 'react';
import { controlClass, fieldId } from '#src/components/field.tsx';
import { pluralOf } from '#domain/pack.ts';
import { wordsForQuantity } from '#domain/quantity-words.ts';
import { materialOf, readAmount, typedAmount, type AmountLine } from './amount-line.ts';
import { useBench } from './bench.ts';
import { tall, useLineControl } from './line-fields.tsx';
import { unitChoices, unitIdOf } from './unit-choice.ts';

export interface AmountInputProps<L extends AmountLine> {
  block: string;
  line: L;
  onLine: (change: Partial<AmountLine>) => void;
  onEnter: () => void;
}

/** Whether the typed amount says its own unit, so that the menu does not count. */
function namesUnit(line: AmountLine): boolean {
  return line.unit !== '' && line.amount.trim() !== '' && typedAmount(line) === line.amount.trim();
}

/** An amount as people write it, and its unit: the menu counts only where the amount names none. */
export function AmountInput<L extends AmountLine>({ block, line, onLine, onEnter }: AmountInputProps<L>) {
  const { context } = useBench();
  const name = `${block}.${line.id}.amount`;
  const { control, leave } = useLineControl(name, 'Amount');
  const material = materialOf(line, context);
  const of = line.name.trim() || 'this line';
  const named = namesUnit(line);
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key !== 'Enter' || event.nativeEvent.isComposing) return;
    event.preventDefault();
    onEnter();
  };
  return (
    <div role="group" aria-label={`Amount of ${of}`} className="flex gap-1 wide:w-48">
      <input
        {...control} type="text" inputMode="decimal" autoComplete="off" aria-label={`Amount of ${of}`} value={line.amount}
        onChange={(event) => onLine({ amount: event.target.value })} onBlur={leave} onKeyDown={onKeyDown}
        className={`${controlClass} ${tall} num ${named ? 'w-28!' : 'w-18!'} wide:w-auto! wide:min-w-0 wide:flex-1`}
      />
      <select
        id={fieldId(`${block}.${line.id}.unit`)} aria-label={`Unit of ${of}`} value={line.unit} onChange={(event) => onLine({ unit: event.target.value })}
        className={`${controlClass} ${tall} select-control w-auto! max-w-32 flex-none pr-8 pl-2.5! wide:w-28! ${named ? 'opacity-50' : ''}`}
      >
        {unitChoices(material, context.measures, line.unit).map((option) => <option key={option.value} value={option.value}>{option.label}</option>)}
      </select>
    </div>
  );
}

/** What a typed amount was read as, where that says more than what was typed. */
export function useShownBack(line: AmountLine): string | null {
  const { context } = useBench();
  if (line.amount.trim() === '' || !materialOf(line, context)) return null;
  const reading = readAmount(line, context);
  if (!reading.ok) return null;
  const amount = line.amount.trim();
  const same = [typedAmount(line), amount, `${amount} ${pluralOf(line.unit)}`].includes(reading.value.shownBack);
  // a comma between thousands may have been meant for a decimal one
  const words = amount.includes(',') ? `read as ${reading.value.shownBack}` : same ? '' : reading.value.shownBack;
  return [words, reading.value.note ?? ''].filter(Boolean).join('; ') || null;
}

/** An exact amount of a line's material, in the unit of the line; where the typed amount names its own, in whole packs or shares of one, or as the material is usually said. */
export function useAmountWords(line: AmountLine): (exact: string) => string {
  const { context } = useBench();
  const material = materialOf(line, context);
  return (exact) => {
    if (!material) return '';
    const words = (unit?: string) => wordsForQuantity(exact, material.dimension, { measures: context.measures, packs: material.packs, ...(unit ? { unit } : {}) });
    if (!namesUnit(line)) return words(unitIdOf(line.unit));
    const plain = words();
    return material.packs.some(({ name }) => plain.includes(name)) ? plain : words(material.unit);
  };
}
