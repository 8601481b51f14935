import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { DESK, linkOn, longestBuild } from './support/addresses.ts';
import { deskIsOpen } from './support/desk-hand.ts';
import { journey, type Scheme, type View } from './support/journey.ts';
import { signIn } from './support/sign-in.ts';

const schemes: readonly Scheme[] = ['light', 'dark'];
const views: readonly View[] = schemes.flatMap((scheme) => [1280, 390].map((width) => ({ scheme, width })));

/** Waits until scripts have taken the page over; what they complain about fails the test by itself. */
async function hydrated(page: Page): Promise<void> {
  await page.waitForFunction(() => Object.keys(document.querySelector('main') ?? {}).some((key) => key.startsWith('__reactFiber')));
}

async function open(page: Page, path: string): Promise<void> {
  const response = await page.goto(path);
  expect(response?.status(), path).toBe(200);
  await hydrated(page);
}

for (const view of views) {
  const where = `${view.scheme}, ${view.width} px`;

  journey(`readers’ pages come to life without a word or a second fetch: ${where}`, async ({ open: visit }) => {
    const { page } = await visit(view);
    const { build, entry } = await longestBuild(page);
    const asked: string[] = [];
    page.on('request', (request) => { if (new URL(request.url()).pathname.startsWith('/api/')) asked.push(`${page.url()} asked for ${request.url()}`); });
    for (const path of ['/', '/builds', '/builds?kind=furniture', build, `${build}?tape=hours`, entry, `${entry}?tape=hours`, '/sign-in', '/sign-up']) await open(page, path);
    expect(asked).toEqual([]);
  });

  journey(`a restorer’s pages come to life without a word: ${where}`, async ({ open: visit }) => {
    const { page } = await visit(view);
    await signIn(page, 'restorer');
    await open(page, '/write');
    const desk = await linkOn(page, DESK);
    const build = desk.replace(/\/edit\/\d+$/, '');
    for (const path of ['/', build, '/my-builds', '/builds/new', `/write?build=${build.replace('/builds/', '')}`, `${build}/plan`, `${build}/settings`, '/settings', '/sign-out', `${desk}/preview`]) await open(page, path);
    await open(page, desk);
    await deskIsOpen(page);
  });
}
