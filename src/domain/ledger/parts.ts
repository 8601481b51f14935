import Fraction from 'fraction.js';

/**
 * The amounts of one material as whole numbers of their smallest common part (a third of a
 * litre beside a half: sixths), so that a replay adds and compares whole numbers and stays exact.
 */
export interface Parts {
  readonly of: (amount: Fraction) => bigint;
  readonly back: (parts: bigint) => Fraction;
}

const nought = new Fraction(0);

function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let [larger, smaller] = [a, b];
  while (smaller !== 0n) [larger, smaller] = [smaller, larger % smaller];
  return larger;
}

/** Below the line of a common part, in bits. What people can type of one material stays under it; beyond it, pricing would hold everybody up. */
const mostBits = 512n;

function withBelow(part: bigint, d: bigint): bigint {
  return part % d === 0n ? part : part * (d / greatestCommonDivisor(part, d));
}

/** Whether some amounts have a common part of a size to work with; stops at the first that is too much. */
export function haveCommonParts(amounts: Iterable<Fraction>): boolean {
  let part = 1n;
  for (const { d } of amounts) {
    part = withBelow(part, d);
    if (part >> mostBits > 0n) return false;
  }
  return true;
}

/** The smallest common part of some amounts, and the way into it and back, both exact. */
export function commonParts(amounts: readonly Fraction[]): Parts {
  let part = 1n;
  for (const { d } of amounts) part = withBelow(part, d);
  return {
    of: ({ s, n, d }) => s * n * (part / d),
    back: (parts) => (parts === 0n ? nought : new Fraction(parts, part)),
  };
}
