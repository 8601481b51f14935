import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { Basis } from '#contracts/words.ts';
import { Build } from './build.ts';
import { Entry } from './entry.ts';

/** One purchase. A Bought block owns its receipt through (entry, block). Money in minor units of `currency` unless said. */
export const Receipt = defineEntity({
  name: 'Receipt',
  tableName: 'receipt',
  uniques: [{ properties: ['entry', 'block'] }],
  properties: {
    id: p.integer().primary(),
    build: () => p.manyToOne(Build).deleteRule('cascade').index(),
    entry: () => p.manyToOne(Entry).nullable().deleteRule('cascade'),
    block: p.string().nullable(),
    /** Number in the owner's one sequence; a Bought block takes its entry's. */
    sequence: p.integer(),
    day: p.string(),
    supplier: p.string(),
    currency: p.string(),
    /** Build money for one of `currency`, exact fraction `n/d`. */
    rate: p.string(),
    basis: p.string().$type<Basis>(),
    discount: p.integer(),
    delivery: p.integer(),
    tax: p.integer(),
    paperTotal: p.integer().nullable(),
    /** In the build's currency, converted once. */
    total: p.integer(),
    /** In the build's currency: on the paper and not in any line yet. */
    notSorted: p.integer(),
    createdAt: p.datetime().onCreate(() => new Date()),
  },
});
export type Receipt = InferEntity<typeof Receipt>;
