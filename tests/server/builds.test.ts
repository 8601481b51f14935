import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { archiveBuild, changeBuild, changeStages, readBuild, readBuilds, readBuildSettings, readMyBuilds, readStages, startBuild } from '#contracts/builds.ts';
import { readDesk, signOffEntry, startEntry } from '#contracts/entries.ts';
import { pluralOf } from '#server/features/builds/work-kinds.service.ts';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';
import type { TestClient } from '#tests/support/test-client.ts';
import { costBlock, dayOf } from '#tests/support/workshop.ts';

let site: TestServer;
let owner: TestClient;
let other: TestClient;
beforeAll(async () => {
  site = await startTestServer();
  owner = await site.as({ handle: 'owner' });
  other = await site.as({ handle: 'other' });
});
afterAll(() => site.close());

const start = (title: string, changes = {}) => owner.ask(startBuild, { body: { kind: 'boat', title, currency: 'GBP', measures: 'imperial', ...changes } });
async function signedOff(slug: string, document: EntryDocument): Promise<void> {
  const { number } = await owner.ask(startEntry, { params: { build: slug }, body: { day: document.day } });
  const { entry } = await owner.ask(readDesk, { params: { build: slug, number } });
  await owner.ask(signOffEntry, { params: { build: slug, number }, body: { version: entry.version, document } });
}
const blankStage = { id: null, title: '', plannedMoney: '', plannedTime: '', plannedWork: '', workUnit: 'piece' as const, workKind: '', done: false };
const planVersion = async (slug: string) => (await owner.ask(readStages, { params: { build: slug } })).version;

describe('a build', () => {
  test('says beside each field what needs mending, all at once', async () => {
    const outcome = await owner.call(startBuild, { body: { kind: 'boat', title: ' ', currency: 'XAU', measures: 'imperial', year: 12 } });
    expect(outcome).toMatchObject({ ok: false, status: 422, problem: { code: 'bad-input', fields: { title: 'Give the build a name.', year: 'Give a year, such as 1961.' } } });
    // XAU is gold: on the ISO 4217 list without a minor unit, so no money to keep a ledger in
    expect(await owner.call(startBuild, { body: { kind: 'boat', title: 'Golden', currency: 'XAU', measures: 'imperial' } })).toMatchObject({ ok: false, problem: { fields: { currency: expect.stringContaining('ISO 4217') as string } } });
  });

  test('refuses settings saved over newer ones', async () => {
    const { slug } = await start('Twice saved');
    const { version } = await owner.ask(readBuildSettings, { params: { build: slug } });
    await owner.ask(changeBuild, { params: { build: slug }, body: { lead: 'First.', version } });
    expect(await owner.call(changeBuild, { params: { build: slug }, body: { lead: 'Second.', version } })).toMatchObject({ ok: false, status: 409, problem: { code: 'newer-exists' } });
    expect((await owner.ask(readBuildSettings, { params: { build: slug } })).lead).toBe('First.');
  });

  test('keeps its currency once money is written down', async () => {
    const { slug } = await start('Paid in pounds');
    await signedOff(slug, dayOf('2026-06-14', [costBlock([{ label: 'Crane', money: '80.00' }])]));
    const settings = await owner.ask(readBuildSettings, { params: { build: slug } });
    expect(settings.currencyFixed).toBe(true);
    expect(await owner.call(changeBuild, { params: { build: slug }, body: { currency: 'EUR', version: settings.version } })).toMatchObject({ ok: false, status: 422, problem: { fields: { currency: expect.stringContaining('GBP') as string } } });
  });

  test('is put away and brought back out', async () => {
    const { slug } = await start('Put away');
    const listed = async () => (await other.ask(readBuilds)).builds.some((card) => card.slug === slug);
    await owner.ask(archiveBuild, { params: { build: slug }, body: { archived: true } });
    expect(await listed()).toBe(false);
    expect(await other.ask(readBuild, { params: { build: slug } })).toMatchObject({ archived: true });
    await owner.ask(archiveBuild, { params: { build: slug }, body: { archived: false } });
    expect(await listed()).toBe(true);
  });

  test('is its restorer\u2019s to settle: others get 403 for what they would change, and 404 for what they may not see', async () => {
    const { slug } = await start('Settled');
    const hidden = await start('Settled in private', { visibility: 'private' });
    expect((await other.call(changeBuild, { params: { build: slug }, body: { lead: 'Mine now.', version: 1 } })).status).toBe(403);
    expect((await other.call(readBuildSettings, { params: { build: hidden.slug } })).status).toBe(404);
    expect((await other.call(changeStages, { params: { build: slug }, body: { stages: [], version: '' } })).status).toBe(403);
    for (const endpoint of [readBuildSettings, readStages] as const) expect((await other.call(endpoint, { params: { build: slug } })).status).toBe(404);
    expect((await other.ask(readMyBuilds)).builds).toEqual([]);
  });
});

