import { afterAll, beforeAll, expect, test } from 'vitest';
import { changeBuild, changeStages, readBuildSettings, readStages, startBuild } from '#contracts/builds.ts';
import type { TestClient } from '#tests/support/test-client.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

// A form of settings that came back as out of date held the version of the newer ones: sent a second time it went over them unseen. The plan had no version at all.
let site: TestServer;
let owner: TestClient;
let build: string;
beforeAll(async () => {
  site = await startTestServer({ pages: 'source' });
  owner = await site.as({ handle: 'maud' });
  ({ slug: build } = await owner.ask(startBuild, { body: { kind: 'boat', title: 'Lugger', currency: 'GBP', measures: 'imperial' } }));
});
afterAll(() => site.close());

function valueOf(html: string, name: string): string | undefined {
  const [element] = new RegExp(`<(?:input|button)[^>]* name="${name}"[^>]*>`).exec(html) ?? [];
  return element && /value="([^"]*)"/.exec(element)?.[1];
}

test('settings saved over newer ones are refused until the person says whose to keep', async () => {
  const address = `/builds/${build}/settings`;
  const version = valueOf((await owner.get(address)).text, 'version') ?? '';
  const settings = () => owner.ask(readBuildSettings, { params: { build } });
  await owner.ask(changeBuild, { params: { build }, body: { lead: 'From the other window.', version: Number(version) } });
  const mine = { lead: 'Mine.', title: 'Lugger', version };
  const first = await owner.submit(address, mine);
  expect([first.status, valueOf(first.text, 'version')]).toEqual([409, version]);
  const second = await owner.submit(address, { ...mine, version: valueOf(first.text, 'version') ?? '' });
  expect(second.status).toBe(409);
  expect((await settings()).lead).toBe('From the other window.');
  const over = valueOf(second.text, 'over') ?? '';
  expect(over).toBe(String((await settings()).version));
  expect((await owner.submit(address, { ...mine, over })).status).toBe(303);
  expect((await settings()).lead).toBe('Mine.');
});

test('a plan kept over a newer one is refused until the person says whose to keep', async () => {
  const address = `/builds/${build}/plan`;
  const stage = { id: null, title: 'Ribs', plannedMoney: '', plannedTime: '', plannedWork: '', workUnit: 'piece' as const, workKind: '', done: false };
  const version = valueOf((await owner.get(address)).text, 'version') ?? '';
  const titles = async () => (await owner.ask(readStages, { params: { build } })).stages.map(({ title }) => title);
  await owner.ask(changeStages, { params: { build }, body: { stages: [stage], version: (await owner.ask(readStages, { params: { build } })).version } });
  const mine = { count: '1', 'stages.0.id': '', 'stages.0.title': 'Planking', version };
  const first = await owner.submit(address, mine);
  expect([first.status, valueOf(first.text, 'version'), first.text.includes('Planking')]).toEqual([409, version, true]);
  expect((await owner.submit(address, mine)).status).toBe(409);
  expect(await titles()).toEqual(['Ribs']);
  expect((await owner.submit(address, { ...mine, over: valueOf(first.text, 'over') ?? '' })).status).toBe(303);
  expect(await titles()).toEqual(['Planking']);
});

test('a plan without a version is refused', async () => {
  expect((await owner.send('PUT', `/api/builds/${build}/stages`, { stages: [] })).status).toBe(422);
});
