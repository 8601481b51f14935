import { hash, verify } from '@node-rs/argon2';
import { afterAll, beforeAll, beforeEach, describe, expect, test, vi } from 'vitest';
import { readSession, signUp } from '#contracts/session.ts';
import { Person } from '#server/entities/index.ts';
import { handleFrom } from '#server/features/accounts/handles.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

vi.mock('@node-rs/argon2', async (original) => {
  const real = await original<typeof import('@node-rs/argon2')>();
  return { ...real, hash: vi.fn<typeof real.hash>(real.hash), verify: vi.fn<typeof real.verify>(real.verify) };
});

let site: TestServer;
beforeAll(async () => {
  site = await startTestServer();
});
afterAll(() => site.close());
beforeEach(() => {
  vi.mocked(hash).mockClear();
  vi.mocked(verify).mockClear();
});

let count = 0;
/** A sign-up that would do, with some of it changed. */
function form(changed: Partial<Record<'name' | 'handle' | 'email' | 'password', string>> = {}) {
  count += 1;
  return { name: 'Tern Wader', handle: `tern-${count}`, email: `tern${count}@people.example`, password: 'a bucket of brass screws', ...changed };
}
const fieldsOf = async (body: ReturnType<typeof form>) => (await site.visitor().refused(signUp, { body })).fields;

test('somebody who signs up is signed in and hashed, not kept in words', async () => {
  const browser = site.visitor();
  const body = form({ handle: ' Tern-One ', email: ' Tern.One@People.example' });
  expect(await browser.ask(signUp, { body })).toEqual({ viewer: { handle: 'tern-one', name: 'Tern Wader', role: 'member', suspended: false } });
  expect((await browser.ask(readSession)).viewer?.handle).toBe('tern-one');
  const person = await site.orm.em.fork().findOneOrFail(Person, { handle: 'tern-one' });
  expect(person).toMatchObject({ email: 'tern.one@people.example', role: 'member', emailConfirmedAt: null, githubId: null });
  expect(person.passwordHash).toMatch(/^\$argon2id\$/);
});

test('nobody can give themselves a role', async () => {
  const browser = site.visitor();
  await browser.ask(signUp, { body: { ...form({ handle: 'climber' }), role: 'administrator' } as never });
  expect((await site.orm.em.fork().findOneOrFail(Person, { handle: 'climber' })).role).toBe('member');
});

describe('a password', () => {
  test.each([
    ['nine letters', 'ninelette', 'Ten letters or more.'],
    ['two hundred and one letters', 'x'.repeat(201), 'Two hundred letters at most.'],
    // "1234567890" and "qwertyuiop" are in every published list of common passwords
    ['a common one', '1234567890', 'This is on the list of common passwords, which are tried first. Take another.'],
    ['a common one in capitals', 'QWERTYUIOP', 'This is on the list of common passwords, which are tried first. Take another.'],
    ['a common one with figures hung on', 'password123456', 'This is on the list of common passwords, which are tried first. Take another.'],
    ['one letter over and over', 'aaaaaaaaaaaa', 'This is on the list of common passwords, which are tried first. Take another.'],
  ])('of %s is refused', async (_what, password, words) => {
    expect(await fieldsOf(form({ password }))).toEqual({ password: words });
  });

  const own = 'A password is not your name, your handle, your address or the name of this site. Take another.';
  test.each([
    ['the handle', { handle: 'long-tailed-duck', password: 'Long Tailed Duck' }],
    ['the name', { name: 'Marsh Harrier', password: 'marshharrier' }],
    ['the address', { email: 'sand.martin@people.example', password: 'sand.martin@people.example' }],
    ['what stands before the at', { email: 'greenshank1@people.example', password: 'Greenshank1!' }],
    ['the site', { password: 'Tallywright' }],
    ['the site with a year', { password: 'tallywright2026' }],
  ])('that is %s is refused', async (_what, changed) => {
    expect(await fieldsOf(form(changed))).toEqual({ password: own });
  });

  test.each([['ten letters', 'oak & brass'], ['two hundred', 'oak, ash and larch! '.repeat(10)], ['other scripts', 'лодка из дуба и меди']])('of %s will do, just as typed', async (_what, password) => {
    expect((await site.visitor().call(signUp, { body: form({ password }) })).ok).toBe(true);
  });
});

