// A day of work or a receipt. Outside these years it is a slip of the finger, and a build's tape would be drawn over centuries.
const first = '1900-01-01';
const last = '2100-12-31';

/** What is wrong with a plain date, yyyy-mm-dd, in words for beside its field; nothing when it is a day. */
export function dayProblem(day: string): string | null {
  return day < first || day > last ? 'Give a day between 1900 and 2100: look at the year again.' : null;
}
