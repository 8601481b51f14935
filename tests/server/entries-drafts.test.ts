import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { AppError } from '#contracts/errors.ts';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { Build, Material, Movement } from '#server/entities/index.ts';
import { readDeskOf } from '#server/features/entries/desk.service.ts';
import { verifyLedger } from '#server/features/entries/ledger-check.service.ts';
import { saveTyped } from '#server/features/entries/save-working.service.ts';
import { buildFigures } from '#server/features/shelf/figures.service.ts';
import type { Caller } from '#server/http/context.ts';
import { boughtBlock, dayOf, timeBlock, usedBlock, Workshop } from '#tests/support/workshop.ts';

const now = new Date('2026-11-20T12:00:00Z');
let shop: Workshop;
let owner: Caller;
let build: string;
let rounds = 0;
beforeAll(async () => {
  shop = await Workshop.open();
});
beforeEach(async () => {
  rounds += 1;
  owner = await shop.person(`drafter${rounds}`);
  build = await shop.build(owner, { title: `Draft ${rounds}` });
});
afterAll(async () => {
  expect((await verifyLedger(shop.em())).differences).toEqual([]);
  await shop.close();
});

async function outcomeOf(run: Promise<unknown>): Promise<AppError> {
  const error = await run.then(() => new Error('It was expected to be refused.'), (reason: unknown) => reason);
  if (!(error instanceof AppError)) throw error;
  return error;
}

async function figures() {
  const em = shop.em();
  return buildFigures(em, await em.findOneOrFail(Build, { slug: build }));
}

function linesOf(document: EntryDocument) {
  return document.content.flatMap((node) => (node.type === 'used' ? node.attrs.data.lines : []));
}

test('a draft leaves the stored ledger alone, and crew see it with drafts: used 10.00 and 30.00', async () => {
  // the worked history: 10 at 1, 10 at 2; a draft uses 10, a published entry uses 10
  const rope = await shop.material(owner, build, 'Rope');
  await shop.signOff(owner, build, dayOf('2026-02-01', [boughtBlock([{ of: rope, amount: '10', money: '10.00' }, { of: rope, amount: '10', money: '20.00' }])]));
  const draft = await shop.start(owner, build, '2026-02-02');
  await shop.save(owner, build, draft, dayOf('2026-02-02', [usedBlock([{ of: rope, amount: '10' }])]));
  const published = await shop.signOff(owner, build, dayOf('2026-02-03', [usedBlock([{ of: rope, amount: '10' }])]));
  expect(await figures()).toMatchObject({ used: 1000, left: 2000 });
  expect(await shop.em().count(Movement, { material: rope.id, kind: 'used' })).toBe(1);
  const atDraft = await readDeskOf(shop.em(), owner, build, draft);
  expect(atDraft.shelf).toEqual([{ material: rope.id, shelf: 'shelf', left: '10/1', short: '0/1', worth: 2000 }]);
  const atPublished = await readDeskOf(shop.em(), owner, build, published);
  expect(atPublished.shelf).toEqual([{ material: rope.id, shelf: 'shelf', left: '10/1', short: '0/1', worth: 2000 }]);
  const elsewhere = await readDeskOf(shop.em(), owner, build, await shop.start(owner, build, '2026-02-04'));
  expect(elsewhere.shelf).toEqual([{ material: rope.id, shelf: 'shelf', left: '0/1', short: '0/1', worth: 0 }]);
  expect(elsewhere.history.flatMap(({ rows }) => rows.map(({ kind, day }) => [kind, day]))).toEqual(
    expect.arrayContaining([['bought', '2026-02-01'], ['used', '2026-02-02'], ['used', '2026-02-03']]),
  );
});

