import type Fraction from 'fraction.js';
import type { Movement } from './movement.ts';
import { drawFrom, leftIn, newLot } from './stock.ts';
import type { Lot, Stock } from './stock.ts';

/** One movement as it was entered on the shelf. Amounts in parts, money in minor units. */
export interface Entered {
  readonly movement: Movement;
  /** the figure its value counts under */
  readonly counts: 'in' | 'used' | 'wasted' | 'returned' | 'sold';
  /** grows while later lots settle what was short */
  value: bigint;
  short: bigint;
  left: bigint;
  /** counted: seen less expected */
  found: bigint | null;
}

export interface Replayed {
  readonly entered: readonly Entered[];
  readonly refused: readonly { readonly key: string; readonly there: bigint }[];
  /** not bought yet, in all */
  readonly short: bigint;
}

/** A replay under way: the shelf, and the uses that wait for something to be bought. */
interface Shelf {
  readonly stock: Stock;
  readonly waiting: Entered[];
  /** the first of `waiting` that is still short */
  nextWaiting: number;
  short: bigint;
  readonly refused: { key: string; there: bigint }[];
}

function entry(movement: Movement, counts: Entered['counts'], value: bigint): Entered {
  return { movement, counts, value, short: 0n, left: 0n, found: null };
}

// A new lot settles what is short before it is pooled, oldest use first; the value belongs to the use.
function settle(shelf: Shelf, lot: Lot): void {
  for (let first = shelf.waiting[shelf.nextWaiting]; first && leftIn(lot) > 0n; first = shelf.waiting[shelf.nextWaiting]) {
    const amount = first.short < leftIn(lot) ? first.short : leftIn(lot);
    first.value += drawFrom(lot, amount);
    first.short -= amount;
    shelf.short -= amount;
    if (first.short === 0n) shelf.nextWaiting += 1;
  }
}

function bringIn(shelf: Shelf, movement: Movement, amount: bigint): Entered {
  const cost = movement.kind === 'given' ? 0n : BigInt(movement.cost ?? 0);
  const lot = newLot(movement.key, cost, amount);
  settle(shelf, lot);
  if (leftIn(lot) > 0n) shelf.stock.put(lot);
  return entry(movement, 'in', cost);
}

function use(shelf: Shelf, movement: Movement, counts: 'used' | 'wasted', amount: bigint): Entered {
  const there = shelf.stock.amount();
  const drawn = amount < there ? amount : there;
  const entered = entry(movement, counts, shelf.stock.take(drawn));
  entered.short = amount - drawn;
  if (entered.short > 0n) {
    shelf.short += entered.short;
    shelf.waiting.push(entered);
  }
  return entered;
}

function giveUp(shelf: Shelf, movement: Movement, counts: 'returned' | 'sold', amount: bigint): Entered {
  const there = shelf.stock.amount();
  if (amount > there) {
    shelf.refused.push({ key: movement.key, there });
    return entry(movement, counts, 0n);
  }
  return entry(movement, counts, shelf.stock.take(amount, counts === 'returned' ? movement.of : undefined));
}

// A surplus is a lot of no cost; it goes straight on the shelf and settles nothing that is short.
function count(shelf: Shelf, movement: Movement, seen: bigint): Entered {
  const found = seen - shelf.stock.amount();
  if (found > 0n) shelf.stock.put(newLot(movement.key, 0n, found));
  const value = found < 0n ? shelf.stock.take(-found) : 0n;
  return { ...entry(movement, movement.shortage ?? 'used', value), found };
}

function enter(shelf: Shelf, movement: Movement, amount: bigint): Entered {
  switch (movement.kind) {
    case 'bought':
    case 'given':
      return bringIn(shelf, movement, amount);
    case 'used':
    case 'wasted':
      return use(shelf, movement, movement.kind, amount);
    case 'returned':
    case 'sold':
      return giveUp(shelf, movement, movement.kind, amount);
    case 'counted':
      return count(shelf, movement, amount);
  }
}

/**
 * Enters movements of one material, already in the ledger's order, on an empty shelf.
 * Each is entered once; what is short is settled by the lots that come after.
 */
export function replay(ordered: readonly Movement[], stock: Stock, parts: (amount: Fraction) => bigint): Replayed {
  const shelf: Shelf = { stock, waiting: [], nextWaiting: 0, short: 0n, refused: [] };
  const entered = ordered.map((movement) => {
    const one = enter(shelf, movement, parts(movement.amount));
    one.left = stock.amount();
    return one;
  });
  return { entered, refused: shelf.refused, short: shelf.short };
}
