import { afterAll, beforeAll, expect, test } from 'vitest';
import Fraction from 'fraction.js';
import { finishAt } from '#domain/forecast.ts';
import { whatOneTakes } from '#domain/one-takes.ts';
import { readHome } from '#contracts/home.ts';
import { entryDocument } from '#src/blocks/pure.ts';
import { Build, Cost } from '#server/entities/index.ts';
import { listBuilds } from '#server/features/publishing/builds-list.service.ts';
import { readFrontPage } from '#server/features/publishing/home.service.ts';
import type { Caller } from '#server/http/context.ts';
import { boughtBlock, costBlock, dayOf, usedBlock, Workshop } from '#tests/support/workshop.ts';

// Sums beyond 2^53 − 1 minor units cannot be kept exactly, and a figure that cannot be kept must never reach a page of everybody's.

let shop: Workshop;
let owner: Caller;
beforeAll(async () => {
  shop = await Workshop.open();
  owner = await shop.person('wren');
});
afterAll(() => shop.close());

const mostTyped = '10000000000.00';
const costs = (count: number) => costBlock(Array.from({ length: count }, () => ({ money: mostTyped })));

test('a day of more money than a day can hold is refused beside the block that holds the most', async () => {
  const build = await shop.build(owner, { title: 'Too much in a day' });
  const [small, large] = [costs(2), costs(9)];
  const signing = shop.signOff(owner, build, dayOf('2026-03-01', [small, large]));
  await expect(signing).rejects.toMatchObject({ code: 'bad-input', fields: { [large.attrs.id]: expect.stringMatching(/more money than a day can hold/) } });
  await shop.signOff(owner, build, dayOf('2026-03-02', [costs(10)]));
});

test('receipts count towards what a day can hold', async () => {
  const build = await shop.build(owner, { title: 'Too many receipts' });
  const receipts = Array.from({ length: 11 }, () => boughtBlock([{ name: 'Hull', goes: 'straight', money: mostTyped }]));
  await expect(shop.signOff(owner, build, dayOf('2026-03-01', receipts))).rejects.toMatchObject({ code: 'bad-input' });
});

test('a build holds so much and no more, and the front page and the list of builds stay readable', async () => {
  const build = await shop.build(owner, { title: 'Too much in a build' });
  const em = shop.em();
  const row = await em.findOneOrFail(Build, { slug: build });
  em.create(Cost, { build: row, entry: null, receiptLine: null, block: null, line: null, day: '2026-01-01', sequence: 1, stage: null, category: 'hire', label: 'Before this', money: 1e15 - 100 });
  await em.flush();
  await expect(shop.signOff(owner, build, dayOf('2026-03-01', [costBlock([{ money: '1.01' }])]))).rejects.toMatchObject({ code: 'bad-input', message: expect.stringMatching(/more money than a build can hold/) });
  await shop.signOff(owner, build, dayOf('2026-03-01', [costBlock([{ money: '1.00' }])]));
  expect(readHome.reply.safeParse(await readFrontPage(shop.em())).success).toBe(true);
  expect((await listBuilds(shop.em(), undefined, 1)).builds.find(({ slug }) => slug === build)?.used?.minor).toBe(1e15);
});

test('much money over next to no work is no figure, and the front page stays readable', async () => {
  const build = await shop.build(owner, { title: 'Next to no work' });
  const gold = await shop.material(owner, build, 'Gold leaf');
  const bought = boughtBlock([{ of: gold, amount: '1', money: mostTyped }]);
  await shop.signOff(owner, build, dayOf('2026-03-01', [bought, usedBlock([{ of: gold, amount: '1' }])], { work: { amount: '0.000001', unit: 'piece', kind: 'letter gilt' } }));
  expect(readHome.reply.safeParse(await readFrontPage(shop.em())).success).toBe(true);
  const use = { material: 'gold', kind: 'used', counts: 'each', amount: new Fraction(1), value: 1e12 } as const;
  expect(whatOneTakes({ work: new Fraction(1, 1e6), uses: [use], times: [] })).toBeNull();
  expect(finishAt({ planned: 1, used: 1e12, wasted: 0, usedForEach: 1e12, workPlanned: new Fraction(1000), workDone: new Fraction(1, 1e6), percent: null, done: false })).toBeNull();
});

test('a day holds two thousand lines in all', () => {
  const lines = (count: number) => dayOf('2026-03-01', Array.from({ length: count / 100 }, () => costs(100)));
  expect(entryDocument.safeParse(lines(2000)).success).toBe(true);
  const read = entryDocument.safeParse(lines(2100));
  expect(read.error?.issues[0]?.message).toMatch(/2,000 lines at most/);
});
