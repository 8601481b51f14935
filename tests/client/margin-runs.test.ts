import { describe, expect, test } from 'vitest';
import type { RowView } from '#contracts/entry-view.ts';
import { hangingSlips, runsOf, type GuessedRow } from '#src/blocks/margin-runs.ts';

const words = (letters: number): RowView['body'][number] => ({ type: 'paragraph', attrs: { id: 'node1' }, content: [{ type: 'text', text: 'a'.repeat(letters) }] });
const slip = (lines: number): RowView['slips'][number] => ({ type: 'used', id: 'slip1', slip: { kind: 'used', word: 'Used', lines: Array.from({ length: lines }, () => ({ label: 'Roves', small: '204', value: '£9.69' })) } });
const row = (letters: number, ...slips: number[]): GuessedRow => ({ body: [words(letters)], slips: slips.map(slip) });

describe('runs of the tally margin', () => {
  test('a slip about as tall as its words starts the next words level with the next slip', () => {
    expect(runsOf([row(900, 4), row(900, 4)], 300)).toEqual([0, 1]);
  });
  test('words run on beside the day\u2019s tally and slips far taller than them, rather than leave a hole', () => {
    expect(runsOf([row(100), row(100, 12), row(100, 12)], 300)).toEqual([0, 0, 0]);
  });
  test('no words wait for the day\u2019s tally alone', () => {
    expect(runsOf([row(400), row(900, 4)], 300)).toEqual([0, 0]);
  });
  test('once the words have caught up, slips keep to their words again', () => {
    expect(runsOf([row(100), row(200, 3), row(2000), row(400, 3)], 300)).toEqual([0, 0, 0, 1]);
  });
});

describe('slips that hang below the end of the words', () => {
  test('stand under them, the last ones first, until both columns end about level', () => {
    // four slips of about 320 px beside 170 px of words: two stay, and two abreast under the words bring both columns to some 1,300 px
    const rows = [row(1500), row(300, 6, 6, 6, 6)];
    expect(hangingSlips(rows, 300)).toBe(2);
  });
  test('stay in the margin where the words go on beside them', () => {
    expect(hangingSlips([row(3000, 4, 4)], 300)).toBe(0);
  });
});
