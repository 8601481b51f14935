import fc from 'fast-check';
import Fraction from 'fraction.js';
import { expect, test } from 'vitest';
import { costsToTheDoor, receiptProblem } from '#domain/receipt.ts';
import type { ReceiptSums } from '#domain/receipt.ts';

function receipt(values: readonly number[], sums: Partial<ReceiptSums> = {}): ReceiptSums {
  return {
    currency: 'GBP', into: 'GBP', rate: new Fraction(1), discount: 0, delivery: 0, tax: 0, paperTotal: null,
    lines: values.map((value, row) => ({ key: `line ${row}`, value })),
    ...sums,
  };
}

function doors(sums: ReceiptSums): number[] {
  return costsToTheDoor(sums).lines.map(({ door }) => door);
}

// Worked histories of the ledger.
test('three lines of 1.05 abroad at 0.9 come to 2.84: 0.95, 0.95 and 0.94', () => {
  const costs = costsToTheDoor(receipt([105, 105, 105], { currency: 'USD', rate: new Fraction('0.9') }));
  expect(costs.lines.map(({ door }) => door)).toEqual([95, 95, 94]);
  expect([costs.ownTotal, costs.total, costs.notSorted]).toEqual([315, 284, 0]);
});

test('with A corrected from 10 to 30, B’s cost to the door goes from 12.50 to 11.25', () => {
  expect(doors(receipt([1000, 1000], { delivery: 500 }))).toEqual([1250, 1250]);
  expect(doors(receipt([3000, 1000], { delivery: 500 }))).toEqual([3375, 1125]);
});

test('discount goes by line value, then delivery and tax each by what is left', () => {
  // 30.00 and 10.00 less 4.00 leave 27.00 and 9.00; delivery 2.00 and tax 7.20 go 3:1.
  expect(doors(receipt([3000, 1000], { discount: 400, delivery: 200, tax: 720 }))).toEqual([2700 + 150 + 540, 900 + 50 + 180]);
});

test('delivery is shared equally where every line is nought', () => {
  expect(doors(receipt([0, 0, 0], { delivery: 100 }))).toEqual([34, 33, 33]);
});

test('a discount of everything leaves delivery and tax to be shared equally', () => {
  expect(doors(receipt([3000, 1000], { discount: 4000, delivery: 100 }))).toEqual([50, 50]);
  expect(doors(receipt([3000, 1000], { discount: 4000, tax: 101 }))).toEqual([51, 50]);
});

test('currencies of other exponents are converted between whole units of each', () => {
  // 1,000 yen at 0.005 pounds are 5.00; 1.234 dinars at 2.50 pounds are 3.085, to the even penny 3.08.
  expect(doors(receipt([1000], { currency: 'JPY', rate: new Fraction('0.005') }))).toEqual([500]);
  expect(doors(receipt([1234], { currency: 'KWD', rate: new Fraction('2.5') }))).toEqual([308]);
  expect(doors(receipt([1050], { into: 'JPY', rate: new Fraction(200) }))).toEqual([2100]);
});

test('what the paper has and no line yet is not sorted yet', () => {
  const part = costsToTheDoor(receipt([1000], { paperTotal: 2500 }));
  expect([part.total, part.notSorted, part.paperDifference]).toEqual([1000, 1500, 1500]);
  const picture = costsToTheDoor(receipt([], { paperTotal: 2500, currency: 'USD', rate: new Fraction('0.8') }));
  expect([picture.total, picture.notSorted, picture.ownTotal]).toEqual([0, 2000, 0]);
  const over = costsToTheDoor(receipt([1000], { paperTotal: 900 }));
  expect([over.total, over.notSorted, over.paperDifference]).toEqual([1000, 0, -100]);
  expect(costsToTheDoor(receipt([1000])).paperDifference).toBeNull();
});

test.each<[string, ReceiptSums, string | null]>([
  ['sound', receipt([1000], { discount: 1000 }), null],
  ['too much off', receipt([1000], { discount: 1001 }), 'The discount is more than the lines come to'],
  ['below nought', receipt([-1]), 'No figure of a receipt is below nought'],
  ['a rate of nought', receipt([1], { currency: 'USD', rate: new Fraction(0) }), 'A rate is more than nought'],
  ['a rate at home', receipt([1], { rate: new Fraction(2) }), 'From GBP into GBP the rate is 1'],
])('sums that are %s', (_, sums, problem) => {
  expect(receiptProblem(sums)).toBe(problem);
  if (problem !== null) expect(() => costsToTheDoor(sums)).toThrow(problem);
});

test('whatever the sums, the lines add up to the receipt and none is below nought', () => {
  const sums = fc
    .record({
      values: fc.array(fc.integer({ min: 0, max: 100_000 }), { minLength: 1, maxLength: 8 }),
      off: fc.integer({ min: 0, max: 100 }),
      delivery: fc.integer({ min: 0, max: 5000 }),
      tax: fc.integer({ min: 0, max: 5000 }),
      rate: fc.integer({ min: 1, max: 3000 }),
      unsorted: fc.integer({ min: 0, max: 5000 }),
    })
    .map(({ values, off, delivery, tax, rate, unsorted }) => {
      const value = values.reduce((a, b) => a + b, 0);
      const discount = Math.floor((value * off) / 100);
      return receipt(values, {
        currency: 'USD', rate: new Fraction(rate, 1000), discount, delivery, tax,
        paperTotal: value - discount + delivery + tax + unsorted,
      });
    });
  fc.assert(
    fc.property(sums, (one) => {
      const costs = costsToTheDoor(one);
      const sum = (of: (line: { own: number; door: number }) => number) => costs.lines.reduce((a, line) => a + of(line), 0);
      expect(sum(({ own }) => own)).toBe(costs.ownTotal);
      expect(sum(({ door }) => door)).toBe(costs.total);
      const exact = one.rate.mul(one.paperTotal ?? 0);
      expect(exact.sub(costs.total + costs.notSorted).abs().lte(new Fraction(1, 2))).toBe(true);
      for (const { own, door } of costs.lines) expect(Math.min(own, door)).toBeGreaterThanOrEqual(0);
    }),
  );
});
