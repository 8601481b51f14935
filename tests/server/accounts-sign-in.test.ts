import { hash, verify } from '@node-rs/argon2';
import { afterAll, beforeAll, beforeEach, describe, expect, test, vi } from 'vitest';
import { changeAccount, readAccount, readSession, signIn, signOut } from '#contracts/session.ts';
import { HttpSession, Person } from '#server/entities/index.ts';
import { createDemoPeople, demoAddress, demoPeople } from '#server/features/accounts/demo-people.ts';
import { hashPassword } from '#server/features/accounts/password.ts';
import { createPerson } from '#server/features/accounts/people.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

// The package itself works as ever; its calls are counted.
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

const right = (handle: string) => ({ email: `${handle}@people.example`, password: `four brass cleats of ${handle}` });
const rows = () => site.orm.em.fork();

describe('signing in', () => {
  test('gives a session that says who it is, by address in any case', async () => {
    await site.as({ handle: 'wren' });
    const browser = site.visitor();
    const { viewer } = await browser.ask(signIn, { body: { ...right('wren'), email: ' Wren@People.Example ' } });
    expect(viewer).toEqual({ handle: 'wren', name: 'wren', role: 'member', suspended: false });
    expect((await browser.ask(readSession)).viewer).toEqual(viewer);
  });

  test('sets a cookie that scripts and other sites do not get', async () => {
    await site.as({ handle: 'wren' });
    const answer = await site.visitor().send('POST', '/api/session', right('wren'));
    const [cookie = ''] = answer.headers.getSetCookie();
    expect(cookie).toMatch(/^tallywright=s%3A[\w-]{32}\./);
    expect(cookie.split('; ').slice(1).map((part) => part.split('=')[0])).toEqual(['Path', 'Expires', 'HttpOnly', 'SameSite']);
    expect(cookie).toContain('SameSite=Lax');
    expect(answer.headers.get('cache-control')).toBe('no-store');
  });

  test('where the site is reached by https, the cookie is for this host and for https only', async () => {
    const secure = await startTestServer({ env: { PUBLIC_URL: 'https://log.example', TRUST_PROXY: '1' } });
    try {
      const headers = { origin: 'https://log.example', 'x-forwarded-proto': 'https', 'content-type': 'application/json' };
      const body = JSON.stringify({ name: 'Wren', handle: 'wren', ...right('wren') });
      const answer = await secure.visitor().fetch('/api/accounts', { method: 'POST', headers, body });
      expect(answer.status).toBe(200);
      const [cookie = ''] = answer.headers.getSetCookie();
      expect(cookie).toMatch(/^__Host-tallywright=/);
      expect(cookie.split('; ')).toEqual(expect.arrayContaining(['Path=/', 'HttpOnly', 'Secure', 'SameSite=Lax']));
      expect(cookie).not.toContain('Domain');
    } finally {
      await secure.close();
    }
  });

  test('takes a new session id each time and forgets the old one', async () => {
    const browser = await site.as({ handle: 'rook' });
    const before = browser.cookies.header();
    await browser.ask(signIn, { body: right('rook') });
    expect(browser.cookies.header()).not.toBe(before);
    const old = await site.visitor().get('/api/session', { cookie: before });
    expect(old.json()).toMatchObject({ viewer: null });
    const person = await rows().findOneOrFail(Person, { handle: 'rook' });
    expect(await rows().count(HttpSession, { person: person.id })).toBe(1);
  });

  test('never takes a session id that a browser brings along', async () => {
    await site.as({ handle: 'wren' });
    const brought = `tallywright=s%3A${'x'.repeat(32)}.${'y'.repeat(43)}`;
    const answer = await site.visitor().fetch('/api/session', {
      method: 'POST', headers: { cookie: brought, 'content-type': 'application/json' }, body: JSON.stringify(right('wren')),
    });
    expect(answer.headers.getSetCookie().join()).not.toContain('x'.repeat(32));
  });

  test('keeps no session id as it stands in the cookie', async () => {
    const browser = await site.as({ handle: 'wren' });
    const id = /s%3A([\w-]{32})/.exec(browser.cookies.header())?.[1] ?? 'none';
    const stored = await rows().find(HttpSession, {});
    expect(stored.length).toBeGreaterThan(0);
    expect(JSON.stringify(stored)).not.toContain(id);
  });

  test('a visitor who only reads gets no cookie', async () => {
    expect((await site.visitor().get('/api/session')).headers.getSetCookie()).toEqual([]);
  });
});

