import { afterAll, beforeAll, expect, test } from 'vitest';
import { readQuantity } from '#domain/quantity-reading.ts';
import { readAmountOfWork } from '#domain/work.ts';
import { Build, Material, Movement, Shelf } from '#server/entities/index.ts';
import type { Caller } from '#server/http/context.ts';
import { boughtBlock, dayOf, Workshop } from '#tests/support/workshop.ts';

// Lines of one material are priced in their smallest common part: with hundreds of unlike figures below the line that part
// grew to thousands of digits, and pricing them held everybody else up for seconds.

let shop: Workshop;
let owner: Caller;
beforeAll(async () => {
  shop = await Workshop.open();
  owner = await shop.person('wren');
});
afterAll(() => shop.close());

const litres = (text: string) => readQuantity(text, { measures: 'imperial', dimension: 'volume', packs: [{ name: 'tin', amount: '2500/1' }] });

test.each(['1/129 l', '1 1/999983 l', '2 x 1/1000003 l', '3 l 1/1009 ml', '1/4 of 1/131 l'])('%s has too much below the line', (text) => {
  expect(litres(text)).toMatchObject({ ok: false, problem: expect.stringMatching(/128 at most below the line/) });
});

test.each(['0.1234567 l', '2 x 0.00000001 l', '1 l 0.3333333 ml'])('%s has too many decimals', (text) => {
  expect(litres(text)).toMatchObject({ ok: false, problem: expect.stringMatching(/[Ss]ix decimals at most/) });
});

test.each(['1/127 x 1/113 l', '1/127 of 1/125 of 1/121 l'])('%s multiplies up to what is too fine', (text) => {
  expect(litres(text)).toMatchObject({ ok: false, problem: expect.stringMatching(/finer than one line can hold/) });
});

test.each(['1/128 l', '0.123456 l', '1/3 x 2.5 l', '2 2/3 tins', '1/64 of a tin', '1/2 x 1/4 l'])('%s is read as before', (text) => {
  expect(litres(text).ok).toBe(true);
});

test('an amount of work goes no finer', () => {
  expect(readAmountOfWork('1/1009')).toMatchObject({ ok: false, problem: expect.stringMatching(/128 at most below the line/) });
  expect(readAmountOfWork('0.1234567')).toMatchObject({ ok: false, problem: expect.stringMatching(/[Ss]ix decimals at most/) });
  expect(readAmountOfWork('1/128').ok).toBe(true);
});

test('a shelf whose amounts have no small common part is not priced, and says which material', async () => {
  const build = await shop.build(owner);
  const oil = await shop.material(owner, build, 'Linseed oil', { dimension: 'volume', unit: 'l' });
  const em = shop.em();
  const row = await em.findOneOrFail(Build, { slug: build });
  const shelf = await em.findOneOrFail(Shelf, { build: row.id });
  // as kept by an earlier reading: one over so many unlike odd figures
  for (let place = 0; place < 60; place += 1) {
    em.create(Movement, {
      shelf, build: row, key: `old:${place}`, kind: 'used', material: em.getReference(Material, oil.id), entry: null, receiptLine: null, block: null, line: null, day: '2026-01-01', sequence: 1, place,
      typed: '', amount: `1/${1_000_003 + 2 * place}`, cost: null, of: null, shortage: null, value: 0, short: '0/1', counts: null, stage: null,
    });
  }
  await em.flush();
  const signing = shop.signOff(owner, build, dayOf('2026-03-01', [boughtBlock([{ of: oil, amount: '1', unit: 'l', money: '10.00' }])]));
  await expect(signing).rejects.toMatchObject({ code: 'bad-input', message: expect.stringMatching(/^Linseed oil: .*rounder/) });
});
