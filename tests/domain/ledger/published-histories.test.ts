import { describe, expect, test } from 'vitest';
import type { MaterialLedger } from '#domain/ledger/price.ts';
import { boughtAt, dayOf, priced, used, valuesUsed } from './history.ts';
import type { Happening } from './history.ts';

function given(...rows: readonly (readonly ['b', number, number] | readonly ['s', number])[]): Happening[] {
  return rows.map((row, at) => {
    const said = { day: dayOf(at + 1) };
    return row[0] === 'b' ? boughtAt(row[1], row[2] * 100, said) : used(row[1], said);
  });
}

// OpenStax, Principles of Accounting, volume 1, chapter 10, sections 10.2 and 10.3 (git snapshot
// of 23 April 2026): opening 150 at 21, issue 120, receipt 225 at 27, issue 180, receipt 210 at 33.
const july = given(['b', 150, 21], ['s', 120], ['b', 225, 27], ['s', 180], ['b', 210, 33]);

describe('OpenStax, chapter 10', () => {
  test('first in first out, exactly', () => {
    const ledger = priced(july, 'fifo');
    expect(valuesUsed(ledger)).toEqual([252000, 468000]);
    expect(ledger.figures).toMatchObject({ in: 1615500, used: 720000, left: 895500 });
    expect(ledger.left.equals(285)).toBe(true);
  });

  test('moving average: exact to the penny, and the book’s rounded figures within 1.00', () => {
    const ledger = priced(july, 'average');
    // 180 × 6,705 ÷ 255 = 4,732.941 176; left 75 of it and 210 at 33 = 8,902.058 824.
    expect(valuesUsed(ledger)).toEqual([252000, 473294]);
    expect(ledger.figures).toMatchObject({ in: 1615500, used: 725294, left: 890206 });
    const book = { used: 725300, left: 890200 };
    expect(Math.abs(ledger.figures.used - book.used)).toBeLessThan(100);
    expect(Math.abs(ledger.figures.left - book.left)).toBeLessThan(100);
  });

  test('the average is never rounded before it is multiplied out', () => {
    // The same goods as one receipt are the book's periodic average: 16,155 ÷ 585, 300 issued.
    // The book rounds to 27.62 first and so issues 8,283 and keeps 7,872; exactly it is 8,284.62 and 7,870.38.
    const one = priced([{ ...boughtAt(585, 1), cost: 1615500 }, used(300)], 'average');
    expect(one.figures).toMatchObject({ used: 828462, left: 787038 });
  });
});

// The same section's exercises: inputs as printed, answers worked out from IAS 2 in exact fractions.
test.each<[string, Happening[], [number, number], [number, number]]>([
  [
    'A76', given(['b', 240, 100], ['s', 160], ['b', 520, 103], ['s', 400], ['b', 400, 110], ['s', 370]),
    [9626000, 2530000], [9682733, 2473267],
  ],
  ['A65 and A67', given(['b', 800, 50], ['b', 600, 52], ['s', 400], ['s', 350]), [3750000, 3370000], [3814286, 3305714]],
])('OpenStax, exercise %s', (_, happenings, fifo, average) => {
  const figures = (ledger: MaterialLedger): [number, number] => [ledger.figures.used, ledger.figures.left];
  expect(figures(priced(happenings, 'fifo'))).toEqual(fifo);
  const [usedByAverage, left] = figures(priced(happenings, 'average'));
  // Each inflow strikes the pool in whole pennies, so that a book's exact figure is met within 0.01.
  expect(Math.abs(usedByAverage - average[0])).toBeLessThanOrEqual(1);
  expect(Math.abs(left - average[1])).toBeLessThanOrEqual(1);
});
