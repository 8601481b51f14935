import { afterAll, beforeAll, expect, test } from 'vitest';
import { readDeskOf } from '#server/features/entries/desk.service.ts';
import { Workshop } from '#tests/support/workshop.ts';

// The number after a discarded draft was that of the draft: the desk of the next entry took up what the browser had kept of the last.
let shop: Workshop;
beforeAll(async () => {
  shop = await Workshop.open();
});
afterAll(() => shop.close());

test('a number once given is given to no other entry of the build', async () => {
  const owner = await shop.person('numberer');
  const build = await shop.build(owner);
  const first = await shop.start(owner, build, '2026-03-01');
  const thrownAway = await shop.start(owner, build, '2026-03-02');
  await shop.discard(owner, build, thrownAway);
  expect([first, thrownAway, await shop.start(owner, build, '2026-03-03')]).toEqual([1, 2, 3]);
});

test('the desk is told the one name of its entry that no other entry has', async () => {
  const owner = await shop.person('namer');
  const build = await shop.build(owner);
  const number = await shop.start(owner, build, '2026-03-01');
  const view = await readDeskOf(shop.em(), owner, build, number);
  expect(view.entry).toMatchObject({ guid: (await shop.entry(build, number)).guid });
});
