import type Fraction from 'fraction.js';
import type { Movement, MovementKind } from './movement.ts';

export type PricingMethod = 'fifo' | 'average';

export interface ShelfFigures {
  readonly in: number;
  readonly used: number;
  readonly wasted: number;
  readonly returned: number;
  readonly sold: number;
  readonly left: number;
}

export interface PricedMovement {
  readonly key: string;
  readonly kind: MovementKind;
  /** settled so far, minor units */
  readonly value: number;
  /** amount not bought yet */
  readonly short: Fraction;
  /** on the shelf after it */
  readonly left: Fraction;
  /** counted: seen less expected, and the value of it */
  readonly found?: { readonly amount: Fraction; readonly value: number };
}

export interface MaterialLedger {
  readonly material: string;
  readonly movements: readonly PricedMovement[];
  readonly figures: ShelfFigures;
  readonly left: Fraction;
  readonly notBoughtYet: Fraction;
  readonly lastPaid: { readonly day: string; readonly cost: number; readonly amount: Fraction } | null;
  readonly refusals: readonly { readonly key: string; readonly problem: 'more than there is'; readonly there: Fraction }[];
  /** work counted: movements replayed */
  readonly replayed: number;
}

export function priceMaterial(material: string, movements: readonly Movement[], method: PricingMethod): MaterialLedger {
  throw new Error(`priceMaterial ${material} ${movements.length} ${method}`);
}

export function priceShelf(movements: readonly Movement[], method: PricingMethod): ReadonlyMap<string, MaterialLedger> {
  throw new Error(`priceShelf ${movements.length} ${method}`);
}
