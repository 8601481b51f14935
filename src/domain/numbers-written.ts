import Fraction from 'fraction.js';

/** A number found at the start of a text, and what follows it. */
export interface NumberFound {
  readonly value: Fraction;
  readonly rest: string;
}

const vulgar: Readonly<Record<string, string>> = {
  '½': '1/2', '⅓': '1/3', '⅔': '2/3', '¼': '1/4', '¾': '3/4', '⅕': '1/5', '⅖': '2/5', '⅗': '3/5', '⅘': '4/5',
  '⅙': '1/6', '⅚': '5/6', '⅛': '1/8', '⅜': '3/8', '⅝': '5/8', '⅞': '7/8',
};

const marks: Readonly<Record<string, string>> = {
  '\u00a0': ' ', '\u2009': ' ', '\u202f': ' ', '⁄': '/', '×': 'x', '²': '2', '³': '3',
  '’': "'", '′': "'", '”': '"', '″': '"', '\u2212': '-', '\u2013': '-', '\u2010': '-', '\u2011': '-',
};

/** Typed text in one plain form: small letters, single spaces, `½` as `1/2`, `×` as `x`, `″` as `"`. */
export function plainText(text: string): string {
  const unmarked = [...text].map((sign) => {
    const inFigures = vulgar[sign];
    return inFigures === undefined ? (marks[sign] ?? sign) : ` ${inFigures} `;
  });
  return unmarked.join('').toLowerCase().replace(/\s+/g, ' ').trim();
}

const counted = ['one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve'];
const shares: Readonly<Record<string, number>> = {
  half: 2, halves: 2, third: 3, thirds: 3, quarter: 4, quarters: 4, eighth: 8, eighths: 8,
};
const countedWords = counted.join('|');
const shareWords = Object.keys(shares).join('|');
const wordsPattern = new RegExp(`^(?:(an?|${countedWords})\\b ?-?)?(?:(${shareWords})\\b)?`);
const halfMorePattern = /^ ?and (?:a |one )?(half|quarter|third|three quarters|two thirds)\b/;
const more: Readonly<Record<string, Fraction>> = {
  half: new Fraction(1, 2), quarter: new Fraction(1, 4), third: new Fraction(1, 3),
  'three quarters': new Fraction(3, 4), 'two thirds': new Fraction(2, 3),
};

function fraction(numerator: string, denominator: string): Fraction | null {
  return Number(denominator) === 0 ? null : new Fraction(BigInt(numerator), BigInt(denominator));
}

function inDigits(text: string): NumberFound | null {
  const shared = /^(?:(\d+)[ -])?(\d+) ?\/ ?(\d+)/.exec(text);
  if (shared) {
    const part = fraction(shared[2] ?? '', shared[3] ?? '');
    return part && { value: part.add(BigInt(shared[1] ?? 0)), rest: text.slice(shared[0].length) };
  }
  const plain = /^(?:\d{1,3}(?:,\d{3})+(?![\d,])|\d+)?(?:\.\d+)?/.exec(text)?.[0];
  return plain ? { value: new Fraction(plain.replaceAll(',', '')), rest: text.slice(plain.length) } : null;
}

function inWords(text: string): NumberFound | null {
  const [matched, count, share] = wordsPattern.exec(text) ?? [''];
  if (matched === '') return null;
  const times = count === undefined || count.startsWith('a') ? 1 : counted.indexOf(count) + 1;
  return { value: new Fraction(times, shares[share ?? ''] ?? 1), rest: text.slice(matched.length) };
}

function withHalfMore({ value, rest }: NumberFound): NumberFound {
  const match = halfMorePattern.exec(rest);
  const part = match && more[match[1] ?? ''];
  return part ? { value: value.add(part), rest: rest.slice(match[0].length) } : { value, rest };
}

/**
 * The number at the start of a text in plain form: `1 1/2`, `1-1/2`, `0.5`, `.5`, `1,250`,
 * `half`, `two thirds`, `a`, `three`, `2 and a half`. Exact, never below nought.
 * @returns null where no number stands there, or one with nought below the line
 */
export function numberAtStart(text: string): NumberFound | null {
  const found = /^[\d.]/.test(text) ? inDigits(text) : inWords(text);
  return found && withHalfMore(found);
}

/** The words that mend a decimal comma (`1,5`), or null where there is none. Commas between thousands are no fault. */
export function decimalCommaProblem(text: string): string | null {
  const typed = /(?<![\d,.])\d+(?:,\d+)+(?![\d,])/g;
  for (const [figure] of text.matchAll(typed)) {
    if (/^\d{1,3}(?:,\d{3})+$/.test(figure)) continue;
    const [whole, ...decimals] = figure.split(',');
    return decimals.length === 1 ? `Write ${whole}.${decimals[0]} with a point` : 'Commas only stand between thousands, like 1,250';
  }
  return null;
}

const mostBelowLine = 128;
const mostDecimals = 6;

/**
 * The words that mend a figure finer than anybody measures, or null where there is none. Amounts of one material are added
 * in their smallest common part, which unlike figures below the line would make endless.
 */
export function finenessProblem(text: string): string | null {
  for (const [, below] of text.matchAll(/\/ ?(\d+)/g)) {
    if (Number(below) > mostBelowLine) return `A fraction has ${mostBelowLine} at most below the line: write a rounder figure, like 1/64`;
  }
  return /\.\d{7}/.test(text) ? 'A figure has six decimals at most: write a rounder one' : null;
}

/** Whether a number is one that could be written: figures multiplied together may come to something finer. */
export function fineAsWritten(value: Fraction): boolean {
  return value.mul(10 ** mostDecimals).d <= BigInt(mostBelowLine);
}
