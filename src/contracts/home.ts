import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { entryCard } from './builds.ts';
import { minor, noBody, nothing } from './fields.ts';
import { slipView } from './slip.ts';
import { buildKinds } from './words.ts';

/** The front page: a real day, fresh entries, what one takes, builds by kind. */
export const readHome = endpoint({
  method: 'GET', path: '/api/home', access: 'anyone', params: nothing, query: nothing, body: noBody,
  reply: z.object({
    opening: z.object({ entry: entryCard, slip: slipView.nullable() }).nullable(),
    fresh: z.array(entryCard),
    /** What one unit of work took in the latest entries that say so. */
    takes: z.array(z.object({ one: z.string(), href: z.string(), build: z.string(), currency: z.string(), money: minor.nullable(), unsettled: z.boolean(), minutes: z.number().int().nullable() })),
    kinds: z.array(z.object({ kind: z.enum(buildKinds), count: z.number().int() })),
  }),
});
export type HomeView = z.output<typeof readHome.reply>;
