import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { z } from 'zod';
import { ENTRY, longestBuild } from './support/addresses.ts';
import { deskIsOpen, PATIENCE } from './support/desk-hand.ts';
import { ask, openDraft } from './support/draft.ts';
import { journey } from './support/journey.ts';
import { signIn } from './support/sign-in.ts';

const main = (page: Page) => page.getByRole('main');
const otherDays = (page: Page) => page.getByRole('navigation', { name: 'Other days of this build' });

/** "7 h 30 min" in minutes. */
function minutesOf(words: string): number {
  const [, hours = '0', minutes = '0'] = /^(?:(\d+) h)? ?(?:(\d+) min)?$/.exec(words.trim()) ?? [];
  return Number(hours) * 60 + Number(minutes);
}

async function titlesInTable(page: Page): Promise<string[]> {
  await page.getByText('as a table', { exact: true }).click();
  return page.getByRole('table', { name: /day by day$/ }).getByRole('link').allInnerTexts();
}

/** Reads on by "Day after" to the last day; gives the titles met. */
async function readOn(page: Page): Promise<string[]> {
  const titles: string[] = [];
  for (;;) {
    const after = otherDays(page).locator('p', { hasText: 'Day after' });
    titles.push(await page.getByRole('heading', { level: 1 }).innerText());
    const link = after.getByRole('link');
    if ((await link.count()) === 0) return titles;
    const title = await link.innerText();
    await link.click();
    await page.getByRole('heading', { level: 1, name: title, exact: true }).waitFor(PATIENCE);
  }
}

for (const scripts of [true, false]) {
  journey(`a build is read from the start to its last day, ${scripts ? 'with scripts' : 'with scripts off'}`, async ({ open }) => {
    const { page } = await open({ scripts });
    await page.goto((await longestBuild(page)).build);
    const written = await titlesInTable(page);
    await main(page).getByRole('link', { name: 'Read from the start' }).first().click();
    await page.waitForURL(({ pathname }) => ENTRY.test(pathname));
    await otherDays(page).getByText('This is the first day').waitFor();
    expect(await readOn(page)).toEqual(written);
    await otherDays(page).locator('p', { hasText: 'Day before' }).getByRole('link').click();
    await page.getByRole('heading', { level: 1, name: written.at(-2), exact: true }).waitFor(PATIENCE);
  });
}

journey('the tape goes by hours, says the same as a table, and the table adds up', async ({ open }) => {
  const { page } = await open();
  const { build } = await longestBuild(page);
  await page.goto(build);
  await page.getByRole('link', { name: 'by hours', exact: true }).click();
  await page.waitForURL(/\?tape=hours$/);
  await main(page).getByText(/^Hands on, a bar a/).waitFor();
  await page.getByText('as a table', { exact: true }).click();
  const cells = await page.getByRole('table', { name: /day by day$/ }).getByRole('row').evaluateAll((rows) => rows.slice(1).map((row) => row.lastElementChild?.textContent ?? ''));
  const whole = /on \d+ days?, (.+)/.exec(await page.getByRole('list', { name: 'What the build has cost' }).innerText())?.[1] ?? '';
  expect(cells.length).toBeGreaterThan(3);
  expect(cells.reduce((sum, cell) => sum + minutesOf(cell), 0)).toBe(minutesOf(whole));
  const bars = page.getByRole('region', { name: /day by day/ }).first().getByRole('link');
  const bar = await bars.first().getAttribute('href');
  await bars.first().press('Enter');
  await page.waitForURL(`**${bar}`);
  await page.goto(build);
  await page.getByRole('link', { name: 'by hours', exact: true }).waitFor();
});