describe('a handle', () => {
  test.each([['ab', 'A handle has three letters or more.'], ['-abc', 'Letters, figures and single hyphens, starting with a letter.'], ['a--b', 'Letters, figures and single hyphens, starting with a letter.'], ['føø-bar', 'Letters, figures and single hyphens, starting with a letter.'], ['x'.repeat(31), 'A handle has thirty letters at most.']])('of %s is refused', async (handle, words) => {
    expect(await fieldsOf(form({ handle }))).toEqual({ handle: words });
  });

  test('that is taken comes back with three that are free', async () => {
    await site.as({ handle: 'avocet' });
    await site.as({ handle: 'avocet-2' });
    expect(await fieldsOf(form({ handle: 'avocet' }))).toEqual({ handle: 'This handle is taken. Free: avocet-3, avocet-shed, avocet-works.' });
  });

  test('of thirty letters is offered with an ending that still fits', async () => {
    const handle = `a${'b'.repeat(29)}`;
    await site.as({ handle });
    expect((await fieldsOf(form({ handle })))?.['handle']).toBe(`This handle is taken. Free: ${handle.slice(0, 28)}-2, ${handle.slice(0, 28)}-3, ${handle.slice(0, 25)}-shed.`);
  });

  test.each(['admin', 'moderator', 'settings', 'tallywright'])('that is the word %s is kept for the site', async (handle) => {
    expect((await fieldsOf(form({ handle })))?.['handle']).toMatch(/^This word is kept for the site\. Free: /);
  });

  test.each([['Bram Ostler', 'bram-ostler'], ['Zoë_Blåtind', 'zoe-blatind'], ['42-things', 'things'], ['龍', '']])('is made of the name %s as %s', (name, handle) => {
    expect(handleFrom(name)).toBe(handle);
  });
});

describe('an address that has an account', () => {
  const words = 'That cannot be used to sign up. If the address is yours, sign in instead.';

  test('is refused in words that do not say so, after the same work', async () => {
    await site.as({ handle: 'knot' });
    vi.mocked(hash).mockClear();
    const browser = site.visitor();
    const problem = await browser.refused(signUp, { body: form({ email: 'KNOT@people.example' }) });
    expect(problem).toMatchObject({ status: 422, code: 'bad-input', fields: { email: words } });
    const refusedWork = vi.mocked(hash).mock.calls.length;
    await site.visitor().ask(signUp, { body: form() });
    expect([refusedWork, vi.mocked(hash).mock.calls.length - refusedWork]).toEqual([1, 1]);
    expect(browser.cookies.header()).toBe('');
  });

  test('makes no difference while anything else needs mending', async () => {
    await site.as({ handle: 'knot' });
    const known = await fieldsOf(form({ email: 'knot@people.example', password: '1234567890' }));
    const unknown = await fieldsOf(form({ password: '1234567890' }));
    expect(known).toEqual(unknown);
  });
});

test('of two who ask for one handle at once, one gets it and one is told', async () => {
  const outcomes = await Promise.all([1, 2, 3].map(() => site.visitor().call(signUp, { body: form({ handle: 'ruff' }) })));
  expect(outcomes.filter(({ ok }) => ok)).toHaveLength(1);
  for (const outcome of outcomes) if (!outcome.ok) expect(outcome.problem.fields?.['handle']).toMatch(/^This handle is taken\./);
});

test('of two who ask with one address at once, one gets in and one is told in the same words', async () => {
  const outcomes = await Promise.all([1, 2].map(() => site.visitor().call(signUp, { body: form({ email: 'twins@people.example' }) })));
  expect(outcomes.filter(({ ok }) => ok)).toHaveLength(1);
  for (const outcome of outcomes) if (!outcome.ok) expect(outcome.problem.fields).toEqual({ email: 'That cannot be used to sign up. If the address is yours, sign in instead.' });
});
