import { expect, test } from 'vitest';
import { keptWords, nothingChanged } from '#src/features/desk/what-is-kept.ts';
import type { SaveState } from '#src/features/desk/saver.ts';

const still: SaveState = { phase: { is: 'still' }, keptHere: true, onServer: true, savedAt: null, version: 3, base: null };

test('an entry opened and not written in has nothing to throw away', () => {
  expect(nothingChanged(still)).toBe(true);
  expect(keptWords(still)).toBe('Nothing changed yet');
});

test('a working copy from another day, or a word just typed, is something to throw away', () => {
  expect(nothingChanged({ ...still, savedAt: new Date() })).toBe(false);
  expect(nothingChanged({ ...still, onServer: false, phase: { is: 'waiting' } })).toBe(false);
});
