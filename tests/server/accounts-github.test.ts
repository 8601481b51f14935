import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { changePassword, readAccount, readJoining, readSession, signUpWithGithub } from '#contracts/session.ts';
import { Person } from '#server/entities/index.ts';
import type { TestClient } from '#tests/support/test-client.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

// The exchange is spoken in full, over sockets, with the provider's stand-in that comes with the site.

let site: TestServer;
beforeAll(async () => {
  site = await startTestServer();
});
afterAll(() => site.close());

const bram = '71001';
const tamsinUnconfirmed = '71002';
const marlow = '71003';

function hiddenFields(markup: string): Record<string, string> {
  const fields = [...markup.matchAll(/name="(\w+)" value="([^"]*)"/g)].map(([, name = '', value = '']) => [name, value] as const);
  return Object.fromEntries(fields.filter(([name]) => name !== 'person'));
}
const locationOf = (answer: { headers: Headers }) => answer.headers.get('location') ?? '';
const pathAt = (location: string) => location.replace(site.url, '');

/** To the provider and back to the gate: the address the provider sends the browser to. */
async function askedAtGithub(browser: TestClient, person: string, next = ''): Promise<string> {
  const away = await browser.get(`/sign-in/github${next && `?next=${encodeURIComponent(next)}`}`);
  expect(away.status).toBe(302);
  const choice = await browser.get(pathAt(locationOf(away)));
  expect(choice.status).toBe(200);
  const back = await browser.submit('/fake-github/login/oauth/authorize', { ...hiddenFields(choice.text), person });
  return pathAt(locationOf(back));
}
/** The whole way: where the site leads in the end. */
async function throughGithub(browser: TestClient, person: string, next = ''): Promise<string> {
  const answer = await browser.get(await askedAtGithub(browser, person, next));
  expect(answer.status).toBe(303);
  return locationOf(answer);
}
const personBy = (row: Partial<Record<'handle' | 'githubId' | 'email', string>>) => site.orm.em.fork().findOne(Person, row);

describe('signing up with GitHub', () => {
  test('leads from the choice of a person to the choice of a handle, and on to where one was going', async () => {
    const browser = site.visitor();
    expect(await throughGithub(browser, bram, '/builds?kind=boat')).toBe('/sign-up?next=%2Fbuilds%3Fkind%3Dboat');
    expect((await browser.ask(readSession)).viewer).toBeNull();
    expect(await browser.ask(readJoining)).toEqual({ joining: { name: 'Bram Ostler', handle: 'bram-ostler', email: 'bram@ostler.example' } });

    expect((await browser.refused(signUpWithGithub, { body: { name: 'Bram', handle: 'admin' } })).fields?.['handle']).toMatch(/^This word is kept/);
    const before = browser.cookies.header();
    expect((await browser.ask(signUpWithGithub, { body: { name: 'Bram', handle: 'bram' } })).viewer).toMatchObject({ handle: 'bram', name: 'Bram' });
    expect(browser.cookies.header()).not.toBe(before);
    expect(await browser.ask(readJoining)).toEqual({ joining: null });
    const person = await personBy({ handle: 'bram' });
    expect(person).toMatchObject({ githubId: bram, email: 'bram@ostler.example', passwordHash: null });
    expect(person?.emailConfirmedAt).toBeInstanceOf(Date);

    const later = site.visitor();
    expect(await throughGithub(later, bram, '/my-builds')).toBe('/my-builds');
    expect((await later.ask(readSession)).viewer?.handle).toBe('bram');
  });

  test('cannot be finished by a browser that did not begin it', async () => {
    expect((await site.visitor().refused(signUpWithGithub, { body: { name: 'Bram', handle: 'brambling' } })).detail).toBe('This sign-up was begun too long ago. Start again with GitHub.');
  });

  test('needs an address that GitHub has confirmed', async () => {
    const browser = site.visitor();
    expect(await throughGithub(browser, tamsinUnconfirmed)).toBe('/sign-in?github=no-address');
    expect(await browser.ask(readJoining)).toEqual({ joining: null });
  });

  test('can be turned down at GitHub', async () => {
    expect(await throughGithub(site.visitor(), '', '/settings')).toBe('/sign-in?github=refused&next=%2Fsettings');
  });
});

