/** What came of reading typed text: the value, or words to stand beside the field. */
export type Reading<T> = { ok: true; value: T } | { ok: false; problem: string };

/** A text that could not be read. @param problem what is wrong and how to mend it, one sentence; its full stop is put here */
export function unread(problem: string): { ok: false; problem: string } {
  return { ok: false, problem: `${problem}.` };
}

/** A text that was read. */
export function read<T>(value: T): { ok: true; value: T } {
  return { ok: true, value };
}
