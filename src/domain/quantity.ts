import Fraction from 'fraction.js';
import type { Dimension } from './units.ts';

export interface Quantity<D extends Dimension = Dimension> {
  readonly dimension: D;
  /** base units of the dimension, exact */
  readonly amount: Fraction;
}

/** An exact amount of one dimension, in its base unit (ml, g, mm, m², m³, piece, minute). */
export function quantity<D extends Dimension>(dimension: D, amount: Fraction): Quantity<D> {
  return { dimension, amount };
}

function requireOneDimension(a: Quantity, b: Quantity): void {
  if (a.dimension !== b.dimension) throw new RangeError(`${a.dimension} and ${b.dimension} are never added to each other`);
}

/** The sum of two quantities of one dimension. @throws RangeError for two dimensions. */
export function addQuantities<D extends Dimension>(a: Quantity<D>, b: Quantity<NoInfer<D>>): Quantity<D> {
  requireOneDimension(a, b);
  return quantity(a.dimension, a.amount.add(b.amount));
}

/** `a` less `b`, of one dimension; may go below nought. @throws RangeError for two dimensions. */
export function subtractQuantities<D extends Dimension>(a: Quantity<D>, b: Quantity<NoInfer<D>>): Quantity<D> {
  requireOneDimension(a, b);
  return quantity(a.dimension, a.amount.sub(b.amount));
}

/** Below nought, nought or above, as `a` is less than, the same as or more than `b`. @throws RangeError for two dimensions. */
export function compareQuantities<D extends Dimension>(a: Quantity<D>, b: Quantity<NoInfer<D>>): number {
  requireOneDimension(a, b);
  return a.amount.compare(b.amount);
}

/** An exact amount as it is stored: `47/2`, `3/1`, in lowest terms. */
export function exactText(amount: Fraction): string {
  return `${amount.s * amount.n}/${amount.d}`;
}

/**
 * A stored amount, `n/d` in base units.
 * @throws RangeError for anything else: stored text is never half right.
 */
export function exactFrom(text: string): Fraction {
  const parts = /^(-?\d+)\/(\d+)$/.exec(text);
  const denominator = BigInt(parts?.[2] ?? 0);
  if (!parts || denominator === 0n) throw new RangeError(`${text} is not an exact amount like 47/2`);
  return new Fraction(BigInt(parts[1] ?? 0), denominator);
}
