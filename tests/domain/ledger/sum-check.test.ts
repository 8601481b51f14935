import { expect, test } from 'vitest';
import { sumCheck } from '#domain/ledger/sum-check.ts';

const even = {
  spent: 10_000, movedIn: 700, used: 3000, wasted: 250, left: 4000, onOrder: 900, notSorted: 1100, returned: 600, sold: 400, movedOut: 450,
};

test('the sum holds when every penny has its place', () => {
  expect(sumCheck(even)).toEqual({ holds: true, difference: 0 });
});

test('a penny too much in any one place is shown, and which side it is on', () => {
  for (const side of ['spent', 'movedIn'] as const) {
    expect(sumCheck({ ...even, [side]: even[side] + 1 })).toEqual({ holds: false, difference: 1 });
  }
  for (const place of ['used', 'wasted', 'left', 'onOrder', 'notSorted', 'returned', 'sold', 'movedOut'] as const) {
    expect(sumCheck({ ...even, [place]: even[place] + 1 })).toEqual({ holds: false, difference: -1 });
  }
});
