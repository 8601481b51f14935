import type Fraction from 'fraction.js';

/** Everything that happens to a material on a shelf, by the names of the ledger. */
export type MovementKind = 'bought' | 'given' | 'used' | 'wasted' | 'returned' | 'sold' | 'counted';

export interface Movement {
  readonly key: string;
  readonly kind: MovementKind;
  readonly material: string;
  /** plain date, yyyy-mm-dd: the day of work, or the day it arrived */
  readonly day: string;
  /** the source's number: one sequence for entries, receipts and shelf acts */
  readonly sequence: number;
  /** place within the source's document */
  readonly place: number;
  /** base units, exact, above nought; for `counted` the amount seen, which may be nought */
  readonly amount: Fraction;
  /** bought: what the lot came to at the door, minor units (nought unless said) */
  readonly cost?: number;
  /** returned: key of the bought line it gives back */
  readonly of?: string;
  /** counted: what became of a shortage (used, not written up, unless said) */
  readonly shortage?: 'used' | 'wasted';
}

/** Which way a kind of movement goes; a count compares, and goes last in its day. */
export type Direction = 'in' | 'out' | 'count';

/** The direction of each kind. */
export const directionOf: Readonly<Record<MovementKind, Direction>> = {
  bought: 'in',
  given: 'in',
  used: 'out',
  wasted: 'out',
  returned: 'out',
  sold: 'out',
  counted: 'count',
};

const turn: Readonly<Record<Direction, number>> = { in: 0, out: 1, count: 2 };

function byText(a: string, b: string): number {
  if (a === b) return 0;
  return a < b ? -1 : 1;
}

/**
 * The order of the ledger: day; inward before outward, counts last; the source's number;
 * the place in its document. The key settles what is left, so that the order never depends on typing.
 */
export function compareMovements(a: Movement, b: Movement): number {
  return (
    byText(a.day, b.day) ||
    turn[directionOf[a.kind]] - turn[directionOf[b.kind]] ||
    a.sequence - b.sequence ||
    a.place - b.place ||
    byText(a.key, b.key)
  );
}

/** @throws RangeError for a movement that cannot be: an amount below nought, a cost that is no whole number. */
export function requirePossible({ key, kind, amount, cost = 0 }: Movement): void {
  const nought = amount.n === 0n;
  if ((amount.s < 0n && !nought) || (nought && kind !== 'counted')) {
    throw new RangeError(`Movement ${key} has an amount of ${amount.toFraction()}`);
  }
  if (!Number.isSafeInteger(cost) || cost < 0) throw new RangeError(`Movement ${key} has a cost of ${cost}`);
}
