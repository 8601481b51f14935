import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { PictureState } from '#contracts/words.ts';
import { Build } from './build.ts';
import { Person } from './person.ts';

/** One picture of a build, re-encoded from what was uploaded. Files live in the picture store under `key`. */
export const Picture = defineEntity({
  name: 'Picture',
  tableName: 'picture',
  properties: {
    id: p.integer().primary(),
    /** Unguessable; the address of every file of it. */
    key: p.string().unique(),
    build: () => p.manyToOne(Build).deleteRule('cascade').index(),
    uploader: () => p.manyToOne(Person),
    state: p.string().$type<PictureState>().default('working'),
    /** Words for the uploader when it was refused. */
    problem: p.string().nullable(),
    originalName: p.string(),
    bytes: p.integer().default(0),
    width: p.integer().default(0),
    height: p.integer().default(0),
    /** Private: when the camera says it was taken. */
    takenAt: p.datetime().nullable(),
    /** Small data URI shown until the picture is there. */
    placeholder: p.text().default(''),
    /** Widths made, ascending, each as AVIF, WebP and JPEG. */
    widths: p.json<number[]>(),
    createdAt: p.datetime().onCreate(() => new Date()),
  },
});
export type Picture = InferEntity<typeof Picture>;
