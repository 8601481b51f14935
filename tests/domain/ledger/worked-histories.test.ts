import Fraction from 'fraction.js';
import { expect, test } from 'vitest';
import { priceMaterial } from '#domain/ledger/price.ts';
import { bought, boughtAt, counted, dayOf, given, history, priced, returned, rowOf, used, wasted } from './history.ts';

// The worked histories at the end of the ledger's page; the two about receipts are in receipt.test.ts.

test('average: of 18 discs for 10.00, eight used one at a time and eight at once come to 4.44 both ways', () => {
  const oneByOne = priced([bought(18, { cost: 1000 }), ...Array.from({ length: 8 }, () => used(1))], 'average');
  const atOnce = priced([bought(18, { cost: 1000 }), used(8)], 'average');
  expect([oneByOne.figures.used, atOnce.figures.used]).toEqual([444, 444]);
  expect(oneByOne.figures).toEqual(atOnce.figures);
});

test('first in first out: a draft laid over shows 30.00 used and nothing left; without it 10.00 and 20.00', () => {
  const published = history([boughtAt(10, 100), boughtAt(10, 200), used(10)]);
  const draft = { ...used(10), key: 'draft', material: 'A', day: dayOf(2), sequence: 9, place: 0 };
  expect(priceMaterial('A', published, 'fifo').figures).toMatchObject({ used: 1000, left: 2000 });
  const withDrafts = priceMaterial('A', [...published, draft], 'fifo');
  expect(withDrafts.figures).toMatchObject({ used: 3000, left: 0 });
  expect(withDrafts.left.equals(0)).toBe(true);
});

test('a use typed later and dated before a count is not short at the count', () => {
  const ledger = priced([boughtAt(10, 100), counted(8, { day: dayOf(5) }), used(2, { day: dayOf(3) })], 'fifo');
  expect(rowOf(ledger, 'A1')).toMatchObject({ value: 0, found: { value: 0 } });
  expect(rowOf(ledger, 'A1').found?.amount.equals(0)).toBe(true);
  expect(ledger.figures).toMatchObject({ used: 200, left: 800 });
});

test('first in first out: a count of 15 of 20 with the shortage wasted takes the oldest five', () => {
  const ledger = priced([boughtAt(10, 100), boughtAt(10, 300), counted(15, { shortage: 'wasted' })], 'fifo');
  expect(ledger.figures).toMatchObject({ wasted: 500, used: 0, left: 3500 });
});

test.each(['fifo', 'average'] as const)('%s: two found at a count are of no cost', (method) => {
  const ledger = priced([bought(10, { cost: 1000 }), used(4), counted(8)], method);
  expect(rowOf(ledger, 'A2').found?.amount.equals(2)).toBe(true);
  expect(ledger.figures).toEqual({ in: 1000, used: 400, wasted: 0, returned: 0, sold: 0, left: 600 });
  expect(ledger.left.equals(8)).toBe(true);
});

test('first in first out: five of the second line go back at what they cost', () => {
  const ledger = priced([boughtAt(10, 100), boughtAt(10, 200), used(4), returned(5, { of: 'A1' })], 'fifo');
  expect(ledger.figures).toMatchObject({ returned: 1000, used: 400, left: 1600 });
  expect(ledger.refusals).toEqual([]);
});

test('average: what was used before anything was bought settles from the first lot of the day alone', () => {
  const ledger = priced([used(2), boughtAt(5, 100, { day: dayOf(2) }), boughtAt(5, 300, { day: dayOf(2) })], 'average');
  expect(ledger.figures).toMatchObject({ used: 200, left: 1800 });
  expect(ledger.notBoughtYet.equals(0)).toBe(true);
});

// Beyond the page, from its rules.

test('a shortage at a count is used, not written up, unless said', () => {
  expect(priced([boughtAt(10, 100), counted(7)], 'fifo').figures).toMatchObject({ used: 300, wasted: 0, left: 700 });
});

test('a surplus settles nothing that is short; the next lot does, oldest use first', () => {
  const early = [used(3), wasted(2), counted(4, { day: dayOf(2) })];
  const before = priced(early, 'fifo');
  expect(before.notBoughtYet.equals(5)).toBe(true);
  expect(before.left.equals(4)).toBe(true);
  const after = priced([...early, boughtAt(4, 100, { day: dayOf(3) })], 'fifo');
  expect([rowOf(after, 'A0').value, rowOf(after, 'A1').value]).toEqual([300, 100]);
  expect(rowOf(after, 'A1').short.equals(1)).toBe(true);
  expect(after.figures).toMatchObject({ used: 300, wasted: 100, left: 0 });
});

