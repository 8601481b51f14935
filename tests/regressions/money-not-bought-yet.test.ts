import { afterAll, beforeAll, expect, test } from 'vitest';
import Fraction from 'fraction.js';
import { estimateOf } from '#domain/ledger/estimate.ts';
import { Build } from '#server/entities/index.ts';
import { replaceStages, listStages } from '#server/features/builds/stages.service.ts';
import { listBuilds } from '#server/features/publishing/builds-list.service.ts';
import { readBuildPage } from '#server/features/publishing/build-page.service.ts';
import { previewWorking, readEntryBySlug } from '#server/features/publishing/entry-page.service.ts';
import { readFrontPage } from '#server/features/publishing/home.service.ts';
import type { Caller } from '#server/http/context.ts';
import { deskLedger } from '#src/features/desk/desk-ledger.ts';
import { tallyWords } from '#src/features/desk/tally-words.ts';
import { bought, brushes, byId, documentOf, usedNode, viewOf } from '#tests/client/desk/desk-view.ts';
import { boughtBlock, dayOf, usedBlock, Workshop } from '#tests/support/workshop.ts';

// What is used and not bought yet has no money so far, and every figure that stands without it says so.

let shop: Workshop;
let owner: Caller;
beforeAll(async () => {
  shop = await Workshop.open();
  owner = await shop.person('wren');
});
afterAll(() => shop.close());

async function pageOf(build: string) {
  const page = await readBuildPage(shop.em(), null, build, 1);
  if ('movedTo' in page) throw new Error('moved');
  return page;
}
async function entryOf(build: string, number: number) {
  const { slug } = await shop.entry(build, number);
  const page = await readEntryBySlug(shop.em(), null, build, slug ?? '');
  if ('movedTo' in page) throw new Error('moved');
  return page;
}

/** Every place a reader sees the day's money, and whether it says that some is still to come. */
async function saidEverywhere(build: string, number: number) {
  const page = await pageOf(build);
  const { tally, tape } = await entryOf(build, number);
  const home = await readFrontPage(shop.em());
  const card = (await listBuilds(shop.em(), undefined, 1)).builds.find(({ slug }) => slug === build);
  const take = home.takes.find((one) => one.build === page.title);
  return {
    cards: page.entries.map((entry) => entry.unsettled), list: card?.used?.unsettled, tape: tape.days.map((day) => day.unsettled), plan: page.plan?.map((row) => row.unsettled),
    home: take?.unsettled, day: tally.money?.unsettled, one: tally.money?.oneUnsettled, build: tally.money?.buildUnsettled, figures: page.figures?.unsettled,
  };
}

test('every figure that stands without what is not bought yet says so, and no longer once it is bought', async () => {
  const build = await shop.build(owner, { title: 'Short of nails' });
  await replaceStages(shop.em(), owner, build, [{ id: null, title: 'Planking', plannedMoney: '', plannedTime: '', plannedWork: '', workUnit: 'piece' as const, workKind: '', done: false }]);
  const [planking] = (await listStages(shop.em(), owner, build)).stages;
  const nails = await shop.material(owner, build, 'Nails');
  const facts = { stage: planking?.id ?? null, work: { amount: '2', unit: 'piece', kind: 'plank hung' } } as const;
  const number = await shop.signOff(owner, build, dayOf('2026-03-02', [boughtBlock([{ of: nails, amount: '10', money: '10.00' }]), usedBlock([{ of: nails, amount: '12' }])], facts));
  expect(await saidEverywhere(build, number)).toEqual({ cards: [true], list: true, tape: [true], plan: [true], home: true, day: true, one: true, build: true, figures: true });
  const later = await shop.signOff(owner, build, dayOf('2026-03-03', [boughtBlock([{ of: nails, amount: '5', money: '9.00' }])], { stage: planking?.id ?? null }));
  expect(later).toBeGreaterThan(number);
  expect(await saidEverywhere(build, number)).toEqual({ cards: [false, false], list: false, tape: [false, false], plan: [false], home: false, day: false, one: false, build: false, figures: false });
});

