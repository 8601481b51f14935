import type Fraction from 'fraction.js';

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
  /** inward: what the lot came to at the door, minor units */
  readonly cost?: number;
  /** returned: key of the bought line it gives back */
  readonly of?: string;
  /** counted: what became of a shortage */
  readonly shortage?: 'used' | 'wasted';
}

export function compareMovements(a: Movement, b: Movement): number {
  throw new Error(`compareMovements ${a.key} ${b.key}`);
}
