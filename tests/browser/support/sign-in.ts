import type { Page } from 'playwright-core';
import { inject } from 'vitest';

export type DemoPerson = 'restorer' | 'crew' | 'reader' | 'moderator' | 'administrator';

/** Signs a page's visitor in as one of the demo people, without going through the sign-in page. */
export async function signIn(page: Page, person: DemoPerson): Promise<void> {
  const { url, password } = inject('demoSite');
  const response = await page.context().request.post('/api/session', {
    headers: { origin: url, 'sec-fetch-site': 'same-origin' },
    data: { email: `${person}@demo.example`, password },
  });
  if (!response.ok()) throw new Error(`Signing in as ${person} answered ${response.status()}: ${await response.text()}`);
}
