import type { ComponentProps } from 'react';
import { controlProps, FieldNotes, type FieldWords } from './field.tsx';

export type CheckboxProps = Omit<FieldWords, 'optional'> & Omit<ComponentProps<'input'>, 'className' | 'id' | 'name' | 'type' | 'children'>;

export function Checkbox({ name, label, hint, error, id, ...input }: CheckboxProps) {
  const control = controlProps({ name, label, hint, error, id });
  return (
    <div>
      <label htmlFor={control.id} className="flex min-h-8 items-start gap-2.5 py-1 text-control">
        <input {...input} {...control} type="checkbox" className="mt-0.5 size-[18px] flex-none accent-scribe" />
        <span>{label}</span>
      </label>
      <div className="-mt-1.5 pl-7">
        <FieldNotes id={control.id} hint={hint} error={error} />
      </div>
    </div>
  );
}
