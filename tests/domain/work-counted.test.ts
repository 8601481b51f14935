import Fraction from 'fraction.js';
import { expect, test } from 'vitest';
import type { Movement, MovementKind } from '#domain/ledger/movement.ts';
import { priceMaterial, priceShelf } from '#domain/ledger/price.ts';

const materials = 400;
const kinds: readonly MovementKind[] = ['bought', 'used', 'used', 'wasted', 'given', 'used', 'returned', 'sold', 'bought', 'used', 'counted'];

/** A shelf of so many movements over 400 materials, back-dated every which way. */
function shelfOf(movements: number): Movement[] {
  return Array.from({ length: movements }, (_, at) => ({
    key: `m${at}`,
    kind: kinds[Math.floor(at / materials) % kinds.length] ?? 'used',
    material: `material ${at % materials}`,
    day: `2026-0${1 + ((at * 7) % 9)}-${10 + ((at * 13) % 18)}`,
    sequence: at,
    place: 0,
    amount: new Fraction(1 + (at % 37), 1 + (at % 6)),
    cost: (at * 31) % 5000,
  }));
}

test.each(['fifo', 'average'] as const)('%s: pricing replays each movement once, in proportion to how many there are', (method) => {
  for (const movements of [500, 5000]) {
    const shelf = priceShelf(shelfOf(movements), method);
    expect(shelf.size).toBe(materials);
    expect([...shelf.values()].reduce((sum, { replayed }) => sum + replayed, 0)).toBe(movements);
  }
});

test('pricing one material replays only its own movements', () => {
  const all = shelfOf(5000);
  const own = all.filter(({ material }) => material === 'material 17').length;
  expect(priceMaterial('material 17', all, 'fifo').replayed).toBe(own);
  expect(own).toBeLessThan(20);
});
