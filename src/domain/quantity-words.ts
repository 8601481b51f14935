import type { Pack } from './quantity-reading.ts';
import type { Dimension, Measures } from './units.ts';

export interface WordingOptions {
  readonly measures: Measures;
  readonly packs?: readonly Pack[];
  /** id of the unit to say it in */
  readonly unit?: string;
}

export function wordsForQuantity(amount: string, dimension: Dimension, options: WordingOptions): string {
  throw new Error(`wordsForQuantity ${amount} ${dimension} ${options.measures}`);
}
