import Fraction from 'fraction.js';
import { exponentOf } from './currency.ts';
import { roundHalfEven, splitByLargestRemainder, wholeNumber } from './rounding.ts';

export interface ReceiptLine {
  readonly key: string;
  /** minor units of the receipt's currency, as printed on the paper */
  readonly value: number;
}

export interface ReceiptSums {
  readonly currency: string;
  /** the shelf's currency */
  readonly into: string;
  /** money of `into` for one of `currency` (for whole pounds or dollars, not minor units) */
  readonly rate: Fraction;
  readonly lines: readonly ReceiptLine[];
  /** taken off, as a figure above nought */
  readonly discount: number;
  readonly delivery: number;
  readonly tax: number;
  readonly paperTotal: number | null;
}

export interface DoorCosts {
  /** `own` in the receipt's currency, `door` in the shelf's; in the order of the receipt */
  readonly lines: readonly { readonly key: string; readonly own: number; readonly door: number }[];
  /** what the lines come to with their shares, in the receipt's currency */
  readonly ownTotal: number;
  /** what the lines come to, in the shelf's currency: the sum of `door`, without `notSorted` */
  readonly total: number;
  /** in the shelf's currency: what the paper has and no line yet */
  readonly notSorted: number;
  /** in the receipt's currency: the paper's total less the lines'; null without a paper total */
  readonly paperDifference: number | null;
}

/** What is wrong with a receipt's sums, in words for its form, or null when they can be priced. */
export function receiptProblem(sums: ReceiptSums): string | null {
  const figures = [...sums.lines.map(({ value }) => value), sums.discount, sums.delivery, sums.tax, sums.paperTotal ?? 0];
  if (figures.some((figure) => figure < 0)) return 'No figure of a receipt is below nought';
  if (sums.rate.s < 0n || sums.rate.n === 0n) return 'A rate is more than nought';
  if (sums.currency === sums.into && !sums.rate.equals(1)) return `From ${sums.currency} into ${sums.into} the rate is 1`;
  const value = sums.lines.reduce((a, line) => a + line.value, 0);
  if (sums.lines.length > 0 && sums.discount > value) return 'The discount is more than the lines come to';
  return null;
}

// Discount by line value, then delivery and tax each by what is left of it (ledger, "A receipt").
function ownCosts({ lines, discount, delivery, tax }: ReceiptSums): number[] {
  if (lines.length === 0) return [];
  const values = lines.map(({ value }) => wholeNumber(value, 'A line'));
  const off = splitByLargestRemainder(discount, values);
  const net = values.map((value, row) => value - (off[row] ?? 0));
  const brought = splitByLargestRemainder(delivery, net);
  const taxed = splitByLargestRemainder(tax, net);
  return net.map((value, row) => value + (brought[row] ?? 0) + (taxed[row] ?? 0));
}

function ownNotSorted({ lines, discount, delivery, tax, paperTotal }: ReceiptSums, ownTotal: number): number {
  if (lines.length > 0) return Math.max(0, (paperTotal ?? ownTotal) - ownTotal);
  return paperTotal ?? Math.max(0, delivery + tax - discount);
}

function converted(minor: number, { currency, into, rate }: ReceiptSums): number {
  const scale = new Fraction(10).pow(exponentOf(into) - exponentOf(currency));
  return roundHalfEven(rate.mul(scale).mul(minor));
}

/**
 * What each line of a receipt costs by the time it is on the shelf. The discount is shared by
 * line value, delivery and tax by net value (equally where all are nought); the whole receipt,
 * with what is not sorted into lines yet, is converted once and split by the lines' costs in
 * the receipt's own currency, largest remainder, ties to the earlier row.
 * A receipt of no lines is all *not sorted yet*.
 * @throws RangeError for sums that `receiptProblem` finds fault with.
 */
export function costsToTheDoor(sums: ReceiptSums): DoorCosts {
  const problem = receiptProblem(sums);
  if (problem !== null) throw new RangeError(problem);
  const own = ownCosts(sums);
  const ownTotal = own.reduce((a, b) => a + b, 0);
  const unsorted = ownNotSorted(sums, ownTotal);
  const shares = splitByLargestRemainder(converted(ownTotal + unsorted, sums), [...own, unsorted]);
  const doors = shares.slice(0, own.length);
  return {
    lines: sums.lines.map(({ key }, row) => ({ key, own: own[row] ?? 0, door: doors[row] ?? 0 })),
    ownTotal,
    total: doors.reduce((a, b) => a + b, 0),
    notSorted: shares[own.length] ?? 0,
    paperDifference: sums.paperTotal === null ? null : sums.paperTotal - ownTotal,
  };
}
