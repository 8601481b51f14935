import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { Build } from './build.ts';
import { Person } from './person.ts';
import { Stage } from './stage.ts';
import { WorkKind } from './work-kind.ts';

/** One write-up: one published document and at most one working copy. Title, days, stage and work are derived at sign-off. */
export const Entry = defineEntity({
  name: 'Entry',
  tableName: 'entry',
  uniques: [{ properties: ['build', 'number'] }, { properties: ['build', 'slug'] }],
  indexes: [{ properties: ['build', 'day'] }, { properties: ['firstPublishedAt'] }],
  properties: {
    id: p.integer().primary(),
    /** For feeds: never changes through edits and renames. */
    guid: p.uuid().unique(),
    build: () => p.manyToOne(Build).deleteRule('cascade'),
    author: () => p.manyToOne(Person),
    /** Number in the one sequence of the build's owner, by creation. */
    sequence: p.integer(),
    /** Entry number shown to readers, by creation among entries. */
    number: p.integer(),
    /** Given at first sign-off. */
    slug: p.string().nullable(),
    workingAt: p.datetime().nullable(),
    title: p.string().default(''),
    day: p.string(),
    dayTo: p.string().nullable(),
    stage: () => p.manyToOne(Stage).nullable().deleteRule('set null'),
    /** Exact `n/d` in `workUnit`. */
    workAmount: p.string().nullable(),
    workUnit: p.string().nullable(),
    workKind: () => p.manyToOne(WorkKind).nullable(),
    firstPublishedAt: p.datetime().nullable(),
    /** Last sign-off that changed the words; re-pricing never touches it. */
    editedAt: p.datetime().nullable(),
    /** Checked on every save: a save over somebody's newer one is refused. */
    version: p.integer().version(),
    createdAt: p.datetime().onCreate(() => new Date()),
    /** Digest of the words taken back: signed off again unchanged, they are no edit. */
    takenBack: p.string().nullable(),
    // last, since long columns are walked by whoever wants one behind them
    working: p.json<EntryDocument | null>().nullable(),
    published: p.json<EntryDocument | null>().nullable(),
  },
});
export type Entry = InferEntity<typeof Entry>;
