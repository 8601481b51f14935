import { join } from 'node:path';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { inject, test } from 'vitest';
import { launchChromium } from './chromium.ts';
import type { DemoSite } from './demo-site.ts';
import { watchContext } from './watched-context.ts';

export type Scheme = 'light' | 'dark';

export interface View {
  readonly width?: number;
  readonly scheme?: Scheme;
  readonly scripts?: boolean;
}

export interface Visitor {
  readonly page: Page;
  /** Says that a console message or failed request is part of what is tested. */
  readonly expectComplaint: (pattern: RegExp) => void;
}

interface Opened {
  readonly context: BrowserContext;
  readonly page: Page;
  readonly faults: () => string[];
}

const WIDE = 1280; // pixels
const HEIGHT = 900; // pixels

async function openContext(browser: Browser, site: DemoSite, view: View) {
  const context = await browser.newContext({
    baseURL: site.url,
    viewport: { width: view.width ?? WIDE, height: HEIGHT },
    colorScheme: view.scheme ?? 'light',
    javaScriptEnabled: view.scripts ?? true,
    locale: 'en-GB',
    // As far from the server's UTC as people live: a date written in local time shows as a hydration fault.
    timezoneId: 'Pacific/Auckland',
    reducedMotion: 'reduce',
  });
  context.setDefaultTimeout(15_000);
  return { context, watch: watchContext(context, view.scripts ?? true), page: await context.newPage() };
}

async function keepPictures(opened: readonly Opened[], name: string): Promise<void> {
  const file = name.replace(/[^a-z0-9]+/gi, '-').slice(0, 80).toLowerCase();
  for (const [index, { page }] of opened.entries()) {
    await page.screenshot({ path: join('test-results', `${file}-${index + 1}.png`), fullPage: true });
  }
}

/**
 * A test in a real browser on the demo site. `open` gives a visitor of their own, with their own
 * cookies; whatever a page complains about on its console, an error or a failed request, fails the test.
 */
export const journey = test.extend<{ browser: Browser; site: DemoSite; open: (view?: View) => Promise<Visitor> }>({
  browser: [
    async ({}, give) => {
      const browser = await launchChromium();
      await give(browser);
      await browser.close();
    },
    { scope: 'file' },
  ],
  site: async ({}, give) => give(inject('demoSite')),
  open: async ({ browser, site, task }, give) => {
    const opened: Opened[] = [];
    await give(async (view = {}) => {
      const { context, watch, page } = await openContext(browser, site, view);
      opened.push({ context, page, faults: () => watch.faults() });
      return { page, expectComplaint: (pattern) => watch.expectComplaint(pattern) };
    });
    const faults = opened.flatMap((visitor) => visitor.faults());
    if (faults.length > 0 || task.result?.state === 'fail') await keepPictures(opened, task.name);
    for (const { context } of opened) await context.close();
    if (faults.length > 0) throw new Error(`The pages complained:\n${faults.join('\n')}`);
  },
});