test('the changes to a published entry are a draft too: until it is signed off again the figures stay', async () => {
  const rope = await shop.material(owner, build, 'Rope');
  await shop.signOff(owner, build, dayOf('2026-02-01', [boughtBlock([{ of: rope, amount: '10', money: '10.00' }])]));
  const entry = await shop.signOff(owner, build, dayOf('2026-02-03', [usedBlock([{ of: rope, amount: '1' }])]));
  const changed = dayOf('2026-02-03', [usedBlock([{ of: rope, amount: '4' }])]);
  await shop.save(owner, build, entry, changed);
  expect(await figures()).toMatchObject({ used: 100 });
  const next = await readDeskOf(shop.em(), owner, build, await shop.start(owner, build, '2026-02-04'));
  expect(next.shelf[0]).toMatchObject({ left: '6/1' });
  await shop.signOff(owner, build, changed, entry);
  expect(await figures()).toMatchObject({ used: 400 });
  await shop.save(owner, build, entry, dayOf('2026-02-03', []));
  await shop.discard(owner, build, entry);
  expect(await shop.entry(build, entry)).toMatchObject({ working: null, workingAt: null, title: 'Day of 2026-02-03' });
  expect(await figures()).toMatchObject({ used: 400 });
});

test('of two who save over each other the later is refused, with both texts', async () => {
  const crew = await shop.person(`mate${rounds}`);
  await shop.joins(build, crew);
  const number = await shop.start(owner, build, '2026-02-01');
  const { version } = await shop.entry(build, number);
  const [mine, theirs] = [dayOf('2026-02-01', [], { title: 'What I wrote' }), dayOf('2026-02-01', [], { title: 'What they wrote' })];
  const saved = await saveTyped(shop.em(), crew, build, number, { version, document: theirs }, now);
  const refused = await outcomeOf(saveTyped(shop.em(), owner, build, number, { version, document: mine }, now));
  expect(refused).toMatchObject({ code: 'newer-exists', newer: { version: saved.version, document: { title: 'What they wrote' } } });
  expect((await shop.entry(build, number)).working?.title).toBe('What they wrote');
  const again = await saveTyped(shop.em(), owner, build, number, { version: saved.version, document: mine }, now);
  expect(again.version).toBe(saved.version + 1);
});

