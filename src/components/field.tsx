import type { ReactNode } from 'react';

/** What every control of a form takes. */
export interface FieldWords {
  /** The name it is sent under; its id follows from it. */
  name: string;
  label: string;
  hint?: ReactNode;
  /** What is wrong and how to mend it. */
  error?: string | undefined;
  /** Says "optional" beside the label. Fields are asked for unless this is set. */
  optional?: boolean;
  /** Only where one page has two fields of a name. */
  id?: string;
}

/** What a `Field` hands its control. */
export interface ControlProps {
  id: string;
  name: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
}

export interface FieldProps extends FieldWords {
  children: (control: ControlProps) => ReactNode;
}

export function fieldId(name: string): string {
  return `field-${name.replaceAll(/[^\w-]+/g, '-')}`;
}

export function controlProps({ name, hint, error, id = fieldId(name) }: FieldWords): ControlProps {
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return { id, name, 'aria-describedby': described || undefined, 'aria-invalid': error ? true : undefined };
}

/** Label above, hint under the control, the error in words under that. */
export function Field({ children, ...words }: FieldProps) {
  const control = controlProps(words);
  return (
    <div>
      <label htmlFor={control.id} className="mb-[5px] block text-small font-semibold">
        {words.label}
        {words.optional && <span className="font-normal text-ink-soft"> (optional)</span>}
      </label>
      {children(control)}
      <FieldNotes id={control.id} hint={words.hint} error={words.error} />
    </div>
  );
}

export function FieldNotes({ id, hint, error }: { id: string; hint?: ReactNode; error?: string | undefined }) {
  return (
    <>
      {hint && (
        <p id={`${id}-hint`} className="mt-1.5 text-small text-ink-soft">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="mt-1.5 text-small font-semibold text-lead">
          {error}
        </p>
      )}
    </>
  );
}

/** The box of every control one types in; `controlClass` is as wide as what it stands in. */
export const controlLook =
  'block rounded-edge border border-edge bg-card px-[11px] py-2 text-control font-medium text-ink placeholder:font-normal placeholder:text-ink-faint aria-[invalid]:border-2 aria-[invalid]:border-lead';
export const controlClass = `w-full ${controlLook}`;
