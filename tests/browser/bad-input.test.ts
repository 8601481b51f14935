import { mkdtemp, rm, truncate, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Locator } from 'playwright-core';
import { expect } from 'vitest';
import { blankPng, quadrants } from '#tests/server/media/picture-samples.ts';
import { addMaterial, amountOf, deskIsOpen, expectKept, expectWords, lineOf, moneyOf, pickMaterial, putIn, PATIENCE, tally, titleField } from './support/desk-hand.ts';
import { openDraft } from './support/draft.ts';
import { journey } from './support/journey.ts';
import { signIn } from './support/sign-in.ts';

/** What stands beside a field, as a screen reader is told it. */
async function noteOf(field: Locator): Promise<string> {
  return field.evaluate((element) => (element.getAttribute('aria-describedby') ?? '').split(' ').map((id) => document.getElementById(id)?.innerText ?? '').join(' '));
}

/** Waits for a fault beside a field, which still holds what was typed. */
async function expectFault(field: Locator, words: RegExp, typed: string): Promise<void> {
  await expect.poll(() => noteOf(field), PATIENCE).toMatch(words);
  expect(await field.getAttribute('aria-invalid')).toBe('true');
  expect(await field.inputValue()).toBe(typed);
}

const amounts = [
  { typed: '', fault: /Start with a figure, like/ },
  { typed: '1,5', fault: /Write 1\.5 with a point/ },
  { typed: '-2 l', fault: /leave the minus out/ },
  { typed: '3 firkins', fault: /“firkins” is not a unit known here/ },
] as const;
const sums = [
  { typed: '', fault: /such as 12\.50/ },
  { typed: '12,5', fault: /Write 12\.5 with a point/ },
  { typed: '-4', fault: /leave the minus out/ },
] as const;

async function expectAllThere(used: Locator, bought: Locator): Promise<void> {
  for (const [index, { typed }] of amounts.entries()) expect(await amountOf(await lineOf(used, index)).inputValue()).toBe(typed);
  for (const [index, { typed }] of sums.entries()) expect(await moneyOf(await lineOf(bought, index)).inputValue()).toBe(typed);
}

journey('amounts and money that cannot be read are said beside their field, and stay as typed', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  const desk = await openDraft(page, 'Amounts as they come');
  await titleField(page).fill('A day of slips');
  const bought = await putIn(page, 'Bought');
  for (const [index, { typed, fault }] of sums.entries()) {
    const line = await lineOf(bought, index);
    if (index === 0) await addMaterial(line, { name: 'Spar varnish', measured: 'By volume: litres, cups', unit: 'l' });
    else await pickMaterial(line, 'Spar v');
    await amountOf(line).fill('1');
    await moneyOf(line).fill(typed);
    await moneyOf(line).blur();
    await expectFault(moneyOf(line), fault, typed);
  }
  const used = await putIn(page, 'Used');
  for (const [index, { typed, fault }] of amounts.entries()) {
    const line = await lineOf(used, index);
    await pickMaterial(line, 'Spar v');
    await amountOf(line).fill(typed);
    await amountOf(line).blur();
    await expectFault(amountOf(line), fault, typed);
  }
  await expectKept(page);
  await tally(page).getByRole('button', { name: 'Sign off the day' }).click();
  const summary = page.getByRole('alert', { name: /things need mending/ });
  expect(await summary.getByRole('link').count()).toBe(sums.length + amounts.length);
  expect(await summary.evaluate((box) => box === document.activeElement), 'the summary has the focus').toBe(true);
  await summary.getByRole('link').first().click();
  expect(await moneyOf(await lineOf(bought, 0)).evaluate((field) => field === document.activeElement), 'and leads to the field').toBe(true);
  await expectAllThere(used, bought);
  await page.goto(desk);
  await deskIsOpen(page);
  await expectAllThere(used, bought);
  const mended = await lineOf(used, 1);
  await amountOf(mended).fill('1.5');
  await expectWords(mended, '1.5 l');
  expect(await amountOf(mended).getAttribute('aria-invalid')).toBeNull();
});

journey('photos that cannot go up say why, each in its place, and the good one goes in', async ({ open }) => {
  const folder = await mkdtemp(join(tmpdir(), 'bad-photos-'));
  const file = (name: string) => join(folder, name);
  await writeFile(file('heavy.jpg'), await quadrants().jpeg().toBuffer());
  await truncate(file('heavy.jpg'), 60_000_000);
  await writeFile(file('notes.jpg'), 'Two pints of resin, set in the pot.\n');
  await writeFile(file('huge.png'), blankPng(30_000, 30_000));
  await writeFile(file('good.jpg'), await quadrants(320, 240).jpeg().toBuffer());
  try {
    const { page, expectComplaint } = await open();
    expectComplaint(/the server responded with a status of 4\d\d/);
    await signIn(page, 'restorer');
    await openDraft(page, 'Photos as they come');
    await titleField(page).fill('Photos of the day');
    const photos = await putIn(page, 'Photos');
    await photos.getByLabel('Photos from this device').setInputFiles(['heavy.jpg', 'notes.jpg', 'huge.png', 'good.jpg'].map(file));
    await expectPhotoFaults(photos);
    await photos.getByLabel('For people who cannot see it').fill('A square of four colours.');
    await photos.getByRole('button', { name: 'Leave heavy.jpg out' }).click();
    await expectKept(page);
    await page.reload();
    await deskIsOpen(page);
    expect(await titleField(page).inputValue()).toBe('Photos of the day');
    expect(await photos.getByLabel('For people who cannot see it').inputValue()).toBe('A square of four colours.');
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
});

async function expectPhotoFaults(photos: Locator): Promise<void> {
  const item = (name: string) => photos.getByRole('listitem').filter({ hasText: name });
  await expectWords(item('heavy.jpg'), '“heavy.jpg” is 60 MB; 40 MB is the most.');
  await expectWords(item('notes.jpg'), 'That is not a picture we can read. JPEG, PNG, WebP, HEIC or GIF.');
  await expectWords(item('huge.png'), 'That picture is 30,000 by 30,000 pixels.', '12,000 pixels a side');
  await expect.poll(() => photos.getByLabel('For people who cannot see it').count(), PATIENCE).toBe(1);
}
