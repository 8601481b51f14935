import Fraction from 'fraction.js';

/** Base units: millilitre, gram, millimetre, square metre, cubic metre, piece, minute. */
export type Dimension = 'volume' | 'mass' | 'length' | 'area' | 'timber' | 'count' | 'time';

/** What a bare gallon, quart, pint or fluid ounce means in a build. */
export type Measures = 'us' | 'imperial';

export interface Unit {
  readonly id: string;
  readonly dimension: Dimension;
  /** base units in one, exact */
  readonly factor: Fraction;
  /** what people type for it, in small letters */
  readonly words: readonly string[];
  /** offered in menus under these measures only */
  readonly only?: Measures;
  readonly one: string;
  readonly many: string;
}

// The four exact seeds (NIST SP 811 and Handbook 44); every factor below is derived from them.
const inch = new Fraction(254, 10); // mm
const pound = new Fraction(45359237, 100000); // g
const cubicInch = inch.div(10).pow(3); // ml
const usGallon = cubicInch.mul(231); // ml
const imperialGallon = new Fraction(454609, 100); // ml

const foot = inch.mul(12);
const metres = (mm: Fraction) => mm.div(1000);

type Row = readonly [id: string, factor: Fraction | number, one: string, many: string, words: string];

function rows(dimension: Dimension, list: readonly Row[], only?: Measures): Unit[] {
  return list.map(([id, factor, one, many, words]) => ({
    id,
    dimension,
    factor: new Fraction(factor),
    words: words.split(', '),
    one,
    many,
    ...(only ? { only } : {}),
  }));
}

function named(prefixes: string, words: string): string {
  const all = prefixes.split(', ').flatMap((prefix) => words.split(', ').map((word) => `${prefix} ${word}`));
  return all.join(', ');
}

const us = 'us, u.s., american';
const imp = 'imp, imperial, uk, british';
const gallon = 'gal, gals, gallon, gallons';
const quart = 'qt, qts, quart, quarts';
const pint = 'pt, pts, pint, pints';
const fluidOunce = 'fl oz, floz, fl. oz., fl. oz, fluid ounce, fluid ounces';
const cup = 'cup, cups';
const tablespoon = 'tbsp, tbsps, tablespoon, tablespoons';
const teaspoon = 'tsp, tsps, teaspoon, teaspoons';

