import pino from 'pino';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { HttpSession, Job } from '#server/entities/index.ts';
import { jobHandlers } from '#server/features/jobs.ts';
import type { JobHandlers, JobRun } from '#server/jobs/handler.ts';
import { queueJob } from '#server/jobs/queue.ts';
import { startJobs, type JobPace, type JobRunner } from '#server/jobs/runner.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

const secondMs = 1000;
const pace: JobPace = { pollMs: 60_000, retryMs: 30 * secondMs, longestRetryMs: 100 * secondMs, attempts: 4, staleMs: 60 * secondMs };

let site: TestServer;
let clock = new Date('2026-11-14T12:00:00Z');
const running: JobRunner[] = [];
beforeAll(async () => {
  site = await startTestServer();
});
afterAll(() => site.close());
beforeEach(async () => {
  clock = new Date('2026-11-14T12:00:00Z');
  await site.orm.em.fork().nativeDelete(Job, {});
});
afterEach(async () => {
  await Promise.all(running.splice(0).map((runner) => runner.stop()));
});

const later = (ms: number) => {
  clock = new Date(clock.getTime() + ms);
};
function start(handlers: JobHandlers, changed: Partial<JobPace> = {}): JobRunner {
  const runner = startJobs({ orm: site.orm, log: pino({ level: 'silent' }), now: () => clock }, handlers, { ...pace, ...changed });
  running.push(runner);
  return runner;
}
async function queue(kind: string, payload: Record<string, unknown> = {}, runAt: Date = clock): Promise<void> {
  const em = site.orm.em.fork();
  queueJob(em, kind, payload, runAt);
  await em.flush();
}
const rows = (where: Partial<{ kind: string }> = {}) => site.orm.em.fork().find(Job, where, { orderBy: { id: 'asc' } });
const only = async () => {
  const [row, ...others] = await rows();
  if (!row || others.length > 0) throw new Error(`One job was expected, and there are ${others.length + (row ? 1 : 0)}`);
  return row;
};
const nothing = () => Promise.resolve();

test('work is done once, in the order it fell due, and written down as done', async () => {
  const done: unknown[] = [];
  await queue('note', { n: 2 }, new Date(clock.getTime() - 1));
  await queue('note', { n: 3 });
  await queue('note', { n: 1 }, new Date(clock.getTime() - 2));
  await start({ note: { run: ({ n }) => Promise.resolve(void done.push(n)) } }).idle();
  expect(done).toEqual([1, 2, 3]);
  expect((await rows()).map(({ doneAt, claimedAt, attempts }) => [doneAt?.getTime(), claimedAt, attempts])).toEqual(done.map(() => [clock.getTime(), null, 1]));
  await start({ note: { run: ({ n }) => Promise.resolve(void done.push(n)) } }).idle();
  expect(done).toHaveLength(3);
});

test('a job is kept only if its cause is', async () => {
  const failing = site.orm.em.fork().transactional(async (em) => {
    queueJob(em, 'note');
    await em.flush();
    throw new Error('the cause came to nothing');
  });
  await expect(failing).rejects.toThrow('the cause came to nothing');
  expect(await rows()).toEqual([]);
});

test('work is not begun before its time, nor by a runner that does not know it', async () => {
  let runs = 0;
  const runner = start({ note: { run: () => Promise.resolve(void (runs += 1)) } });
  await queue('note', {}, new Date(clock.getTime() + 5 * secondMs));
  await queue('of a newer version');
  await runner.idle();
  expect(runs).toBe(0);
  later(5 * secondMs);
  await runner.idle();
  expect(runs).toBe(1);
  expect((await rows({ kind: 'of a newer version' }))[0]).toMatchObject({ attempts: 0, doneAt: null, claimedAt: null });
});

