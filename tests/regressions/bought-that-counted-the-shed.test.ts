import { afterAll, beforeAll, expect, test } from 'vitest';
import { buildFigures } from '#server/features/shelf/figures.service.ts';
import { previewWorking, readEntryBySlug } from '#server/features/publishing/entry-page.service.ts';
import { Build } from '#server/entities/index.ts';
import type { Caller } from '#server/http/context.ts';
import { deskLedger } from '#src/features/desk/desk-ledger.ts';
import { boughtBlock, dayOf, Workshop } from '#tests/support/workshop.ts';
import { boughtNode, brushes, byId, documentOf, viewOf } from '#tests/client/desk/desk-view.ts';

// A receipt's lines for the shed counted in what the day bought and not in what the build spent: the two never agreed.

let shop: Workshop;
let owner: Caller;
beforeAll(async () => {
  shop = await Workshop.open();
  owner = await shop.person('wren');
});
afterAll(() => shop.close());

test('what a day bought is what the build spent; the shed’s part is said on the slip', async () => {
  const build = await shop.build(owner);
  const nails = await shop.material(owner, build, 'Nails');
  const receipt = boughtBlock([
    { of: nails, amount: '10', money: '10.00' }, { of: nails, amount: '4', money: '4.00', goes: 'shed' }, { name: 'Drill bit', goes: 'straight', money: '2.00' }, { name: 'Bread', goes: 'not-mine', money: '1.00' },
  ]);
  const number = await shop.signOff(owner, build, dayOf('2026-03-01', [receipt]));
  const { slug } = await shop.entry(build, number);
  const page = await readEntryBySlug(shop.em(), owner, build, slug ?? '');
  if ('movedTo' in page) throw new Error('moved');
  const row = await shop.em().findOneOrFail(Build, { slug: build });
  expect((await buildFigures(shop.em(), row)).spent).toBe(1200);
  expect(page.tally.money?.bought).toBe(1200);
  expect((await previewWorking(shop.em(), owner, build, number)).tally.money?.bought).toBe(1200);
  const slip = page.rows.flatMap(({ slips }) => slips)[0]?.slip;
  expect(slip?.sum).toEqual({ label: 'To the door', value: '£16.00' });
  expect(slip?.footnote).toBe('£4.00 of it to the shed');
});

test('so does the desk', () => {
  const line = { material: brushes.id, name: brushes.name, amount: '1', unit: 'box', money: '10' };
  const reckoning = deskLedger(viewOf()).reckon(documentOf({ content: [boughtNode('bought1', [{ ...line, id: 'lineA' }, { ...line, id: 'lineB', goes: 'shed' }])] }), byId);
  expect(reckoning.figures.bought).toBe(1000);
});
