import Fraction from 'fraction.js';
import { roundedWithin } from './rounding.ts';

export interface StageFigures {
  /** minor units; null when the stage has no plan */
  readonly planned: number | null;
  readonly used: number;
  readonly wasted: number;
  /** used + wasted of *for each* lines */
  readonly usedForEach: number;
  readonly workPlanned: Fraction | null;
  readonly workDone: Fraction | null;
  /** how far the stage is said to be, out of a hundred (40, not 0.4) */
  readonly percent: Fraction | null;
  readonly done: boolean;
}

// Minor units. A forecast beyond it comes of a slip in the work planned or done; under it, those of all stages still add up exactly.
const mostForecast = 1e14;

function byWork(soFar: number, forEach: number, planned: Fraction, done: Fraction): number | null {
  const remaining = planned.gt(done) ? planned.sub(done) : new Fraction(0);
  return roundedWithin(remaining.mul(forEach).div(done).add(soFar), mostForecast);
}

// Planned ÷ (earned ÷ so far), the estimate at completion of earned value, where earned is planned × percent.
function byPercent(soFar: number, planned: number, percent: Fraction): number | null {
  const earned = percent.mul(planned).div(100);
  return roundedWithin(new Fraction(planned).div(earned.div(soFar)), mostForecast);
}

/**
 * Where a stage will finish, minor units. Done: what it took. Nothing used yet: the plan. Work
 * measured and planned: what it took so far and the remaining work at the pace of *for each*
 * lines. Only a percent: the usual estimate at completion (planned ÷ cost performance index).
 * @returns null where there is not enough to go on beyond the plan
 */
export function finishAt(stage: StageFigures): number | null {
  const { planned, workPlanned, workDone, percent } = stage;
  const soFar = stage.used + stage.wasted;
  if (stage.done) return soFar;
  if (soFar === 0) return planned;
  if (workPlanned && workDone && workDone.n > 0n) return byWork(soFar, stage.usedForEach, workPlanned, workDone);
  if (planned && percent && percent.n > 0n) return byPercent(soFar, planned, percent);
  return null;
}
