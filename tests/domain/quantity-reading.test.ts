import fc from 'fast-check';
import Fraction from 'fraction.js';
import { describe, expect, test } from 'vitest';
import { readQuantity } from '#domain/quantity-reading.ts';
import type { QuantityRead, ReadingContext } from '#domain/quantity-reading.ts';
import { exactText } from '#domain/quantity.ts';
import { unitById, unitsFor } from '#domain/units.ts';

const resin: ReadingContext = { measures: 'us', dimension: 'volume', packs: [{ name: 'tin', amount: '2500/1' }] };
const screws: ReadingContext = { measures: 'imperial', dimension: 'count', packs: [{ name: 'box', amount: '500/1' }] };
const batten: ReadingContext = { measures: 'imperial', dimension: 'length' };
/** Nails bought by weight and used by the piece: 240 to the kilogram, about. */
const nails: ReadingContext = { measures: 'imperial', dimension: 'mass', ratio: { to: 'count', amount: '240/1000', about: true } };

function readOf(text: string, context: ReadingContext): QuantityRead {
  const reading = readQuantity(text, context);
  if (!reading.ok) throw new Error(`${text}: ${reading.problem}`);
  return reading.value;
}

function amountOf(text: string, context: ReadingContext): string {
  return exactText(readOf(text, context).quantity.amount);
}

function problemOf(text: string, context: ReadingContext): string {
  const reading = readQuantity(text, context);
  return reading.ok ? `read as ${reading.value.shownBack}` : reading.problem;
}

describe('volume, US measures (millilitres)', () => {
  test.each([
    ['1 1/2 gal', '5678.117676'],
    ['1½ gal', '5678.117676'],
    ['1-1/2 gal', '5678.117676'],
    ['0.5 US gal', '1892.705892'],
    ['1 imp pt', '568.26125'],
    ['3 cups', '709.7647095'],
    ['a cup', '236.5882365'],
    ['4 fl. oz.', '118.29411825'],
    ['350ml', '350'],
    ['350 ML', '350'],
    ['1,250 ml', '1250'],
    ['.5 l', '500'],
    ['2 x 2.5 l', '5000'],
    ['2×2.5l', '5000'],
    ['2.5 l x 2', '5000'],
    ['2 tins', '5000'],
    ['half a tin', '1250'],
    ['1/2 tin', '1250'],
    ['2 and a half tins', '6250'],
    ['3 cans of 500 ml', '1500'],
    ['2 tins and 300 ml', '5300'],
    ['2 tins of 1 l', '2000'],
  ])('%s', (text, millilitres) => {
    expect(amountOf(text, resin)).toBe(exactText(new Fraction(millilitres)));
  });

  test('a share of a pack is exact', () => {
    expect(amountOf('two thirds of a tin', resin)).toBe('5000/3');
  });
});

test.each([
  ['17', '17/1'],
  ['2 boxes', '1000/1'],
  ['a dozen', '12/1'],
  ['half a dozen', '6/1'],
  ['2 dozen', '24/1'],
  ['12 off', '12/1'],
  ['ten', '10/1'],
  ['2 boxes of 250', '500/1'],
  ['3 x 12', '36/1'],
  ['1 box and 20', '520/1'],
  ['half a sheet', '1/2'],
])('pieces: %s', (text, pieces) => {
  expect(amountOf(text, screws)).toBe(pieces);
});

test.each([
  ['3 ft 6 in', '1066.8'],
  [`3' 6"`, '1066.8'],
  ['3′6″', '1066.8'],
  ['2 1/4"', '57.15'],
  ['4 off 1.2 m', '4800'],
  ['2 lengths of 1.2 m', '2400'],
  ['2 m 40 cm', '2400'],
])('millimetres: %s', (text, millimetres) => {
  expect(amountOf(text, batten)).toBe(exactText(new Fraction(millimetres)));
});

test('area and timber', () => {
  expect(amountOf('2 m²', { measures: 'imperial', dimension: 'area' })).toBe('2/1');
  expect(amountOf('12 sq ft', { measures: 'us', dimension: 'area' })).toBe(exactText(new Fraction('1.11483648')));
  expect(amountOf('1000 board feet', { measures: 'us', dimension: 'timber' })).toBe(exactText(new Fraction('2.359737216')));
});

test('a unit of another dimension goes by the material’s ratio, and says so where it is about', () => {
  const read = readOf('40 pieces', nails);
  expect(exactText(read.quantity.amount)).toBe('500/3');
  expect(read.quantity.dimension).toBe('mass');
  expect(read.shownBack).toBe('40, about 166.7 g');
  expect(read.note).toMatch(/about/);
  expect(amountOf('1 lb 4 oz', nails)).toBe(exactText(new Fraction('566.9904625')));
});

test.each([
  ['350ml', resin, '350 ml'],
  ['2 tins', resin, '2 tins of 2.5 l, 5 l'],
  ['2 x 2.5 l', resin, '2 × 2.5 l, 5 l'],
  ['half a tin', resin, 'half a tin, 1.25 l'],
  ['3 cups', resin, '3 US cups, 709.8 ml'],
  ['2 boxes', screws, '2 boxes of 500, 1,000'],
  ['1 box', screws, '1 box of 500'],
  ['17', screws, '17'],
  ['3 ft 6 in', batten, '3 ft 6 in, 1.067 m'],
])('%s is shown back', (text, context, words) => {
  expect(readOf(text, context).shownBack).toBe(words);
});

