import { expect, test } from 'vitest';
import { wordsForQuantity } from '#domain/quantity-words.ts';
import type { WordingOptions } from '#domain/quantity-words.ts';
import { exactText } from '#domain/quantity.ts';
import { unitById } from '#domain/units.ts';
import type { Dimension } from '#domain/units.ts';

const imperial: WordingOptions = { measures: 'imperial' };
const us: WordingOptions = { measures: 'us' };
const boxes: WordingOptions = { measures: 'imperial', packs: [{ name: 'box', amount: '500/1' }] };
const tins: WordingOptions = { measures: 'imperial', packs: [{ name: 'tin', amount: '2500/1' }, { name: 'drum', amount: '25000/1' }] };
const gallon = exactText(unitById('us-gal').factor);
const halfGallon = exactText(unitById('us-gal').factor.div(2));
const cup = exactText(unitById('us-cup').factor);

test.each<[string, string, Dimension, WordingOptions]>([
  ['350 ml', '350/1', 'volume', imperial],
  ['2.5 l', '2500/1', 'volume', imperial],
  ['709.8 ml', '1419529419/2000000', 'volume', imperial],
  ['333.3 ml', '1000/3', 'volume', imperial],
  ['0 ml', '0/1', 'volume', imperial],
  ['1.25 kg', '1250/1', 'mass', imperial],
  ['3.5 m', '3500/1', 'length', imperial],
  ['0.8 m²', '4/5', 'area', imperial],
  ['0.0236 m³', '59/2500', 'timber', imperial],
  ['204', '204/1', 'count', imperial],
  ['12,500', '12500/1', 'count', imperial],
  ['7 h 30 min', '450/1', 'time', imperial],
  ['−3', '-3/1', 'count', imperial],
  ['2 boxes of 500', '1000/1', 'count', boxes],
  ['1 box of 500', '500/1', 'count', boxes],
  ['250', '250/1', 'count', boxes],
  ['204', '204/1', 'count', boxes],
  ['half a tin', '1250/1', 'volume', tins],
  ['two thirds of a tin', '5000/3', 'volume', tins],
  ['2 and a half tins of 2.5 l', '6250/1', 'volume', tins],
  ['2 drums of 25 l', '50000/1', 'volume', tins],
  ['7 tins of 2.5 l', '17500/1', 'volume', tins],
  ['2.3 l', '2300/1', 'volume', tins],
  ['1 US gal', gallon, 'volume', us],
  ['2 US qt', halfGallon, 'volume', us],
  ['1 US cup', cup, 'volume', us],
  ['350 ml', '350/1', 'volume', us],
  ['5.5 ft', '41910/25', 'length', us],
])('%s', (words, amount, dimension, options) => {
  expect(wordsForQuantity(amount, dimension, options)).toBe(words);
});

test('an amount is said in the unit or pack asked for', () => {
  expect(wordsForQuantity(halfGallon, 'volume', { ...us, unit: 'us-gal' })).toBe('0.5 US gal');
  expect(wordsForQuantity(halfGallon, 'volume', { ...us, unit: 'us-cup' })).toBe('8 US cups');
  expect(wordsForQuantity('1000/1', 'volume', { ...tins, unit: 'tin' })).toBe('0.4 of a tin');
  expect(wordsForQuantity('1000/1', 'volume', { ...tins, unit: 'kg' })).toBe('1 l');
  // metric units of one dimension are one way of saying it
  expect(wordsForQuantity('1600/1', 'volume', { ...imperial, unit: 'ml' })).toBe('1.6 l');
  expect(wordsForQuantity('350/1', 'volume', { ...imperial, unit: 'l' })).toBe('350 ml');
});

test('a pack of one piece is said without its size', () => {
  const lengths = { ...imperial, packs: [{ name: 'length', amount: '1/1' }], unit: 'length' };
  expect(wordsForQuantity('3/1', 'count', lengths)).toBe('3 lengths');
  expect(wordsForQuantity('1/1', 'count', lengths)).toBe('1 length');
});

test('text that is no exact amount is refused', () => {
  expect(() => wordsForQuantity('350', 'volume', imperial)).toThrow(RangeError);
});
