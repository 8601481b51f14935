import type { Quantity } from './quantity.ts';
import type { Reading } from './reading.ts';
import type { Dimension, Measures } from './units.ts';

export interface Pack {
  /** box, tin, roll */
  readonly name: string;
  /** n/d base units of the material's dimension */
  readonly amount: string;
}

export interface Ratio {
  readonly to: Dimension;
  /** n/d base units of `to` for one base unit of the material's dimension */
  readonly amount: string;
  readonly about: boolean;
}

export interface ReadingContext {
  readonly measures: Measures;
  readonly dimension: Dimension;
  readonly packs?: readonly Pack[];
  readonly ratio?: Ratio | null;
}

export interface QuantityRead {
  readonly quantity: Quantity;
  readonly shownBack: string;
  readonly note?: string;
}

export function readQuantity(text: string, context: ReadingContext): Reading<QuantityRead> {
  throw new Error(`readQuantity ${text} ${context.dimension}`);
}
