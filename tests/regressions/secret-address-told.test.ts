import { afterAll, beforeAll, expect, test } from 'vitest';
import { changeBuild, readBuild, readBuildSettings, startBuild } from '#contracts/builds.ts';
import { readDesk, readEntryPage, signOffEntry, startEntry } from '#contracts/entries.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';
import { dayOf } from '#tests/support/workshop.ts';

// A public build made unlisted got an address that cannot be guessed, and its old one, which can, told it to everybody.
let site: TestServer;
beforeAll(async () => {
  site = await startTestServer();
});
afterAll(() => site.close());

test('the old addresses of an unlisted build lead on for its crew, and for others are not there', async () => {
  const owner = await site.as({ handle: 'maud' });
  const { slug: old } = await owner.ask(startBuild, { body: { kind: 'boat', title: 'Quiet skiff', currency: 'GBP', measures: 'imperial' } });
  const { number } = await owner.ask(startEntry, { params: { build: old }, body: { day: '2026-03-02' } });
  const { entry: { version: first } } = await owner.ask(readDesk, { params: { build: old, number } });
  await owner.ask(signOffEntry, { params: { build: old, number }, body: { version: first, document: dayOf('2026-03-02', [], { title: 'Keel laid' }) } });
  const { version } = await owner.ask(readBuildSettings, { params: { build: old } });
  const { slug: secret } = await owner.ask(changeBuild, { params: { build: old }, body: { visibility: 'unlisted', version } });
  expect(await owner.ask(readBuild, { params: { build: old } })).toEqual({ movedTo: `/builds/${secret}` });
  const visitor = site.visitor();
  for (const client of [visitor, await site.as({ handle: 'gull' })]) {
    const answers = [
      await client.get(`/api/builds/${old}`), await client.get(`/api/builds/${old}/pages/keel-laid`), await client.get(`/builds/${old}/feed.xml`), await client.get(`/builds/${old}/feed.json`),
    ];
    expect(answers.map(({ status, headers }) => [status, headers.get('location')])).toEqual(answers.map(() => [404, null]));
    expect(answers.map(({ text }) => text).join('')).not.toContain(secret);
  }
  expect(await visitor.ask(readEntryPage, { params: { build: secret, entry: 'keel-laid' } })).toMatchObject({ title: 'Keel laid' });
});
