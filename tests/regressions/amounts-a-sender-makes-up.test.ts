import { expect, test } from 'vitest';
import { readQuantity } from '#domain/quantity-reading.ts';
import { deriveEntry, readEntry, type EntryDocument, type MaterialFacts } from '#src/blocks/pure.ts';
import { boughtBlock, dayOf } from '#tests/support/workshop.ts';

const nails: MaterialFacts = { id: 1, name: 'Nails', dimension: 'count', unit: 'piece', packs: [], ratio: null, hazards: [] };
const context = { measures: 'imperial' as const, currency: 'GBP', materials: new Map([[1, nails]]) };

function bought(goes: 'straight' | 'shelf', exact: string | null): EntryDocument {
  return dayOf('2026-05-01', [boughtBlock([{ of: nails, id: 'line-nails', amount: '1', unit: 'piece', money: '1.00', goes, exact, read: '1|1 piece' }], {}, 'bought-nails')]);
}

// A line that went straight into use kept whatever figure its sender wrote, and was believed once it went to the shelf.
test.each(['999/1', '1/0'])('a figure of %s sent with a line that is not stocked is not believed when it is', (exact) => {
  const first = readEntry(bought('straight', exact), [], context);
  const second = readEntry(bought('shelf', exact), [first], context);
  expect(deriveEntry(second, context).receipts[0]?.lines[0]?.amount).toBe('1/1');
});

// The exact text went beyond what a document may hold, so that the saved draft could not be opened again.
test('an amount too fine to be kept is refused in words', () => {
  const text = '1234567 1/9999999999999999999999999999999999999999999 ft';
  expect(readQuantity(text, { measures: 'us', dimension: 'length' })).toEqual({ ok: false, problem: 'A fraction has 128 at most below the line: write a rounder figure, like 1/64.' });
  expect(readQuantity('1/3 ft', { measures: 'us', dimension: 'length' }).ok).toBe(true);
});
