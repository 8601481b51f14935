import type { Page } from 'playwright-core';
import { z } from 'zod';

export const BUILD = /^\/builds\/(?!new$)[a-z0-9-]+$/;
export const ENTRY = /^\/builds\/(?!new\/)[a-z0-9-]+\/(?!edit|plan|settings)[a-z0-9-]+$/;
export const DESK = /^\/builds\/[a-z0-9-]+\/edit\/\d+$/;

/** The first link of a page whose address has this form. */
export async function linkOn(page: Page, form: RegExp): Promise<string> {
  const paths = await page.locator('a[href]').evaluateAll((links) => links.map((link) => new URL(link.getAttribute('href') ?? '', document.baseURI).pathname));
  const found = paths.find((path) => form.test(path));
  if (found === undefined) throw new Error(`${page.url()} has no link of the form ${form}: ${paths.join(', ')}`);
  return found;
}

const builds = z.object({ builds: z.array(z.object({ slug: z.string(), days: z.number() })) });

/** The build with the most days written up, and the entry at the top of its page. Tests beside this one may have started builds of their own. */
export async function longestBuild(page: Page): Promise<{ build: string; entry: string }> {
  const { builds: all } = builds.parse(await (await page.context().request.get('/api/builds')).json());
  const longest = all.reduce((most, one) => (one.days > most.days ? one : most), { slug: '', days: 0 });
  const build = `/builds/${longest.slug}`;
  await page.goto(build);
  return { build, entry: await linkOn(page, ENTRY) };
}
