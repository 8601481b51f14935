import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { readSession } from '#contracts/session.ts';
import { Person } from '#server/entities/index.ts';
import type { TestClient } from '#tests/support/test-client.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

// The pages as a browser without scripts meets them: plain forms posted to their own address.

let site: TestServer;
beforeAll(async () => {
  site = await startTestServer({ pages: 'source' });
});
afterAll(() => site.close());

const right = (handle: string) => ({ email: `${handle}@people.example`, password: `four brass cleats of ${handle}` });
const whoIs = async (browser: TestClient) => (await browser.ask(readSession)).viewer?.handle ?? null;
const locationOf = (answer: { headers: Headers }) => answer.headers.get('location');

describe('the sign-in page', () => {
  test('signs in and goes on to where one was going', async () => {
    await site.as({ handle: 'wren' });
    const browser = site.visitor();
    const asked = await browser.get('/settings');
    expect([asked.status, locationOf(asked)]).toEqual([302, '/sign-in?next=%2Fsettings']);
    const answer = await browser.submit('/sign-in?next=%2Fsettings', right('wren'));
    expect([answer.status, locationOf(answer)]).toEqual([303, '/settings']);
    expect(await whoIs(browser)).toBe('wren');
    const again = await browser.get('/sign-in?next=%2Fsettings');
    expect([again.status, locationOf(again)]).toEqual([302, '/settings']);
  });

  test.each(['//elsewhere.example', '/\\elsewhere.example', 'https://elsewhere.example', '/.//elsewhere.example', '/\t/elsewhere.example'])('does not send anybody on to %j', async (next) => {
    await site.as({ handle: 'wren' });
    const browser = site.visitor();
    const path = `/sign-in?next=${encodeURIComponent(next)}`;
    expect((await browser.get(path)).text).not.toContain('href="/sign-up?next');
    expect(locationOf(await browser.submit(path, right('wren')))).toBe('/');
    expect(locationOf(await browser.get(path))).toBe('/');
  });

  test('comes back with the address typed, without the password, and says what is wrong', async () => {
    const answer = await site.visitor().submit('/sign-in', { email: '"><b>wren@people.example', password: 'five brass cleats' });
    expect(answer.status).toBe(422);
    expect(answer.text).toContain('This address and this password do not go together. Check both and try again.');
    expect(answer.text).toContain('value="&quot;&gt;&lt;b&gt;wren@people.example"');
    expect(answer.text).not.toContain('five brass cleats');
  });

  test('leads from the summary to each field, which names its words', async () => {
    const { text } = await site.visitor().submit('/sign-in', { email: '', password: '' });
    expect(text).toContain('href="#field-email"');
    expect(text).toMatch(/id="field-email"[^>]*aria-describedby="field-email-error"[^>]*aria-invalid="true"|aria-describedby="field-email-error"[^>]*aria-invalid="true"[^>]*id="field-email"/);
    expect(text).toContain('2 things need mending');
  });

  test('says how a way by GitHub ended, in words of ours only', async () => {
    expect((await site.visitor().get('/sign-in?github=address-taken')).text).toContain('Sign in first, then join GitHub in settings.');
    expect((await site.visitor().get('/sign-in?github=constructor')).text).not.toContain('role="status"');
  });

  test('lists the demo people while it is the demo, and is kept by nobody', async () => {
    const page = await site.visitor().get('/sign-in');
    for (const who of ['restorer', 'crew', 'reader', 'moderator', 'administrator']) expect(page.text).toContain(`${who}@demo.example`);
    expect(page.text).toContain('href="/sign-in/github"');
    const open = await startTestServer({ pages: 'source', env: { PUBLIC_URL: 'https://log.example', TRUST_PROXY: '1' } });
    try {
      const { text } = await open.visitor().get('/sign-in');
      expect(text).toContain('Sign in');
      expect(text).not.toMatch(/demo\.example|\/sign-in\/github/);
    } finally {
      await open.close();
    }
  });
});

