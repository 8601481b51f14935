import type Fraction from 'fraction.js';
import { mostOfDay } from '../money.ts';
import { roundedWithin } from '../rounding.ts';

/** The last line bought of a material: what it cost to the door, minor units, and how much it was. */
export interface LastPaid {
  readonly cost: number;
  readonly amount: Fraction;
}

/**
 * What an amount not bought yet would cost at the last price paid, minor units, half to even. Worked out when it is read,
 * never stored, and never part of a sum.
 * @returns null where nothing is short, or no price is known
 */
export function estimateOf(short: Fraction, lastPaid: LastPaid | null): number | null {
  if (short.n === 0n || !lastPaid || lastPaid.cost === 0) return null;
  return roundedWithin(short.mul(lastPaid.cost).div(lastPaid.amount), mostOfDay);
}
