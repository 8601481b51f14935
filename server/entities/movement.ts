import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { MovementKind } from '#domain/ledger/movement.ts';
import type { Counts } from '#contracts/words.ts';
import { Build } from './build.ts';
import { Entry } from './entry.ts';
import { Material } from './material.ts';
import { ReceiptLine } from './receipt-line.ts';
import { Shelf } from './shelf.ts';
import { Stage } from './stage.ts';

/** One thing that happened to a material on a shelf, priced. `value` and `short` are what the last replay gave. */
export const Movement = defineEntity({
  name: 'Movement',
  tableName: 'movement',
  uniques: [{ properties: ['shelf', 'key'] }],
  indexes: [{ properties: ['shelf', 'material', 'day'] }, { properties: ['build', 'kind'] }],
  properties: {
    id: p.integer().primary(),
    shelf: () => p.manyToOne(Shelf).deleteRule('cascade'),
    /** The build it is charged to. On the shed's rows: set for a use told in a build's entry, which carries its value there (moved out of the shed, moved in and used in the build). */
    build: () => p.manyToOne(Build).nullable().deleteRule('cascade'),
    /** `entry:block:line` or `receipt:line`, unique within the shelf. */
    key: p.string(),
    kind: p.string().$type<MovementKind>(),
    material: () => p.manyToOne(Material),
    entry: () => p.manyToOne(Entry).nullable().deleteRule('cascade').index(),
    receiptLine: () => p.manyToOne(ReceiptLine).nullable().deleteRule('cascade').index(),
    block: p.string().nullable(),
    line: p.string().nullable(),
    day: p.string(),
    sequence: p.integer(),
    place: p.integer(),
    /** As typed, and exact `n/d` in the material's base unit. */
    typed: p.string(),
    amount: p.string(),
    /** Inward: cost to the door. */
    cost: p.integer().nullable(),
    /** Returned: key of the bought movement it gives back. */
    of: p.string().nullable(),
    shortage: p.string().$type<'used' | 'wasted'>().nullable(),
    /** Settled so far, minor units of the shelf's currency. */
    value: p.integer(),
    /** Exact `n/d`: used and not bought yet. */
    short: p.string(),
    counts: p.string().$type<Counts>().nullable(),
    stage: () => p.manyToOne(Stage).nullable().deleteRule('set null').index(),
  },
});
export type Movement = InferEntity<typeof Movement>;