test('a return by name goes on to the oldest lot once its own is eaten', () => {
  const ledger = priced([boughtAt(10, 100), boughtAt(10, 200), returned(12, { of: 'A1' })], 'fifo');
  expect(ledger.figures).toMatchObject({ returned: 2200, left: 800 });
});

test('average: a return goes by the method, whatever it names', () => {
  const ledger = priced([boughtAt(10, 100), boughtAt(10, 200), returned(10, { of: 'A1' })], 'average');
  expect(ledger.figures).toMatchObject({ returned: 1500, left: 1500 });
});

test('an empty pool starts again at the new cost', () => {
  const ledger = priced([boughtAt(3, 100), used(3), boughtAt(2, 500, { day: dayOf(2) }), used(1, { day: dayOf(2) })], 'average');
  expect(ledger.figures).toMatchObject({ used: 800, left: 500 });
});

test.each(['returned', 'sold'] as const)('more %s than there is is refused and takes nothing', (kind) => {
  const ledger = priced([boughtAt(3, 100), { kind, amount: new Fraction(4) }], 'fifo');
  expect(ledger.refusals).toEqual([{ key: 'A1', problem: 'more than there is', there: new Fraction(3) }]);
  expect(ledger.figures).toMatchObject({ left: 300, returned: 0, sold: 0 });
});

test('an edit of the past that leaves too little for a later sale is refused too', () => {
  const sale = { kind: 'sold' as const, amount: new Fraction(5), day: dayOf(9) };
  expect(priced([boughtAt(10, 100), sale], 'fifo').refusals).toEqual([]);
  expect(priced([boughtAt(10, 100), sale, used(6, { day: dayOf(3) })], 'fifo').refusals.map(({ key }) => key)).toEqual(['A1']);
});

test('inward goes before outward within a day, and a count last, whatever was typed first', () => {
  const ledger = priced([counted(8), used(2), boughtAt(10, 100)], 'fifo');
  expect(ledger.movements.map(({ kind }) => kind)).toEqual(['bought', 'used', 'counted']);
  expect(ledger.notBoughtYet.equals(0)).toBe(true);
});

test('within a day and direction the source’s number goes before the place, and the place before the key', () => {
  const happenings = [
    boughtAt(1, 400, { key: 'b', sequence: 2, place: 1 }),
    boughtAt(1, 300, { key: 'a', sequence: 2, place: 1 }),
    boughtAt(1, 200, { key: 'd', sequence: 1, place: 9 }),
    boughtAt(1, 100, { key: 'c', sequence: 1, place: 3 }),
    boughtAt(1, 500, { key: '0', sequence: 10, place: 0 }),
  ];
  expect(priced(happenings, 'fifo').movements.map(({ key }) => key)).toEqual(['c', 'd', 'a', 'b', '0']);
});

test('what was given is of no cost, whatever worth is noted beside it', () => {
  const ledger = priced([given(4, { cost: 900 }), used(1)], 'fifo');
  expect(ledger.figures).toEqual({ in: 0, used: 0, wasted: 0, returned: 0, sold: 0, left: 0 });
  expect(ledger.left.equals(3)).toBe(true);
});

test('the last price paid is that of the last line bought by day', () => {
  const ledger = priced([bought(4, { cost: 900, day: dayOf(7) }), bought(2, { cost: 100, day: dayOf(2) })], 'fifo');
  expect(ledger.lastPaid).toEqual({ day: dayOf(7), cost: 900, amount: new Fraction(4) });
  expect(priced([used(1)], 'fifo').lastPaid).toBeNull();
});

test.each([
  ['an amount below nought', [used(-1)], /amount/],
  ['an amount of nought', [used(0)], /amount/],
  ['a cost that is no whole number', [bought(1, { cost: 0.5 })], /cost/],
  ['one key twice', [used(1, { key: 'k' }), used(1, { key: 'k' })], /key k/],
])('%s cannot be priced', (_, happenings, problem) => {
  expect(() => priced(happenings, 'fifo')).toThrow(problem);
});
