import type Fraction from 'fraction.js';

export interface StageFigures {
  readonly planned: number | null;
  readonly used: number;
  readonly wasted: number;
  /** used + wasted of *for each* lines */
  readonly usedForEach: number;
  readonly workPlanned: Fraction | null;
  readonly workDone: Fraction | null;
  readonly percent: Fraction | null;
  readonly done: boolean;
}

export function finishAt(stage: StageFigures): number | null {
  throw new Error(`finishAt ${stage.used}`);
}