test('where costs are kept to the crew, nothing says that money is to come', async () => {
  const build = await shop.build(owner, { title: 'Hidden costs' });
  const em = shop.em();
  (await em.findOneOrFail(Build, { slug: build })).costsShown = false;
  await em.flush();
  const nails = await shop.material(owner, build, 'Hidden nails');
  const number = await shop.signOff(owner, build, dayOf('2026-03-02', [boughtBlock([{ of: nails, amount: '1', money: '1.00' }]), usedBlock([{ of: nails, amount: '12' }])]));
  const page = await pageOf(build);
  expect(page.entries[0]).not.toHaveProperty('unsettled');
  expect(page.tape.days[0]).not.toHaveProperty('unsettled');
  expect(JSON.stringify((await entryOf(build, number)).rows)).not.toMatch(/£|about/);
});

test('the slip of a short line says what it would cost at the last price paid, and no sum does', async () => {
  const build = await shop.build(owner, { title: 'Estimates' });
  const nails = await shop.material(owner, build, 'Brass nails');
  const first = boughtBlock([{ of: nails, amount: '10', money: '10.00' }]);
  const second = boughtBlock([{ of: nails, amount: '4', money: '8.00' }]);
  const unknown = await shop.material(owner, build, 'Never bought');
  const number = await shop.signOff(owner, build, dayOf('2026-03-02', [first, second, usedBlock([{ of: nails, amount: '17' }, { of: unknown, amount: '1' }])]));
  for (const page of [await entryOf(build, number), await previewWorking(shop.em(), owner, build, number)]) {
    const slip = page.rows.flatMap(({ slips }) => slips).find(({ type }) => type === 'used')?.slip;
    // three more at 2.00 each
    expect(slip?.lines[0]).toMatchObject({ small: expect.stringContaining('not bought yet, about £6.00 at the last price'), value: '£18.00' });
    expect(slip?.lines[1]?.small).toMatch(/not bought yet$/);
    expect(slip?.lines[1]).not.toHaveProperty('value');
    expect(slip?.sum?.value).toBe('£18.00, some not bought yet');
    expect(page.tally.money?.used).toBe(1800);
  }
});

test('so does the desk, on the line and in the tally', () => {
  const view = viewOf({ history: [bought(brushes.id, '15/1', 1000)] });
  const content = [usedNode('used1', [{ id: 'lineA', material: brushes.id, name: brushes.name, amount: '18', unit: 'piece' }])];
  const reckoning = deskLedger(view).reckon(documentOf({ content, work: { amount: '2', unit: 'piece', kind: 'board' } }), byId);
  expect(reckoning.lines.get('used1:lineA')).toEqual({ value: 1000, short: '3/1', estimate: 200, left: '0/1' });
  expect(reckoning.figures).toMatchObject({ used: 1000, linesShort: 1, estimate: 200 });
  const words = tallyWords(reckoning, 'USD');
  expect(words.words).toBe('this day: $10.00 used; some not bought yet');
  expect(words.groups.flat()).toContainEqual({ label: 'One board takes', value: '$5.00, some not bought yet' });
  expect(words.groups.flat()).toContainEqual({ label: 'Not bought yet', value: '1 line, about $2.00' });
});

test('an estimate is half to even once, and none is given without a price', () => {
  const paid = { cost: 5, amount: new Fraction(2) };
  expect(estimateOf(new Fraction(1), paid)).toBe(2);
  expect(estimateOf(new Fraction(3), paid)).toBe(8);
  expect(estimateOf(new Fraction(1), null)).toBeNull();
  expect(estimateOf(new Fraction(1), { cost: 0, amount: new Fraction(2) })).toBeNull();
  expect(estimateOf(new Fraction(0), paid)).toBeNull();
});