describe('stages', () => {
  test('keep their order and what is planned, read as people write it', async () => {
    const { slug } = await start('Planned');
    const stages = [
      { ...blankStage, title: 'Ribs', plannedMoney: '£110.00', plannedTime: '30 h', plannedWork: '24', workKind: 'steamed rib' },
      { ...blankStage, title: 'Planking', plannedMoney: '1,180', plannedTime: '7 h 30 min' },
    ];
    await owner.ask(changeStages, { params: { build: slug }, body: { stages, version: await planVersion(slug) } });
    const { stages: kept } = await owner.ask(readStages, { params: { build: slug } });
    expect(kept.map(({ title, plannedMoney, plannedMinutes, plannedWork, workKind }) => [title, plannedMoney, plannedMinutes, plannedWork, workKind])).toEqual([
      ['Ribs', 11_000, 1800, '24', 'steamed rib'], ['Planking', 118_000, 450, null, null],
    ]);
    await owner.ask(changeStages, { params: { build: slug }, body: { stages: kept.toReversed().map((stage, index) => ({ ...blankStage, ...stages[1 - index], id: stage.id })), version: await planVersion(slug) } });
    expect((await owner.ask(readStages, { params: { build: slug } })).stages.map(({ title }) => title)).toEqual(['Planking', 'Ribs']);
  });

  test('with a fault change nothing, and say which field of which stage', async () => {
    const { slug } = await start('Faulty plan');
    const outcome = await owner.call(changeStages, { params: { build: slug }, body: { stages: [{ ...blankStage, title: 'Ribs' }, { ...blankStage, title: 'Planking', plannedMoney: '1,5', plannedTime: 'a while', plannedWork: '3' }], version: await planVersion(slug) } });
    expect(outcome).toMatchObject({ ok: false, status: 422, problem: { fields: {
      'stages.1.plannedMoney': 'Write 1.5 with a point.', 'stages.1.plannedTime': expect.any(String) as string, 'stages.1.workKind': expect.any(String) as string,
    } } });
    expect((await owner.ask(readStages, { params: { build: slug } })).stages).toEqual([]);
  });

  test('that hold days stay when they are left out', async () => {
    const { slug } = await start('Kept stage');
    await owner.ask(changeStages, { params: { build: slug }, body: { stages: [{ ...blankStage, title: 'Ribs' }], version: await planVersion(slug) } });
    const [stage] = (await owner.ask(readStages, { params: { build: slug } })).stages;
    await signedOff(slug, dayOf('2026-06-14', [], { stage: stage?.id ?? null }));
    expect(await owner.call(changeStages, { params: { build: slug }, body: { stages: [], version: await planVersion(slug) } })).toMatchObject({ ok: false, status: 409, problem: { code: 'in-use' } });
    expect((await owner.ask(readStages, { params: { build: slug } })).stages).toHaveLength(1);
  });
});

test.each([
  ['steamed rib', 'steamed ribs'], ['panel coated', 'panels coated'], ['frame joint', 'frame joints'], ['batch', 'batches'], ['bearing scraped', 'bearings scraped'], ['assembly', 'assemblies'], ['day', 'days'],
])('one %s, many %s', (one, many) => {
  expect(pluralOf(one)).toBe(many);
});
