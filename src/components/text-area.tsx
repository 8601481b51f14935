import type { ComponentProps } from 'react';
import { controlClass, Field, type FieldWords } from './field.tsx';

export type TextAreaProps = FieldWords & {
  /** As wide as what it stands in, rather than as lines are read. */
  full?: boolean;
} & Omit<ComponentProps<'textarea'>, 'className' | 'id' | 'name' | 'children'>;

export function TextArea({ name, label, hint, error, optional, id, rows = 4, full = false, ...area }: TextAreaProps) {
  return (
    <Field name={name} label={label} hint={hint} error={error} optional={optional} id={id}>
      {(control) => <textarea {...area} {...control} rows={rows} className={`${controlClass} field-sizing-content min-h-24 ${full ? '' : 'max-w-reading'}`} />}
    </Field>
  );
}
