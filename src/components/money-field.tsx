import type { ComponentProps } from 'react';
import { controlClass, Field, type FieldWords } from './field.tsx';

export type MoneyFieldProps = FieldWords & {
  /** The currency's sign, before the amount: £, $, €. */
  sign: string;
} & Omit<ComponentProps<'input'>, 'className' | 'id' | 'name' | 'type' | 'children'>;

/** Takes what people type, `1,5` and `£12` alike; the server reads it and says when it cannot. */
export function MoneyField({ name, label, hint, error, optional, id, sign, ...input }: MoneyFieldProps) {
  return (
    <Field name={name} label={label} hint={hint} error={error} optional={optional} id={id}>
      {(control) => (
        <span className="relative block">
          <span aria-hidden="true" className="absolute left-[11px] top-1/2 -translate-y-1/2 text-control text-ink-soft">
            {sign}
          </span>
          <input {...input} {...control} type="text" inputMode="decimal" autoComplete="off" className={`${controlClass} num pl-8 text-right`} />
        </span>
      )}
    </Field>
  );
}
