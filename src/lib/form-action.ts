import { data, useActionData, useNavigation } from 'react-router-dom';
import { AppError, type FieldProblems } from '#contracts/errors.ts';
import { SignedOutForm } from './signed-out-form.ts';

/** What a form gets back when something in it needs mending: problems by field, and all that was typed. */
export interface FormResult {
  readonly fields: FieldProblems;
  readonly message: string;
  readonly values: Readonly<Record<string, string>>;
  /** With an answer that somebody changed it meanwhile: the version that stands there now. */
  readonly newer?: string;
  /** New each time, so that the summary takes the focus again. */
  readonly attempt: number;
}

/** What was typed, by field; never passwords. */
export function typedValues(form: FormData): Record<string, string> {
  const values: Record<string, string> = {};
  for (const [name, value] of form) {
    if (typeof value === 'string' && !/password|current/i.test(name)) values[name] = value;
  }
  return values;
}

function newerVersion({ newer }: AppError): { newer?: string } {
  return typeof newer === 'object' && newer !== null && 'version' in newer ? { newer: String(newer.version) } : {};
}

/** Runs a form's case. Outcomes the person can mend come back beside their fields, with all that was typed. */
export async function formAction(request: Request, run: (form: FormData) => Promise<Response>) {
  const form = await request.formData();
  try {
    return await run(form);
  } catch (error) {
    if (error instanceof AppError && error.code === 'sign-in-needed') throw new SignedOutForm(typedValues(form));
    if (!(error instanceof AppError) || error.code === 'not-found') throw error;
    const result: FormResult = { fields: error.fields ?? {}, message: error.message, values: typedValues(form), attempt: Date.now(), ...newerVersion(error) };
    return data(result, { status: error.status });
  }
}

export interface FormState {
  /** Problem of a field, for beside it. */
  readonly error: (name: string) => string | undefined;
  /** What stands in a field: what was typed, else what was there. */
  readonly value: (name: string, before?: string) => string;
  /** Whether a box is ticked: as sent, else as it was. */
  readonly ticked: (name: string, before: boolean) => boolean;
  readonly errors: { name?: string; message: string }[];
  /** The version somebody else saved meanwhile, which this form may go over only when asked to. */
  readonly newer: string | undefined;
  readonly attempt: number | undefined;
  readonly pending: boolean;
}

/**
 * The state of this page's form, with scripts or without.
 * @param form which one, where the page has several: what its field `form` holds
 */
export function useFormState(form?: string): FormState {
  const reply = useActionData<FormResult>();
  const navigation = useNavigation();
  const result = form === undefined || reply?.values['form'] === form ? reply : undefined;
  const sent = form === undefined || navigation.formData?.get('form') === form;
  const named = Object.entries(result?.fields ?? {}).map(([name, message]) => ({ name, message }));
  return {
    error: (name) => result?.fields[name],
    value: (name, before = '') => result?.values[name] ?? before,
    ticked: (name, before) => (result ? result.values[name] !== undefined : before),
    errors: result && named.length === 0 ? [{ message: result.message }] : named,
    newer: result?.newer,
    attempt: result?.attempt,
    pending: sent && navigation.state !== 'idle' && navigation.formMethod === 'POST',
  };
}

/** The version a form stands on: the one it was opened with, or the newer one its writer chose to go over. */
export function versionOf(form: FormData): string {
  return textOf(form, 'over') || textOf(form, 'version');
}

/** A text of a form, trimmed; empty where it was not sent. */
export function textOf(form: FormData, name: string): string {
  return passwordOf(form, name).trim();
}

/** The same just as typed: spaces at the ends of a password are part of it. */
export function passwordOf(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}
