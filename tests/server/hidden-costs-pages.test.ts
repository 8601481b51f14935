import { expect, test } from 'vitest';
import { startBuild } from '#contracts/builds.ts';
import { readDesk, signOffEntry, startEntry } from '#contracts/entries.ts';
import { addMaterial } from '#contracts/materials.ts';
import { startTestServer } from '#tests/support/test-server.ts';
import { boughtBlock, costBlock, dayOf, timeBlock, usedBlock } from '#tests/support/workshop.ts';

test('hidden costs are in no page as a browser gets it, its state for scripts included', { timeout: 60_000 }, async () => {
  const site = await startTestServer({ pages: 'source' });
  const owner = await site.as({ handle: 'owner' });
  const { slug } = await owner.ask(startBuild, { body: { kind: 'boat', title: 'Quiet boat', currency: 'GBP', measures: 'imperial', costsShown: false } });
  const oak = await owner.ask(addMaterial, { body: { build: slug, name: 'Oak', dimension: 'count', unit: 'piece', packs: [] } });
  const { number } = await owner.ask(startEntry, { params: { build: slug }, body: { day: '2026-06-14' } });
  const { entry } = await owner.ask(readDesk, { params: { build: slug, number } });
  const document = dayOf('2026-06-14', [
    boughtBlock([{ of: oak, amount: '20', unit: 'piece', money: '68.00' }]), usedBlock([{ of: oak, amount: '17', unit: 'piece' }]),
    timeBlock([{ name: 'Wren', time: '1 h 7 min' }]), costBlock([{ label: 'Steamer', money: '12.34' }]),
  ], { title: 'Quiet day', work: { amount: '17', unit: 'piece', kind: 'steamed rib' } });
  const { href } = await owner.ask(signOffEntry, { params: { build: slug, number }, body: { version: entry.version, document } });
  for (const path of [href, `/builds/${slug}`, '/', '/builds', `/builds?kind=boat`]) {
    const { text, status } = await site.visitor().get(path);
    expect(status).toBe(200);
    // 68.00 bought, 57.80 used, 12.34 hired, 10.20 left, 70.14 and 80.34 in all, 3.40 for one
    expect(text, path).not.toMatch(/£|68\.00|6800\b|57\.80|5780|12\.34|1234|1020\b|7014|8034|\b340\b/);
  }
  expect((await site.visitor().get(href)).text).toContain('1 h 7 min');
  expect((await owner.get(href)).text).toContain('£57.80');
  await site.close();
});
