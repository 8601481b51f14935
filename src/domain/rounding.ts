import Fraction from 'fraction.js';

/**
 * `numerator ÷ denominator` rounded half to even, in whole numbers throughout.
 * @param denominator above nought
 */
export function halfEvenQuotient(numerator: bigint, denominator: bigint): bigint {
  const sign = numerator < 0n ? -1n : 1n;
  const size = numerator * sign;
  const floor = size / denominator;
  const twice = (size % denominator) * 2n;
  const up = twice > denominator || (twice === denominator && floor % 2n === 1n);
  return sign * (up ? floor + 1n : floor);
}

/**
 * A whole number small enough to be exact as a `number`.
 * @throws RangeError beyond 2^53 − 1 either way: no sum of real receipts gets there.
 */
export function safeNumber(value: bigint): number {
  const result = Number(value);
  if (!Number.isSafeInteger(result)) throw new RangeError(`${value} is too large to be kept exactly`);
  return result;
}

/** The whole number itself. @throws RangeError when it is not a safe integer. */
export function wholeNumber(value: number, what: string): number {
  if (!Number.isSafeInteger(value)) throw new RangeError(`${what} must be a whole number, not ${value}`);
  return value;
}

/**
 * The nearest whole number, halves to the even one (21.5 and 22.5 both give 22).
 * The one rounding of money in this program; done once, where the ledger names it.
 * @throws RangeError when the result is beyond a safe integer.
 */
export function roundHalfEven(value: Fraction): number {
  return safeNumber(halfEvenQuotient(value.s * value.n, value.d));
}

/** The nearest whole number, half to even; nothing beyond `most`, where it would be no figure anybody can use. */
export function roundedWithin(value: Fraction, most: number): number | null {
  return value.abs().gt(most) ? null : roundHalfEven(value);
}

function weightsAsWhole(weights: readonly (number | Fraction)[]): bigint[] {
  const exact = weights.map((weight) => {
    const fraction = typeof weight === 'number' ? new Fraction(wholeNumber(weight, 'A weight')) : weight;
    if (fraction.s < 0n && fraction.n > 0n) throw new RangeError('A weight is never below nought');
    return fraction;
  });
  const common = exact.reduce((lcm, { d }) => (lcm % d === 0n ? lcm : lcm * d), 1n);
  const whole = exact.map(({ n, d }) => n * (common / d));
  return whole.some((weight) => weight > 0n) ? whole : whole.map(() => 1n);
}

/**
 * Splits a total by weights so that the parts add up to it: floors of the exact quotas, then
 * one more to the largest remainders, ties to the earlier row (Hamilton's method). Weights that
 * are all nought split equally; a negative total mirrors the positive one.
 * @param total a whole number (minor units)
 * @param weights whole numbers or fractions, none below nought
 * @throws RangeError for a total with no row to go to, or a weight below nought.
 */
export function splitByLargestRemainder(total: number, weights: readonly (number | Fraction)[]): number[] {
  wholeNumber(total, 'A total');
  if (weights.length === 0) {
    if (total !== 0) throw new RangeError('There is no row to split the total over');
    return [];
  }
  const shares = weightsAsWhole(weights);
  const sum = shares.reduce((a, b) => a + b, 0n);
  const size = BigInt(Math.abs(total));
  const rows = shares.map((share, row) => ({ row, floor: (size * share) / sum, rest: (size * share) % sum }));
  const over = Number(size - rows.reduce((a, { floor }) => a + floor, 0n));
  const byRemainder = rows.toSorted((a, b) => (a.rest === b.rest ? a.row - b.row : a.rest > b.rest ? -1 : 1));
  const raised = new Set(byRemainder.slice(0, over).map(({ row }) => row));
  const sign = total < 0 ? -1 : 1;
  return rows.map(({ row, floor }) => sign * Number(floor + (raised.has(row) ? 1n : 0n)) || 0);
}