describe('work that fails', () => {
  test('is tried again after longer and longer, and given up with its reason', async () => {
    const attempts: number[] = [];
    const runner = start({ note: { run: (_payload, job) => {
      attempts.push(job.attempt);
      return Promise.reject(new Error(`no paper, ${job.attempt}`));
    } } });
    await queue('note');
    const waits: number[] = [];
    for (let round = 1; round < pace.attempts; round += 1) {
      await runner.idle();
      const row = await only();
      expect(row).toMatchObject({ attempts: round, failure: `no paper, ${round}`, claimedAt: null, givenUpAt: null });
      const wait = row.runAt.getTime() - clock.getTime();
      waits.push(wait / secondMs);
      later(wait - 1);
      await runner.idle();
      expect(attempts).toHaveLength(round);
      later(1);
    }
    expect(waits).toEqual([30, 60, 100]);
    await runner.idle();
    expect(await only()).toMatchObject({ attempts: 4, failure: 'no paper, 4', doneAt: null, givenUpAt: clock });
    later(3_600 * secondMs);
    await runner.idle();
    expect(attempts).toEqual([1, 2, 3, 4]);
  });

  test('and then goes well leaves no reason behind', async () => {
    let first = true;
    const runner = start({ note: { run: () => {
      const failing = first;
      first = false;
      return failing ? Promise.reject(new Error('no paper')) : nothing();
    } } });
    await queue('note');
    await runner.idle();
    later(30 * secondMs);
    await runner.idle();
    expect(await only()).toMatchObject({ attempts: 2, failure: null, doneAt: clock });
  });

  test('does not hold up what comes after it', async () => {
    const done: string[] = [];
    await queue('broken');
    await queue('note');
    await start({ broken: { run: () => Promise.reject(new Error('no')) }, note: { run: () => Promise.resolve(void done.push('note')) } }).idle();
    expect(done).toEqual(['note']);
  });
});

describe('several runners on one queue', () => {
  test('share the work and do none of it twice', async () => {
    const done: unknown[] = [];
    const em = site.orm.em.fork();
    for (let n = 0; n < 40; n += 1) queueJob(em, 'note', { n }, clock);
    await em.flush();
    const handlers: JobHandlers = { note: { run: async ({ n }) => {
      await new Promise((resolve) => setTimeout(resolve, 2));
      done.push(n);
    } } };
    await Promise.all([start(handlers), start(handlers), start(handlers)].map((runner) => runner.idle()));
    expect(done.toSorted((a, b) => Number(a) - Number(b))).toEqual(Array.from({ length: 40 }, (_, n) => n));
    expect((await rows()).every(({ attempts }) => attempts === 1)).toBe(true);
  });

  test('one takes over what a dead one held, once it has been silent long enough', async () => {
    const em = site.orm.em.fork();
    em.persist(em.create(Job, { kind: 'note', payload: {}, runAt: clock, attempts: 1, claimedAt: clock }));
    await em.flush();
    const seen: JobRun[] = [];
    const runner = start({ note: { run: (_payload, job) => Promise.resolve(void seen.push(job)) } });
    later(pace.staleMs);
    await runner.idle();
    expect(seen).toEqual([]);
    later(1);
    await runner.idle();
    expect(seen.map(({ attempt }) => attempt)).toEqual([2]);
    expect(await only()).toMatchObject({ attempts: 2, doneAt: clock });
  });

  test('one that was thought dead does not settle what another has taken over', async () => {
    let release: () => void = () => undefined;
    const slow = start({ note: { run: () => new Promise<void>((resolve) => (release = resolve)) } });
    await queue('note');
    const first = slow.idle();
    await expect.poll(async () => (await only()).attempts).toBe(1);
    later(pace.staleMs + 1);
    await start({ note: { run: () => Promise.reject(new Error('the second try')) } }).idle();
    release();
    await first;
    expect(await only()).toMatchObject({ attempts: 2, doneAt: null, failure: 'the second try' });
  });

  test('one that is still at work keeps its claim', async () => {
    let release: () => void = () => undefined;
    const slow = start({ note: { run: () => new Promise<void>((resolve) => (release = resolve)) } }, { staleMs: 40 });
    await queue('note');
    const first = slow.idle();
    await expect.poll(async () => (await only()).attempts).toBe(1);
    later(30);
    await expect.poll(async () => (await only()).claimedAt).toEqual(clock);
    release();
    await first;
    expect((await only()).doneAt).toEqual(clock);
  });
});

