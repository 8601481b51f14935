import { z } from 'zod';
import { plainDay } from './fields.ts';

/** A day of work on the tape. Money is absent where costs are hidden. */
export const tapeDay = z.object({
  day: plainDay,
  number: z.number().int(),
  title: z.string(),
  href: z.string(),
  money: z.number().int().optional(),
  /** Some of the money is not bought yet; absent where the money is. */
  unsettled: z.boolean().optional(),
  minutes: z.number().int(),
});
export type TapeDay = z.output<typeof tapeDay>;
/** Today's day in UTC is part of the view, so that server and browser draw the same tape. */
export const tapeView = z.object({ from: plainDay, to: plainDay, days: z.array(tapeDay) });
export type TapeView = z.output<typeof tapeView>;
