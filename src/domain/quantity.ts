import type Fraction from 'fraction.js';
import type { Dimension } from './units.ts';

export interface Quantity<D extends Dimension = Dimension> {
  readonly dimension: D;
  /** base units of the dimension, exact */
  readonly amount: Fraction;
}

export function quantity<D extends Dimension>(dimension: D, amount: Fraction): Quantity<D> {
  return { dimension, amount };
}
export function addQuantities<D extends Dimension>(a: Quantity<D>, b: Quantity<NoInfer<D>>): Quantity<D> {
  return quantity(a.dimension, a.amount.add(b.amount));
}
export function subtractQuantities<D extends Dimension>(a: Quantity<D>, b: Quantity<NoInfer<D>>): Quantity<D> {
  return quantity(a.dimension, a.amount.sub(b.amount));
}
export function compareQuantities<D extends Dimension>(a: Quantity<D>, b: Quantity<NoInfer<D>>): number {
  return a.amount.compare(b.amount);
}
export function exactText(amount: Fraction): string {
  throw new Error(`exactText ${amount.toFraction()}`);
}
export function exactFrom(text: string): Fraction {
  throw new Error(`exactFrom ${text}`);
}
