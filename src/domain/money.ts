import type Fraction from 'fraction.js';
import type { Reading } from './reading.ts';

export type { Reading } from './reading.ts';

export interface Money<C extends string = string> {
  readonly currency: C;
  /** integer minor units of the currency */
  readonly minor: number;
}

export function money<C extends string>(minor: number, currency: C): Money<C> {
  throw new Error(`money ${minor} ${currency}`);
}
export function addMoney<C extends string>(a: Money<C>, b: Money<NoInfer<C>>): Money<C> {
  throw new Error(`addMoney ${a.minor} ${b.minor}`);
}
export function subtractMoney<C extends string>(a: Money<C>, b: Money<NoInfer<C>>): Money<C> {
  throw new Error(`subtractMoney ${a.minor} ${b.minor}`);
}
export function roundHalfEven(value: Fraction): number {
  throw new Error(`roundHalfEven ${value.toFraction()}`);
}
export function splitByLargestRemainder(total: number, weights: readonly (number | Fraction)[]): number[] {
  throw new Error(`split ${total} ${weights.length}`);
}
export function readMoney(text: string, currency: string): Reading<Money> {
  throw new Error(`readMoney ${text} ${currency}`);
}
