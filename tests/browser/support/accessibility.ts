import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import type { Scheme } from './journey.ts';

const WIDTHS = [1280, 390] as const; // pixels: a desk and a phone
const SCHEMES: readonly Scheme[] = ['light', 'dark'];
const HEIGHT = 900; // pixels

async function findings(page: Page): Promise<string[]> {
  // Our pages hold no frames, so the checker need not open a page of its own to gather what it found in each.
  const { violations } = await new AxeBuilder({ page }).setLegacyMode().options({ resultTypes: ['violations'] }).analyze();
  return violations.flatMap(({ id, help, nodes }) => nodes.map(({ target, failureSummary }) => `${id}: ${help} at ${target.join(' ')}\n${failureSummary ?? ''}`));
}

async function sideways(page: Page): Promise<string[]> {
  const over = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  return over > 0 ? [`the page is ${over} px wider than the window`] : [];
}

/**
 * Expects no finding of axe and no sideways scrolling, in both colour schemes, at desk and phone width.
 * Only for a page with scripts on: the checker is itself a script.
 */
export async function expectAccessible(page: Page): Promise<void> {
  const found: string[] = [];
  for (const scheme of SCHEMES) {
    await page.emulateMedia({ colorScheme: scheme });
    for (const width of WIDTHS) {
      await page.setViewportSize({ width, height: HEIGHT });
      const here = [...(await findings(page)), ...(await sideways(page))];
      found.push(...here.map((finding) => `${page.url()}, ${scheme}, ${width} px: ${finding}`));
    }
  }
  await page.emulateMedia({ colorScheme: SCHEMES[0] ?? 'light' });
  await page.setViewportSize({ width: WIDTHS[0], height: HEIGHT });
  expect(found).toEqual([]);
}
