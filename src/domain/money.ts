import { currencySigns, exponentOf, isCurrency } from './currency.ts';
import { read, unread } from './reading.ts';
import type { Reading } from './reading.ts';
import { wholeNumber } from './rounding.ts';

export type { Reading } from './reading.ts';
export { roundHalfEven, splitByLargestRemainder } from './rounding.ts';

export interface Money<C extends string = string> {
  readonly currency: C;
  /** integer minor units of the currency */
  readonly minor: number;
}

// A typed amount goes up to this many minor units, so that thousands of them still add up exactly.
const mostTyped = 1e12;
/** What one day, and one build, may come to in minor units: every sum over them stays exact (2^53 − 1 is 9e15). */
export const mostOfDay = 1e13;
export const mostOfBuild = 1e15;

/**
 * An amount of money.
 * @param minor integer minor units (pence, cents, yen, fils)
 * @throws RangeError for an unknown currency or an amount that is not a safe integer.
 */
export function money<C extends string>(minor: number, currency: C): Money<C> {
  exponentOf(currency);
  return { currency, minor: wholeNumber(minor, 'Money') };
}

function requireOneCurrency(a: Money, b: Money): void {
  if (a.currency !== b.currency) throw new RangeError(`${a.currency} and ${b.currency} are never added to each other`);
}

/** The sum of two amounts of one currency. @throws RangeError for two currencies. */
export function addMoney<C extends string>(a: Money<C>, b: Money<NoInfer<C>>): Money<C> {
  requireOneCurrency(a, b);
  return money(a.minor + b.minor, a.currency);
}

/** `a` less `b`, of one currency. @throws RangeError for two currencies. */
export function subtractMoney<C extends string>(a: Money<C>, b: Money<NoInfer<C>>): Money<C> {
  requireOneCurrency(a, b);
  return money(a.minor - b.minor, a.currency);
}

// Beside the sign it is shown with, what people write who use no other dollar.
const otherSigns: Readonly<Record<string, readonly string[]>> = { USD: ['US$'], CAD: ['C$'] };

function signsOf(currency: string): string[] {
  const sign = currencySigns[currency];
  const all = [currency, ...(sign === undefined ? [] : [sign]), ...(otherSigns[currency] ?? []), ...(sign?.endsWith('$') ? ['$'] : [])];
  return all.toSorted((a, b) => b.length - a.length);
}

function withoutSign(text: string, currency: string): string {
  for (const sign of signsOf(currency)) {
    if (text.toUpperCase().startsWith(sign)) return text.slice(sign.length).trim();
    if (text.toUpperCase().endsWith(sign)) return text.slice(0, -sign.length).trim();
  }
  return text;
}

function decimalsProblem(currency: string, exponent: number): string {
  if (exponent === 0) return `${currency} has no decimals: write a whole number, like 1250`;
  return `${currency} has ${exponent} decimals at most: write it like ${(1250 / 10 ** exponent).toFixed(exponent)}`;
}

function shapeProblem(figure: string, currency: string): string {
  const comma = /^(\d+),(\d{1,2})$/.exec(figure);
  if (comma) return `Write ${comma[1]}.${comma[2]} with a point`;
  if (figure.includes(',')) return 'Commas only stand between thousands, like 1,234.50';
  if (/[£$€¥]/.test(figure) || isCurrency(/[a-z]+/i.exec(figure)?.[0].toUpperCase() ?? '')) return `This amount is in ${currency}: write the figure alone, or with ${currency}`;
  return 'Write the amount as a figure, like 12.50';
}

/**
 * Reads an amount of money as people type it: `12.50`, `£12.50`, `1,234.50`, `12.50 GBP`.
 * Fewer decimals than the currency has are filled up; more are refused, as are a decimal comma,
 * a minus, an empty field and another currency's sign. Nought is an amount.
 * @throws RangeError for an unknown currency.
 */
export function readMoney(text: string, currency: string): Reading<Money> {
  const exponent = exponentOf(currency);
  const typed = text.replaceAll('\u00a0', ' ').trim();
  if (typed === '') return unread('Write an amount, like 12.50');
  if (/[-\u2212\u2013]/.test(typed)) return unread('An amount is never below nought: leave the minus out');
  const figure = withoutSign(typed, currency);
  const parts = /^(\d+|\d{1,3}(?:,\d{3})+)?(?:\.(\d+))?$/.exec(figure);
  if (figure === '' || !parts) return unread(shapeProblem(figure, currency));
  const decimals = parts[2] ?? '';
  if (decimals.length > exponent) return unread(decimalsProblem(currency, exponent));
  const minor = Number(`${(parts[1] ?? '').replaceAll(',', '')}${decimals.padEnd(exponent, '0')}`);
  if (minor > mostTyped) return unread('That is more money than one line can hold');
  return read(money(minor, currency));
}
