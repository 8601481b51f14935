import { z } from 'zod';
import { dayProblem } from '#domain/day.ts';

// Shapes that many contracts share.
export const nothing = z.object({}).strict();
/** For endpoints without a body: absent or empty. */
export const noBody = z.undefined().or(z.object({}).strict()).or(z.null());
export const slug = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/).max(80);
export const plainDay = z.iso.date('Give a day, such as 2026-11-14.').refine((day) => dayProblem(day) === null, 'Give a day between 1900 and 2100: look at the year again.');
export const currencyCode = z.string().regex(/^[A-Z]{3}$/);
export const minor = z.number().int();
export const handleText = z.string().trim().toLowerCase()
  .min(3, 'A handle has three letters or more.').max(30, 'A handle has thirty letters at most.')
  .regex(/^[a-z][a-z0-9]*(-[a-z0-9]+)*$/, 'Letters, figures and single hyphens, starting with a letter.');
export const personName = z.string().trim().min(1, 'Say what to call you.').max(80, 'Eighty letters at most.');
export const emailText = z.string().trim().toLowerCase().max(254).pipe(z.email('That does not look like an e-mail address.'));
export const ok = z.object({ ok: z.literal(true) });

export const personView = z.object({ handle: z.string(), name: z.string() });
export type PersonView = z.output<typeof personView>;
/** The reply of a case that has nothing to tell. */
export const done = { ok: true } as const;