describe('an address that has an account here', () => {
  test('is not enough to get into that account, nor to be joined to it', async () => {
    const owner = await site.as({ handle: 'finch' });
    await site.orm.em.fork().nativeUpdate(Person, { handle: 'finch' }, { email: 'restorer@demo.example' });
    const browser = site.visitor();
    expect(await throughGithub(browser, marlow)).toBe('/sign-in?github=address-taken');
    expect((await browser.ask(readSession)).viewer).toBeNull();
    expect((await personBy({ handle: 'finch' }))?.githubId).toBeNull();

    expect(await throughGithub(owner, marlow)).toBe('/settings?github=joined');
    expect(await owner.ask(readAccount)).toMatchObject({ github: true });
    expect(await throughGithub(browser, marlow)).toBe('/');
    expect((await browser.ask(readSession)).viewer?.handle).toBe('finch');
  });

  test('that came to have one while the handle was being chosen is refused as well', async () => {
    const late = site.visitor();
    await site.orm.em.fork().nativeUpdate(Person, { githubId: bram }, { githubId: null, email: 'was-bram@people.example' });
    expect(await throughGithub(late, bram)).toBe('/sign-up');
    await site.orm.em.fork().nativeUpdate(Person, { email: 'was-bram@people.example' }, { email: 'bram@ostler.example' });
    expect(await late.refused(signUpWithGithub, { body: { name: 'Bram', handle: 'bram-late' } })).toMatchObject({ status: 409, code: 'already-taken' });
    expect(await personBy({ handle: 'bram-late' })).toBeNull();
    await site.orm.em.fork().nativeUpdate(Person, { email: 'bram@ostler.example' }, { githubId: bram });
  });
});

describe('joining in settings', () => {
  test('takes no GitHub account that somebody else has, and no second one', async () => {
    await site.orm.em.fork().nativeUpdate(Person, { githubId: marlow }, { githubId: null, email: 'finch@people.example' });
    const browser = await site.as({ handle: 'siskin' });
    expect(await throughGithub(browser, bram)).toBe('/settings?github=someone-else');
    expect(await throughGithub(browser, tamsinUnconfirmed)).toBe('/settings?github=joined');
    expect(await throughGithub(browser, marlow)).toBe('/settings?github=another-joined');
    expect((await personBy({ handle: 'siskin' }))?.githubId).toBe(tamsinUnconfirmed);
  });

  test('is not for the suspended', async () => {
    const browser = await site.as({ handle: 'crossbill' });
    await site.orm.em.fork().nativeUpdate(Person, { handle: 'crossbill' }, { suspendedUntil: new Date(Date.now() + 60_000) });
    expect(await throughGithub(browser, marlow)).toBe('/settings?github=suspended');
    expect((await personBy({ handle: 'crossbill' }))?.githubId).toBeNull();
  });
});

