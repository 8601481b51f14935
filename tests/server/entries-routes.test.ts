import { afterAll, beforeAll, expect, test } from 'vitest';
import { readBuild, startBuild } from '#contracts/builds.ts';
import { discardWorking, previewEntry, readDesk, readLastTime, saveWorking, signOffEntry, startEntry, takeBackEntry } from '#contracts/entries.ts';
import { addMaterial, readMyMaterials } from '#contracts/materials.ts';
import { Build } from '#server/entities/index.ts';
import { joinCrew } from '#server/features/builds/builds.service.ts';
import { verifyLedger } from '#server/features/entries/ledger-check.service.ts';
import type { TestClient } from '#tests/support/test-client.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';
import { boughtBlock, dayOf, timeBlock, usedBlock } from '#tests/support/workshop.ts';

let site: TestServer;
let owner: TestClient;
let crew: TestClient;
let build: string;
beforeAll(async () => {
  site = await startTestServer();
  [owner, crew] = [await site.as({ handle: 'maud' }), await site.as({ handle: 'pike' })];
  build = (await owner.ask(startBuild, { body: { kind: 'boat', title: 'Whelk', currency: 'GBP', measures: 'imperial' } })).slug;
  const em = site.orm.em.fork();
  const [pike] = await em.execute<{ id: number }[]>("select id from person where handle = 'pike'");
  await joinCrew(em, await em.findOneOrFail(Build, { slug: build }), pike?.id ?? 0);
});
afterAll(() => site.close());

const material = (name: string, by = owner) => by.ask(addMaterial, { body: { build, name, dimension: 'count', unit: 'piece', packs: [{ name: 'box', amount: '500' }] } });

test('a day from start to sign-off and back, over the wire, by the crew on the restorer’s materials', async () => {
  const nails = await material('Copper nails', crew);
  const { number } = await crew.ask(startEntry, { params: { build }, body: { day: '2026-05-02' } });
  const params = { build, number };
  const desk = await crew.ask(readDesk, { params });
  expect(desk).toMatchObject({ entry: { number, hasWorking: true, published: false, href: null, document: { day: '2026-05-02', title: '' } }, people: [{ handle: 'maud' }, { handle: 'pike' }], materials: [{ name: 'Copper nails' }] });
  const document = dayOf('2026-05-02', [boughtBlock([{ of: nails, amount: '1 box', money: '41.50' }]), usedBlock([{ of: nails, amount: '204' }]), timeBlock([{ time: '7 h 30' }])], { title: 'Nails driven', lead: 'Twelve to a rib.' });
  const saved = await crew.ask(saveWorking, { params, body: { version: desk.entry.version, document } });
  expect((await site.visitor().ask(readBuild, { params: { build } }))).toMatchObject({ days: 0, figures: { spent: 0 } });
  const { version, href } = await crew.ask(signOffEntry, { params, body: { version: saved.version, document: saved.document } });
  expect(href).toBe(`/builds/${build}/nails-driven`);
  // 204 of 500 for 41.50: 16.932
  expect(await site.visitor().ask(readBuild, { params: { build } })).toMatchObject({ days: 1, minutes: 450, figures: { spent: 4150, used: 1693, left: 2457, receipts: 1, materialsLeft: 1 } });
  const { number: next } = await owner.ask(startEntry, { params: { build }, body: { day: '2026-05-03', stage: null } });
  expect(await owner.ask(readLastTime, { params: { build, number: next } })).toMatchObject({ title: 'Nails driven', used: [{ amount: '204' }], time: [{ time: '7 h 30' }] });
  await owner.ask(discardWorking, { params: { build, number: next }, body: { version: 1 } });
  await owner.ask(takeBackEntry, { params, body: { version } });
  expect(await site.visitor().ask(readBuild, { params: { build } })).toMatchObject({ days: 0, figures: { spent: 0, left: 0, receipts: 0 } });
  expect((await owner.ask(readDesk, { params })).entry).toMatchObject({ published: false, hasWorking: true, document: { title: 'Nails driven' } });
  expect((await verifyLedger(site.orm.em.fork())).differences).toEqual([]);
});

test('a hundred days started at once get a hundred numbers', async () => {
  const em = site.orm.em.fork();
  const { version } = await em.findOneOrFail(Build, { slug: build });
  const dayAt = (at: number) => new Date(Date.UTC(2025, 0, 1 + at)).toISOString().slice(0, 10);
  const started = await Promise.all(Array.from({ length: 100 }, (_, at) => (at % 2 ? owner : crew).ask(startEntry, { params: { build }, body: { day: dayAt(at) } })));
  const numbers = started.map(({ number }) => number);
  expect(new Set(numbers).size).toBe(100);
  const rows = await em.execute<{ sequence: number }[]>(`select sequence from entry where number in (${numbers.join(', ')})`);
  expect(new Set(rows.map(({ sequence }) => sequence)).size).toBe(100);
  // numbering is no change of the build's settings
  expect((await site.orm.em.fork().findOneOrFail(Build, { slug: build })).version).toBe(version);
});

