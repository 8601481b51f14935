import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { expectAccessible } from './support/accessibility.ts';
import { BUILD, DESK, linkOn, longestBuild } from './support/addresses.ts';
import { deskIsOpen } from './support/desk-hand.ts';
import { journey } from './support/journey.ts';
import { signIn } from './support/sign-in.ts';

async function expectOneHeading(page: Page): Promise<void> {
  expect(await page.locator('h1').count(), `headings of the first rank on ${page.url()}`).toBe(1);
  expect(await page.title()).not.toBe('');
}

journey('every page open to readers is accessible, wide and narrow, light and dark', async ({ open }) => {
  const { page } = await open();
  const { build, entry } = await longestBuild(page);
  for (const path of ['/', '/builds', build, entry, '/sign-in', '/sign-up']) {
    const response = await page.goto(path);
    expect(response?.status(), path).toBe(200);
    await expectOneHeading(page);
    await expectAccessible(page);
  }
});

journey('every page of a restorer is accessible, wide and narrow, light and dark', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  await page.goto('/my-builds');
  const build = await linkOn(page, BUILD);
  for (const path of ['/my-builds', '/builds/new', '/write', `${build}/settings`, `${build}/plan`, '/settings', '/sign-out']) {
    const response = await page.goto(path);
    expect(response?.status(), path).toBe(200);
    await expectOneHeading(page);
    await expectAccessible(page);
  }
});

journey('the desk with a draft on it, and its preview, are accessible, wide and narrow, light and dark', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  await page.goto('/write');
  const desk = await linkOn(page, DESK);
  await page.goto(desk);
  await deskIsOpen(page);
  await page.waitForLoadState('networkidle');
  await expectOneHeading(page);
  await expectAccessible(page);
  await page.goto(`${desk}/preview`);
  await expectOneHeading(page);
  await expectAccessible(page);
});

journey('public pages read the same with scripts off', async ({ open }) => {
  const reader = await open();
  const plain = await open({ scripts: false });
  const { build, entry } = await longestBuild(reader.page);
  for (const path of ['/', '/builds', build, entry]) {
    await reader.page.goto(path, { waitUntil: 'networkidle' });
    await plain.page.goto(path);
    expect(await plain.page.locator('main').innerText()).toBe(await reader.page.locator('main').innerText());
  }
});

journey('a page that is not there says so, with status 404', async ({ open }) => {
  const { page, expectComplaint } = await open();
  expectComplaint(/404/);
  const response = await page.goto('/builds/no-such-build');
  expect(response?.status()).toBe(404);
  await expectOneHeading(page);
  await expectAccessible(page);
});

journey('readers walk from home to a build and its entry without a page being loaded anew', async ({ open }) => {
  const { page } = await open();
  const { build, entry } = await longestBuild(page);
  await page.goto('/builds');
  await page.evaluate(() => document.documentElement.setAttribute('data-kept', 'yes'));
  await page.locator(`a[href="${build}"]`).first().click();
  await page.waitForURL(`**${build}`);
  await page.locator(`a[href="${entry}"]`).first().click();
  await page.waitForURL(`**${entry}`);
  expect(await page.locator('html').getAttribute('data-kept')).toBe('yes');
});
