import { request } from 'node:http';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

// One proxy is trusted, so that a test can come from any address it likes.

let site: TestServer;
beforeAll(async () => {
  site = await startTestServer({ limits: true, pages: 'source', env: { TRUST_PROXY: '1' } });
});
afterAll(() => site.close());

let places = 0;
const somewhere = () => {
  places += 1;
  return `203.0.113.${places}`;
};
/** Somebody of the test's own, with a right and a wrong way to sign in. */
async function somebody(handle: string) {
  await site.as({ handle });
  const right = { email: `${handle}@people.example`, password: `four brass cleats of ${handle}` };
  // an empty password is a wrong try like any other, and is found wrong before anything slow is done
  return { right, wrong: { ...right, password: 'five brass cleats' }, empty: { ...right, password: '' } };
}

const json = (path: string, from: string, body: unknown) =>
  site.visitor().fetch(path, { method: 'POST', headers: { 'content-type': 'application/json', 'x-forwarded-for': from }, body: JSON.stringify(body) });
const form = (path: string, from: string, fields: Record<string, string>) =>
  site.visitor().fetch(path, { method: 'POST', headers: { 'x-forwarded-for': from }, body: new URLSearchParams(fields) });
async function times<T>(count: number, run: (index: number) => Promise<T>): Promise<T[]> {
  const all: T[] = [];
  for (let index = 0; index < count; index += 1) all.push(await run(index));
  return all;
}

/** The path exactly as given: `fetch` would tidy it first. */
function rawForm(path: string, from: string, fields: Record<string, string>): Promise<{ status: number; cookies: string[] }> {
  const { hostname, port, origin } = new URL(site.url);
  return new Promise((resolve, reject) => {
    const headers = { origin, 'x-forwarded-for': from, 'content-type': 'application/x-www-form-urlencoded' };
    request({ hostname, port, path, method: 'POST', headers }, (answer) => {
      answer.resume();
      answer.on('end', () => resolve({ status: answer.statusCode ?? 0, cookies: answer.headers['set-cookie'] ?? [] }));
    }).on('error', reject).end(new URLSearchParams(fields).toString());
  });
}

describe('wrong passwords for one address', () => {
  test('are taken ten times from one place, by the API and the page together', async () => {
    const { right, wrong } = await somebody('wren');
    const place = somewhere();
    expect((await times(5, () => json('/api/session', place, wrong))).map(({ status }) => status)).toEqual(Array(5).fill(422));
    expect((await times(5, () => form('/sign-in', place, wrong))).map(({ status }) => status)).toEqual(Array(5).fill(422));
    const api = await json('/api/session', place, right);
    expect([api.status, api.json()]).toEqual([429, expect.objectContaining({ code: 'too-many', detail: 'Too many tries. Wait 10 minutes and try again.' })]);
    expect(Number(api.headers.get('retry-after'))).toBeGreaterThan(0);
    // in capitals and with spaces it is the same address
    expect((await json('/api/session', place, { ...right, email: ' WREN@people.example' })).status).toBe(429);
    expect((await json('/api/session', somewhere(), right)).status).toBe(200);
    expect((await json('/api/session', place, { ...wrong, email: 'robin@people.example' })).status).toBe(422);
  });

  test('past the limit the page comes back with what was typed and the reason', async () => {
    const { right, empty } = await somebody('dipper');
    const place = somewhere();
    await times(10, () => json('/api/session', place, empty));
    const page = await form('/sign-in?next=%2Fsettings', place, right);
    expect(page.status).toBe(429);
    expect(page.text).toContain('Too many tries. Wait 10 minutes and try again.');
    expect(page.text).toContain('value="dipper@people.example"');
    expect(page.text).not.toContain(right.password);
    expect(page.headers.getSetCookie()).toEqual([]);
  });

  test('no way of writing the page\'s address gets around it', async () => {
    const { right, empty } = await somebody('serin');
    const place = somewhere();
    await times(10, () => json('/api/session', place, empty));
    const ways = ['/sign-in', '/sign-in/', '/SIGN-IN', '/sign%2Din', '/%73ign-in', '/x/../sign-in', '/./sign-in', '//elsewhere.example/sign-in', '/sign-in?next=%2F', '/sign-in?%'];
    for (const path of ways) {
      const answer = await rawForm(path, place, right);
      expect([path, answer.cookies]).toEqual([path, []]);
      expect([404, 429]).toContain(answer.status);
    }
    expect((await rawForm('/sign-in', somewhere(), right)).status).toBe(303);
  });

  test('are taken a hundred times from anywhere', async () => {
    const { empty: body } = await somebody('hunted');
    const statuses = (await times(100, (index) => json('/api/session', `198.51.100.${index}`, body))).map(({ status }) => status);
    expect(new Set(statuses)).toEqual(new Set([422]));
    expect((await json('/api/session', somewhere(), body)).json()).toMatchObject({ code: 'too-many', detail: 'Too many tries. Wait an hour and try again.' });
  });
});

test('one place has thirty wrong tries at any addresses', async () => {
  const place = somewhere();
  const statuses = (await times(31, (index) => json('/api/session', place, { email: `guess${index}@people.example`, password: '' }))).map(({ status }) => status);
  expect(statuses).toEqual([...Array<number>(30).fill(422), 429]);
});

test('right ones are not counted', async () => {
  const { right } = await somebody('linnet');
  const place = somewhere();
  expect(new Set((await times(35, () => json('/api/session', place, right))).map(({ status }) => status))).toEqual(new Set([200]));
});

test('an address of the sixth version counts with its neighbours, which one line can take at will', async () => {
  const { empty } = await somebody('brambling');
  await times(10, (index) => json('/api/session', `2001:db8:0:${index}::1`, empty));
  expect((await json('/api/session', '2001:db8:0:ff::1', empty)).status).toBe(429);
  expect((await json('/api/session', '2001:db8:ffff::1', empty)).status).toBe(422);
});

test('twenty tries to sign up an hour come from one place, right ones among them', async () => {
  const place = somewhere();
  const signUp = (password: string) => json('/api/accounts', place, { name: 'Teal', handle: 'teal', email: 'teal@people.example', password });
  expect((await signUp('a bucket of brass screws')).status).toBe(200);
  const statuses = (await times(20, () => signUp(''))).map(({ status }) => status);
  expect(statuses).toEqual([...Array<number>(19).fill(422), 429]);
});

test('ten wrong tries at changing a password are one person\'s, wherever they come from', async () => {
  const browser = await site.as({ handle: 'pipit' });
  const change = (from: string) => browser.fetch('/api/account/password', {
    method: 'POST', headers: { 'content-type': 'application/json', 'x-forwarded-for': from },
    body: JSON.stringify({ current: 'five brass cleats', password: '' }),
  });
  const statuses = (await times(11, () => change(somewhere()))).map(({ status }) => status);
  expect(statuses).toEqual([...Array<number>(10).fill(422), 429]);
});

test('what is sent to sign in with is small', async () => {
  const { right } = await somebody('redpoll');
  expect((await json('/api/session', somewhere(), { ...right, more: 'x'.repeat(20_000) })).status).toBe(413);
});