describe('the sign-up page', () => {
  test('signs up and in', async () => {
    const browser = site.visitor();
    const answer = await browser.submit('/sign-up?next=%2Fwrite', { name: 'Tern', handle: 'tern', email: 'tern@people.example', password: 'a bucket of brass screws' });
    expect([answer.status, locationOf(answer)]).toEqual([303, '/write']);
    expect(await whoIs(browser)).toBe('tern');
  });

  test('keeps everything typed but the password', async () => {
    const { status, text } = await site.visitor().submit('/sign-up', { name: 'Tern & Co', handle: 'admin', email: 'tern', password: 'short' });
    expect(status).toBe(422);
    for (const kept of ['value="Tern &amp; Co"', 'value="admin"', 'value="tern"']) expect(text).toContain(kept);
    for (const words of ['That does not look like an e-mail address.', 'Ten letters or more.']) expect(text).toContain(words);
    expect(text).not.toContain('value="short"');
  });

  test('finishes what was begun at GitHub', async () => {
    const browser = site.visitor();
    const away = await browser.get('/sign-in/github');
    const choice = await browser.get((locationOf(away) ?? '').replace(site.url, ''));
    const fields = Object.fromEntries([...choice.text.matchAll(/type="hidden" name="(\w+)" value="([^"]*)"/g)].map(([, name, value]) => [name, value]));
    const back = await browser.submit('/fake-github/login/oauth/authorize', { ...fields, person: '71001' });
    await browser.get((locationOf(back) ?? '').replace(site.url, ''));
    const page = await browser.get('/sign-up');
    expect(page.text).toContain('Finish signing up');
    expect(page.text).toContain('value="bram-ostler"');
    expect(page.text).not.toContain('type="password"');
    expect((await browser.get('/sign-up?with=email')).text).toContain('type="password"');
    expect((await browser.submit('/sign-up', { form: 'github', name: 'Bram', handle: 'x' })).status).toBe(422);
    expect(locationOf(await browser.submit('/sign-up', { form: 'github', name: 'Bram', handle: 'bram' }))).toBe('/');
    expect(await whoIs(browser)).toBe('bram');
  });
});

describe('the sign-out page', () => {
  test('signs out by its button only', async () => {
    await site.as({ handle: 'wren' });
    const browser = site.visitor();
    await browser.submit('/sign-in', right('wren'));
    expect((await browser.get('/sign-out')).text).toContain('You are signed in as wren.');
    expect(await whoIs(browser)).toBe('wren');
    expect(locationOf(await browser.submit('/sign-out', {}))).toBe('/');
    expect(await whoIs(browser)).toBeNull();
  });
});

describe('the settings page', () => {
  test('saves the profile and says so', async () => {
    const browser = await site.as({ handle: 'plover' });
    const answer = await browser.submit('/settings', { form: 'profile', name: 'Ringed Plover', about: 'Old lathes & new belts.' });
    expect([answer.status, locationOf(answer)]).toEqual([303, '/settings?done=profile']);
    const { text } = await browser.get('/settings?done=profile');
    for (const shown of ['Profile saved.', 'value="Ringed Plover"', 'Old lathes &amp; new belts.']) expect(text).toContain(shown);
  });

  test('keeps what was typed in the form that was wrong, and shows the others as they are', async () => {
    const browser = await site.as({ handle: 'dunlin' });
    const long = 'x'.repeat(1001);
    const { status, text } = await browser.submit('/settings', { form: 'profile', name: '', about: long });
    expect(status).toBe(422);
    expect(text).toContain(long);
    expect(text.match(/id="error-summary-title"/g)).toHaveLength(1);
    const wrong = await browser.submit('/settings', { form: 'password', current: 'not this one', password: 'nine copper rivets' });
    expect(wrong.text).toContain('This is not your current password.');
    expect(wrong.text).not.toMatch(/not this one|nine copper rivets/);
    expect(wrong.text).toContain('value="dunlin"');
  });

  test('changes the password and keeps this browser signed in', async () => {
    const browser = await site.as({ handle: 'godwit' });
    const answer = await browser.submit('/settings', { form: 'password', current: right('godwit').password, password: 'nine copper rivets' });
    expect(locationOf(answer)).toBe('/settings?done=password');
    expect((await browser.get('/settings?done=password')).text).toContain('Password changed. You are signed out everywhere else.');
  });

  test('signs out elsewhere, and parts GitHub where a password is left', async () => {
    const browser = await site.as({ handle: 'knot' });
    await site.visitor().submit('/sign-in', right('knot'));
    expect((await browser.get('/settings')).text).toContain('Another browser');
    expect(locationOf(await browser.submit('/settings', { form: 'sessions' }))).toBe('/settings?done=sessions');
    expect((await browser.get('/settings')).text).not.toContain('Another browser');
    const em = site.orm.em.fork();
    await em.nativeUpdate(Person, { handle: 'knot' }, { githubId: '9' });
    expect((await browser.get('/settings')).text).toContain('GitHub is joined: you can sign in with it.');
    expect(locationOf(await browser.submit('/settings', { form: 'github' }))).toBe('/settings?done=github');
    expect((await em.findOneOrFail(Person, { handle: 'knot' }, { refresh: true })).githubId).toBeNull();
  });

  test('tells a suspended person why nothing was saved', async () => {
    const browser = await site.as({ handle: 'shrike' });
    await site.orm.em.fork().nativeUpdate(Person, { handle: 'shrike' }, { suspendedUntil: new Date(Date.now() + 60_000) });
    const answer = await browser.submit('/settings', { form: 'profile', name: 'Another', about: 'Kept in the form.' });
    expect(answer.status).toBe(403);
    expect(answer.text).toContain('This account is suspended: you can read, and take your data away.');
    expect(answer.text).toContain('Kept in the form.');
  });

  test('is for its own person, and never kept by anybody between', async () => {
    const answer = await (await site.as({ handle: 'wren' })).get('/settings');
    expect(answer.headers.get('cache-control')).toBe('private, no-store');
    expect(answer.headers.get('vary')).toContain('Cookie');
  });
});
