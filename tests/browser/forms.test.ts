import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { z } from 'zod';
import { ask } from './support/draft.ts';
import { journey } from './support/journey.ts';
import { signIn } from './support/sign-in.ts';

/** Sends the page's form and waits for it to come back with what needs mending. */
async function sentBack(page: Page, button: string): Promise<string> {
  await page.getByRole('main').getByRole('button', { name: button, exact: true }).click();
  const summary = page.getByRole('alert');
  await summary.waitFor();
  return summary.innerText();
}

async function noteBeside(page: Pick<Page, 'getByLabel'>, label: string | RegExp): Promise<string> {
  return page.getByLabel(label).evaluate((field) => (field.getAttribute('aria-describedby') ?? '').split(' ').map((id) => document.getElementById(id)?.textContent ?? '').join(' '));
}

for (const scripts of [true, false]) {
  const how = scripts ? 'with scripts' : 'with scripts off';

  journey(`a sign-up that needs mending comes back as typed, ${how}`, async ({ open }) => {
    const { page, expectComplaint } = await open({ scripts });
    expectComplaint(/status of 422/);
    await page.goto('/sign-up');
    const typed = { 'Your name': 'Wren Ashby', Handle: 'wren ashby!', 'E-mail address': 'wren at home' } as const;
    for (const [label, words] of Object.entries(typed)) await page.getByLabel(label).fill(words);
    await page.getByLabel('Password').fill('short');
    await sentBack(page, 'Sign up');
    for (const [label, words] of Object.entries(typed)) expect(await page.getByLabel(label).inputValue(), label).toBe(words);
    for (const label of ['Handle', 'E-mail address', 'Password']) {
      expect(await page.getByLabel(label).getAttribute('aria-invalid'), label).toBe('true');
    }
    expect(await noteBeside(page, 'Handle')).toContain('Letters, figures and single hyphens, starting with a letter.');
    expect(await noteBeside(page, 'E-mail address')).toContain('That does not look like an e-mail address.');
    expect(await noteBeside(page, 'Password')).toMatch(/Ten letters or more\.$/);
    if (!scripts) expect(await page.getByLabel('Password').inputValue(), 'a password is never sent back').toBe('');
  });

  journey(`a build without a name comes back as filled in, ${how}`, async ({ open }) => {
    const { page, expectComplaint } = await open({ scripts });
    expectComplaint(/status of 422/);
    await signIn(page, 'restorer');
    await page.goto('/builds/new');
    const lead = 'Bought at a farm sale, seized since the war.';
    await page.getByLabel(/^In a few sentences/).fill(lead);
    await page.getByLabel('Kind', { exact: true }).selectOption({ label: 'Motorcycle' });
    await page.getByLabel('Started on').fill('2026-03-14');
    await page.getByLabel('Currency').selectOption('USD');
    for (const choice of [/^US \(/, 'Moving average', /^Private/]) await page.getByLabel(choice).check();
    await page.getByLabel(/^Show costs/).uncheck();
    expect(await sentBack(page, 'Start the build')).toContain('Give the build a name.');
    expect(await noteBeside(page, 'Name of the build')).toContain('Give the build a name.');
    expect(await page.getByLabel(/^In a few sentences/).inputValue()).toBe(lead);
    expect(await page.getByLabel('Kind', { exact: true }).inputValue()).toBe('motorcycle');
    expect(await page.getByLabel('Started on').inputValue()).toBe('2026-03-14');
    expect(await page.getByLabel('Currency').inputValue()).toBe('USD');
    for (const choice of [/^US \(/, 'Moving average', /^Private/]) expect(await page.getByLabel(choice).isChecked(), String(choice)).toBe(true);
    expect(await page.getByLabel(/^Show costs/).isChecked()).toBe(false);
  });

  journey(`a plan that cannot be read comes back as typed, ${how}`, async ({ open }) => {
    const { page, expectComplaint } = await open({ scripts });
    expectComplaint(/status of 422/);
    await signIn(page, 'restorer');
    const { slug } = await ask(page, '/api/builds', { kind: 'boat', title: `A plan ${how}`, currency: 'GBP', measures: 'imperial', visibility: 'private' }, z.object({ slug: z.string() }));
    await page.goto(`/builds/${slug}/plan`);
    const stage = page.getByRole('group', { name: 'New stage 1', exact: true });
    const typed = { 'New stage': 'Ribs', Planned: '1,5', Hours: 'soon', 'Work to count': 'steamed rib', 'How many': '-4' } as const;
    for (const [label, words] of Object.entries(typed)) await stage.getByLabel(new RegExp(`^${label}`)).fill(words);
    expect(await sentBack(page, 'Keep the plan')).toContain('3 things need mending');
    for (const [label, fault] of [['Planned', 'Write 1.5 with a point.'], ['Hours', 'Say hours or minutes'], ['How many', 'leave the minus out']] as const) {
      expect(await noteBeside(stage, new RegExp(`^${label}`)), label).toContain(fault);
    }
    for (const [label, words] of Object.entries(typed)) expect(await stage.getByLabel(new RegExp(`^${label}`)).inputValue(), label).toBe(words);
    for (const label of ['Planned', 'Hours', 'How many']) expect(await stage.getByLabel(new RegExp(`^${label}`)).getAttribute('aria-invalid'), label).toBe('true');
  });
}
