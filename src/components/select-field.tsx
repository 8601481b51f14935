import type { ComponentProps } from 'react';
import { controlClass, Field, type FieldWords } from './field.tsx';

export interface SelectOption {
  value: string;
  label: string;
}

export type SelectFieldProps = FieldWords & { options: SelectOption[] } & Omit<ComponentProps<'select'>, 'className' | 'id' | 'name' | 'children'>;

export function SelectField({ name, label, hint, error, optional, id, options, ...select }: SelectFieldProps) {
  return (
    <Field name={name} label={label} hint={hint} error={error} optional={optional} id={id}>
      {(control) => (
        <select {...select} {...control} className={`${controlClass} select-control pr-8`}>
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
