import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { Pack, Ratio } from '#domain/quantity-reading.ts';
import type { Dimension } from '#domain/units.ts';
import type { HazardTag } from '#contracts/words.ts';
import { Build } from './build.ts';
import { Person } from './person.ts';

/** A material of one restorer; it serves all their builds. */
export const Material = defineEntity({
  name: 'Material',
  tableName: 'material',
  uniques: [{ properties: ['owner', 'nameKey'] }],
  properties: {
    id: p.integer().primary(),
    owner: () => p.manyToOne(Person).deleteRule('cascade'),
    /** The build it was added at, whose crew may use it; nothing where it was added to the restorer's own list. */
    addedFor: () => p.manyToOne(Build).nullable().deleteRule('set null'),
    name: p.string(),
    /** The name lower-cased with runs of space folded: one material a name. */
    nameKey: p.string(),
    /** Fixed once used. */
    dimension: p.string().$type<Dimension>(),
    /** The unit amounts are usually shown and typed in: an id of the unit table, or a pack's name. */
    unit: p.string(),
    ratio: p.json<Ratio | null>().nullable(),
    packs: p.json<Pack[]>(),
    hazards: p.json<HazardTag[]>(),
    createdAt: p.datetime().onCreate(() => new Date()),
  },
});
export type Material = InferEntity<typeof Material>;
