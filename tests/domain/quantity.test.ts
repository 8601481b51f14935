import fc from 'fast-check';
import Fraction from 'fraction.js';
import { expect, test } from 'vitest';
import { addQuantities, compareQuantities, exactFrom, exactText, quantity, subtractQuantities } from '#domain/quantity.ts';
import type { Quantity } from '#domain/quantity.ts';
import { unitById } from '#domain/units.ts';

test('a gallon less sixteen cups is nothing, exactly', () => {
  const cup = quantity('volume', unitById('us-cup').factor);
  let left = quantity('volume', unitById('us-gal').factor);
  for (let board = 0; board < 16; board += 1) left = subtractQuantities(left, cup);
  expect(exactText(left.amount)).toBe('0/1');
});

test('three thirds of a litre are a litre', () => {
  const third = quantity('volume', new Fraction(1000, 3));
  const sum = addQuantities(addQuantities(third, third), third);
  expect(compareQuantities(sum, quantity('volume', new Fraction(1000)))).toBe(0);
  expect(compareQuantities(third, sum)).toBeLessThan(0);
});

test('two dimensions are never added, even where their types are not known', () => {
  const litre: Quantity = quantity('volume', new Fraction(1000));
  const kilo: Quantity = quantity('mass', new Fraction(1000));
  expect(() => addQuantities(litre, kilo)).toThrow(/volume and mass/);
  expect(() => subtractQuantities(litre, kilo)).toThrow(RangeError);
  expect(() => compareQuantities(litre, kilo)).toThrow(RangeError);
});

test('exact amounts are stored in lowest terms and read back the same', () => {
  expect([exactText(new Fraction(23.5)), exactText(new Fraction(3)), exactText(new Fraction(-1, 3))]).toEqual(['47/2', '3/1', '-1/3']);
  fc.assert(
    fc.property(fc.bigInt({ min: -(10n ** 15n), max: 10n ** 15n }), fc.bigInt({ min: 1n, max: 10n ** 9n }), (n, d) => {
      const amount = new Fraction(n, d);
      expect(exactFrom(exactText(amount)).equals(amount)).toBe(true);
    }),
  );
});

test.each(['', '3', '1/0', '1.5/2', '1/-2', ' 1/2', '1/2/3', 'a/b'])('%j is no stored amount', (text) => {
  expect(() => exactFrom(text)).toThrow(RangeError);
});
