import { z } from 'zod';
import { entryDocument } from '#src/blocks/entry-document.ts';
import { endpoint } from './endpoint.ts';
import { entryPage } from './entry-view.ts';
import { minor, noBody, nothing, ok, plainDay, slug } from './fields.ts';
import { materialView } from './materials.ts';
import { sentDocument } from './sent-document.ts';
import { measuresList, pricingMethods, timeKinds } from './words.ts';

const buildParams = z.object({ build: slug });
const entryParams = z.object({ build: slug, number: z.coerce.number().int().positive() });

/** A reader's page of one entry, by its slug. */
export const readEntryPage = endpoint({
  method: 'GET', path: '/api/builds/:build/pages/:entry', access: 'anyone', params: z.object({ build: slug, entry: slug }), query: nothing, body: noBody,
  reply: z.union([entryPage, z.object({ movedTo: z.string() })]),
});

export const startEntry = endpoint({
  method: 'POST', path: '/api/builds/:build/entries', access: 'member', params: buildParams, query: nothing,
  body: z.object({ day: plainDay, stage: z.number().int().positive().nullable().optional() }), reply: z.object({ number: z.number().int() }),
});

/** A past movement of a material, as the desk replays it. Keys `entry:block:line` or `receipt:line`. */
export const historyRow = z.object({
  key: z.string(), kind: z.string(), day: plainDay, sequence: z.number().int(), place: z.number().int(),
  amount: z.string(), cost: minor.nullable(), of: z.string().nullable(), shortage: z.enum(['used', 'wasted']).nullable(),
});
/** One material on one shelf: what the published ledger and other people's working copies say, without this entry. */
export const materialHistory = z.object({ material: z.number().int(), shelf: z.enum(['shelf', 'shed']), rows: z.array(historyRow) });
export type MaterialHistory = z.output<typeof materialHistory>;

export const shelfRow = z.object({
  material: z.number().int(), shelf: z.enum(['shelf', 'shed']), left: z.string(), short: z.string(), worth: minor,
});
export type ShelfRow = z.output<typeof shelfRow>;

/** Everything the desk needs to show a cost while somebody types. */
export const deskView = z.object({
  build: z.object({ slug: z.string(), title: z.string(), currency: z.string(), measures: z.enum(measuresList), method: z.enum(pricingMethods), costsShown: z.boolean(), visibility: z.string() }),
  shedMethod: z.enum(pricingMethods),
  entry: z.object({
    number: z.number().int(), guid: z.string(), version: z.number().int(), document: entryDocument, hasWorking: z.boolean(), savedAt: z.string().nullable(),
    published: z.boolean(), href: z.string().nullable(),
    /** Number of the owner's one sequence: the place of its movements among those of a day. */
    sequence: z.number().int(),
  }),
  stages: z.array(z.object({
    id: z.number().int(), title: z.string(), done: z.boolean(), planned: minor.nullable(),
    plannedWork: z.string().nullable(), workUnit: z.string().nullable(), workKind: z.string().nullable(),
    /** From published entries other than this one. */
    used: minor, wasted: minor, usedForEach: minor, workDone: z.string(),
  })),
  workKinds: z.array(z.object({ one: z.string(), many: z.string() })),
  people: z.array(z.object({ handle: z.string(), name: z.string() })),
  materials: z.array(materialView),
  shelf: z.array(shelfRow),
  history: z.array(materialHistory),
  buildUsed: minor,
});
export type DeskView = z.output<typeof deskView>;
export const readDesk = endpoint({
  method: 'GET', path: '/api/builds/:build/desk/:number', access: 'member', params: entryParams, query: nothing, body: noBody, reply: deskView,
});

const saved = z.object({ version: z.number().int(), document: entryDocument, savedAt: z.string() });
/** Saves the working copy. A newer one standing there answers `newer-exists` with `newer: { version, document }`. */
export const saveWorking = endpoint({
  method: 'PUT', path: '/api/builds/:build/entries/:number/working', access: 'member', params: entryParams, query: nothing,
  body: z.object({ version: z.number().int(), document: sentDocument }), reply: saved,
});
/** Publishes the document given: validates all of it, replaces the entry's rows, re-prices, in one transaction. */
export const signOffEntry = endpoint({
  method: 'POST', path: '/api/builds/:build/entries/:number/sign-off', access: 'member', params: entryParams, query: nothing,
  body: z.object({ version: z.number().int(), document: sentDocument }), reply: z.object({ version: z.number().int(), href: z.string() }),
});
/** Takes a published entry back: its document becomes the working copy, its rows leave the ledger. */
export const takeBackEntry = endpoint({
  method: 'POST', path: '/api/builds/:build/entries/:number/take-back', access: 'member', params: entryParams, query: nothing,
  body: z.object({ version: z.number().int() }), reply: z.object({ version: z.number().int() }),
});
/** Throws away the working copy of that version: of a published entry the changes, of a draft the whole entry, of one taken back all but its address. */
export const discardWorking = endpoint({
  method: 'DELETE', path: '/api/builds/:build/entries/:number/working', access: 'member', params: entryParams, query: nothing,
  body: z.object({ version: z.number().int() }), reply: ok,
});
/** What readers will see of the working copy. */
export const previewEntry = endpoint({
  method: 'GET', path: '/api/builds/:build/entries/:number/preview', access: 'member', params: entryParams, query: nothing, body: noBody, reply: entryPage,
});
/** Lines of the last Used and Time blocks before this entry, for "same as last time": in the same stage if there are any. */
export const readLastTime = endpoint({
  method: 'GET', path: '/api/builds/:build/entries/:number/last-time', access: 'member', params: entryParams,
  query: z.object({ stage: z.coerce.number().int().positive().optional() }), body: noBody,
  reply: z.object({
    title: z.string().nullable(),
    used: z.array(z.object({ material: z.number().int(), name: z.string(), amount: z.string(), unit: z.string(), fate: z.enum(['used', 'wasted']), counts: z.enum(['each', 'whole', 'opened']), from: z.enum(['shelf', 'shed']) })),
    time: z.array(z.object({ handle: z.string().nullable(), name: z.string(), time: z.string(), what: z.string(), kind: z.enum(timeKinds) })),
  }),
});
export type LastTime = z.output<typeof readLastTime.reply>;
