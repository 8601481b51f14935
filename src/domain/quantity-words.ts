import Fraction from 'fraction.js';
import { endsWithin, shownFigure } from './figures.ts';
import { formatMinutes } from './format.ts';
import { exactFrom } from './quantity.ts';
import type { Pack } from './pack.ts';
import { packWords, wordsInPacks } from './pack.ts';
import { unitById, units, unitsFor } from './units.ts';
import type { Dimension, Measures, Unit } from './units.ts';

export interface WordingOptions {
  readonly measures: Measures;
  readonly packs?: readonly Pack[];
  /** id of a unit, or name of a pack, to say it in */
  readonly unit?: string;
}

// The units a quantity is said in when nobody asks for one, larger first.
const metricLadder: Readonly<Record<Dimension, readonly string[]>> = {
  volume: ['l', 'ml'],
  mass: ['kg', 'g'],
  length: ['m', 'mm'],
  area: ['m2'],
  timber: ['m3'],
  count: ['piece'],
  time: ['min'],
};
const usLadder: Readonly<Record<Dimension, readonly string[]>> = {
  ...metricLadder,
  volume: ['us-gal', 'us-qt', 'us-pt', 'us-cup', 'us-fl-oz'],
  mass: ['lb', 'oz'],
  length: ['ft', 'in'],
  area: ['ft2', 'in2'],
  timber: ['board-foot'],
};

function ladder(dimension: Dimension, ids: Readonly<Record<Dimension, readonly string[]>>): Unit[] {
  return ids[dimension].map(unitById);
}

const neatPlaces = 3;

function neatIn(amount: Fraction, candidates: readonly Unit[]): Unit | undefined {
  return candidates.find(({ factor }) => amount.gte(factor) && endsWithin(amount.div(factor), neatPlaces));
}

function largestReached(amount: Fraction, candidates: readonly Unit[]): Unit | undefined {
  return candidates.find(({ factor }) => amount.gte(factor)) ?? candidates.at(-1);
}

// US builds say US measures where they come out neat; what came in litres stays in litres.
function usualUnit(amount: Fraction, dimension: Dimension, measures: Measures): Unit | undefined {
  const metric = ladder(dimension, metricLadder);
  if (measures === 'imperial') return largestReached(amount, metric);
  const us = ladder(dimension, usLadder);
  return neatIn(amount, us) ?? neatIn(amount, metric) ?? largestReached(amount, us);
}

/** An amount in one unit: `2.5 l`, `8 US cups`; pieces are a bare number. */
export function wordsInUnit(amount: Fraction, unit: Unit): string {
  const value = amount.div(unit.factor);
  const figure = shownFigure(value);
  if (unit.id === 'piece') return figure;
  return `${figure} ${value.gt(1) ? unit.many : unit.one}`;
}

function wordsInUsualUnit(amount: Fraction, dimension: Dimension, measures: Measures): string {
  if (dimension === 'time' && amount.d === 1n) return formatMinutes(Number(amount.n));
  const unit = usualUnit(amount, dimension, measures) ?? unitsFor(dimension, measures)[0];
  return unit ? wordsInUnit(amount, unit) : shownFigure(amount);
}

// Somebody who buys by the millilitre still reads 1.6 l: metric units of one dimension are one way of saying it.
function onItsLadder(unit: Unit, amount: Fraction): Unit {
  const rungs = metricLadder[unit.dimension];
  return rungs.includes(unit.id) ? largestReached(amount, ladder(unit.dimension, metricLadder)) ?? unit : unit;
}

function wordsAsked(amount: Fraction, dimension: Dimension, options: WordingOptions): string | null {
  const unit = units.find(({ id }) => id === options.unit);
  if (unit?.dimension === dimension) return wordsInUnit(amount, onItsLadder(unit, amount));
  const pack = options.packs?.find(({ name }) => name === options.unit);
  const size = pack && exactFrom(pack.amount);
  return pack && size ? packWords(amount.div(size), pack, wordsInUsualUnit(size, dimension, options.measures)) : null;
}

function wordsForSize(amount: Fraction, dimension: Dimension, options: WordingOptions): string {
  const asked = options.unit === undefined ? null : wordsAsked(amount, dimension, options);
  if (asked !== null) return asked;
  const sizeWords = (size: Fraction) => wordsInUsualUnit(size, dimension, options.measures);
  const inPacks = amount.n === 0n ? null : wordsInPacks(amount, dimension, options.packs ?? [], sizeWords);
  return inPacks ?? wordsInUsualUnit(amount, dimension, options.measures);
}

/**
 * An amount in words: `350 ml`, `2.5 l`, `204`, `2 boxes of 500`, `half a tin`. Packs are used where
 * they come out whole or as a neat share (pieces: only whole); else the usual unit of the build's
 * measures, at most four significant figures. An amount below nought has a minus before it.
 * @param amount stored text, n/d base units
 * @throws RangeError for text that is no exact amount.
 */
export function wordsForQuantity(amount: string, dimension: Dimension, options: WordingOptions): string {
  const exact = exactFrom(amount);
  const words = wordsForSize(exact.abs(), dimension, options);
  return exact.compare(new Fraction(0)) < 0 ? `\u2212${words}` : words;
}
