import type Fraction from 'fraction.js';

export interface UseForOne {
  readonly material: string;
  readonly kind: 'used' | 'wasted';
  readonly counts: 'each' | 'whole' | 'opened';
  readonly amount: Fraction;
  readonly value: number;
}

export interface TimeForOne {
  readonly minutes: number;
  readonly kind: 'each' | 'setup' | 'waiting';
}

export interface WorkForOne {
  readonly work: Fraction;
  readonly uses: readonly UseForOne[];
  readonly times: readonly TimeForOne[];
}

export interface OneTakes {
  readonly materials: readonly { readonly material: string; readonly amount: Fraction; readonly money: number }[];
  readonly money: number;
  readonly minutes: number;
  readonly wastedShare: Fraction | null;
}

export function whatOneTakes(input: WorkForOne): OneTakes | null {
  throw new Error(`whatOneTakes ${input.uses.length}`);
}