test('many saves of one version at once: one goes in, the rest are refused', async () => {
  const number = await shop.start(owner, build, '2026-02-01');
  const { version } = await shop.entry(build, number);
  const saves = await Promise.allSettled(Array.from({ length: 12 }, (_, at) => saveTyped(shop.em(), owner, build, number, { version, document: dayOf('2026-02-01', [], { title: `Text ${at}` }) }, now)));
  expect(saves.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
  expect(saves.flatMap((save) => (save.status === 'rejected' ? [save.reason] : [])).every((reason) => reason instanceof AppError && reason.code === 'newer-exists')).toBe(true);
});

test('ids that occur twice are renewed, within the entry', async () => {
  const rope = await shop.material(owner, build, 'Rope');
  const number = await shop.start(owner, build, '2026-02-01');
  const line = { of: rope, amount: '1', id: 'line-pasted' };
  const { document } = await shop.save(owner, build, number, dayOf('2026-02-01', [usedBlock([line], 'block-pasted'), usedBlock([line, line], 'block-pasted')]));
  const ids = [...document.content.map((node) => node.attrs.id), ...linesOf(document).map(({ id }) => id)];
  expect(new Set(ids).size).toBe(ids.length);
  expect(linesOf(document)[0]?.id).toBe('line-pasted');
});

test('an amount once read keeps what it came to while its words stand, whatever becomes of the pack', async () => {
  const nails = await shop.material(owner, build, 'Nails', { packs: [{ name: 'box', amount: '500' }] });
  const number = await shop.start(owner, build, '2026-02-01');
  const typed = dayOf('2026-02-01', [usedBlock([{ of: nails, amount: '2 boxes', id: 'line-nails' }], 'used-nails')]);
  const { document } = await shop.save(owner, build, number, typed);
  expect(linesOf(document)[0]).toMatchObject({ exact: '1000/1', amount: '2 boxes' });
  await shop.em().nativeUpdate(Material, { id: nails.id }, { packs: [{ name: 'box', amount: '200/1' }] });
  // a sender's own figure is never believed
  const sent = structuredClone(document);
  for (const line of linesOf(sent)) Object.assign(line, { exact: '1/1' });
  expect(linesOf((await shop.save(owner, build, number, sent)).document)[0]?.exact).toBe('1000/1');
  await shop.signOff(owner, build, sent, number);
  expect((await shop.em().findOneOrFail(Movement, { material: nails.id })).amount).toBe('1000/1');
  for (const line of linesOf(sent)) line.amount = '3 boxes';
  expect(linesOf((await shop.save(owner, build, number, sent)).document)[0]?.exact).toBe('600/1');
});

test('what cannot be read is kept as it was typed', async () => {
  const rope = await shop.material(owner, build, 'Rope');
  const number = await shop.start(owner, build, '2026-02-01');
  const { document } = await shop.save(owner, build, number, dayOf('2026-02-01', [usedBlock([{ of: rope, amount: '1,5' }, { of: rope, amount: '-3' }, { of: rope, amount: '2 furlongs' }, { of: rope, amount: '' }])], { title: '' }));
  expect(linesOf(document).map(({ amount, exact }) => [amount, exact])).toEqual([['1,5', null], ['-3', null], ['2 furlongs', null], ['', null]]);
});

test('a draft that is thrown away is gone, with its place in the lists', async () => {
  const number = await shop.start(owner, build, '2026-02-01');
  await shop.save(owner, build, number, dayOf('2026-02-01', [timeBlock([{ time: '1 h' }])]));
  await shop.discard(owner, build, number);
  await expect(shop.entry(build, number)).rejects.toThrow(/Entry not found/);
});

test('drafts of another build reach the shed only for those who work on that build', async () => {
  const screws = await shop.material(owner, build, 'Screws');
  const secret = await shop.build(owner, { title: `Secret ${rounds}`, visibility: 'private' });
  const crew = await shop.person(`hand${rounds}`);
  await shop.joins(build, crew);
  await shop.signOff(owner, build, dayOf('2026-02-01', [boughtBlock([{ of: screws, amount: '100', money: '10.00', goes: 'shed' }])]));
  const draft = await shop.start(owner, secret, '2026-02-02');
  await shop.save(owner, secret, draft, dayOf('2026-02-02', [usedBlock([{ of: screws, amount: '30', from: 'shed' }, { of: screws, amount: '5' }])]));
  const number = await shop.start(owner, build, '2026-02-03');
  const shed = async (caller: Caller) => (await readDeskOf(shop.em(), caller, build, number)).shelf;
  expect(await shed(owner)).toEqual([{ material: screws.id, shelf: 'shed', left: '70/1', short: '0/1', worth: 700 }]);
  expect(await shed(crew)).toEqual([{ material: screws.id, shelf: 'shed', left: '100/1', short: '0/1', worth: 1000 }]);
});

test('opening the desk again on a day nothing was written on leads back to the same draft', async () => {
  const first = await shop.start(owner, build, '2026-02-01');
  expect(await shop.start(owner, build, '2026-02-01')).toBe(first);
  expect((await readDeskOf(shop.em(), owner, build, first)).entry.version).toBe(1);
  const nextDay = await shop.start(owner, build, '2026-02-02');
  expect(nextDay).not.toBe(first);
  await shop.save(owner, build, first, dayOf('2026-02-01', [timeBlock([{ time: '1 h' }])]));
  const second = await shop.start(owner, build, '2026-02-01');
  expect([first, nextDay]).not.toContain(second);
});

test('a blank draft of somebody else of the crew is theirs', async () => {
  const mate = await shop.person(`mate${rounds}`);
  await shop.joins(build, mate);
  const mine = await shop.start(owner, build, '2026-02-01');
  expect(await shop.start(mate, build, '2026-02-01')).not.toBe(mine);
});
