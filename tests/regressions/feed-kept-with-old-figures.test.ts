import { afterAll, beforeAll, expect, test } from 'vitest';
import { changeBuild, readBuildSettings, startBuild } from '#contracts/builds.ts';
import { readDesk, signOffEntry, startEntry } from '#contracts/entries.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';
import { costBlock, dayOf } from '#tests/support/workshop.ts';

// A feed was dated by its words. Hiding costs, or pricing anew, changes no words: a reader that asks by that date alone was told to keep the old figures.
let site: TestServer;
beforeAll(async () => {
  site = await startTestServer();
});
afterAll(() => site.close());

// fetch says no-cache beside a condition, unless told what to say
const asking = { 'cache-control': 'max-age=0' };

test.each(['xml', 'json'])('a reader of feed.%s that asks by date alone gets the figures of now', async (format) => {
  const owner = await site.as({ handle: 'maud' });
  const { slug: build } = await owner.ask(startBuild, { body: { kind: 'boat', title: `Lugger ${format}`, currency: 'GBP', measures: 'imperial' } });
  const { number } = await owner.ask(startEntry, { params: { build }, body: { day: '2026-03-02' } });
  const { entry } = await owner.ask(readDesk, { params: { build, number } });
  await owner.ask(signOffEntry, { params: { build, number }, body: { version: entry.version, document: dayOf('2026-03-02', [costBlock([{ money: '61.00' }])]) } });
  const before = await site.visitor().get(`/builds/${build}/feed.${format}`);
  expect(before.text).toContain('61.00');
  const { version } = await owner.ask(readBuildSettings, { params: { build } });
  await owner.ask(changeBuild, { params: { build }, body: { costsShown: false, version } });
  const since = before.headers.get('last-modified') ?? before.headers.get('date') ?? '';
  const after = await site.visitor().get(`/builds/${build}/feed.${format}`, { ...asking, 'if-modified-since': since });
  expect(after.status).toBe(200);
  expect(after.text).not.toContain('61.00');
  // by its tag, which is of the whole feed, it may still be told that nothing changed
  const tag = after.headers.get('etag') ?? '';
  expect((await site.visitor().get(`/builds/${build}/feed.${format}`, { ...asking, 'if-none-match': tag })).status).toBe(304);
});
