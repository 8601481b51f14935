import Fraction from 'fraction.js';
import { expect, test } from 'vitest';
import type { Movement } from '#domain/ledger/movement.ts';
import { priceShelf } from '#domain/ledger/price.ts';
import { whatOneTakes } from '#domain/one-takes.ts';
import { unitById } from '#domain/units.ts';

// Common practice, no source: resin bought by the US gallon at 50.00 and used one US cup a board on
// eight boards, with brushes at 10.00 for fifteen and one a board.
const boards = 8;
const gallon = unitById('us-gal').factor;
const cup = unitById('us-cup').factor;

function line(key: string, said: Pick<Movement, 'kind' | 'material' | 'amount'> & Partial<Movement>): Movement {
  return { key, day: '2026-11-14', sequence: 1, place: 0, ...said };
}

const bought = [
  line('tin', { kind: 'bought', material: 'resin', amount: gallon, cost: 5000 }),
  line('box', { kind: 'bought', material: 'brush', amount: new Fraction(15), cost: 1000 }),
];
const usedByBoard = Array.from({ length: boards }, (_, board) => [
  line(`resin ${board}`, { kind: 'used', material: 'resin', amount: cup, place: board }),
  line(`brush ${board}`, { kind: 'used', material: 'brush', amount: new Fraction(1), place: board }),
]).flat();

test.each(['fifo', 'average'] as const)('%s: eight boards used 25.00 of resin and 5.33 of brushes', (method) => {
  const shelf = priceShelf([...bought, ...usedByBoard], method);
  const [resin, brush] = [shelf.get('resin'), shelf.get('brush')];
  expect([resin?.figures.used, brush?.figures.used]).toEqual([2500, 533]);
  expect((resin?.figures.used ?? 0) + (brush?.figures.used ?? 0)).toBe(3033);
  expect(resin?.left.equals(gallon.div(2))).toBe(true);
  expect(brush?.left.equals(7)).toBe(true);
  expect([resin?.figures.left, brush?.figures.left]).toEqual([2500, 467]);
});

test('one board took a cup of resin, a brush and 3.79', () => {
  const shelf = priceShelf([...bought, ...usedByBoard], 'average');
  const uses = usedByBoard.map(({ key, material, amount }) => ({
    material, amount, kind: 'used' as const, counts: 'each' as const,
    value: shelf.get(material)?.movements.find((row) => row.key === key)?.value ?? Number.NaN,
  }));
  const one = whatOneTakes({ work: new Fraction(boards), uses, times: [] });
  expect(one?.money).toBe(379);
  expect(one?.materials.map(({ amount }) => amount)).toEqual([cup, new Fraction(1)]);
});
