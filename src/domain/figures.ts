import type Fraction from 'fraction.js';
import { grouped } from './format.ts';
import { halfEvenQuotient } from './rounding.ts';

const significant = 4;
const mostPlaces = 12;

function decimal(value: Fraction, places: number): string {
  const scaled = halfEvenQuotient(value.n * 10n ** BigInt(places), value.d);
  const digits = String(scaled).padStart(places + 1, '0');
  const decimals = digits.slice(digits.length - places).replace(/0+$/, '');
  const units = grouped(digits.slice(0, digits.length - places));
  return places === 0 || decimals === '' ? units : `${units}.${decimals}`;
}

function placesToShow(value: Fraction): number {
  let places = 0;
  for (let scaled = value.abs(); scaled.lt(10 ** (significant - 1)) && places < mostPlaces; places += 1) {
    scaled = scaled.mul(10);
  }
  return places;
}

/**
 * A number for reading: four significant figures at most, whole numbers in full, half to even,
 * no trailing noughts: `0.3333`, `2.5`, `1.067`, `12,346`. Only for showing; never read back.
 */
export function shownFigure(value: Fraction): string {
  return decimal(value, value.n === 0n ? 0 : placesToShow(value));
}

/** Whether a number ends within so many decimal places. */
export function endsWithin(value: Fraction, places: number): boolean {
  return (value.n * 10n ** BigInt(places)) % value.d === 0n;
}

/** A typed number said back exactly: as a decimal where it ends within four places, else `1 1/3`. */
export function exactFigure(value: Fraction): string {
  if (endsWithin(value, significant)) return decimal(value, significant);
  const whole = value.n / value.d;
  const rest = `${value.n % value.d}/${value.d}`;
  return whole === 0n ? rest : `${whole} ${rest}`;
}
