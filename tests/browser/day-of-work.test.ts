import type { Locator, Page } from 'playwright-core';
import Parser from 'rss-parser';
import sharp from 'sharp';
import { expect } from 'vitest';
import { z } from 'zod';
import { fromPhone } from '#tests/server/media/picture-samples.ts';
import {
  addMaterial, amountOf, expectWords, imperial, leadField, lineOf, moneyOf, pickMaterial, putIn, PATIENCE, signOff, startBuild, tally, titleField, wordsField, writeUpADay,
} from './support/desk-hand.ts';
import { journey } from './support/journey.ts';
import { signIn } from './support/sign-in.ts';

// The receipt, in pence. The lines come to 90.00 + 60.00 + 24.00 + 9.50 = 183.50.
// 10.00 of discount by line value, the three pence over to the largest remainders:
//   4.90 (.46), 3.27 (.98), 1.31 (.79), 0.52 (.77)          leaves 85.10, 56.73, 22.69, 8.98
// 12.00 of delivery by what is left, the two pence over likewise:
//   5.89 (.59), 3.92 (.37), 1.57 (.93), 0.62 (.11)          makes  90.99, 60.65, 24.26, 9.60 = 185.50
const door = { resin: '£90.99', oak: '£60.65', nails: '£24.26', gloves: '£9.60', all: '£185.50' };

// An imperial pint is 568.26125 ml, so two pints of the 5 l take 90.99 × 1.1365225 ÷ 5 = 20.682…
// 15 m of 24 m take 60.65 × 15 ÷ 24 = 37.906…; 136 of 500 nails take 24.26 × 136 ÷ 500 = 6.598…
// The quarter pint that set in the pot takes the resin to 1.2785878… l: 90.99 × that ÷ 5 = 23.267…, of which 20.68 went before.
const took = { resin: '£20.68', oak: '£37.91', nails: '£6.60', spoilt: '£2.59' };

// used 20.68 + 37.91 + 6.60 = 65.19; the day 65.19 + 2.59 = 67.78; left 185.50 − 65.19 − 2.59 = 117.72
// one of 17 ribs: 65.19 ÷ 17 = 3.834…; 6 h 30 and 4 h 15 are 645 min, ÷ 17 = 37.9…
// the stage would finish at 67.78 + 7 ribs × 67.78 ÷ 17 = 95.689…
const day = { all: '£67.78', used: '£65.19', one: '£3.83, 38 min', hours: '10 h 45 min', finish: '£95.69' };
const left = '£117.72';

const heading = 'Seventeen ribs steamed and riveted';
const shown = ['Steam leaks from the end of a long plank box.', 'A rib bent over the mould, held by three clamps.', 'Copper rivets in a row along the rib.'];

function photo(width: number, height: number, background: string): Promise<Buffer> {
  return sharp({ create: { width, height, channels: 3, background } }).jpeg().toBuffer();
}

async function planRibs(page: Page, build: string): Promise<void> {
  await page.goto(`${build}/plan`);
  const stage = page.getByRole('group', { name: 'New stage 1', exact: true });
  await stage.getByLabel('New stage').fill('Ribs');
  await stage.getByLabel(/^Planned/).fill('200.00');
  await stage.getByLabel(/^Hours/).fill('30 h');
  await stage.getByLabel(/^Work to count/).fill('steamed rib');
  await stage.getByLabel(/^How many/).fill('24');
  await page.getByRole('button', { name: 'Keep the plan' }).click();
  await page.waitForURL(`**${build}`);
}

async function addPhotos(page: Page): Promise<void> {
  const photos = await putIn(page, 'Photos');
  const files = [await photo(640, 480, '#886644'), await fromPhone(), await photo(800, 500, '#446688')];
  await photos.getByLabel('Photos from this device').setInputFiles(files.map((buffer, index) => ({ name: `bench-${index}.jpg`, mimeType: 'image/jpeg', buffer })));
  const fields = photos.getByLabel('For people who cannot see it');
  await expect.poll(() => fields.count(), PATIENCE).toBe(shown.length);
  for (const [index, one] of shown.entries()) await fields.nth(index).fill(one);
}

async function buy(bought: Locator): Promise<void> {
  const volume = 'By volume: litres, cups';
  const bill = [
    { material: { name: 'Epoxy resin', measured: volume, unit: 'l', pack: ['tin', '2.5 l'] }, amount: '2', money: '90.00', to: door.resin },
    { material: { name: 'Oak lath', measured: 'By length', unit: 'm', pack: ['length', '2.4 m'] }, amount: '10', money: '60', to: door.oak },
    { material: { name: 'Copper nail', measured: 'By the piece', pack: ['box', '500'] }, amount: '1', money: '24.00', to: door.nails },
    { material: { name: 'Nitrile glove', measured: 'By the piece', pack: ['box', '50'] }, amount: '1', money: '9.50', to: door.gloves },
  ] as const;
  await bought.getByLabel('Supplier').fill('Foreland Chandlery');
  for (const [index, { material, amount, money }] of bill.entries()) {
    const line = await lineOf(bought, index);
    await addMaterial(line, material);
    await amountOf(line).fill(amount);
    await moneyOf(line).fill(money);
  }
  await bought.getByLabel('Delivery').fill('12.00');
  await bought.getByLabel('Discount').fill('10.00');
  await bought.getByLabel('Total on the paper').fill('185.50');
  await expectWords(bought, `The lines come to ${door.all}, as the paper says.`, ...bill.map(({ to }) => `${to} to the door`));
}

