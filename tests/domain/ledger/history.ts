import Fraction from 'fraction.js';
import type { Movement, MovementKind } from '#domain/ledger/movement.ts';
import type { MaterialLedger, PricedMovement, PricingMethod } from '#domain/ledger/price.ts';
import { priceMaterial } from '#domain/ledger/price.ts';

export type Said = Partial<Omit<Movement, 'kind' | 'amount' | 'material'>>;

/** One thing that happened, on day 1 unless said; keys and numbers are given by `history`. */
export interface Happening extends Said {
  readonly kind: MovementKind;
  readonly amount: Fraction;
}

function happening(kind: MovementKind) {
  return (amount: number | string | Fraction, said: Said = {}): Happening => ({ kind, amount: new Fraction(amount), ...said });
}

/** @param each minor units for one; the cost is for all of them */
export function boughtAt(amount: number, each: number, said: Said = {}): Happening {
  return { kind: 'bought', amount: new Fraction(amount), cost: amount * each, ...said };
}

export const bought = happening('bought');
export const given = happening('given');
export const used = happening('used');
export const wasted = happening('wasted');
export const returned = happening('returned');
export const sold = happening('sold');
export const counted = happening('counted');

/** A plain date of January 2026. */
export function dayOf(number: number): string {
  return `2026-01-${String(number).padStart(2, '0')}`;
}

/** Happenings as movements of one material, numbered as they were typed. */
export function history(happenings: readonly Happening[], material = 'A'): Movement[] {
  return happenings.map((one, at) => ({ key: `${material}${at}`, day: dayOf(1), sequence: at, place: 0, material, ...one }));
}

export function priced(happenings: readonly Happening[], method: PricingMethod): MaterialLedger {
  return priceMaterial('A', history(happenings), method);
}

export function rowOf(ledger: MaterialLedger, key: string): PricedMovement {
  const row = ledger.movements.find((one) => one.key === key);
  if (!row) throw new Error(`no movement ${key}`);
  return row;
}

/** The values of what was used, in the ledger's order. */
export function valuesUsed(ledger: MaterialLedger): number[] {
  return ledger.movements.filter(({ kind }) => kind === 'used').map(({ value }) => value);
}
