import { expect, test } from 'vitest';
import { startBuild } from '#contracts/builds.ts';
import { startEntry } from '#contracts/entries.ts';
import { sendHostileBodies } from '#tests/support/hostile-bodies.ts';
import { startTestServer } from '#tests/support/test-server.ts';

test('ten thousand random and hostile bodies over every endpoint', async () => {
  const site = await startTestServer();
  const owner = await site.as({ handle: 'owner' });
  const { slug } = await owner.ask(startBuild, { body: { kind: 'boat', title: 'Hostile boat', currency: 'GBP', measures: 'imperial' } });
  await owner.ask(startEntry, { params: { build: slug }, body: { day: '2026-06-14' } });
  const sent = await sendHostileBodies(site.table, [site.visitor(), owner, await site.as({ handle: 'other' })], 10_000, Date.now());
  await site.close();
  expect(sent.length).toBeGreaterThan(9000);
});
