import { expect, test } from 'vitest';
import { plainDay } from '#contracts/fields.ts';
import { deriveEntry, entryDocument, isProse } from '#src/blocks/pure.ts';
import { layoutTape } from '#src/components/tape-layout.ts';
import { boughtBlock, dayOf } from '#tests/support/workshop.ts';

// A year of 26 or 2206 drew a tape over centuries: megabytes of it, on every page of the build.

const around = { measures: 'imperial', currency: 'GBP', materials: new Map() } as const;
const slips = ['0026-11-14', '1899-12-31', '2101-01-01', '9999-12-31'];

test.each(slips)('%s is no day of work', (day) => {
  const between = /between 1900 and 2100/;
  expect(plainDay.safeParse(day).error?.issues[0]?.message).toMatch(between);
  expect(entryDocument.safeParse(dayOf(day, [])).success).toBe(false);
  expect(entryDocument.safeParse(dayOf('2026-11-14', [], { dayTo: day })).success).toBe(false);
  expect(deriveEntry(dayOf(day, []), around).faults['day']).toMatch(between);
  const receipt = boughtBlock([{ name: 'Drill', goes: 'straight', money: '1' }], { day });
  expect(entryDocument.safeParse(dayOf('2026-11-14', [receipt])).success).toBe(false);
  if (isProse(receipt)) throw new Error('a receipt is no prose');
  expect(deriveEntry(dayOf('2026-11-14', [receipt]), around).faults[`${receipt.attrs.id}.day`]).toMatch(between);
});

test.each(['1900-01-01', '1961-06-30', '2100-12-31'])('%s is one', (day) => {
  expect(plainDay.safeParse(day).success).toBe(true);
  expect(deriveEntry(dayOf(day, []), around).faults['day']).toBeUndefined();
});

test('a tape folds years in which nothing was written up, and says which', () => {
  const bar = (day: string) => ({ day, amount: 100, label: day, href: `/builds/curlew/${day}` });
  const { strips } = layoutTape({ from: '1900-01-01', to: '2030-05-01', bars: [bar('1926-11-14'), bar('2026-11-14'), bar('2027-03-01'), bar('2030-05-01')] });
  expect(strips.map(({ year }) => year)).toEqual([1926, 2026, 2027, 2030]);
  expect(strips.map(({ idle }) => idle)).toEqual([{ from: 1900, to: 1925 }, { from: 1927, to: 2025 }, null, { from: 2028, to: 2029 }]);
  expect(strips.flatMap(({ ticks }) => [...ticks.day, ...ticks.week, ...ticks.month]).length).toBeLessThan(4 * 371);
});

test('days before the first Monday of a year stand on the tape of the year before', () => {
  const bar = (day: string) => ({ day, amount: 100, label: day, href: `/builds/curlew/${day}` });
  const { strips } = layoutTape({ from: '2020-01-01', to: '2026-11-14', bars: [bar('2021-01-02'), bar('2026-11-14')] });
  expect(strips.flatMap(({ bars }) => bars)).toHaveLength(2);
});