test('a save over a newer one answers 409 with what stands there, and nothing is lost', async () => {
  const { number } = await owner.ask(startEntry, { params: { build }, body: { day: '2026-05-05' } });
  const params = { build, number };
  const { entry: { version } } = await owner.ask(readDesk, { params });
  await crew.ask(saveWorking, { params, body: { version, document: dayOf('2026-05-05', [], { title: 'Theirs' }) } });
  for (const endpoint of [saveWorking, signOffEntry] as const) {
    const problem = await owner.refused(endpoint, { params, body: { version, document: dayOf('2026-05-05', [], { title: 'Mine' }) } });
    expect(problem).toMatchObject({ status: 409, code: 'newer-exists', newer: { version: version + 1, document: { title: 'Theirs' } } });
  }
});

test('a signed-out save, a stranger and a day that is none are told so', async () => {
  const { number } = await owner.ask(startEntry, { params: { build }, body: { day: '2026-05-06' } });
  const params = { build, number };
  const body = { version: 1, document: dayOf('2026-05-06', []) };
  expect(await site.visitor().refused(saveWorking, { params, body })).toMatchObject({ status: 401, code: 'sign-in-needed' });
  expect(await (await site.as({ handle: 'gull' })).refused(saveWorking, { params, body })).toMatchObject({ status: 403 });
  for (const endpoint of [readDesk, readLastTime, previewEntry] as const) expect(await (await site.as({ handle: 'gull' })).refused(endpoint, { params })).toMatchObject({ status: 404 });
  expect(await owner.refused(readDesk, { params: { build, number: 9999 } })).toMatchObject({ status: 404 });
  expect(await owner.refused(startEntry, { params: { build }, body: { day: '2026-02-30' } })).toMatchObject({ status: 422, fields: { day: expect.any(String) } });
  expect(await owner.refused(startEntry, { params: { build }, body: { day: '2026-05-06', stage: 77 } })).toMatchObject({ status: 422, fields: { stage: 'Pick a stage of this build.' } });
});

test('a document of a shape that is none of ours is refused before anything is read', async () => {
  const { number } = await owner.ask(startEntry, { params: { build }, body: { day: '2026-05-07' } });
  const hostile = (node: unknown) => owner.send('PUT', `/api/builds/${build}/entries/${number}/working`, { version: 1, document: { ...dayOf('2026-05-07', []), content: [node] } });
  const link = { type: 'link', attrs: { href: 'javascript:alert(1)' } };
  for (const node of [
    { type: 'script', attrs: { id: 'script' } }, { type: 'paragraph', attrs: { id: 'words1' }, content: [{ type: 'text', text: 'x', marks: [link] }] },
    { type: 'used', attrs: { id: 'used-x', version: 99, data: { lines: [] } } }, { type: 'heading', attrs: { id: 'head1', level: '9" onclick=1' } },
  ]) expect((await hostile(node)).status).toBe(422);
});

test('one material a name: added twice at once, the second is told so beside the name', async () => {
  const outcomes = await Promise.all(['Roves', ' roves ', 'ROVES'].map((name) => owner.call(addMaterial, { body: { build, name, dimension: 'count', unit: '', packs: [] } })));
  expect(outcomes.filter(({ ok }) => ok)).toHaveLength(1);
  const [refused] = outcomes.flatMap((outcome) => (outcome.ok ? [] : [outcome.problem]));
  expect(refused).toMatchObject({ status: 409, code: 'already-taken', fields: { name: expect.stringMatching(/already/) } });
});

test('packs are read as typed, in the build’s measures, and faults stand beside their fields', async () => {
  const paint = await owner.ask(addMaterial, { body: { build, name: 'Topside paint', dimension: 'volume', unit: 'tin', packs: [{ name: 'tin', amount: '2.5 l' }, { name: 'can', amount: '1 gal' }], hazards: ['solvent'] } });
  // an imperial gallon is 4.54609 l
  expect(paint).toMatchObject({ unit: 'tin', packs: [{ name: 'tin', amount: '2500/1' }, { name: 'can', amount: '454609/100' }], ratio: null, hazards: ['solvent'] });
  const problem = await owner.refused(addMaterial, { body: { build, name: 'Primer', dimension: 'volume', unit: 'furlong', packs: [{ name: 'tin', amount: '1,5 l' }, { name: 'Tin', amount: '3 kg' }] } });
  expect(Object.keys(problem.fields ?? {}).toSorted()).toEqual(['packs.0.amount', 'packs.1.amount', 'packs.1.name', 'unit']);
  const seen = await crew.ask(readMyMaterials, { query: { build } });
  expect(seen.materials.map(({ name }) => name)).toContain('Topside paint');
  expect((await crew.ask(readMyMaterials)).materials).toEqual([]);
  expect(await (await site.as({ handle: 'gull' })).refused(readMyMaterials, { query: { build } })).toMatchObject({ status: 404 });
});
