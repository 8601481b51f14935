import { afterAll, beforeAll, expect, test } from 'vitest';
import { startBuild } from '#contracts/builds.ts';
import { signOffEntry, startEntry } from '#contracts/entries.ts';
import { Build } from '#server/entities/index.ts';
import { changeSettings, readSettings } from '#server/features/builds/builds.service.ts';
import { listStages, replaceStages } from '#server/features/builds/stages.service.ts';
import { previewWorking } from '#server/features/publishing/entry-page.service.ts';
import { readFrontPage } from '#server/features/publishing/home.service.ts';
import type { Caller } from '#server/http/context.ts';
import { startTestServer } from '#tests/support/test-server.ts';
import { dayOf, usedBlock, boughtBlock, Workshop } from '#tests/support/workshop.ts';

let shop: Workshop;
let owner: Caller;
beforeAll(async () => {
  shop = await Workshop.open();
  owner = await shop.person('wren');
});
afterAll(() => shop.close());

const noStage = { id: null, plannedMoney: '', plannedTime: '', plannedWork: '', workUnit: 'piece' as const, workKind: '', done: false };

async function keepCosts(slug: string): Promise<void> {
  const { version } = await readSettings(shop.em(), owner, slug);
  await changeSettings(shop.em(), owner, slug, { costsShown: false, version });
}

test('a preview names no stage of another build, whatever its working copy says', async () => {
  const hidden = await shop.build(owner, { title: 'Hidden', visibility: 'private' });
  await replaceStages(shop.em(), owner, hidden, [{ ...noStage, title: 'Secret stage' }]);
  const [secret] = (await listStages(shop.em(), owner, hidden)).stages;
  const other = await shop.person('other');
  const build = await shop.build(other, { title: 'Nosy' });
  const number = await shop.start(other, build, '2026-03-01');
  await shop.save(other, build, number, dayOf('2026-03-01', [], { stage: secret?.id ?? 0 }));
  expect((await previewWorking(shop.em(), other, build, number)).stage).toBeNull();
});

test('the front page says nothing of a day whose only figure is kept to the crew', async () => {
  const build = await shop.build(owner, { title: 'Quiet' });
  const nails = await shop.material(owner, build, 'Nails');
  await shop.signOff(owner, build, dayOf('2026-03-01', [boughtBlock([{ of: nails, amount: '10', money: '5.00' }]), usedBlock([{ of: nails, amount: '4' }])], { work: { amount: '2', unit: 'piece', kind: 'plank hung' } }));
  expect((await readFrontPage(shop.em())).takes).toHaveLength(1);
  await keepCosts(build);
  expect((await readFrontPage(shop.em())).takes).toEqual([]);
});

test('the days and feeds of an unlisted build say that they are nobody’s to find, and those of a public one do not', async () => {
  const site = await startTestServer({ pages: 'source' });
  const restorer = await site.as({ handle: 'restorer' });
  for (const visibility of ['unlisted', 'public'] as const) {
    const { slug: build } = await restorer.ask(startBuild, { body: { kind: 'boat', title: `Told ${visibility}`, currency: 'GBP', measures: 'imperial', visibility } });
    const { number } = await restorer.ask(startEntry, { params: { build }, body: { day: '2026-03-01' } });
    const { href } = await restorer.ask(signOffEntry, { params: { build, number }, body: { version: 1, document: dayOf('2026-03-01', []) } });
    const page = (await site.visitor().get(href)).text;
    const feed = (await site.visitor().get(`/builds/${build}/feed.xml`)).headers;
    const found = [page.includes('<meta name="robots" content="noindex"/>'), page.includes(`<link rel="canonical" href="${site.url}${href}"/>`), feed.get('x-robots-tag')];
    expect(found, visibility).toEqual(visibility === 'unlisted' ? [true, false, 'noindex'] : [false, true, null]);
  }
  await site.close();
});

test('the currency stays once something was drawn from the shed', async () => {
  const buyer = await shop.build(owner, { title: 'Buyer' });
  const build = await shop.build(owner, { title: 'Draws on the shed' });
  const screws = await shop.material(owner, build, 'Screws');
  await shop.signOff(owner, buyer, dayOf('2026-03-01', [boughtBlock([{ of: screws, amount: '10', money: '10.00', goes: 'shed' }])]));
  expect((await readSettings(shop.em(), owner, build)).currencyFixed).toBe(false);
  await shop.signOff(owner, build, dayOf('2026-03-02', [usedBlock([{ of: screws, amount: '3', from: 'shed' }])]));
  expect((await readSettings(shop.em(), owner, build)).currencyFixed).toBe(true);
});

test('the currency stays once money is planned in it', async () => {
  const build = await shop.build(owner, { title: 'Planned' });
  await replaceStages(shop.em(), owner, build, [{ ...noStage, title: 'Ribs', plannedMoney: '123.45' }]);
  const { version, currencyFixed } = await readSettings(shop.em(), owner, build);
  expect(currencyFixed).toBe(true);
  const change = changeSettings(shop.em(), owner, build, { currency: 'JPY', version });
  await expect(change).rejects.toMatchObject({ code: 'bad-input', fields: { currency: expect.stringContaining('GBP') } });
  expect((await shop.em().findOneOrFail(Build, { slug: build })).currency).toBe('GBP');
});
