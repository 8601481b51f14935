import { afterAll, beforeAll, expect, test } from 'vitest';
import { readFrontPage } from '#server/features/publishing/home.service.ts';
import type { Caller } from '#server/http/context.ts';
import { dayOf, Workshop } from '#tests/support/workshop.ts';

// What one takes was asked day by day: two queries for each of forty days that had nothing to say.

let shop: Workshop;
let owner: Caller;
beforeAll(async () => {
  shop = await Workshop.open();
  owner = await shop.person('wren');
});
afterAll(() => shop.close());

async function queriesOfFrontPage(): Promise<number> {
  let count = 0;
  const counted = () => { count += 1; };
  const knex = shop.orm.em.getKnex();
  knex.on('query', counted);
  await readFrontPage(shop.em());
  knex.off('query', counted);
  return count;
}

test('the front page asks the database as often for twelve days as for two', async () => {
  const build = await shop.build(owner);
  const write = (day: number) => shop.signOff(owner, build, dayOf(`2026-03-${String(day).padStart(2, '0')}`, [], { work: { amount: '1', unit: 'piece', kind: `kind ${day} done` } }));
  for (const day of [1, 2]) await write(day);
  const few = await queriesOfFrontPage();
  for (let day = 3; day <= 12; day += 1) await write(day);
  expect(few).toBeGreaterThan(0);
  expect(await queriesOfFrontPage()).toBe(few);
});
