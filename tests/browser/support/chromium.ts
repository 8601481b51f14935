import { chromium, type Browser } from 'playwright-core';

// Without these, Chromium keeps asking for addresses outside, which slows it where there is no way out.
const QUIET = [
  '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking',
  '--disable-component-update', '--disable-sync',
];

/** The machine's own Chromium, without a window. */
export async function launchChromium(): Promise<Browser> {
  const { findBrowser }: { findBrowser: () => string | null } = await import(
    new URL('../../../scripts/browser-path.mjs', import.meta.url).href
  );
  const executablePath = findBrowser();
  if (executablePath === null) throw new Error('No Chromium was found: run the tests with npm test, which says what to install.');
  return chromium.launch({ executablePath, args: QUIET });
}