test('a bare gallon follows the build’s measures and says so; a named one says nothing', () => {
  const imperial: ReadingContext = { ...resin, measures: 'imperial' };
  expect(amountOf('1 gal', resin)).toBe(exactText(unitById('us-gal').factor));
  expect(amountOf('1 gal', imperial)).toBe(exactText(unitById('imp-gal').factor));
  expect(readOf('1 gal', resin).note).toMatch(/US gal.*US units/);
  expect(readOf('2 pints', imperial).note).toMatch(/imp pt.*imperial units/);
  expect(readOf('1 US gal', imperial).note).toBeUndefined();
  expect(amountOf('1 US cup', imperial)).toBe(amountOf('1 cup', resin));
  expect(problemOf('3 cups', imperial)).toBe('A cup is a US measure: write US cups, or ml.');
});

test.each([
  ['', resin, 'Write an amount, like 350 ml, 2 l'],
  ['1,5 l', resin, 'Write 1.5 with a point'],
  ['1,5', screws, 'Write 1.5 with a point'],
  ['-3 l', resin, 'An amount is never below nought: leave the minus out'],
  ['−3', screws, 'An amount is never below nought: leave the minus out'],
  ['0 l', resin, 'An amount is more than nought: leave the line out if there was none'],
  ['0', screws, 'An amount is more than nought: leave the line out if there was none'],
  ['7', resin, 'Say which unit: 350 ml, 2 l'],
  ['3 ft 6', batten, 'Say which unit: 350 mm, 2 m'],
  ['4 furlong', resin, '“furlong” is not a unit known here: write US gal, US qt, US pt, ml, l or tins'],
  ['3 kg', resin, '3 kg is measured by weight, and this material by volume: write US gal, US qt, US pt, ml, l or tins'],
  ['8 oz', resin, '8 oz is measured by weight, and this material by volume: write fl oz, US gal, US qt, US pt, ml, l or tins'],
  ['40', nails, 'Say which unit: 350 g, 2 kg'],
  ['2 cans', resin, 'This material has no can: write 2 x 350 ml, or give the material a pack of that name'],
  ['1/0 l', resin, 'A fraction needs a figure below the line, like 1/2'],
  ['2 gallons resin', resin, 'Write the amount alone, like 2 US gal'],
  ['about 3 l', resin, 'Start with a figure, like 350 ml, 2 l'],
  ['6 in 3 ft', batten, 'Write the larger unit first, or one amount: 6 in'],
  ['1 200', screws, 'Two figures stand side by side: put a unit or an x between them'],
  ['9999999999999 l', resin, 'That is more than one line can hold'],
  ['1 l '.repeat(30), resin, 'Write one amount, like 350 ml, 2 l'],
])('%j is answered beside its field', (text, context, problem) => {
  expect(problemOf(text, context)).toBe(`${problem}.`);
});

test('two packs of one name and two sizes are not guessed between', () => {
  const two: ReadingContext = { ...resin, packs: [{ name: 'tin', amount: '2500/1' }, { name: 'tin', amount: '750/1' }] };
  expect(problemOf('1 tin', two)).toBe('There is a tin of 2.5 l and of 750 ml: write the amount instead.');
  expect(amountOf('2 tins of 750 ml', two)).toBe('1500/1');
});

test('a count may find nothing left', () => {
  for (const text of ['0', 'none', 'Nothing']) expect(amountOf(text, { ...screws, allowNought: true })).toBe('0/1');
  expect(amountOf('0 l', { ...resin, allowNought: true })).toBe('0/1');
});

test('every unit a menu offers is read by each of its words', () => {
  for (const dimension of ['volume', 'mass', 'length', 'area', 'timber', 'count', 'time'] as const) {
    for (const measures of ['us', 'imperial'] as const) {
      for (const unit of unitsFor(dimension, measures)) {
        for (const word of [...unit.words, unit.one, unit.many]) {
          expect(amountOf(`3 ${word}`, { measures, dimension }), word).toBe(exactText(unit.factor.mul(3)));
        }
      }
    }
  }
});

test('what is shown back is read as the same amount', () => {
  const figure = fc.integer({ min: 1, max: 9999 }).map((hundredths) => hundredths / 100);
  const unit = fc.constantFrom(...unitsFor('volume', 'us'));
  fc.assert(
    fc.property(figure, unit, (value, { one }) => {
      const [words = ''] = readOf(`${value} ${one}`, resin).shownBack.split(', ');
      expect(amountOf(words, resin)).toBe(amountOf(`${value} ${one}`, resin));
    }),
  );
});

test('no text at all makes the reader fail', () => {
  const piece = fc.constantFrom('1', '2.5', '1/2', ' ', 'x', 'half', 'a', 'of', 'tin', 'tins', 'l', 'ml', 'gal', 'and', ',', '-', '.', '½', 'oz', 'off', '0', '/', '"');
  const typed = fc.oneof(fc.string(), fc.array(piece, { maxLength: 8 }).map((pieces) => pieces.join(' ')), fc.array(piece).map((pieces) => pieces.join('')));
  fc.assert(
    fc.property(typed, fc.constantFrom(resin, screws, batten, nails), (text, context) => {
      const reading = readQuantity(text, context);
      if (reading.ok) expect(reading.value.quantity.amount.gt(0)).toBe(true);
      else expect(reading.problem).not.toBe('');
    }),
    { numRuns: 1000 },
  );
});
