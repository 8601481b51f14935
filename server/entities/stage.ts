import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { Build } from './build.ts';
import { WorkKind } from './work-kind.ts';

/** A part of a build, with what is planned for it. */
export const Stage = defineEntity({
  name: 'Stage',
  tableName: 'stage',
  properties: {
    id: p.integer().primary(),
    build: () => p.manyToOne(Build).deleteRule('cascade').index(),
    title: p.string(),
    position: p.integer(),
    /** Minor units of the build's currency. */
    plannedMoney: p.integer().nullable(),
    plannedMinutes: p.integer().nullable(),
    /** Exact fraction `n/d`, in the unit below. */
    plannedWork: p.string().nullable(),
    workUnit: p.string().nullable(),
    workKind: () => p.manyToOne(WorkKind).nullable(),
    done: p.boolean().default(false),
  },
});
export type Stage = InferEntity<typeof Stage>;
