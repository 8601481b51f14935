import type Fraction from 'fraction.js';

export interface ReceiptLine {
  readonly key: string;
  /** minor units of the receipt's currency, as printed on the paper */
  readonly value: number;
}

export interface ReceiptSums {
  readonly currency: string;
  /** the shelf's currency */
  readonly into: string;
  /** money of `into` for one of `currency` */
  readonly rate: Fraction;
  readonly lines: readonly ReceiptLine[];
  readonly discount: number;
  readonly delivery: number;
  readonly tax: number;
  readonly paperTotal: number | null;
}

export interface DoorCosts {
  /** `own` in the receipt's currency, `door` in the shelf's */
  readonly lines: readonly { readonly key: string; readonly own: number; readonly door: number }[];
  readonly ownTotal: number;
  readonly total: number;
  /** in the shelf's currency: what the paper has and no line yet */
  readonly notSorted: number;
  readonly paperDifference: number | null;
}

export function costsToTheDoor(sums: ReceiptSums): DoorCosts {
  throw new Error(`costsToTheDoor ${sums.currency}`);
}
