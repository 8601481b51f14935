import { halfEvenQuotient } from '../rounding.ts';

/**
 * An amount bought at a cost that gives it up as it is drawn: after `drawn` in all it has given
 * round(cost × drawn ÷ amount), so that eaten whole it has given exactly its cost (ledger, "Pricing").
 * Amounts in parts, money in minor units.
 */
export interface Lot {
  /** key of the movement that brought it */
  readonly origin: string;
  readonly cost: bigint;
  readonly amount: bigint;
  drawn: bigint;
  given: bigint;
}

/** A lot nothing has been drawn from. @param cost minor units @param amount parts, above nought */
export function newLot(origin: string, cost: bigint, amount: bigint): Lot {
  return { origin, cost, amount, drawn: 0n, given: 0n };
}

/** Parts of a lot not drawn yet. */
export function leftIn(lot: Lot): bigint {
  return lot.amount - lot.drawn;
}

/** Draws from a lot and gives the value of the draw. @param amount at most what is left in it */
export function drawFrom(lot: Lot, amount: bigint): bigint {
  const before = lot.given;
  lot.drawn += amount;
  lot.given = halfEvenQuotient(lot.cost * lot.drawn, lot.amount);
  return lot.given - before;
}

/** What is on a shelf of one material, priced by one method. */
export interface Stock {
  /** parts on the shelf, never below nought */
  readonly amount: () => bigint;
  /** value of what is on the shelf, minor units */
  readonly value: () => bigint;
  /** Takes in what is left of a lot. */
  readonly put: (lot: Lot) => void;
  /** Draws at most what is there and gives its value. @param from bought line to draw from first */
  readonly take: (amount: bigint, from?: string) => bigint;
}
