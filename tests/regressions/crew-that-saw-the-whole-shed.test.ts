import { afterAll, beforeAll, expect, test } from 'vitest';
import { readDeskOf } from '#server/features/entries/desk.service.ts';
import { listMaterials } from '#server/features/shelf/materials.service.ts';
import type { Caller } from '#server/http/context.ts';
import { AppError } from '#contracts/errors.ts';
import { boughtBlock, dayOf, usedBlock, Workshop } from '#tests/support/workshop.ts';

// The desk of one build handed its crew the names of everything its restorer owns, and what each thing in the shed had cost and when, private builds and all.
let shop: Workshop;
let owner: Caller;
let crew: Caller;
let shared: string;
let secret: string;
beforeAll(async () => {
  shop = await Workshop.open();
  owner = await shop.person('maud');
  crew = await shop.person('pike');
  shared = await shop.build(owner, { title: 'Shared' });
  secret = await shop.build(owner, { title: 'Secret', visibility: 'private' });
  await shop.joins(shared, crew);
});
afterAll(() => shop.close());

const deskOf = async (who: Caller) => readDeskOf(shop.em(), who, shared, await shop.start(who, shared, '2026-03-05'));
const names = (list: readonly { name: string }[]) => list.map(({ name }) => name).toSorted();

test('crew see of the shed and of the materials what this build has to do with; the restorer sees all', async () => {
  const [gold, nails, rope, tar] = [
    await shop.material(owner, secret, 'Gold leaf'), await shop.material(owner, secret, 'Nails'), await shop.material(owner, secret, 'Rope'), await shop.material(owner, secret, 'Tar'),
  ];
  await shop.signOff(owner, secret, dayOf('2026-02-01', [boughtBlock([gold, nails, rope].map((of) => ({ of, amount: '10', money: '70.00', goes: 'shed' as const })))]));
  // in this build's ledger: nails drawn from the shed; in somebody's working copy: rope
  await shop.signOff(owner, shared, dayOf('2026-02-02', [usedBlock([{ of: nails, amount: '1', from: 'shed' }])]));
  await shop.save(owner, shared, await shop.start(owner, shared, '2026-02-03'), dayOf('2026-02-03', [usedBlock([{ of: rope, amount: '1', from: 'shed' }])]));
  const theirs = await deskOf(crew);
  expect(names(theirs.materials)).toEqual(['Nails', 'Rope']);
  const seen = [...theirs.shelf, ...theirs.history].map(({ material }) => material);
  expect(seen).toEqual(expect.arrayContaining([nails.id, rope.id]));
  expect(seen).not.toContain(gold.id);
  expect(names(await listMaterials(shop.em(), crew, shared))).toEqual(['Nails', 'Rope']);
  const own = await deskOf(owner);
  expect(names(own.materials)).toEqual(['Gold leaf', 'Nails', 'Rope', 'Tar']);
  expect(own.history.map(({ material }) => material)).toContain(gold.id);
  expect(tar.id).toBeGreaterThan(0);
});

test('a material that crew put in their text by its number alone is not theirs to see', async () => {
  const hidden = (await shop.em().execute<{ id: number; name: string }[]>(`select id, name from material where name = 'Gold leaf'`))[0];
  if (!hidden) throw new Error('The material of the test before is gone.');
  const guessed = dayOf('2026-03-06', [usedBlock([{ of: { id: hidden.id, name: 'a guess' }, amount: '1', from: 'shed' }])]);
  const number = await shop.start(crew, shared, '2026-03-06');
  const { document } = await shop.save(crew, shared, number, guessed);
  expect(JSON.stringify(document)).toContain('a guess');
  const view = await readDeskOf(shop.em(), crew, shared, number);
  expect(names(view.materials)).not.toContain('Gold leaf');
  expect(view.history.map(({ material }) => material)).not.toContain(hidden.id);
  const outcome = await shop.signOff(crew, shared, guessed, number).catch((error: unknown) => error);
  expect(outcome).toBeInstanceOf(AppError);
  expect(outcome).toMatchObject({ code: 'bad-input' });
});

test('what crew add is theirs to use at once, and a name they cannot see says so', async () => {
  const wax = await shop.material(crew, shared, 'Beeswax');
  expect(names((await deskOf(crew)).materials)).toContain('Beeswax');
  const number = await shop.start(crew, shared, '2026-03-07');
  const { document } = await shop.save(crew, shared, number, dayOf('2026-03-07', [usedBlock([{ of: wax, amount: '1' }])]));
  expect(document.content.some((node) => node.type === 'used' && node.attrs.data.lines.some(({ material }) => material === wax.id))).toBe(true);
  await expect(shop.material(crew, shared, 'gold  leaf')).rejects.toMatchObject({ code: 'already-taken', fields: { name: expect.stringContaining('not on the list of this build') as string } });
});