test('work at which the server dies each time is given up and says so', async () => {
  const em = site.orm.em.fork();
  em.persist(em.create(Job, { kind: 'note', payload: {}, runAt: clock, attempts: pace.attempts, claimedAt: new Date(clock.getTime() - pace.staleMs - 1) }));
  await em.flush();
  let runs = 0;
  await start({ note: { run: () => Promise.resolve(void (runs += 1)) } }).idle();
  expect(runs).toBe(0);
  expect(await only()).toMatchObject({ givenUpAt: clock, failure: 'The server stopped each time this was being done.' });
});

describe('stopping', () => {
  test('waits for the work in hand, tells it, and begins no other', async () => {
    const begun: unknown[] = [];
    const runner = start({ note: { run: ({ n }, { signal }) => {
      begun.push(n);
      return new Promise((_resolve, reject) => signal.addEventListener('abort', () => reject(new Error('cut short'))));
    } } });
    await queue('note', { n: 1 });
    await queue('note', { n: 2 });
    const round = runner.idle();
    await expect.poll(() => begun).toEqual([1]);
    await runner.stop();
    await round;
    expect(begun).toEqual([1]);
    // what was cut short is due at once for whoever starts next
    expect((await rows()).map(({ claimedAt, runAt }) => [claimedAt, runAt])).toEqual([[null, clock], [null, clock]]);
  });
});

describe('work that comes round by itself', () => {
  const everyMs = 3_600 * secondMs;

  test('is there once however often the server starts, and again after each round', async () => {
    let runs = 0;
    const handlers: JobHandlers = { sweep: { everyMs, run: () => Promise.resolve(void (runs += 1)) } };
    await start(handlers).idle();
    await start(handlers).idle();
    expect(runs).toBe(1);
    expect((await rows()).filter(({ doneAt }) => doneAt === null).map(({ runAt }) => runAt.getTime() - clock.getTime())).toEqual([everyMs]);
    later(everyMs);
    await start(handlers).idle();
    expect(runs).toBe(2);
  });

  test('goes on after a round that was given up', async () => {
    const handlers: JobHandlers = { sweep: { everyMs, run: () => Promise.reject(new Error('no broom')) } };
    await start(handlers, { attempts: 1 }).idle();
    expect((await rows()).map(({ givenUpAt, runAt }) => [givenUpAt !== null, runAt.getTime() - clock.getTime()])).toEqual([[true, 0], [false, everyMs]]);
  });
});

test('sessions that have run out are dropped, and no others', async () => {
  const people = await site.as({ handle: 'wren' });
  await people.get('/api/session');
  const em = site.orm.em.fork();
  for (const [sid, ms] of [['past', -1], ['future', 1]] as const) em.create(HttpSession, { sid, data: '{}', expiresAt: new Date(clock.getTime() + ms), createdAt: clock }, { persist: true });
  await em.flush();
  const handlers = jobHandlers({ ...site.parts, now: () => clock });
  const prune = handlers['prune-sessions'];
  if (!prune) throw new Error('No job prunes sessions');
  await start({ 'prune-sessions': prune }).idle();
  expect((await em.find(HttpSession, { sid: { $in: ['past', 'future'] } })).map(({ sid }) => sid)).toEqual(['future']);
});

test('work that was done goes a week after; what waits and what was given up stays', async () => {
  const dayMs = 86_400 * secondMs;
  const em = site.orm.em.fork();
  const job = (kind: string, daysAgo: number, end: 'doneAt' | 'givenUpAt' | null) => em.persist(em.create(Job, {
    kind, payload: {}, runAt: new Date(clock.getTime() - daysAgo * dayMs), ...(end ? { [end]: new Date(clock.getTime() - daysAgo * dayMs) } : {}),
  }));
  job('done-long-ago', 8, 'doneAt');
  job('done-lately', 6, 'doneAt');
  job('given-up', 30, 'givenUpAt');
  job('waiting', 30, null);
  await em.flush();
  const pruning = jobHandlers({ ...site.parts, now: () => clock })['prune-jobs'];
  if (!pruning) throw new Error('Nothing prunes the queue.');
  expect(pruning.everyMs).toBe(dayMs);
  await pruning.run({}, { id: 0, attempt: 1, signal: new AbortController().signal });
  expect((await rows()).map(({ kind }) => kind)).toEqual(['done-lately', 'given-up', 'waiting']);
});
