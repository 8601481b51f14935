import fc from 'fast-check';
import Fraction from 'fraction.js';
import { expect, test } from 'vitest';
import { roundHalfEven, splitByLargestRemainder } from '#domain/rounding.ts';

test.each([
  // Rules for rounding off, Hartnell College (chemistry 22): the last figure kept is made even.
  ['21.350', 1, 214],
  ['21.45', 1, 214],
  ['21.4501', 1, 215],
  ['56.748', 1, 567],
  ['2.146', 2, 215],
  // Worked in decimal arithmetic from the same rule.
  ['0.125', 2, 12],
  ['0.135', 2, 14],
  ['1.005', 2, 100],
  ['2.675', 2, 268],
  ['7.325', 2, 732],
  ['-0.125', 2, -12],
  ['-0.135', 2, -14],
])('%s to %i places, half to even', (text, places, expected) => {
  expect(roundHalfEven(new Fraction(text).mul(10 ** places))).toBe(expected);
});

test('a figure beyond a safe integer is refused, never rounded off', () => {
  expect(() => roundHalfEven(new Fraction(2n ** 53n))).toThrow(RangeError);
});

// Electowiki, "Hamilton method": 60 seats over the fifteen states of the 1790 census.
const census: readonly (readonly [string, number, number])[] = [
  ['VA', 630560, 11], ['MA', 475327, 8], ['PA', 432879, 7], ['NC', 353523, 6], ['NY', 331589, 6],
  ['MD', 278514, 5], ['CT', 236841, 4], ['SC', 206236, 3], ['NJ', 179570, 3], ['NH', 141822, 2],
  ['VT', 85533, 1], ['GA', 70835, 1], ['KY', 68705, 1], ['RI', 68446, 1], ['DE', 55540, 1],
];

test('sixty seats go to the fifteen states as published', () => {
  expect(splitByLargestRemainder(60, census.map(([, people]) => people))).toEqual(census.map(([, , seats]) => seats));
});

test.each<[string, number, number[], number[]]>([
  // D. Lippman, Math in Society, apportionment of Delaware: inputs from memory, answer worked out.
  ['Delaware, 41 seats', 41, [162310, 538479, 197145], [7, 25, 9]],
  // Worked out from the rule (largest remainder, ties to the earlier row).
  ['100.00 in three', 10000, [1, 1, 1], [3334, 3333, 3333]],
  ['1.00 in three', 100, [1, 1, 1], [34, 33, 33]],
  ['19.99 at 5:3:2', 1999, [5, 3, 2], [999, 600, 400]],
  ['10.00 in seven', 1000, [1, 1, 1, 1, 1, 1, 1], [143, 143, 143, 143, 143, 143, 142]],
  ['1.01 at 1:1', 101, [1, 1], [51, 50]],
  ['5 yen at 7:3, a tie', 5, [7, 3], [4, 1]],
  ['weights all nought', 100, [0, 0, 0], [34, 33, 33]],
  ['below nought, mirrored', -101, [1, 1], [-51, -50]],
  ['nothing', 0, [3, 4], [0, 0]],
])('%s', (_, total, weights, parts) => {
  expect(splitByLargestRemainder(total, weights)).toEqual(parts);
});

test('a total with no row to go to, and a weight below nought, are refused', () => {
  expect(splitByLargestRemainder(0, [])).toEqual([]);
  expect(() => splitByLargestRemainder(1, [])).toThrow(RangeError);
  expect(() => splitByLargestRemainder(1, [1, -1])).toThrow(RangeError);
  expect(() => splitByLargestRemainder(1, [0.5])).toThrow(RangeError);
});

test('parts add up, each is less than one from its exact share, and a larger weight never gets less', () => {
  const weight = fc.tuple(fc.integer({ min: 0, max: 10 ** 6 }), fc.integer({ min: 1, max: 12 })).map(([n, d]) => new Fraction(n, d));
  fc.assert(
    fc.property(fc.integer({ min: -(10 ** 9), max: 10 ** 9 }), fc.array(weight, { minLength: 1, maxLength: 12 }), (total, weights) => {
      const parts = splitByLargestRemainder(total, weights);
      expect(parts.reduce((a, b) => a + b, 0)).toBe(total);
      const sum = weights.reduce((a, b) => a.add(b), new Fraction(0));
      parts.forEach((part, row) => {
        const own = weights[row] ?? new Fraction(0);
        const share = sum.n === 0n ? new Fraction(total, parts.length) : own.mul(total).div(sum);
        expect(share.sub(part).abs().lt(1)).toBe(true);
        parts.forEach((other, otherRow) => {
          if (own.gt(weights[otherRow] ?? 0)) expect(Math.abs(part)).toBeGreaterThanOrEqual(Math.abs(other));
        });
      });
    }),
  );
});
