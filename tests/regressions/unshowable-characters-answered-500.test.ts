import { expect, test } from 'vitest';
import { startBuild } from '#contracts/builds.ts';
import { readDesk, saveWorking, startEntry } from '#contracts/entries.ts';
import { startTestServer } from '#tests/support/test-server.ts';
import { dayOf } from '#tests/support/workshop.ts';

test('a NUL, a half surrogate or a turned-around text is answered beside its field and not by a fault', async () => {
  const site = await startTestServer();
  const owner = await site.as({ handle: 'owner' });
  for (const title of ['a\u0000b', 'half \ud800', 'turned \u202Eround']) {
    const outcome = await owner.call(startBuild, { body: { kind: 'boat', title, currency: 'GBP', measures: 'imperial' } });
    expect(outcome).toMatchObject({ ok: false, status: 422, problem: { fields: { title: expect.stringContaining('cannot be shown') as string } } });
  }
  const { slug } = await owner.ask(startBuild, { body: { kind: 'boat', title: 'Plain', currency: 'GBP', measures: 'imperial' } });
  const { number } = await owner.ask(startEntry, { params: { build: slug }, body: { day: '2026-06-14' } });
  const { entry } = await owner.ask(readDesk, { params: { build: slug, number } });
  const saved = await owner.call(saveWorking, { params: { build: slug, number }, body: { version: entry.version, document: dayOf('2026-06-14', [], { lead: 'a\u0000b' }) } });
  expect(saved).toMatchObject({ ok: false, status: 422, problem: { fields: { 'document.lead': expect.any(String) as string } } });
  // letters of every script, marks and line ends are nobody's business
  expect((await owner.call(startBuild, { body: { kind: 'boat', title: 'القارب القديم ½ 🛶', lead: 'two\nlines', currency: 'GBP', measures: 'imperial' } })).ok).toBe(true);
  await site.close();
});
