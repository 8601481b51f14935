import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { PricingMethod } from '#domain/ledger/price.ts';
import { Build } from './build.ts';
import { Person } from './person.ts';

/** Materials on hand: of a build, or (the shed) of a person. Exactly one of the two is set. */
export const Shelf = defineEntity({
  name: 'Shelf',
  tableName: 'shelf',
  // one shed a person and currency; a build's shelf has no person and is unique by its build
  uniques: [{ properties: ['person', 'currency'] }],
  checks: [{ expression: '(build_id is null) <> (person_id is null)' }],
  properties: {
    id: p.integer().primary(),
    build: () => p.manyToOne(Build).nullable().unique().deleteRule('cascade'),
    person: () => p.manyToOne(Person).nullable().deleteRule('cascade'),
    currency: p.string(),
    method: p.string().$type<PricingMethod>().default('fifo'),
  },
});
export type Shelf = InferEntity<typeof Shelf>;
