import type { Page } from 'playwright-core';
import { inject } from 'vitest';
import { z } from 'zod';
import { deskIsOpen } from './desk-hand.ts';

const DAY_MS = 86_400_000;

/** Asks the site for something as the page's visitor would; gives its reply. */
export async function ask<T>(page: Page, path: string, body: unknown, reply: z.ZodType<T>): Promise<T> {
  const { url } = inject('demoSite');
  const response = await page.context().request.post(path, { headers: { origin: url, 'sec-fetch-site': 'same-origin' }, data: body });
  if (!response.ok()) throw new Error(`${path} answered ${response.status()}: ${await response.text()}`);
  return reply.parse(await response.json());
}

/** Starts a private build and the write-up of yesterday without going through the forms, and opens its desk. Gives the desk's address. */
export async function openDraft(page: Page, title: string): Promise<string> {
  const { slug } = await ask(page, '/api/builds', { kind: 'boat', title, currency: 'GBP', measures: 'imperial', visibility: 'private' }, z.object({ slug: z.string() }));
  const day = new Date(Date.now() - DAY_MS).toISOString().slice(0, 10);
  const { number } = await ask(page, `/api/builds/${slug}/entries`, { day }, z.object({ number: z.number() }));
  const desk = `/builds/${slug}/edit/${number}`;
  await page.goto(desk);
  await deskIsOpen(page);
  return desk;
}