async function use(page: Page, used: Locator): Promise<void> {
  const uses = [['epo', '2 pints', took.resin], ['oak', '15 m', took.oak], ['cop', '136', took.nails], ['epo', '1/4 pint', took.spoilt]] as const;
  for (const [index, [letters, amount, value]] of uses.entries()) {
    const line = await lineOf(used, index);
    await pickMaterial(line, letters);
    await amountOf(line).fill(amount);
    await expectWords(line, value);
  }
  await (await lineOf(used, 3)).getByRole('combobox', { name: /^Used or wasted/ }).selectOption('Wasted');
  await expectWords(tally(page), `${day.used} used, ${took.spoilt} wasted`);
}

async function clock(time: Locator): Promise<void> {
  const own = await lineOf(time, 0);
  await own.getByLabel('Who').selectOption({ label: 'Marlow Finch' });
  await own.getByLabel(/^How long/).fill('6 h 30');
  const helper = await lineOf(time, 1);
  await helper.getByLabel('Name').fill('Tam');
  await helper.getByLabel(/^How long/).fill('4:15');
  await expectWords(time, day.hours);
}

/** What every reader of the entry sees, however they read. */
async function expectEntry(page: Page, address: string): Promise<void> {
  const response = await page.goto(address);
  expect(response?.status()).toBe(200);
  expect(await page.getByRole('heading', { level: 1 }).innerText()).toBe(heading);
  await expectWords(tally(page), day.all, `${day.used} used, ${took.spoilt} wasted`, '17 steamed ribs', day.one, day.hours, door.all);
  await expectWords(page.getByRole('region', { name: /^Bought/ }), ...Object.values(door));
  await expectWords(page.getByRole('region', { name: /^Used/ }), ...Object.values(took), day.used, `${took.spoilt} wasted beside it`);
  await expectWords(page.getByRole('region', { name: 'Time' }), 'Marlow Finch', '6 h 30 min', 'Tam', '4 h 15 min', day.hours);
  expect(await page.getByRole('article').getByRole('img').evaluateAll((pictures) => pictures.map((picture) => picture.getAttribute('alt')))).toEqual(shown);
}

async function expectBuild(page: Page, build: string): Promise<void> {
  await page.goto(build);
  const figures = page.getByRole('list', { name: 'What the build has cost' }).getByRole('listitem');
  const said = (await figures.allInnerTexts()).map((figure) => figure.split('\n').slice(0, 2).join(' '));
  expect(said).toEqual([`${door.all} spent`, `${day.used} used in the build`, `${took.spoilt} wasted`, `${left} left on the shelf`]);
  await expectWords(page.getByRole('main'), day.finish);
}

const jsonFeed = z.object({ items: z.array(z.object({ title: z.string(), content_html: z.string() })) });
type Rss = { 'content:encoded': string };

/** What feed readers get of the day, from the build's feeds and from those of everything. */
async function fedEntries(page: Page, build: string): Promise<string[]> {
  const { request } = page.context();
  const contents: string[] = [];
  for (const at of [build, '']) {
    const rss = await new Parser<object, Rss>().parseString(await (await request.get(`${at}/feed.xml`)).text());
    contents.push(rss.items.find((item) => item.title === heading)?.['content:encoded'] ?? '');
    const json = jsonFeed.parse(await (await request.get(`${at}/feed.json`)).json());
    contents.push(json.items.find((item) => item.title === heading)?.content_html ?? '');
  }
  return contents;
}

journey('a restorer writes up a day, and every reader gets its figures to the penny', async ({ open }) => {
  const { page } = await open();
  await signIn(page, 'restorer');
  const build = await startBuild(page, { title: 'Wren, a clinker dinghy', kind: 'Boat', currency: 'GBP', measures: imperial });
  await planRibs(page, build);
  await writeUpADay(page, build, 'Ribs');
  await titleField(page).fill(heading);
  await leadField(page).fill('The steam box held its heat, and one pot of resin did not wait for us.');
  await wordsField(page).pressSequentially('Two of us on the box from nine.');
  await addPhotos(page);
  await buy(await putIn(page, 'Bought'));
  await use(page, await putIn(page, 'Used'));
  await clock(await putIn(page, 'Time'));
  await page.getByLabel('How much work').fill('17');
  await page.getByLabel('Kind of work, one of it').fill('steamed rib');
  await expectWords(tally(page), day.all, day.one, '£200.00 planned', day.finish, day.hours, door.all);
  await expectWords(page.getByRole('region', { name: /^On the shelf/ }), '9 m', '364', '3.721 l');
  const entry = await signOff(page);
  await expectEntry(page, entry);
  const upright = page.getByRole('img', { name: shown[1] });
  expect([await upright.getAttribute('width'), await upright.getAttribute('height')], 'a picture taken on its side stands upright').toEqual(['80', '120']);
  for (const view of [{}, { scripts: false }]) {
    const reader = await open(view);
    await expectEntry(reader.page, entry);
    await expectBuild(reader.page, build);
  }
  const contents = await fedEntries((await open()).page, build);
  expect(contents).toHaveLength(4);
  for (const content of contents) {
    for (const figure of [...Object.values(door), ...Object.values(took), day.used, day.hours]) expect(content).toContain(figure);
    for (const one of shown) expect(content).toContain(one);
    expect(content, 'nothing of a page’s head').not.toMatch(/<(link|script|style)/);
  }
}, 240_000);
