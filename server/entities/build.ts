import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { Measures } from '#domain/units.ts';
import type { BuildKind, Stands, Visibility } from '#contracts/words.ts';
import { Person } from './person.ts';
import { Picture } from './picture.ts';

/** One restoration. */
export const Build = defineEntity({
  name: 'Build',
  tableName: 'build',
  properties: {
    id: p.integer().primary(),
    /** The address today; every address it ever had is kept in `build_address`. */
    slug: p.string().unique(),
    owner: () => p.manyToOne(Person),
    kind: p.string().$type<BuildKind>(),
    title: p.string(),
    lead: p.text().default(''),
    maker: p.string().default(''),
    model: p.string().default(''),
    year: p.integer().nullable(),
    yearAbout: p.boolean().default(false),
    frameNumber: p.string().default(''),
    engineNumber: p.string().default(''),
    hullNumber: p.string().default(''),
    serialNumber: p.string().default(''),
    registration: p.string().default(''),
    /** The five numbers above are private unless the restorer shows them. */
    numbersShown: p.boolean().default(false),
    stands: p.string().$type<Stands>().default('working'),
    /** Laid up until (a plain date) or what it waits for, in words. */
    standsNote: p.string().default(''),
    currency: p.string(),
    measures: p.string().$type<Measures>(),
    visibility: p.string().$type<Visibility>().default('public'),
    costsShown: p.boolean().default(true),
    archivedAt: p.datetime().nullable(),
    beforePicture: () => p.manyToOne(Picture).nullable().deleteRule('set null'),
    afterPicture: () => p.manyToOne(Picture).nullable().deleteRule('set null'),
    /** Last number given to an entry: none is given again, whatever became of the entry. */
    lastNumber: p.integer().default(0),
    startedOn: p.string(),
    version: p.integer().version(),
    createdAt: p.datetime().onCreate(() => new Date()),
  },
});
export type Build = InferEntity<typeof Build>;