/** Every unit, the usual ones of its dimension first. */
export const units: readonly Unit[] = [
  ...rows('volume', [
    ['ml', 1, 'ml', 'ml', 'ml, mls, cc, millilitre, millilitres, milliliter, milliliters'],
    ['l', 1000, 'l', 'l', 'l, lt, ltr, ltrs, litre, litres, liter, liters'],
  ]),
  ...rows('volume', [
    ['us-gal', usGallon, 'US gal', 'US gal', named(us, gallon)],
    ['us-qt', usGallon.div(4), 'US qt', 'US qt', named(us, quart)],
    ['us-pt', usGallon.div(8), 'US pt', 'US pt', named(us, pint)],
    ['us-cup', usGallon.div(16), 'US cup', 'US cups', named(us, cup)],
    ['us-fl-oz', usGallon.div(128), 'US fl oz', 'US fl oz', named(us, fluidOunce)],
    ['us-tbsp', usGallon.div(256), 'US tbsp', 'US tbsp', named(us, tablespoon)],
    ['us-tsp', usGallon.div(768), 'US tsp', 'US tsp', named(us, teaspoon)],
  ], 'us'),
  ...rows('volume', [
    ['imp-gal', imperialGallon, 'imp gal', 'imp gal', named(imp, gallon)],
    ['imp-qt', imperialGallon.div(4), 'imp qt', 'imp qt', named(imp, quart)],
    ['imp-pt', imperialGallon.div(8), 'imp pt', 'imp pt', named(imp, pint)],
    ['imp-fl-oz', imperialGallon.div(160), 'imp fl oz', 'imp fl oz', named(imp, fluidOunce)],
  ], 'imperial'),
  ...rows('mass', [
    ['g', 1, 'g', 'g', 'g, gm, gms, gram, grams, gramme, grammes'],
    ['kg', 1000, 'kg', 'kg', 'kg, kgs, kilo, kilos, kilogram, kilograms, kilogramme, kilogrammes'],
    ['oz', pound.div(16), 'oz', 'oz', 'oz, ozs, ounce, ounces'],
    ['lb', pound, 'lb', 'lb', 'lb, lbs, pound, pounds'],
    ['t', 1_000_000, 't', 't', 't, tonne, tonnes'],
  ]),
  ...rows('length', [
    ['mm', 1, 'mm', 'mm', 'mm, millimetre, millimetres, millimeter, millimeters'],
    ['cm', 10, 'cm', 'cm', 'cm, cms, centimetre, centimetres, centimeter, centimeters'],
    ['m', 1000, 'm', 'm', 'm, metre, metres, meter, meters'],
    ['in', inch, 'in', 'in', 'in, ins, inch, inches, "'],
    ['ft', foot, 'ft', 'ft', "ft, foot, feet, '"],
    ['yd', foot.mul(3), 'yd', 'yd', 'yd, yds, yard, yards'],
  ]),
  ...rows('area', [
    ['m2', 1, 'm²', 'm²', 'm2, sq m, sqm, square metre, square metres, square meter, square meters'],
    ['ft2', metres(foot).pow(2), 'ft²', 'ft²', 'ft2, sq ft, sqft, square foot, square feet'],
    ['yd2', metres(foot.mul(3)).pow(2), 'yd²', 'yd²', 'yd2, sq yd, sqyd, square yard, square yards'],
    ['cm2', new Fraction(1, 10_000), 'cm²', 'cm²', 'cm2, sq cm, square centimetre, square centimetres, square centimeter, square centimeters'],
    ['in2', metres(inch).pow(2), 'in²', 'in²', 'in2, sq in, square inch, square inches'],
  ]),
  ...rows('timber', [
    ['m3', 1, 'm³', 'm³', 'm3, cubic metre, cubic metres, cubic meter, cubic meters, cu m'],
    ['board-foot', metres(foot).pow(3).div(12), 'board foot', 'board feet', 'board foot, board feet, board-foot, board-feet, bd ft, bdft, bf, fbm'],
    ['ft3', metres(foot).pow(3), 'ft³', 'ft³', 'ft3, cubic foot, cubic feet, cu ft, cuft'],
  ]),
  ...rows('count', [
    ['piece', 1, 'piece', 'pieces', 'piece, pieces, pc, pcs, each, ea, off, item, items'],
    ['dozen', 12, 'dozen', 'dozen', 'dozen, dozens, doz'],
    ['gross', 144, 'gross', 'gross', 'gross'],
  ]),
  ...rows('time', [
    ['min', 1, 'min', 'min', 'min, mins, minute, minutes'],
    ['h', 60, 'h', 'h', 'h, hr, hrs, hour, hours'],
  ]),
];

const byId = new Map(units.map((unit) => [unit.id, unit]));

/** The unit of an id such as `us-cup`. @throws RangeError for an id that is none. */
export function unitById(id: string): Unit {
  const unit = byId.get(id);
  if (!unit) throw new RangeError(`${id} is not the id of a unit`);
  return unit;
}

/** The words that mean a unit of the build's own measures when bare, by the id without its prefix. */
export const wordsByMeasures: Readonly<Record<string, readonly string[]>> = {
  gal: gallon.split(', '),
  qt: quart.split(', '),
  pt: pint.split(', '),
  'fl-oz': fluidOunce.split(', '),
  cup: cup.split(', '),
  tbsp: tablespoon.split(', '),
  tsp: teaspoon.split(', '),
};

/** What a unit menu offers for a dimension, the usual ones first; in US builds US measures lead. */
export function unitsFor(dimension: Dimension, measures: Measures): readonly Unit[] {
  const offered = units.filter((unit) => unit.dimension === dimension && (unit.only ?? measures) === measures);
  if (measures === 'imperial') return offered;
  const customary = offered.filter(({ id }) => !metric.has(id));
  return [...customary, ...offered.filter(({ id }) => metric.has(id))];
}

const metric = new Set(['ml', 'l', 'g', 'kg', 't', 'mm', 'cm', 'm', 'm2', 'cm2', 'm3']);
