import type { ComponentProps } from 'react';
import { controlLook, controlProps, fieldId, FieldNotes, type FieldWords } from './field.tsx';
import { SelectBox, type SelectOption } from './select-box.tsx';

export interface AmountFieldProps extends FieldWords {
  /** Props of the amount's own box: value, onChange, defaultValue. */
  amount: Omit<ComponentProps<'input'>, 'className' | 'id' | 'name' | 'type'>;
  /** Props of the unit's box. */
  unit: Omit<ComponentProps<'select'>, 'className' | 'id' | 'name' | 'children'>;
  unitName: string;
  units: readonly SelectOption[];
  /** In a row of a block the label is read out only, naming the material. */
  labelHidden?: boolean;
}

/** An amount and its unit side by side, as one thing with one label and one error. */
export function AmountField({ amount, unit, unitName, units, labelHidden = false, ...words }: AmountFieldProps) {
  const control = controlProps(words);
  return (
    <div role="group" aria-label={words.label}>
      <label htmlFor={control.id} className={labelHidden ? 'sr-only' : 'mb-[5px] block text-small font-semibold'}>
        {labelHidden ? `${words.label}, amount` : words.label}
        {words.optional && <span className="font-normal text-ink-soft"> (optional)</span>}
      </label>
      <div className="flex gap-1">
        <input {...amount} {...control} type="text" inputMode="decimal" autoComplete="off" className={`${controlLook} num w-20 flex-none`} />
        <SelectBox {...unit} id={fieldId(unitName)} name={unitName} aria-label={`${words.label}, unit`} options={units} snug />
      </div>
      <FieldNotes id={control.id} hint={words.hint} error={words.error} />
    </div>
  );
}
