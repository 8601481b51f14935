import { afterAll, beforeAll, expect, test } from 'vitest';
import { discardWorking, readDesk, saveWorking, signOffEntry, startEntry, takeBackEntry } from '#contracts/entries.ts';
import { startBuild } from '#contracts/builds.ts';
import { Entry, EntryAddress } from '#server/entities/index.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';
import { dayOf } from '#tests/support/workshop.ts';

// Throwing a working copy away asked for no version: a text that somebody saved meanwhile went with it, and of an entry
// that had been taken back also its permanent address and the guid its readers know it by.
let site: TestServer;
beforeAll(async () => {
  site = await startTestServer();
});
afterAll(() => site.close());

const day = '2026-03-02';
async function opened() {
  const owner = await site.as({ handle: 'maud' });
  const { slug: build } = await owner.ask(startBuild, { body: { kind: 'boat', title: 'Lugger', currency: 'GBP', measures: 'imperial' } });
  const { number } = await owner.ask(startEntry, { params: { build }, body: { day } });
  const params = { build, number };
  return { owner, params, version: (await owner.ask(readDesk, { params })).entry.version };
}

test('a text saved since is not thrown away: both are there to choose from', async () => {
  const { owner, params, version } = await opened();
  await owner.ask(saveWorking, { params, body: { version, document: dayOf(day, [], { title: 'Typed meanwhile' }) } });
  expect(await owner.refused(discardWorking, { params, body: { version } })).toMatchObject({ code: 'newer-exists', newer: { document: { title: 'Typed meanwhile' } } });
  expect((await owner.ask(readDesk, { params })).entry.document.title).toBe('Typed meanwhile');
});

test('without a version nothing is thrown away', async () => {
  const { owner, params } = await opened();
  expect((await owner.send('DELETE', `/api/builds/${params.build}/entries/${params.number}/working`, {})).status).toBe(422);
  expect((await owner.ask(readDesk, { params })).entry.hasWorking).toBe(true);
});

test('an entry that readers once had keeps its address and its guid, and opens blank', async () => {
  const { owner, params, version } = await opened();
  const signed = await owner.ask(signOffEntry, { params, body: { version, document: dayOf(day, [], { title: 'Ribs in' }) } });
  const entryNow = () => site.orm.em.fork().findOneOrFail(Entry, { build: { slug: params.build }, number: params.number });
  const { guid } = await entryNow();
  const back = await owner.ask(takeBackEntry, { params, body: { version: signed.version } });
  await owner.ask(discardWorking, { params, body: { version: back.version } });
  expect(await entryNow()).toMatchObject({ guid, slug: 'ribs-in', working: null, workingAt: null, published: null, title: '' });
  const address = await site.orm.em.fork().findOneOrFail(EntryAddress, { build: { slug: params.build }, slug: 'ribs-in' }, { populate: ['entry'] });
  expect(address.entry?.guid).toBe(guid);
  const { entry } = await owner.ask(readDesk, { params });
  expect(entry).toMatchObject({ hasWorking: false, published: false, href: null, document: { title: '', day } });
  const again = await owner.ask(signOffEntry, { params, body: { version: entry.version, document: dayOf(day, [], { title: 'Ribs in' }) } });
  expect(again.href).toBe(signed.href);
});
