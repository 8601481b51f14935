import { standsWords, type Stands } from '#contracts/words.ts';

/** "Working", "Laid up until March", "Waiting for chrome". */
export function standsText(stands: Stands, note: string): string {
  const takesNote = stands === 'laid-up' || stands === 'waiting';
  if (!takesNote) return standsWords[stands];
  return note === '' ? standsWords[stands].replace(/ (until|for)$/, '') : `${standsWords[stands]} ${note}`;
}
