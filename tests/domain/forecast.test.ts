import Fraction from 'fraction.js';
import { expect, test } from 'vitest';
import { finishAt } from '#domain/forecast.ts';
import type { StageFigures } from '#domain/forecast.ts';

function stage(said: Partial<StageFigures>): StageFigures {
  return { planned: null, used: 0, wasted: 0, usedForEach: 0, workPlanned: null, workDone: null, percent: null, done: false, ...said };
}

const hundred = 100;

test.each([
  // Earned-value exercise 1 of a textbook's chapter 7 (student solution at studylib.net 9750501): EAC 150,000.
  ['planned 120,000, earned 20,000, cost 25,000', 120_000, 20_000, 25_000, 150_000_00],
  // P. Govan, PRA, chapter EVM: inputs published, estimate worked out: 725,000.
  ['planned 500,000, earned 200,000, cost 290,000', 500_000, 200_000, 290_000, 725_000_00],
  // The same: 102,857.142 857.
  ['planned 100,000, earned 35,000, cost 36,000', 100_000, 35_000, 36_000, 102_857_14],
  // Course case study: 4,162.5 thousand. Its cost is over what was earned, so it finishes over the plan.
  ['planned 3,700k, earned 2,400k, cost 2,700k', 3_700_000, 2_400_000, 2_700_000, 4_162_500_00],
])('only a percent: %s', (_, planned, earned, cost, finish) => {
  const percent = new Fraction(earned).div(planned).mul(100);
  expect(finishAt(stage({ planned: planned * hundred, used: cost * hundred, percent }))).toBe(finish);
});

test('what was wasted counts into what a stage took', () => {
  expect(finishAt(stage({ planned: 1000, used: 300, wasted: 100, percent: new Fraction(50) }))).toBe(800);
  expect(finishAt(stage({ planned: 1000, used: 300, wasted: 100, done: true }))).toBe(400);
});

test('work measured and planned goes on at the pace of the for-each lines alone', () => {
  // 17 of 40 ribs; 200.00 in all, of which 85.00 for each: 200.00 + 23 × 5.00.
  const ribs = stage({
    planned: 30_000, used: 18_000, wasted: 2000, usedForEach: 8500,
    workPlanned: new Fraction(40), workDone: new Fraction(17), percent: new Fraction(10),
  });
  expect(finishAt(ribs)).toBe(31_500);
  expect(finishAt({ ...ribs, workDone: new Fraction(50), usedForEach: 25_000 })).toBe(20_000);
});

test('nothing used yet stands at the plan; without one there is no figure', () => {
  expect(finishAt(stage({ planned: 9000, workPlanned: new Fraction(4), percent: new Fraction(20) }))).toBe(9000);
  expect(finishAt(stage({}))).toBeNull();
});

test('no figure is given where there is not enough to go on beyond the plan', () => {
  expect(finishAt(stage({ planned: 9000, used: 500 }))).toBeNull();
  expect(finishAt(stage({ planned: 9000, used: 500, percent: new Fraction(0) }))).toBeNull();
  expect(finishAt(stage({ used: 500, percent: new Fraction(50) }))).toBeNull();
  expect(finishAt(stage({ planned: 9000, used: 500, workPlanned: new Fraction(4), workDone: new Fraction(0) }))).toBeNull();
});
