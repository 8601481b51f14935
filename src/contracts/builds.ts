import { z } from 'zod';
import { workUnits } from '#src/blocks/entry-document.ts';
import { endpoint } from './endpoint.ts';
import { currencyCode, minor, noBody, nothing, ok, personView, plainDay, slug } from './fields.ts';
import { pictureView } from './pictures.ts';
import { tapeView } from './tape.ts';
import { buildKinds, measuresList, pricingMethods, standsList, visibilities } from './words.ts';

const text = (most: number) => z.string().trim().max(most, `${most} letters at most.`);
const buildFields = {
  kind: z.enum(buildKinds, 'Pick what it is.'),
  title: text(100).min(1, 'Give the build a name.'),
  lead: text(600),
  maker: text(80), model: text(80),
  year: z.number('Give a year, such as 1961.').int().min(1500, 'Give a year, such as 1961.').max(2100, 'Give a year, such as 1961.').nullable(),
  yearAbout: z.boolean(),
  frameNumber: text(60), engineNumber: text(60), hullNumber: text(60), serialNumber: text(60), registration: text(60),
  numbersShown: z.boolean(),
  stands: z.enum(standsList), standsNote: text(80),
  startedOn: plainDay,
  currency: currencyCode, measures: z.enum(measuresList), method: z.enum(pricingMethods),
  visibility: z.enum(visibilities), costsShown: z.boolean(),
};

/** Everything a restorer sets about a build. */
export const buildSettings = z.object(buildFields).extend({
  slug: z.string(), version: z.number().int(), archived: z.boolean(),
  /** Currency is fixed once money was written down. */
  currencyFixed: z.boolean(),
});
export type BuildSettings = z.output<typeof buildSettings>;

const buildParams = z.object({ build: slug });
export const startBuild = endpoint({
  method: 'POST', path: '/api/builds', access: 'member', params: nothing, query: nothing,
  body: z.object(buildFields).partial().required({ kind: true, title: true, currency: true, measures: true }),
  reply: z.object({ slug: z.string() }),
});
export const readBuildSettings = endpoint({
  method: 'GET', path: '/api/builds/:build/settings', access: 'member', params: buildParams, query: nothing, body: noBody, reply: buildSettings,
});
/** A newer version standing there answers `newer-exists` with `newer: { version }`. */
export const changeBuild = endpoint({
  method: 'PATCH', path: '/api/builds/:build/settings', access: 'member', params: buildParams, query: nothing,
  body: z.object(buildFields).partial().extend({ version: z.number().int() }), reply: z.object({ slug: z.string(), version: z.number().int() }),
});
export const archiveBuild = endpoint({
  method: 'POST', path: '/api/builds/:build/archive', access: 'member', params: buildParams, query: nothing,
  body: z.object({ archived: z.boolean() }), reply: ok,
});

export const stageView = z.object({
  id: z.number().int(), title: z.string(),
  plannedMoney: minor.nullable(), plannedMinutes: z.number().int().nullable(),
  /** As written: "24". */
  plannedWork: z.string().nullable(), workUnit: z.string().nullable(), workKind: z.string().nullable(),
  done: z.boolean(),
  /** Whether entries stand in it; such a stage cannot be taken out. */
  used: z.boolean(),
});
export type StageView = z.output<typeof stageView>;
export const readStages = endpoint({
  method: 'GET', path: '/api/builds/:build/stages', access: 'member', params: buildParams, query: nothing, body: noBody,
  reply: z.object({
    currency: z.string(), stages: z.array(stageView),
    /** Of the list as it was read: a change of it says which it stands on. */
    version: z.string(),
  }),
});
/** The whole list in order: rows without an id are new, rows left out are taken away. Money and hours as typed. A newer list standing there answers `newer-exists` with `newer: { version }`. */
export const changeStages = endpoint({
  method: 'PUT', path: '/api/builds/:build/stages', access: 'member', params: buildParams, query: nothing,
  body: z.object({
    stages: z.array(z.object({
      id: z.number().int().nullable(), title: text(60).min(1, 'Give the stage a name.'),
      plannedMoney: text(20), plannedTime: text(20), plannedWork: text(20), workUnit: z.enum(workUnits, 'Pick what it is counted in.'), workKind: text(60), done: z.boolean(),
    })).max(60),
    version: z.string().max(40),
  }),
  reply: ok,
});

