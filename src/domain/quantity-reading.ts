import Fraction from 'fraction.js';
import { decimalCommaProblem, finenessProblem, plainText } from './numbers-written.ts';
import type { Pack } from './pack.ts';
import { exampleOf, readTerms } from './quantity-terms.ts';
import type { Terms } from './quantity-terms.ts';
import { wordsForQuantity } from './quantity-words.ts';
import { exactFrom, exactText, quantity } from './quantity.ts';
import type { Quantity } from './quantity.ts';
import { read, unread } from './reading.ts';
import type { Reading } from './reading.ts';
import { wordsThatFit } from './unit-words.ts';
import type { Dimension, Measures } from './units.ts';

export type { Pack } from './pack.ts';
export type { Reading } from './reading.ts';

/** What a material says of itself in a second dimension: density, pieces to the kilogram. */
export interface Ratio {
  readonly to: Dimension;
  /** n/d base units of `to` for one base unit of the material's dimension */
  readonly amount: string;
  /** the figure is an estimate, and what is read by it says so */
  readonly about: boolean;
}

export interface ReadingContext {
  readonly measures: Measures;
  /** the material's own dimension, in which the quantity comes back */
  readonly dimension: Dimension;
  readonly packs?: readonly Pack[];
  readonly ratio?: Ratio | null;
  /** for a count, where nothing left is an amount too */
  readonly allowNought?: boolean;
}

export interface QuantityRead {
  readonly quantity: Quantity;
  /** the reading in words, to stand beside the field */
  readonly shownBack: string;
  /** what was taken for granted: whose gallon, an estimated ratio */
  readonly note?: string;
}

const longestText = 60;
// A million cubic metres of anything is a slip of the finger, and the figures stay of a size.
const most = new Fraction(10n ** 12n);

// An exact amount is kept as text of so many letters; 1/99999999999999999999 of a tin is a slip too.
const longestExact = 80;

const keptBy: Readonly<Record<Dimension, string>> = {
  volume: 'volume',
  mass: 'weight',
  length: 'length',
  area: 'area',
  timber: 'cubic measure',
  count: 'the piece',
  time: 'time',
};

function textProblem(typed: string, { dimension }: ReadingContext): string | null {
  if (typed === '') return `Write an amount, like ${exampleOf(dimension)}`;
  if (typed.length > longestText) return `Write one amount, like ${exampleOf(dimension)}`;
  if (/^-|[^\w'")]-\d/.test(typed)) return 'An amount is never below nought: leave the minus out';
  if (/\d ?\/ ?0+(?!\d)/.test(typed)) return 'A fraction needs a figure below the line, like 1/2';
  return decimalCommaProblem(typed) ?? finenessProblem(typed);
}

function otherDimension({ dimension, words }: Terms, context: ReadingContext): string {
  const fits = wordsThatFit(context.dimension, context.measures, context.packs ?? []);
  const ounces = dimension === 'mass' && context.dimension === 'volume' && words.endsWith(' oz') ? 'fl oz, ' : '';
  return `${words} is measured by ${keptBy[dimension]}, and this material by ${keptBy[context.dimension]}: write ${ounces}${fits}`;
}

interface InOwnDimension {
  readonly amount: Fraction;
  readonly about: boolean;
}

function inOwnDimension(terms: Terms, context: ReadingContext): InOwnDimension | null {
  if (terms.dimension === context.dimension) return { amount: terms.amount, about: false };
  if (!context.ratio || context.ratio.to !== terms.dimension) return null;
  return { amount: terms.amount.div(exactFrom(context.ratio.amount)), about: context.ratio.about };
}

function shownBack(terms: Terms, { amount, about }: InOwnDimension, context: ReadingContext): string {
  const own = wordsForQuantity(exactText(amount), context.dimension, { measures: 'imperial' });
  const saysItAll = own === terms.words || terms.words.endsWith(` of ${own}`) || terms.words.startsWith(`${own} `);
  if ((terms.plain && terms.dimension === context.dimension) || saysItAll) return terms.words;
  return `${terms.words}, ${about ? 'about ' : ''}${own}`;
}

function readPlain(typed: string, context: ReadingContext): Reading<QuantityRead> {
  const { measures, dimension, packs = [] } = context;
  const found = readTerms(typed, { measures, dimension, packs });
  if (!found.ok) return found;
  const terms = found.value;
  const own = inOwnDimension(terms, context);
  if (!own) return unread(otherDimension(terms, context));
  if (own.amount.n === 0n && !context.allowNought) return unread('An amount is more than nought: leave the line out if there was none');
  if (own.amount.gt(most)) return unread('That is more than one line can hold');
  if (exactText(own.amount).length > longestExact) return unread('That is finer than one line can hold: write a rounder figure');
  const note = terms.note ?? (own.about ? 'By a ratio of this material that is marked about' : undefined);
  const value = { quantity: quantity(dimension, own.amount), shownBack: shownBack(terms, own, context) };
  return read(note === undefined ? value : { ...value, note });
}

/**
 * Reads a quantity as people type it, exactly, into base units of the material's dimension:
 * `1 1/2 gal`, `1½ gal`, `0.5 US gal`, `350ml`, `2 x 2.5 l`, `2 boxes`, `half a tin`, `a dozen`,
 * `3 ft 6 in`, `17`. A bare gallon, quart, pint or fluid ounce follows the build's measures and says
 * so in `note`; a bare cup is refused in imperial. A unit of another dimension goes by the
 * material's ratio. Refused, in words for beside the field: an empty field, a minus, nought
 * (unless allowed), a decimal comma, a bare number where a unit is wanted, an unknown unit.
 */
export function readQuantity(text: string, context: ReadingContext): Reading<QuantityRead> {
  const typed = plainText(text);
  const problem = textProblem(typed, context);
  if (problem !== null) return unread(problem);
  const none = context.allowNought && /^(?:0|none|nothing)$/.test(typed);
  if (none) return read({ quantity: quantity(context.dimension, new Fraction(0)), shownBack: 'none' });
  return readPlain(typed, context);
}
