import fc from 'fast-check';
import Fraction from 'fraction.js';
import type { Movement, MovementKind } from '#domain/ledger/movement.ts';
import { dayOf } from './history.ts';

const kinds: readonly MovementKind[] = ['bought', 'given', 'used', 'wasted', 'returned', 'sold', 'counted'];

/** Halves, thirds, sevenths and the awkward parts of a US cup, up to some sixty base units. */
const amount = fc
  .tuple(fc.integer({ min: 1, max: 60 }), fc.constantFrom(1, 1, 1, 2, 3, 7, 16))
  .map(([n, d]) => new Fraction(n, d));

interface Drawn {
  readonly kind: MovementKind;
  readonly material: string;
  readonly date: number;
  readonly sequence: number;
  readonly amount: Fraction;
  readonly cost: number;
  readonly of: number;
  readonly shortage: 'used' | 'wasted' | undefined;
  readonly seenNothing: boolean;
}

const drawn: fc.Arbitrary<Drawn> = fc.record({
  kind: fc.constantFrom(...kinds, 'bought', 'bought', 'used', 'used'),
  material: fc.constantFrom('A', 'A', 'B', 'C'),
  date: fc.integer({ min: 1, max: 12 }),
  sequence: fc.integer({ min: 1, max: 8 }),
  amount,
  cost: fc.integer({ min: 0, max: 20_000 }),
  of: fc.nat(60),
  shortage: fc.constantFrom('used', 'wasted', undefined),
  seenNothing: fc.boolean(),
});

function movementOf(one: Drawn, at: number): Movement {
  const common = {
    key: `m${at}`, kind: one.kind, material: one.material, day: dayOf(one.date), sequence: one.sequence, place: at,
    amount: one.kind === 'counted' && one.seenNothing ? new Fraction(0) : one.amount,
  };
  if (one.kind === 'bought') return { ...common, cost: one.cost };
  // Named lots may be of another material, later or no lot at all: a return then goes by the oldest.
  if (one.kind === 'returned') return { ...common, of: `m${one.of}` };
  if (one.kind === 'counted' && one.shortage) return { ...common, shortage: one.shortage };
  return common;
}

/** Movements of every kind over three materials and twelve days, in the order somebody typed them. */
export const anyHistory: fc.Arbitrary<Movement[]> = fc
  .array(drawn, { minLength: 1, maxLength: 60 })
  .map((rows) => rows.map(movementOf));

/** As `anyHistory`, two hundred movements long. */
export const longHistory: fc.Arbitrary<Movement[]> = fc
  .array(drawn, { minLength: 200, maxLength: 200 })
  .map((rows) => rows.map(movementOf));

export const anyMethod = fc.constantFrom('fifo' as const, 'average' as const);

/** Whole pieces bought at whole prices each: what a shelf of separate pieces can check. */
export const pieceHistory: fc.Arbitrary<Movement[]> = fc.array(drawn, { minLength: 1, maxLength: 40 }).map((rows) =>
  rows.map((one, at) => {
    const pieces = new Fraction(one.amount.n);
    const movement = movementOf({ ...one, material: 'A', amount: pieces }, at);
    return movement.kind === 'bought' ? { ...movement, cost: (one.cost % 100) * Number(pieces.n) } : movement;
  }),
);
