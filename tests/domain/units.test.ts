import Fraction from 'fraction.js';
import { describe, expect, test } from 'vitest';
import { unitById, units, unitsFor } from '#domain/units.ts';

/** Of one unit in another, exactly. */
function converted(amount: string, from: string, to: string): Fraction {
  expect(unitById(from).dimension).toBe(unitById(to).dimension);
  return new Fraction(amount).mul(unitById(from).factor).div(unitById(to).factor);
}

describe('exact figures', () => {
  test.each([
    // GNU units database 3.15 (Debian units 2.22-2), whose seeds are the legal definitions.
    ['in', 'mm', '25.4'],
    ['ft', 'm', '0.3048'],
    ['yd', 'm', '0.9144'],
    ['ft2', 'm2', '0.09290304'],
    ['yd2', 'm2', '0.83612736'],
    ['ft3', 'm3', '0.028316846592'],
    ['lb', 'kg', '0.45359237'],
    ['board-foot', 'm3', '0.002359737216'],
    ['us-qt', 'l', '0.946352946'],
    // Defined as 231 cubic inches (GNU units); worked out exactly from it.
    ['us-gal', 'l', '3.785411784'],
    ['us-pt', 'l', '0.473176473'],
    ['us-cup', 'ml', '236.5882365'],
    ['us-fl-oz', 'ml', '29.5735295625'],
    // GNU units, and NIST SP 811 appendix B.8; worked out exactly from the gallon.
    ['imp-gal', 'l', '4.54609'],
    ['imp-pt', 'ml', '568.26125'],
    ['imp-fl-oz', 'ml', '28.4130625'],
    ['oz', 'g', '28.349523125'],
  ])('one %s in %s is %s', (from, to, figure) => {
    expect(converted('1', from, to).equals(new Fraction(figure))).toBe(true);
  });

  test.each([
    ['5', 'us-gal', 'l', '18.92705892'],
    ['5', 'imp-gal', 'l', '22.73045'],
    ['1000', 'board-foot', 'm3', '2.359737216'],
  ])('%s %s in %s is %s', (amount, from, to, figure) => {
    expect(converted(amount, from, to).equals(new Fraction(figure))).toBe(true);
  });
});

test.each([
  // NIST SP 811, appendix B.8, seven figures, by way of the R package NISTunits 1.0.1.
  ['in', 'm', 0.0254],
  ['ft3', 'm3', 0.02831685],
  ['us-gal', 'l', 3.785412],
  ['us-pt', 'l', 0.4731765],
  ['us-cup', 'ml', 236.5882],
  ['us-fl-oz', 'ml', 29.57353],
  ['imp-gal', 'l', 4.54609],
  ['imp-fl-oz', 'ml', 28.41306],
  ['lb', 'kg', 0.4535924],
  ['oz', 'g', 28.34952],
])('one %s in %s agrees with the seven figures of NIST SP 811', (from, to, figure) => {
  expect(Math.abs(converted('1', from, to).valueOf() / figure - 1)).toBeLessThan(5e-7);
});

test('a thousand board feet are 2.36 m³ and 83.33 cubic feet (FAO, T0269E, appendix II)', () => {
  expect(converted('1000', 'board-foot', 'm3').valueOf()).toBeCloseTo(2.36, 2);
  expect(converted('1000', 'board-foot', 'ft3').valueOf()).toBeCloseTo(83.33, 2);
});

test('derived ratios of cloth, mat and coverage', () => {
  const perArea = (amount: string, mass: string, area: string) =>
    new Fraction(amount).mul(unitById(mass).factor).div(unitById(area).factor).valueOf();
  // Worked out with GNU units; NIST SP 811 has 0.033 905 75 and 0.305 151 7 kg/m².
  expect(perArea('1', 'oz', 'yd2')).toBeCloseTo(33.9057474748823, 9);
  expect(perArea('1', 'oz', 'ft2')).toBeCloseTo(305.15172727, 7);
  expect(perArea('6', 'oz', 'yd2')).toBeCloseTo(203.434484849, 8);
  expect(perArea('1.5', 'oz', 'ft2')).toBeCloseTo(457.727590911, 8);
  expect(perArea('18', 'oz', 'yd2')).toBeCloseTo(610.303454548, 8);
  const perLitre = unitById('ft2').factor.div(unitById('us-gal').factor.div(1000));
  expect(perLitre.valueOf()).toBeCloseTo(0.024542386747, 11);
});

test('sixteen cups are a gallon and three thirds a litre, exactly', () => {
  expect(converted('16', 'us-cup', 'us-gal').equals(1)).toBe(true);
  expect(new Fraction(1, 3).mul(unitById('l').factor).mul(3).equals(1000)).toBe(true);
});

test('ids and words mean one unit each', () => {
  const words = units.flatMap((unit) => unit.words);
  expect(new Set(units.map(({ id }) => id)).size).toBe(units.length);
  expect(words.filter((word, at) => words.indexOf(word) !== at)).toEqual([]);
  expect(() => unitById('furlong')).toThrow(RangeError);
});

test('a menu offers the units of the build’s measures, the usual ones first', () => {
  const ids = (measures: 'us' | 'imperial') => unitsFor('volume', measures).map(({ id }) => id);
  expect(ids('us').slice(0, 2)).toEqual(['us-gal', 'us-qt']);
  expect(ids('us')).toContain('l');
  expect(ids('us')).not.toContain('imp-gal');
  expect(ids('imperial').slice(0, 3)).toEqual(['ml', 'l', 'imp-gal']);
  expect(ids('imperial')).not.toContain('us-cup');
});
