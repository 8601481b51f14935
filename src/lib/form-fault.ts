import { data, useActionData, useNavigation } from 'react-router-dom';
import { AppError, errorStatus, type FieldProblems } from '#contracts/errors.ts';

/** A form that came back: what is wrong, beside which fields, and what was typed. */
export interface FormFault {
  /** Which form of the page, by its field `form`; empty where there is one only. */
  readonly form: string;
  readonly message: string;
  readonly fields: FieldProblems;
  readonly values: Readonly<Record<string, string>>;
  /** New each time, so that the summary takes the focus again. */
  readonly attempt: number;
}

/** What was typed under a name; empty for a file or nothing. */
export function textOf(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}

/** Outcomes that are about the whole page and not about what was typed. */
const ofThePage = new Set(['sign-in-needed', 'not-found', 'broken']);

/**
 * The reply of an action whose call was refused; anything that is not for the form goes on up.
 * @param secret fields that are never sent back
 */
export function formFault(error: unknown, form: FormData, secret: readonly string[] = []) {
  if (!(error instanceof AppError) || ofThePage.has(error.code)) throw error;
  const typed = [...form].filter((field): field is [string, string] => typeof field[1] === 'string' && !secret.includes(field[0]));
  const fault: FormFault = {
    form: textOf(form, 'form'), message: error.message, fields: error.fields ?? {}, values: Object.fromEntries(typed), attempt: Date.now(),
  };
  return data(fault, { status: errorStatus[error.code] });
}

export interface FormState {
  readonly fault: FormFault | null;
  /** True while this form is on its way. */
  readonly pending: boolean;
}

/** How a form of this page stands. */
export function useFormState(form = ''): FormState {
  const reply = useActionData<FormFault>();
  const navigation = useNavigation();
  const sent = navigation.formMethod === 'POST' ? navigation.formData : undefined;
  return {
    fault: reply?.form === form ? reply : null,
    pending: sent !== undefined && textOf(sent, 'form') === form,
  };
}
