import { afterAll, beforeAll, expect, test } from 'vitest';
import { Build, Entry, Picture, PublishedPicture } from '#server/entities/index.ts';
import { listMyBuilds } from '#server/features/builds/my-builds.service.ts';
import { listStages, replaceStages } from '#server/features/builds/stages.service.ts';
import { coversOfBuilds } from '#server/features/publishing/covers.service.ts';
import { previewWorking } from '#server/features/publishing/entry-page.service.ts';
import { tapeOf } from '#server/features/publishing/tape.service.ts';
import { listBuilds } from '#server/features/publishing/builds-list.service.ts';
import type { Caller } from '#server/http/context.ts';
import { boughtBlock, costBlock, dayOf, usedBlock, Workshop } from '#tests/support/workshop.ts';

let shop: Workshop;
let owner: Caller;
beforeAll(async () => {
  shop = await Workshop.open();
  owner = await shop.person('wren');
});
afterAll(() => shop.close());

const buildOf = (slug: string) => shop.em().findOneOrFail(Build, { slug });

test('a day taken back is not counted as written up, and stands among what is left unfinished', async () => {
  const build = await shop.build(owner, { title: 'Taken back' });
  await shop.signOff(owner, build, dayOf('2026-03-01', []));
  const number = await shop.signOff(owner, build, dayOf('2026-03-02', []));
  await shop.takeBack(owner, build, number);
  const mine = (await listMyBuilds(shop.em(), owner)).find(({ slug }) => slug === build);
  expect(mine).toMatchObject({ days: 1, drafts: [{ number, day: '2026-03-02' }] });
});

test('a day of several weeks stands within the tape, in the order of its bars', async () => {
  const build = await shop.build(owner, { title: 'Long coats' });
  await shop.signOff(owner, build, dayOf('2026-02-01', [], { dayTo: '2026-02-20' }));
  await shop.signOff(owner, build, dayOf('2026-02-05', []));
  const tape = await tapeOf(shop.em(), await buildOf(build), true);
  expect(tape.days.map(({ day }) => day)).toEqual(['2026-02-05', '2026-02-20']);
  // and two days more, so that the last bar is not cut in half
  expect([tape.from, tape.to]).toEqual(['2026-01-01', '2026-02-22']);
});

test('a build’s last day is the last one worked, not the last one begun', async () => {
  const build = await shop.build(owner, { title: 'Slow drying' });
  await shop.signOff(owner, build, dayOf('2026-02-01', [], { dayTo: '2026-02-20' }));
  await shop.signOff(owner, build, dayOf('2026-02-05', []));
  const card = (await listBuilds(shop.em(), undefined, 1)).builds.find(({ slug }) => slug === build);
  expect(card).toMatchObject({ days: 2, lastDay: '2026-02-20' });
});

test('a preview counts itself in what the build used so far, in place of what is published of it', async () => {
  const build = await shop.build(owner, { title: 'Preview' });
  const nails = await shop.material(owner, build, 'Nails');
  const bought = boughtBlock([{ of: nails, amount: '10', money: '10.00' }]);
  const number = await shop.signOff(owner, build, dayOf('2026-03-01', [bought, usedBlock([{ of: nails, amount: '2' }]), costBlock([{ money: '1.00' }])]));
  await shop.signOff(owner, build, dayOf('2026-03-02', [usedBlock([{ of: nails, amount: '1' }])]));
  await shop.save(owner, build, number, dayOf('2026-03-01', [bought, usedBlock([{ of: nails, amount: '5' }]), costBlock([{ money: '3.00' }])]));
  // five nails and the hire of this day, one nail of the other
  expect((await previewWorking(shop.em(), owner, build, number)).tally.money).toMatchObject({ day: 800, buildUsed: 900 });
});

test('thirds in a plan come back in words that the plan can be kept with', async () => {
  const build = await shop.build(owner, { title: 'Thirds' });
  const stage = { id: null, title: 'Seams', plannedMoney: '', plannedTime: '', plannedWork: '4 1/3', workUnit: 'm' as const, workKind: 'seam caulked', done: false };
  await replaceStages(shop.em(), owner, build, [stage]);
  const [kept] = (await listStages(shop.em(), owner, build)).stages;
  expect(kept?.plannedWork).toBe('4 1/3');
  await replaceStages(shop.em(), owner, build, [{ ...stage, id: kept?.id ?? null, plannedWork: kept?.plannedWork ?? '' }]);
});

test('a stage is used once a day stands in it, and by nothing of another stage', async () => {
  const build = await shop.build(owner, { title: 'Used stages' });
  const blank = { id: null, plannedMoney: '', plannedTime: '', plannedWork: '', workUnit: 'piece' as const, workKind: '', done: false };
  await replaceStages(shop.em(), owner, build, [{ ...blank, title: 'Ribs' }, { ...blank, title: 'Planks' }]);
  const [ribs] = (await listStages(shop.em(), owner, build)).stages;
  await shop.signOff(owner, build, dayOf('2026-03-01', [], { stage: ribs?.id ?? null }));
  expect((await listStages(shop.em(), owner, build)).stages.map(({ used }) => used)).toEqual([true, false]);
});

test('the covers of a list read one picture a build, and no day’s text', async () => {
  const build = await shop.build(owner, { title: 'Pictured' });
  const earlier = await shop.signOff(owner, build, dayOf('2026-03-01', []));
  const later = await shop.signOff(owner, build, dayOf('2026-03-02', []));
  const em = shop.em();
  const row = await em.findOneOrFail(Build, { slug: build });
  const shown = [[earlier, true], [later, false], [later, true], [later, false]] as const;
  for (const [position, [number, cover]] of shown.entries()) {
    const picture = em.create(Picture, { key: `cover${position}`, build: row, uploader: row.owner, state: 'ready', originalName: 'x.jpg', widths: [480] });
    em.create(PublishedPicture, { entry: await em.findOneOrFail(Entry, { build: row.id, number }), picture, position, cover, alt: `Picture ${position}` });
  }
  await em.flush();
  const reading = shop.em();
  const covers = await coversOfBuilds(reading, [row.id]);
  expect(covers.get(row.id)).toMatchObject({ key: 'cover2', alt: 'Picture 2' });
  const read = [...reading.getUnitOfWork().getIdentityMap().keys()].map((key) => key.split('-')[0]);
  expect(read.filter((name) => name === 'Picture')).toHaveLength(1);
});
