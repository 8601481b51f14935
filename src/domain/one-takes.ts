import Fraction from 'fraction.js';
import { roundedWithin, roundHalfEven } from './rounding.ts';

export interface UseForOne {
  readonly material: string;
  readonly kind: 'used' | 'wasted';
  /** for each, for the whole job, or opened and not counted */
  readonly counts: 'each' | 'whole' | 'opened';
  /** base units */
  readonly amount: Fraction;
  /** minor units, settled so far */
  readonly value: number;
}

export interface TimeForOne {
  readonly minutes: number;
  readonly kind: 'each' | 'setup' | 'waiting';
}

export interface WorkForOne {
  /** units of work done */
  readonly work: Fraction;
  readonly uses: readonly UseForOne[];
  readonly times: readonly TimeForOne[];
}

export interface MaterialForOne {
  readonly material: string;
  /** base units used for one, exact */
  readonly amount: Fraction;
  /** minor units for one, rounded for itself: a column of these need not add up to `money` */
  readonly money: number;
  /** amount wasted ÷ amount used; null when none was used */
  readonly wastedShare: Fraction | null;
}

export interface OneTakes {
  /** in the order they were first named */
  readonly materials: readonly MaterialForOne[];
  /** minor units for one: the sum, rounded once */
  readonly money: number;
  readonly minutes: number;
  /** money wasted ÷ money used; null when nothing was used */
  readonly wastedShare: Fraction | null;
}

interface Sums {
  used: Fraction;
  wasted: Fraction;
  money: number;
}

const nought = new Fraction(0);
// Minor units or minutes for one: more comes of a slip in the work done.
const mostForOne = 1e13;

function share(wasted: Fraction, used: Fraction): Fraction | null {
  return used.n === 0n ? null : wasted.div(used);
}

function sumsByMaterial(uses: readonly UseForOne[]): Map<string, Sums> {
  const sums = new Map<string, Sums>();
  for (const { material, kind, amount, value } of uses) {
    const own = sums.get(material) ?? { used: nought, wasted: nought, money: 0 };
    own[kind] = own[kind].add(amount);
    if (kind === 'used') own.money += value;
    sums.set(material, own);
  }
  return sums;
}

/**
 * Money (minor units, half to even) and hands-on minutes (nearest whole) for one unit of work, of sums over *for each* lines.
 * @returns null when no work was done, or so little that what one takes is no figure
 */
export function forOneOf(work: Fraction, sums: { readonly money: number; readonly minutes: number }): { money: number; minutes: number } | null {
  if (work.n === 0n) return null;
  const [money, minutes] = [sums.money, sums.minutes].map((sum) => roundedWithin(new Fraction(sum).div(work), mostForOne));
  return money == null || minutes == null ? null : { money, minutes };
}

/**
 * What one unit of work really took: material (exact base units), money (minor units, half to
 * even once, of the sum) and hands-on minutes (nearest whole, half to even). Only *for each*
 * lines and times count; what was wasted is kept apart and given as a share of what was used.
 * @returns null when no work was done, or so little that what one takes is no figure
 */
export function whatOneTakes({ work, uses, times }: WorkForOne): OneTakes | null {
  const each = uses.filter(({ counts }) => counts === 'each');
  const moneyOf = (kind: UseForOne['kind']) =>
    each.reduce((sum, use) => (use.kind === kind ? sum + use.value : sum), 0);
  const minutesForEach = times.reduce((sum, { minutes, kind }) => (kind === 'each' ? sum + minutes : sum), 0);
  const one = forOneOf(work, { money: moneyOf('used'), minutes: minutesForEach });
  if (!one) return null;
  const materials = [...sumsByMaterial(each)].map(([material, { used, wasted, money }]) => ({
    material,
    amount: used.div(work),
    money: roundHalfEven(new Fraction(money).div(work)),
    wastedShare: share(wasted, used),
  }));
  return {
    materials,
    money: one.money,
    minutes: one.minutes,
    wastedShare: share(new Fraction(moneyOf('wasted')), new Fraction(moneyOf('used'))),
  };
}
