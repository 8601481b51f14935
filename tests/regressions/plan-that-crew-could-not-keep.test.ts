import { afterAll, beforeAll, expect, test } from 'vitest';
import { readStages, startBuild } from '#contracts/builds.ts';
import { Build, Person } from '#server/entities/index.ts';
import { joinCrew } from '#server/features/builds/builds.service.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

// Crew were shown the whole plan as a form, filled it in, and were told at the end that it was not theirs to keep.
let site: TestServer;
let build: string;
beforeAll(async () => {
  site = await startTestServer({ pages: 'source' });
  ({ slug: build } = await (await site.as({ handle: 'maud' })).ask(startBuild, { body: { kind: 'boat', title: 'Lugger', currency: 'GBP', measures: 'imperial' } }));
  await site.as({ handle: 'pike' });
  const em = site.orm.em.fork();
  await joinCrew(em, await em.findOneOrFail(Build, { slug: build }), (await em.findOneOrFail(Person, { handle: 'pike' })).id);
});
afterAll(() => site.close());

test('the form of the plan is the restorer’s: crew are told so, and others find nothing', async () => {
  const pageFor = async (handle: string) => (await site.as({ handle })).get(`/builds/${build}/plan`);
  const [owner, crew, stranger] = [await pageFor('maud'), await pageFor('pike'), await pageFor('gull')];
  expect([owner.status, crew.status, stranger.status]).toEqual([200, 403, 404]);
  expect(crew.text).not.toContain('Keep the plan');
  expect((await (await site.as({ handle: 'pike' })).get(`/builds/${build}`)).text).not.toContain(`/builds/${build}/plan`);
  // they still pick a stage for the day they write up
  expect(await (await site.as({ handle: 'pike' })).ask(readStages, { params: { build } })).toMatchObject({ stages: [] });
});

test('work is counted in a unit that work can be counted in', async () => {
  const owner = await site.as({ handle: 'maud' });
  const { version } = await owner.ask(readStages, { params: { build } });
  const stage = { id: null, title: 'Ribs', plannedMoney: '', plannedTime: '', plannedWork: '4', workUnit: 'furlong', workKind: 'rib', done: false };
  const answer = await owner.send('PUT', `/api/builds/${build}/stages`, { stages: [stage], version });
  expect([answer.status, answer.json()]).toEqual([422, expect.objectContaining({ fields: { 'stages.0.workUnit': 'Pick what it is counted in.' } })]);
});
