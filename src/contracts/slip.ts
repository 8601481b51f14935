import { z } from 'zod';

export const slipKinds = ['used', 'bought', 'cost', 'time', 'mix', 'worked', 'wrong', 'measure'] as const;

/** How a block looks to a reader: words and figures already written out. Money is absent where costs are hidden. */
export const slipView = z.object({
  kind: z.enum(slipKinds),
  word: z.string(),
  note: z.string().optional(),
  lines: z.array(z.object({ label: z.string(), small: z.string().optional(), value: z.string().optional() })),
  text: z.array(z.object({ lead: z.string().optional(), words: z.string() })).optional(),
  sum: z.object({ label: z.string(), value: z.string() }).nullable().optional(),
  footnote: z.string().optional(),
});
export type SlipView = z.output<typeof slipView>;
