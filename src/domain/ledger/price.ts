import type Fraction from 'fraction.js';
import { safeNumber } from '../rounding.ts';
import { averageStock } from './average.ts';
import { fifoStock } from './fifo.ts';
import { compareMovements, requirePossible } from './movement.ts';
import type { Movement, MovementKind } from './movement.ts';
import { commonParts } from './parts.ts';
import type { Parts } from './parts.ts';
import { replay } from './replay.ts';
import type { Entered } from './replay.ts';

/** How what leaves a shelf is valued: first in first out, or moving average (IAS 2, paragraph 25). */
export type PricingMethod = 'fifo' | 'average';

/** Minor units; `in` is the sum of the others, exactly. */
export interface ShelfFigures {
  readonly in: number;
  readonly used: number;
  readonly wasted: number;
  readonly returned: number;
  readonly sold: number;
  readonly left: number;
}

export interface PricedMovement {
  readonly key: string;
  readonly kind: MovementKind;
  /** minor units: what came in, or what has been settled so far of what went out */
  readonly value: number;
  /** amount not bought yet */
  readonly short: Fraction;
  /** on the shelf after it */
  readonly left: Fraction;
  /** counted: seen less expected, and the value of a shortage (a surplus is of no cost) */
  readonly found?: { readonly amount: Fraction; readonly value: number };
}

/** A return or sale of more than is there: nothing was taken for it, and it may not be kept. */
export interface Refusal {
  readonly key: string;
  readonly problem: 'more than there is';
  readonly there: Fraction;
}

export interface MaterialLedger {
  readonly material: string;
  /** in the ledger's order */
  readonly movements: readonly PricedMovement[];
  readonly figures: ShelfFigures;
  readonly left: Fraction;
  readonly notBoughtYet: Fraction;
  /** the last line bought, for estimates */
  readonly lastPaid: { readonly day: string; readonly cost: number; readonly amount: Fraction } | null;
  readonly refusals: readonly Refusal[];
  /** work counted: movements replayed */
  readonly replayed: number;
}

const stockBy = { fifo: fifoStock, average: averageStock } as const;

function inOrder(movements: readonly Movement[]): Movement[] {
  const keys = new Set<string>();
  for (const movement of movements) {
    requirePossible(movement);
    if (keys.has(movement.key)) throw new RangeError(`Two movements have the key ${movement.key}`);
    keys.add(movement.key);
  }
  return movements.toSorted(compareMovements);
}

function priced({ movement, value, short, left, found }: Entered, parts: Parts): PricedMovement {
  const row = {
    key: movement.key,
    kind: movement.kind,
    value: safeNumber(value),
    short: parts.back(short),
    left: parts.back(left),
  };
  return found === null ? row : { ...row, found: { amount: parts.back(found), value: row.value } };
}

function figuresOf(entered: readonly Entered[], left: bigint): ShelfFigures {
  const sums = { in: 0n, used: 0n, wasted: 0n, returned: 0n, sold: 0n };
  for (const { counts, value } of entered) sums[counts] += value;
  return {
    in: safeNumber(sums.in),
    used: safeNumber(sums.used),
    wasted: safeNumber(sums.wasted),
    returned: safeNumber(sums.returned),
    sold: safeNumber(sums.sold),
    left: safeNumber(left),
  };
}

function lastPaidIn(ordered: readonly Movement[]): MaterialLedger['lastPaid'] {
  const last = ordered.findLast(({ kind }) => kind === 'bought');
  return last ? { day: last.day, cost: last.cost ?? 0, amount: last.amount } : null;
}

function priceOwn(material: string, movements: readonly Movement[], method: PricingMethod): MaterialLedger {
  const ordered = inOrder(movements);
  const parts = commonParts(ordered.map(({ amount }) => amount));
  const stock = stockBy[method]();
  const { entered, refused, short } = replay(ordered, stock, parts.of);
  return {
    material,
    movements: entered.map((one) => priced(one, parts)),
    figures: figuresOf(entered, stock.value()),
    left: parts.back(stock.amount()),
    notBoughtYet: parts.back(short),
    lastPaid: lastPaidIn(ordered),
    refusals: refused.map(({ key, there }) => ({ key, problem: 'more than there is', there: parts.back(there) })),
    replayed: entered.length,
  };
}

/**
 * Prices one material of one shelf from nothing: each movement's value, what is left, what is
 * not bought yet, and the figures, for which `in = used + wasted + returned + sold + left` exactly.
 * Movements may come in any order; those of other materials are passed over.
 * @throws RangeError for what cannot be: an amount below nought, a cost that is no whole number
 * of minor units, one key twice.
 */
export function priceMaterial(material: string, movements: readonly Movement[], method: PricingMethod): MaterialLedger {
  return priceOwn(material, movements.filter((movement) => movement.material === material), method);
}

/** Prices every material of a shelf from nothing, each by itself. @throws RangeError as `priceMaterial` does. */
export function priceShelf(movements: readonly Movement[], method: PricingMethod): ReadonlyMap<string, MaterialLedger> {
  const byMaterial = new Map<string, Movement[]>();
  for (const movement of movements) {
    const own = byMaterial.get(movement.material);
    if (own) own.push(movement);
    else byMaterial.set(movement.material, [movement]);
  }
  return new Map([...byMaterial].map(([material, own]) => [material, priceOwn(material, own, method)]));
}