journey('a renamed build answers 301 at its old address, for pages and feeds alike', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  const { slug } = await ask(page, '/api/builds', { kind: 'machine', title: 'A mangle of no name', currency: 'GBP', measures: 'imperial' }, z.object({ slug: z.string() }));
  await page.goto(`/builds/${slug}/settings`);
  await page.getByLabel('Name of the build').fill('The laundry mangle');
  await page.getByRole('button', { name: 'Keep the settings' }).click();
  await page.waitForURL(/\/builds\/the-laundry-mangle[^/]*$/);
  const now = new URL(page.url()).pathname;
  const reader = await open();
  for (const rest of ['', '?tape=hours', '/feed.xml', '/feed.json']) {
    const moved = await reader.page.context().request.get(`/builds/${slug}${rest}`, { maxRedirects: 0 });
    expect([moved.status(), moved.headers()['location']], rest).toEqual([301, `${now}${rest}`]);
  }
  await reader.page.goto(`/builds/${slug}`);
  expect(await reader.page.getByRole('heading', { level: 1 }).innerText()).toBe('The laundry mangle');
});

interface Focused { readonly name: string; readonly shows: boolean; readonly seen: boolean }

/** What has the focus, whether a line of two pixels or more says so, and whether it is in the window. */
async function focused(page: Page): Promise<Focused | null> {
  return page.evaluate(() => {
    const at = document.activeElement;
    if (!at || at === document.body) return null;
    const { outlineStyle, outlineWidth } = getComputedStyle(at);
    // A bar of the tape is drawn: there the line is a stroke.
    const strokes = at instanceof SVGElement ? [...at.children].map((part) => getComputedStyle(part)).filter(({ stroke }) => stroke !== 'none') : [];
    const line = Math.max(outlineStyle === 'none' ? 0 : parseFloat(outlineWidth), ...strokes.map(({ strokeWidth }) => parseFloat(strokeWidth)));
    const box = at.getBoundingClientRect();
    const name = at.getAttribute('aria-label') ?? at.textContent ?? at.tagName;
    return { name: name.trim(), shows: line >= 2, seen: box.width > 0 && box.bottom > 0 && box.top < innerHeight };
  });
}

journey('the keyboard alone reaches everything of an entry, and shows where it is', async ({ open }) => {
  const { page } = await open();
  const { entry } = await longestBuild(page);
  await page.goto(entry);
  await page.keyboard.press('Tab');
  expect((await focused(page))?.name).toBe('Skip to the page');
  await page.keyboard.press('Enter');
  await page.keyboard.press('Tab');
  expect(await page.evaluate(() => document.activeElement?.closest('main') !== null), 'past the bar of the site').toBe(true);
  const links = await main(page).locator('a[href]:visible, button:visible, summary:visible, [tabindex="0"]').count();
  const met: Focused[] = [];
  for (let at = await focused(page); at && await page.evaluate(() => document.activeElement?.closest('main') !== null); at = await focused(page)) {
    met.push(at);
    await page.keyboard.press('Tab');
  }
  expect(met.filter(({ shows, seen }) => !shows || !seen)).toEqual([]);
  expect(met.length).toBeGreaterThanOrEqual(links - 1); // the skip past the tape counts only once it is met
});

const NARROW = 320; // pixels: WCAG 2.2, success criterion 1.4.10

async function expectNoSideways(page: Page, path: string): Promise<void> {
  await page.goto(path);
  if (/\/edit\/\d+$/.test(path)) await deskIsOpen(page);
  expect(await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth), path).toBe(0);
}

journey('at 320 px every page reflows without scrolling sideways', async ({ open }) => {
  const { page } = await open({ width: NARROW });
  const { build, entry } = await longestBuild(page);
  for (const path of ['/', '/builds', build, entry, '/sign-in', '/sign-up']) await expectNoSideways(page, path);
  await signIn(page, 'restorer');
  const desk = await openDraft(page, 'A narrow shed');
  const own = desk.replace(/\/edit\/\d+$/, '');
  for (const path of ['/my-builds', '/builds/new', '/write', `${own}/plan`, `${own}/settings`, '/settings', desk, `${desk}/preview`]) await expectNoSideways(page, path);
});

journey('the site follows the reader’s choice of light or dark', async ({ open }) => {
  const grounds: string[] = [];
  for (const scheme of ['light', 'dark'] as const) {
    const { page } = await open({ scheme });
    await page.goto('/');
    grounds.push(await page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor));
  }
  const [light = 0, dark = 0] = grounds.map((ground) => Number(/\d+/.exec(ground)?.[0]));
  expect(light).toBeGreaterThan(200);
  expect(dark).toBeLessThan(60);
});
