import Fraction from 'fraction.js';
import type { Locator, Page } from 'playwright-core';
import { expect } from 'vitest';
import { z } from 'zod';
import { addMaterial, amountOf, expectWords, lineOf, moneyOf, pickMaterial, putIn, signOff, startBuild, tally, titleField, us, writeUpADay } from './support/desk-hand.ts';
import { journey } from './support/journey.ts';
import { signIn } from './support/sign-in.ts';

// Common practice, no source: resin bought by the US gallon at 50.00 and used one US cup a board on
// eight boards, with brushes at 10.00 for fifteen and one a board. Sixteen cups are a gallon, so
// 50.00 × 8 ÷ 16 = 25.00 and 10.00 × 8 ÷ 15 = 5.333…: the day used 25.00 + 5.33 = 30.33,
// and exactly half a gallon and seven brushes are left, worth 25.00 and 4.67.
const boards = 8;
// One US gallon is 231 cubic inches of 16.387064 ml.
const halfAGallon = new Fraction('16.387064').mul(231).div(2);

const deskReply = z.object({
  materials: z.array(z.object({ id: z.number(), name: z.string() })),
  shelf: z.array(z.object({ material: z.number(), shelf: z.string(), left: z.string(), short: z.string(), worth: z.number() })),
});

async function buy(bought: Locator): Promise<void> {
  const resin = await lineOf(bought, 0);
  await addMaterial(resin, { name: 'Laminating resin', measured: 'By volume: litres, cups', unit: 'US gal' });
  await amountOf(resin).fill('1');
  await moneyOf(resin).fill('50.00');
  const brushes = await lineOf(bought, 1);
  await addMaterial(brushes, { name: 'Throwaway brush', measured: 'By the piece', pack: ['box', '15'] });
  await amountOf(brushes).fill('1');
  await moneyOf(brushes).fill('10.00');
  await expectWords(bought, '$60.00');
}

/** One cup and one brush a board, each on a line of its own. */
async function useOnEachBoard(used: Locator): Promise<void> {
  for (let board = 0; board < boards; board += 1) {
    const cup = await lineOf(used, board * 2);
    await pickMaterial(cup, 'lam');
    await amountOf(cup).fill('1 cup');
    const brush = await lineOf(used, board * 2 + 1);
    await pickMaterial(brush, 'thr');
    await amountOf(brush).fill('1');
  }
}

async function shelfByApi(page: Page, build: string, number: number) {
  const { materials, shelf } = deskReply.parse(await (await page.context().request.get(`/api${build}/desk/${number}`)).json());
  const of = (name: string) => shelf.find(({ material }) => material === materials.find((one) => one.name === name)?.id);
  return { resin: of('Laminating resin'), brushes: of('Throwaway brush') };
}

journey('resin by the gallon and by the cup leaves exactly half a gallon', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  const build = await startBuild(page, { title: 'Tern, a cedar canoe', kind: 'Boat', currency: 'USD', measures: us });
  await writeUpADay(page, build);
  await titleField(page).fill('Eight boards coated');
  await buy(await putIn(page, 'Bought'));
  const used = await putIn(page, 'Used');
  await useOnEachBoard(used);
  await page.getByLabel('How much work').fill(String(boards));
  await page.getByLabel('Kind of work, one of it').fill('board coated');
  await expectWords(tally(page), '$30.33', 'this day: $30.33 used', 'One board coated takes', '$3.79'); // 30.33 ÷ 8 = 3.791…
  await expectWords(used, 'Used\n$30.33');
  const shelf = page.getByRole('region', { name: /^On the shelf/ });
  await expectWords(shelf, '0.5 US gal', '7');
  await signOff(page);
  await expectWords(tally(page), '$30.33', 'this day: $30.33 used');
  // The next day's desk stands on what is stored.
  await writeUpADay(page, build);
  await expectWords(page.getByRole('region', { name: /^On the shelf/ }), '0.5 US gal', '7');
  const { resin, brushes } = await shelfByApi(page, build, 2);
  expect(resin?.left).toBe(halfAGallon.toFraction());
  expect(resin?.worth).toBe(25_00);
  expect(brushes?.left).toBe('7/1');
  expect(brushes?.worth).toBe(4_67);
}, 240_000);
