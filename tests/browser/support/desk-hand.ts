import type { Locator, Page } from 'playwright-core';
import { expect } from 'vitest';

/** How long the hand waits for the page to say something: other tests may hold the machine. */
export const PATIENCE = { timeout: 40_000 } as const; // ms

/** Waits until a place says all of these; spaces that keep a figure on one line are spaces. */
export async function expectWords(place: Locator, ...words: readonly string[]): Promise<void> {
  for (const one of words) await expect.poll(async () => (await place.innerText()).replaceAll('\u00a0', ' '), PATIENCE).toContain(one);
}

export interface BuildFacts {
  readonly title: string;
  readonly kind: string;
  readonly currency: string;
  readonly measures: RegExp;
}

export const imperial = /^Imperial/;
export const us = /^US \(/;

/** Starts a build through its form; gives its address. */
export async function startBuild(page: Page, { title, kind, currency, measures }: BuildFacts): Promise<string> {
  await page.goto('/builds/new');
  await page.getByLabel('Name of the build').fill(title);
  await page.getByLabel('Kind', { exact: true }).selectOption({ label: kind });
  await page.getByLabel('Currency').selectOption(currency);
  await page.getByLabel(measures).check();
  await page.getByRole('button', { name: 'Start the build' }).click();
  await page.waitForURL(/\/builds\/(?!new$)[^/]+$/);
  return new URL(page.url()).pathname;
}

/** Goes from a build's page to the desk, by "Write up a day" and its form. */
export async function writeUpADay(page: Page, build: string, stage?: string): Promise<void> {
  await page.goto(build);
  await page.getByRole('main').getByRole('link', { name: 'Write up a day' }).first().click();
  await page.waitForURL(/\/write\?build=/);
  if (stage !== undefined) await page.getByLabel('Stage').selectOption({ label: stage });
  await page.getByRole('button', { name: 'Open the desk' }).click();
  await page.waitForURL(/\/edit\/\d+$/);
  await deskIsOpen(page);
}

export async function deskIsOpen(page: Page): Promise<void> {
  await page.getByRole('region', { name: 'Put in next' }).waitFor(PATIENCE);
}

export function titleField(page: Page): Locator {
  return page.getByRole('textbox', { name: 'Title', exact: true });
}

export function leadField(page: Page): Locator {
  return page.getByRole('textbox', { name: /^Lead, / });
}

export function wordsField(page: Page): Locator {
  return page.getByRole('textbox', { name: 'The words of the day' });
}

export function tally(page: Page): Locator {
  return page.getByRole('region', { name: "The day's tally", exact: true });
}

/** Waits until everything typed is on the server. */
export async function expectKept(page: Page): Promise<void> {
  await expectWords(tally(page), 'Kept here and on the server');
}

/** Puts a block in from the tray at the end of the text. */
export async function putIn(page: Page, word: string): Promise<Locator> {
  const blocks = page.getByRole('group', { name: word, exact: true });
  const before = await blocks.count();
  await page.getByRole('region', { name: 'Put in next' }).getByRole('button', { name: word, exact: true }).click();
  const block = blocks.nth(before);
  await block.waitFor(PATIENCE);
  return block;
}

/** A line of a block, added where it is not there yet. */
export async function lineOf(block: Locator, index: number): Promise<Locator> {
  const lines = block.getByRole('listitem');
  if ((await lines.count()) <= index) await block.getByRole('button', { name: 'Add a line' }).click();
  const line = lines.nth(index);
  await line.waitFor(PATIENCE);
  return line;
}

function materialField(line: Locator): Locator {
  return line.getByRole('combobox', { name: 'Material', exact: true });
}

/** Picks a material by some of its letters and Enter. */
export async function pickMaterial(line: Locator, letters: string): Promise<void> {
  await materialField(line).fill(letters);
  await materialField(line).press('Enter');
}

export interface MaterialFacts {
  readonly name: string;
  readonly measured: string;
  readonly unit?: string;
  readonly pack?: readonly [name: string, amount: string];
}

/** Adds a material that is not on the list yet, without leaving the line. */
export async function addMaterial(line: Locator, { name, measured, unit, pack }: MaterialFacts): Promise<void> {
  await materialField(line).fill(name);
  await line.getByRole('option', { name: `Add “${name}” to your materials` }).click();
  const form = line.getByRole('form', { name: 'A new material' });
  await form.getByLabel('How it is measured').selectOption({ label: measured });
  if (unit !== undefined) await form.getByLabel('Usually in').selectOption({ label: unit });
  if (pack) {
    await form.getByLabel(/^Comes in a/).fill(pack[0]);
    await form.getByLabel(/^of/).fill(pack[1]);
  }
  await form.getByRole('button', { name: 'Add the material' }).click();
  await form.waitFor({ state: 'detached', ...PATIENCE });
}

export function amountOf(line: Locator): Locator {
  return line.getByRole('textbox', { name: /^Amount of / });
}

export function moneyOf(line: Locator): Locator {
  return line.getByRole('textbox', { name: /came to on the paper/ });
}

/** Signs the day off and waits for its page; gives the page's address. */
export async function signOff(page: Page): Promise<string> {
  await tally(page).getByRole('button', { name: /^Sign off/ }).click();
  await page.waitForURL((url) => !url.pathname.includes('/edit/'), PATIENCE);
  return new URL(page.url()).pathname;
}