describe('what does not go together', () => {
  test.each([
    ['a wrong password', { email: 'wren@people.example', password: 'four brass cleats of robin' }],
    ['an address nobody has', { email: 'nobody@people.example', password: 'four brass cleats of robin' }],
    ['an account that only has a provider', { email: 'provided@people.example', password: 'four brass cleats of robin' }],
  ])('%s gets the same words after the same work', async (_what, body) => {
    await site.as({ handle: 'wren' });
    const em = rows();
    if ((await em.count(Person, { handle: 'provided' })) === 0) {
      createPerson(em, { handle: 'provided', name: 'P', email: 'provided@people.example', githubId: '5' });
      await em.flush();
    }
    vi.mocked(hash).mockClear();
    vi.mocked(verify).mockClear();
    const browser = site.visitor();
    expect(await browser.refused(signIn, { body })).toEqual({
      requestId: expect.any(String),
      type: 'urn:tallywright:problem:wrong-sign-in', title: 'wrong sign in', status: 422, code: 'wrong-sign-in',
      detail: 'This address and this password do not go together. Check both and try again.',
    });
    expect([vi.mocked(hash).mock.calls.length, vi.mocked(verify).mock.calls.length]).toEqual([0, 1]);
    expect(browser.cookies.header()).toBe('');
  });

  test('the hash that stands in for an unknown account costs what a real one costs', async () => {
    await site.visitor().refused(signIn, { body: { email: 'nobody@people.example', password: 'four brass cleats' } });
    const standIn = String(vi.mocked(verify).mock.calls[0]?.[0]);
    // OWASP Password Storage Cheat Sheet: argon2id, 19 MiB (19456 KiB), 2 passes, 1 lane at the least
    const least = '$argon2id$v=19$m=19456,t=2,p=1$';
    expect(standIn.startsWith(least)).toBe(true);
    expect((await hashPassword('four brass cleats')).startsWith(least)).toBe(true);
  });

  test('an empty form is told what each field wants', async () => {
    expect((await site.visitor().refused(signIn, { body: { email: '', password: '' } })).fields).toEqual({ email: 'Give your e-mail address.', password: 'Give your password.' });
  });
});

test('the demo people sign in with one password, hashed once, each in their role', async () => {
  const em = rows();
  vi.mocked(hash).mockClear();
  await createDemoPeople(em, 'three turns of twine', new Date());
  await em.flush();
  expect(vi.mocked(hash).mock.calls).toHaveLength(1);
  const roles: Record<string, string> = {};
  for (const { key } of demoPeople) {
    const { viewer } = await site.visitor().ask(signIn, { body: { email: demoAddress(key), password: 'three turns of twine' } });
    roles[`${key} ${viewer.handle}`] = viewer.role;
  }
  expect(roles).toEqual({ 'restorer marlow': 'member', 'crew ines': 'member', 'reader harker': 'member', 'moderator petra': 'moderator', 'administrator sol': 'administrator' });
});

describe('signing out', () => {
  test('ends the session on both sides', async () => {
    const browser = await site.as({ handle: 'dunlin' });
    const before = browser.cookies.header();
    const answer = await browser.send('DELETE', '/api/session', {});
    expect(answer.status).toBe(200);
    expect(answer.headers.getSetCookie()).toEqual(['tallywright=; Path=/; Expires=Thu, 01 Jan 1970 00:00:00 GMT; HttpOnly; SameSite=Lax']);
    expect((await site.visitor().get('/api/session', { cookie: before })).json()).toMatchObject({ viewer: null });
  });

  test('is no fault for somebody who is not signed in', async () => {
    expect(await site.visitor().ask(signOut)).toEqual({ ok: true });
  });
});

describe('a suspended person', () => {
  test('signs in, reads, and writes nothing until it is over', async () => {
    await site.as({ handle: 'shrike' });
    await rows().nativeUpdate(Person, { handle: 'shrike' }, { suspendedUntil: new Date(Date.now() + 60_000) });
    const browser = site.visitor();
    expect((await browser.ask(signIn, { body: right('shrike') })).viewer.suspended).toBe(true);
    expect((await browser.ask(readAccount)).handle).toBe('shrike');
    expect(await browser.refused(changeAccount, { body: { about: 'x' } })).toMatchObject({ status: 403, code: 'suspended' });
    await rows().nativeUpdate(Person, { handle: 'shrike' }, { suspendedUntil: new Date(Date.now() - 1000) });
    expect(await browser.ask(changeAccount, { body: { about: 'x' } })).toEqual({ ok: true });
    expect(await browser.ask(signOut)).toEqual({ ok: true });
  });
});

describe('what another site sends', () => {
  const body = () => JSON.stringify(right('wren'));
  const json = { 'content-type': 'application/json' };
  test.each([
    ['an origin that is not ours', { origin: 'https://elsewhere.example', 'sec-fetch-site': 'same-origin' }],
    ['a browser that says it came across sites', { 'sec-fetch-site': 'cross-site' }],
    ['a browser that says it came from a neighbour of our domain', { 'sec-fetch-site': 'same-site' }],
    ['an origin kept secret', { origin: 'null', 'sec-fetch-site': 'cross-site' }],
  ])('%s is refused, by the API as by a form', async (_what, headers: Record<string, string>) => {
    await site.as({ handle: 'wren' });
    const api = await site.visitor().fetch('/api/session', { method: 'POST', headers: { ...json, ...headers }, body: body() });
    expect([api.status, api.json()]).toEqual([403, expect.objectContaining({ code: 'cross-site' })]);
    const form = await site.visitor().fetch('/sign-in', { method: 'POST', headers, body: new URLSearchParams(right('wren')) });
    expect([form.status, form.headers.getSetCookie()]).toEqual([403, []]);
  });

  test('a program that is no browser sends neither and is let in', async () => {
    await site.as({ handle: 'wren' });
    const answer = await fetch(`${site.url}/api/session`, { method: 'POST', headers: json, body: body() });
    expect(answer.status).toBe(200);
  });
});
