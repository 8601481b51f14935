import type { ComponentProps } from 'react';
import { controlClass, Field, type FieldWords } from './field.tsx';

export type TextAreaProps = FieldWords & Omit<ComponentProps<'textarea'>, 'className' | 'id' | 'name' | 'children'>;

export function TextArea({ name, label, hint, error, optional, id, rows = 4, ...area }: TextAreaProps) {
  return (
    <Field name={name} label={label} hint={hint} error={error} optional={optional} id={id}>
      {(control) => <textarea {...area} {...control} rows={rows} className={`${controlClass} field-sizing-content min-h-24 max-w-reading`} />}
    </Field>
  );
}
