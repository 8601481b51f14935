import { z } from 'zod';
import { proseNode } from '#src/blocks/prose.ts';
import { minor, personView, plainDay } from './fields.ts';
import { pictureView } from './pictures.ts';
import { slipView } from './slip.ts';
import { tapeView } from './tape.ts';
import { visibilities } from './words.ts';

/** What stands in the reading column. */
export const bodyNode = z.union([
  proseNode,
  z.object({ type: z.literal('photos'), id: z.string(), photos: z.array(pictureView) }),
  z.object({ type: z.literal('caution'), id: z.string(), title: z.string(), words: z.string(), source: z.string().nullable() }),
]);
/** Words with the slips that belong beside them. */
export const rowView = z.object({
  body: z.array(bodyNode),
  /** How many of the body the slips come after, in the order they were written. */
  at: z.number().int(),
  /** Rows of one run have their words run on without a gap; their slips stand one under the other. */
  run: z.number().int(),
  /** How many of its last slips stand under the words, since none stand beside them any more. */
  under: z.number().int(),
  slips: z.array(z.object({ type: z.string(), id: z.string(), slip: slipView })),
});
export type RowView = z.output<typeof rowView>;

/** The day's tally. Money is absent where costs are hidden. */
export const tallyView = z.object({
  currency: z.string(),
  money: z.object({
    day: minor, used: minor, wasted: minor, costs: minor, bought: minor, buildUsed: minor,
    /** Some of what the build used so far is not bought yet. */
    buildUnsettled: z.boolean(),
    /** For one unit of work: materials counted for each, half-even once. */
    one: minor.nullable(),
    /** Some of what counts for one is not bought yet. */
    oneUnsettled: z.boolean(),
    /** Some of it is not bought yet, so not settled. */
    unsettled: z.boolean(),
  }).optional(),
  minutes: z.number().int(), waiting: z.number().int(), people: z.number().int(),
  /** "17 steamed ribs" and "one steamed rib". */
  work: z.object({ words: z.string(), one: z.string() }).nullable(),
  oneMinutes: z.number().int().nullable(),
});
export type TallyView = z.output<typeof tallyView>;

const neighbour = z.object({ href: z.string(), title: z.string(), day: plainDay }).nullable();
export const entryPage = z.object({
  build: z.object({ slug: z.string(), title: z.string(), currency: z.string(), visibility: z.enum(visibilities) }),
  owner: personView, author: personView, withNames: z.array(z.string()),
  number: z.number().int(), slug: z.string(), title: z.string(), lead: z.string(),
  day: plainDay, dayTo: plainDay.nullable(), stage: z.string().nullable(),
  publishedAt: z.string().nullable(), editedAt: z.string().nullable(),
  rows: z.array(rowView), tally: tallyView, tape: tapeView,
  before: neighbour, after: neighbour, first: neighbour,
  cover: pictureView.nullable(),
  may: z.object({ write: z.boolean() }),
  /** True where this is what readers would see of a working copy. */
  preview: z.boolean(),
});
export type EntryPage = z.output<typeof entryPage>;
