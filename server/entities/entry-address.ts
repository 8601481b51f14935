import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { Build } from './build.ts';
import { Entry } from './entry.ts';

/** Every slug an entry has ever had within its build. One outlives a discarded entry, so that it is never given to another. */
export const EntryAddress = defineEntity({
  name: 'EntryAddress',
  tableName: 'entry_address',
  uniques: [{ properties: ['build', 'slug'] }],
  properties: {
    id: p.integer().primary(),
    build: () => p.manyToOne(Build).deleteRule('cascade'),
    slug: p.string(),
    entry: () => p.manyToOne(Entry).nullable().deleteRule('set null').index(),
  },
});
export type EntryAddress = InferEntity<typeof EntryAddress>;
