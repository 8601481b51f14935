import type { ComponentProps } from 'react';
import { controlClass, Field, type FieldWords } from './field.tsx';

export type TextFieldProps = FieldWords & Omit<ComponentProps<'input'>, 'className' | 'id' | 'name' | 'children'>;

export function TextField({ name, label, hint, error, optional, id, type = 'text', ...input }: TextFieldProps) {
  return (
    <Field name={name} label={label} hint={hint} error={error} optional={optional} id={id}>
      {(control) => <input {...input} {...control} type={type} className={controlClass} />}
    </Field>
  );
}
