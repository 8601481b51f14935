import { expect, test } from 'vitest';
import { startBuild } from '#contracts/builds.ts';
import { startEntry } from '#contracts/entries.ts';
import { sendHostileBodies } from '#tests/support/hostile-bodies.ts';
import { startTestServer } from '#tests/support/test-server.ts';

test('random and hostile bodies over every endpoint get an answer one can act on (a short sample; the long run is in tests/long)', { timeout: 60_000 }, async () => {
  const site = await startTestServer();
  const owner = await site.as({ handle: 'owner' });
  const { slug } = await owner.ask(startBuild, { body: { kind: 'boat', title: 'Hostile boat', currency: 'GBP', measures: 'imperial' } });
  await owner.ask(startEntry, { params: { build: slug }, body: { day: '2026-06-14' } });
  const sent = await sendHostileBodies(site.table, [site.visitor(), owner, await site.as({ handle: 'other' })], 400, 20_261_201);
  await site.close();
  // it must reach past the first refusal to mean anything: some are taken, some are refused by their fields
  expect(sent.some(({ status }) => status === 200)).toBe(true);
  expect(sent.some(({ status }) => status === 422)).toBe(true);
});
