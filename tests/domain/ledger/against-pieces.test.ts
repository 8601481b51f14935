import fc from 'fast-check';
import Fraction from 'fraction.js';
import { expect, test } from 'vitest';
import { compareMovements } from '#domain/ledger/movement.ts';
import type { Movement } from '#domain/ledger/movement.ts';
import { priceMaterial } from '#domain/ledger/price.ts';
import { pieceHistory } from './random-history.ts';

// The ledger's rules told again the slow way, as a row of separate pieces, and as an exact average.

interface Piece {
  readonly from: string;
  readonly price: number;
}

/** What each movement gave up, piece by piece: the oldest first, named ones before that, the short settled first. */
function byPieces(movements: readonly Movement[]): { values: Map<string, number>; worth: number } {
  const shelf: Piece[] = [];
  const waiting: string[] = [];
  const values = new Map<string, number>();
  const charge = (key: string, piece: Piece | undefined) => values.set(key, (values.get(key) ?? 0) + (piece?.price ?? 0));
  const take = (key: string, pieces: number, named?: string) => {
    for (let taken = 0; taken < pieces; taken += 1) {
      const at = shelf.findIndex(({ from }) => from === named);
      charge(key, shelf.splice(Math.max(0, at), 1)[0]);
    }
  };
  for (const { key, kind, amount, cost = 0, of } of movements.toSorted(compareMovements)) {
    const pieces = Number(amount.n);
    values.set(key, 0);
    if (kind === 'bought' || kind === 'given') {
      const price = kind === 'bought' ? cost / pieces : 0;
      values.set(key, kind === 'bought' ? cost : 0);
      for (let came = 0; came < pieces; came += 1) {
        const owed = waiting.shift();
        if (owed === undefined) shelf.push({ from: key, price });
        else charge(owed, { from: key, price });
      }
    } else if (kind === 'counted') {
      const there = shelf.length;
      take(key, Math.max(0, there - pieces));
      for (let found = there; found < pieces; found += 1) shelf.push({ from: key, price: 0 });
    } else if (kind === 'used' || kind === 'wasted') {
      const there = Math.min(pieces, shelf.length);
      take(key, there);
      for (let short = there; short < pieces; short += 1) waiting.push(key);
    } else if (pieces <= shelf.length) {
      take(key, pieces, kind === 'returned' ? of : undefined);
    }
  }
  return { values, worth: shelf.reduce((sum, { price }) => sum + price, 0) };
}

test('first in first out gives each movement the very pieces it took', () => {
  fc.assert(
    fc.property(pieceHistory, (movements) => {
      const ledger = priceMaterial('A', movements, 'fifo');
      const { values, worth } = byPieces(movements);
      for (const { key, value } of ledger.movements) expect(value, key).toBe(values.get(key));
      expect(ledger.figures.left).toBe(worth);
    }),
    { numRuns: 500 },
  );
});

/** The pool's worth at the end, never rounded. */
function exactPool(movements: readonly Movement[]): Fraction {
  let [worth, there, owed] = [new Fraction(0), new Fraction(0), new Fraction(0)];
  const draw = (amount: Fraction) => {
    if (there.n > 0n) worth = worth.mul(there.sub(amount)).div(there);
    there = there.sub(amount);
  };
  for (const { kind, amount, cost = 0 } of movements.toSorted(compareMovements)) {
    const least = amount.lt(there) ? amount : there;
    if (kind === 'bought' || kind === 'given') {
      const settled = amount.lt(owed) ? amount : owed;
      owed = owed.sub(settled);
      there = there.add(amount).sub(settled);
      if (kind === 'bought') worth = worth.add(amount.sub(settled).mul(cost).div(amount));
    } else if (kind === 'counted') {
      if (amount.lt(there)) draw(there.sub(amount));
      else there = amount;
    } else if (kind === 'used' || kind === 'wasted') {
      owed = owed.add(amount.sub(least));
      draw(least);
    } else if (amount.lte(there)) {
      draw(amount);
    }
  }
  return worth;
}

test('the moving average stays within half a penny for each time the pool was struck', () => {
  fc.assert(
    fc.property(pieceHistory, (movements) => {
      const struck = movements.filter(({ kind }) => kind === 'bought' || kind === 'given' || kind === 'counted').length;
      const worth = priceMaterial('A', movements, 'average').figures.left;
      expect(exactPool(movements).sub(worth).abs().lte(new Fraction(struck + 1, 2))).toBe(true);
    }),
    { numRuns: 500 },
  );
});
