import { afterAll, beforeAll, expect, test } from 'vitest';
import { Movement } from '#server/entities/index.ts';
import { boughtBlock, dayOf, usedBlock, Workshop } from '#tests/support/workshop.ts';

// Each build counted its own entries, and a shed compared the counts of different builds: of two days in one, the one written first did not come first.
let shop: Workshop;
beforeAll(async () => {
  shop = await Workshop.open();
});
afterAll(() => shop.close());

test('of two builds that draw on the shed on one day, the one written first takes the first lot', async () => {
  const owner = await shop.person('shed-owner');
  const busy = await shop.build(owner, { title: 'Lugger' });
  const fresh = await shop.build(owner, { title: 'Dinghy' });
  const nails = await shop.material(owner, busy, 'Rove nail');
  await shop.signOff(owner, busy, dayOf('2026-02-01', [boughtBlock([{ of: nails, amount: '10', money: '10.00', goes: 'shed' }])]));
  await shop.signOff(owner, busy, dayOf('2026-02-02', [boughtBlock([{ of: nails, amount: '10', money: '20.00', goes: 'shed' }])]));
  const draw = () => dayOf('2026-02-10', [usedBlock([{ of: nails, amount: '10', from: 'shed' }])]);
  await shop.signOff(owner, busy, draw());
  await shop.signOff(owner, fresh, draw());
  const used = await shop.em().find(Movement, { kind: 'used' }, { populate: ['build'] });
  const byBuild = Object.fromEntries(used.map((row) => [row.build?.slug, row.value]));
  expect(byBuild).toEqual({ [busy]: 1000, [fresh]: 2000 });
});
