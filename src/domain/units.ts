import type Fraction from 'fraction.js';

export type Dimension = 'volume' | 'mass' | 'length' | 'area' | 'timber' | 'count' | 'time';
export type Measures = 'us' | 'imperial';

export interface Unit {
  readonly id: string;
  readonly dimension: Dimension;
  /** base units (ml, g, mm, m², m³, piece, minute) in one */
  readonly factor: Fraction;
  readonly words: readonly string[];
  readonly only?: Measures;
  readonly one: string;
  readonly many: string;
}

export function unitsFor(dimension: Dimension, measures: Measures): readonly Unit[] {
  throw new Error(`unitsFor ${dimension} ${measures}`);
}
export function unitById(id: string): Unit {
  throw new Error(`unitById ${id}`);
}
