import type { ComponentProps } from 'react';
import { Field, type FieldWords } from './field.tsx';
import { SelectBox, type SelectOption } from './select-box.tsx';

export type SelectFieldProps = FieldWords & { options: readonly SelectOption[] } & Omit<ComponentProps<'select'>, 'className' | 'id' | 'name' | 'children'>;

export function SelectField({ name, label, hint, error, optional, id, options, ...select }: SelectFieldProps) {
  return (
    <Field name={name} label={label} hint={hint} error={error} optional={optional} id={id}>
      {(control) => <SelectBox {...select} {...control} options={options} />}
    </Field>
  );
}