describe('coming back with something else than was sent', () => {
  const changed = (path: string, name: string, value: string | null) => {
    const url = new URL(path, site.url);
    if (value === null) url.searchParams.delete(name);
    else url.searchParams.set(name, value);
    return url.pathname + url.search;
  };
  const outcomeOf = async (browser: TestClient, path: string) => locationOf(await browser.get(path));

  test.each([['another state', 'state', 'x'.repeat(24)], ['no state', 'state', null], ['no code', 'code', null]])('%s signs nobody in', async (_what, name, value) => {
    const browser = site.visitor();
    const back = await askedAtGithub(browser, bram);
    expect(await outcomeOf(browser, changed(back, name, value))).toBe('/sign-in?github=lost');
    expect((await browser.ask(readSession)).viewer).toBeNull();
  });

  test('a code that GitHub did not give signs nobody in', async () => {
    const browser = site.visitor();
    expect(await outcomeOf(browser, changed(await askedAtGithub(browser, bram), 'code', 'made-up'))).toBe('/sign-in?github=failed');
  });

  test('what was begun in another browser is not finished in this one', async () => {
    const back = await askedAtGithub(site.visitor(), bram);
    expect(await outcomeOf(site.visitor(), back)).toBe('/sign-in?github=lost');
    // with a round of its own begun: another state, and a proof key that does not fit the code
    const victim = site.visitor();
    const own = await askedAtGithub(victim, marlow);
    const ownState = new URL(own, site.url).searchParams.get('state');
    expect(await outcomeOf(victim, changed(back, 'state', ownState))).toBe('/sign-in?github=failed');
    expect((await victim.ask(readSession)).viewer).toBeNull();
  });

  test('a way back is good once', async () => {
    const browser = site.visitor();
    const back = await askedAtGithub(browser, bram);
    expect(await outcomeOf(browser, back)).toBe('/');
    const again = site.visitor();
    expect(await outcomeOf(again, back)).toBe('/sign-in?github=lost');
  });

  test('a session that was changed in between does not take a join begun before', async () => {
    const browser = await site.as({ handle: 'twite' });
    const back = await askedAtGithub(browser, marlow);
    await browser.ask(changePassword, { body: { current: 'four brass cleats of twite', password: 'nine copper rivets' } });
    expect(await outcomeOf(browser, back)).toBe('/settings?github=lost');
    expect((await personBy({ handle: 'twite' }))?.githubId).toBeNull();
  });
});

test('another site cannot send a browser off to GitHub', async () => {
  const answer = await site.visitor().get('/sign-in/github?next=/settings', { 'sec-fetch-site': 'cross-site' });
  expect([answer.status, locationOf(answer), answer.headers.getSetCookie()]).toEqual([303, '/sign-in?next=%2Fsettings', []]);
});

test('nobody is sent on to another site afterwards', async () => {
  for (const next of ['//elsewhere.example', '/\\elsewhere.example', 'https://elsewhere.example', '/.//elsewhere.example', '/\t/elsewhere.example']) {
    expect(await throughGithub(site.visitor(), bram, next)).toBe('/');
  }
});

describe('a site that is open to the world', () => {
  test('has no stand-in, and no button without GitHub of its own', async () => {
    const open = await startTestServer({ env: { PUBLIC_URL: 'https://log.example', TRUST_PROXY: '1' } });
    try {
      expect(await open.visitor().ask(readSession)).toEqual({ viewer: null, demo: false, github: false });
      for (const path of ['/sign-in/github', '/sign-in/github/callback', '/fake-github/login/oauth/authorize', '/fake-github/user']) {
        expect((await open.visitor().get(path)).status).toBe(404);
      }
    } finally {
      await open.close();
    }
  });

  test('with GitHub of its own asks GitHub, with state, a proof key and its own address', async () => {
    const open = await startTestServer({ env: { PUBLIC_URL: 'https://log.example', GITHUB_CLIENT_ID: 'the-id', GITHUB_CLIENT_SECRET: 'the-secret', TRUST_PROXY: '1' } });
    try {
      expect((await open.visitor().ask(readSession)).github).toBe(true);
      const away = new URL(locationOf(await open.visitor().get('/sign-in/github', { 'x-forwarded-proto': 'https' })));
      expect(away.origin + away.pathname).toBe('https://github.com/login/oauth/authorize');
      expect(Object.fromEntries(away.searchParams)).toMatchObject({
        client_id: 'the-id', response_type: 'code', scope: 'user:email', code_challenge_method: 'S256',
        redirect_uri: 'https://log.example/sign-in/github/callback', state: expect.stringMatching(/.{20}/), code_challenge: expect.stringMatching(/.{43}/),
      });
      expect(away.href).not.toContain('the-secret');
      expect((await open.visitor().get('/fake-github/user')).status).toBe(404);
    } finally {
      await open.close();
    }
  });
});