/** Builds somebody may write in, newest work first. */
export const readMyBuilds = endpoint({
  method: 'GET', path: '/api/my/builds', access: 'member', params: nothing, query: nothing, body: noBody,
  reply: z.object({
    builds: z.array(z.object({
      slug: z.string(), title: z.string(), kind: z.enum(buildKinds), visibility: z.enum(visibilities), mine: z.boolean(), archived: z.boolean(),
      picture: pictureView.nullable(), days: z.number().int(),
      drafts: z.array(z.object({ number: z.number().int(), title: z.string(), day: plainDay, savedAt: z.string() })),
    })),
  }),
});
export type MyBuilds = z.output<typeof readMyBuilds.reply>;

/** A build in a list. */
export const buildCard = z.object({
  slug: z.string(), title: z.string(), kind: z.enum(buildKinds), lead: z.string(),
  owner: personView, stands: z.enum(standsList), standsNote: z.string(), madeIn: z.string(),
  days: z.number().int(), lastDay: plainDay.nullable(), picture: pictureView.nullable(),
  /** Unsettled: some of it is not bought yet. */
  used: z.object({ minor, currency: z.string(), unsettled: z.boolean() }).optional(),
});
export type BuildCard = z.output<typeof buildCard>;
export const readBuilds = endpoint({
  method: 'GET', path: '/api/builds', access: 'anyone', params: nothing,
  query: z.object({ kind: z.enum(buildKinds).optional().catch(undefined), page: z.coerce.number().int().min(1).max(10_000).catch(1) }), body: noBody,
  reply: z.object({
    builds: z.array(buildCard), page: z.number().int(), pages: z.number().int(), count: z.number().int(),
    kinds: z.array(z.object({ kind: z.enum(buildKinds), count: z.number().int() })),
  }),
});
export type BuildsView = z.output<typeof readBuilds.reply>;

/** One entry in a list. */
export const entryCard = z.object({
  href: z.string(), number: z.number().int(), title: z.string(), lead: z.string(),
  day: plainDay, dayTo: plainDay.nullable(), stage: z.string().nullable(),
  build: z.object({ slug: z.string(), title: z.string() }), author: personView,
  picture: pictureView.nullable(), photos: z.number().int(),
  currency: z.string(), money: minor.optional(), minutes: z.number().int(), draft: z.boolean(),
  /** Some of the money is not bought yet; absent where the money is. */
  unsettled: z.boolean().optional(),
});
export type EntryCard = z.output<typeof entryCard>;

export const planRow = z.object({
  stage: z.string(), done: z.boolean(), planned: minor.nullable(), used: minor, wasted: minor,
  /** Some of what went is not bought yet, so its money is in neither figure. */
  unsettled: z.boolean(),
  /** Nothing where there is not enough to go on. */
  finishAt: minor.nullable(), minutes: z.number().int(), plannedMinutes: z.number().int().nullable(),
});
export type PlanRow = z.output<typeof planRow>;

/** The terms of the sum that must hold; a headline is always shown, the rest when not nought. */
export const figuresView = z.object({
  spent: minor, used: minor, wasted: minor, left: minor, movedIn: minor, onOrder: minor, notSorted: minor, returned: minor, sold: minor, movedOut: minor,
  receipts: z.number().int(), materialsLeft: z.number().int(), unsettled: z.boolean(),
});
export type FiguresView = z.output<typeof figuresView>;

export const buildPage = z.object({
  slug: z.string(), title: z.string(), kind: z.enum(buildKinds), lead: z.string(), owner: personView, crew: z.array(personView),
  madeIn: z.string(), identity: z.array(z.object({ label: z.string(), value: z.string() })),
  startedOn: plainDay, stands: z.enum(standsList), standsNote: z.string(), archived: z.boolean(), visibility: z.enum(visibilities),
  currency: z.string(), days: z.number().int(), minutes: z.number().int(),
  before: pictureView.nullable(), after: pictureView.nullable(),
  tape: tapeView,
  /** Absent where costs are hidden. */
  figures: figuresView.optional(),
  plan: z.array(planRow).optional(),
  /** Hours by stage, for builds whose costs are hidden. */
  stages: z.array(z.object({ stage: z.string(), done: z.boolean(), minutes: z.number().int(), days: z.number().int() })),
  entries: z.array(entryCard), page: z.number().int(), pages: z.number().int(),
  /** What this viewer may do here. */
  may: z.object({ write: z.boolean(), settle: z.boolean() }),
});
export type BuildPage = z.output<typeof buildPage>;
/** Answers with the address of today where the slug is an old one. */
export const readBuild = endpoint({
  method: 'GET', path: '/api/builds/:build', access: 'anyone', params: buildParams,
  query: z.object({ page: z.coerce.number().int().min(1).max(10_000).catch(1) }), body: noBody,
  reply: z.union([buildPage, z.object({ movedTo: z.string() })]),
});
