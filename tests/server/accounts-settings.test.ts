import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { changeAccount, changePassword, endOtherSessions, partGithub, readAccount, readSession, signIn } from '#contracts/session.ts';
import { HttpSession, Person } from '#server/entities/index.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

let site: TestServer;
beforeAll(async () => {
  site = await startTestServer();
});
afterAll(() => site.close());

const right = (handle: string) => ({ email: `${handle}@people.example`, password: `four brass cleats of ${handle}` });
async function anotherBrowser(handle: string) {
  const browser = site.visitor();
  await browser.ask(signIn, { body: right(handle) });
  return browser;
}
const person = (handle: string) => site.orm.em.fork().findOneOrFail(Person, { handle });

describe('the profile', () => {
  test('changes what was given and leaves the rest', async () => {
    const browser = await site.as({ handle: 'plover' });
    await browser.ask(changeAccount, { body: { about: 'Old lathes.' } });
    await browser.ask(changeAccount, { body: { name: 'Ringed Plover' } });
    expect(await browser.ask(readAccount)).toMatchObject({ handle: 'plover', name: 'Ringed Plover', about: 'Old lathes.', email: 'plover@people.example', github: false, password: true });
    expect((await browser.ask(readSession)).viewer?.name).toBe('Ringed Plover');
  });

  test('does not take an empty name or a thousand and one letters', async () => {
    const browser = await site.as({ handle: 'plover' });
    expect((await browser.refused(changeAccount, { body: { name: ' ', about: 'x'.repeat(1001) } })).fields).toEqual({ name: 'Say what to call you.', about: 'A thousand letters at most.' });
  });
});

describe('a new password', () => {
  test('ends every other session of the person, nobody else\'s, and renews this one', async () => {
    const here = await site.as({ handle: 'heron' });
    const there = await anotherBrowser('heron');
    const bystander = await site.as({ handle: 'egret' });
    const before = here.cookies.header();

    expect(await here.ask(changePassword, { body: { current: right('heron').password, password: 'nine copper rivets' } })).toEqual({ ok: true });

    expect((await here.ask(readSession)).viewer?.handle).toBe('heron');
    expect(here.cookies.header()).not.toBe(before);
    expect((await site.visitor().get('/api/session', { cookie: before })).json()).toMatchObject({ viewer: null });
    expect((await there.ask(readSession)).viewer).toBeNull();
    expect((await bystander.ask(readSession)).viewer?.handle).toBe('egret');
    expect(await site.orm.em.fork().count(HttpSession, { person: (await person('heron')).id })).toBe(1);
    expect((await site.visitor().refused(signIn, { body: right('heron') })).code).toBe('wrong-sign-in');
    expect((await site.visitor().ask(signIn, { body: { ...right('heron'), password: 'nine copper rivets' } })).viewer.handle).toBe('heron');
  });

  test('needs the one of today, and changes nothing without', async () => {
    const here = await site.as({ handle: 'grebe' });
    const there = await anotherBrowser('grebe');
    const hashed = (await person('grebe')).passwordHash;
    for (const current of ['', 'nine copper rivets']) {
      expect(await here.refused(changePassword, { body: { current, password: 'nine copper rivets' } })).toMatchObject({ code: 'wrong-sign-in', fields: { current: 'This is not your current password.' } });
    }
    expect((await person('grebe')).passwordHash).toBe(hashed);
    expect((await there.ask(readSession)).viewer?.handle).toBe('grebe');
  });

  test('keeps to the rules of a first one', async () => {
    const here = await site.as({ handle: 'grebe' });
    const current = right('grebe').password;
    expect((await here.refused(changePassword, { body: { current, password: '1234567890' } })).fields).toHaveProperty('password');
    expect((await here.refused(changePassword, { body: { current, password: 'grebe@people.example' } })).fields).toHaveProperty('password');
  });

  test('is set without an old one where there is none', async () => {
    const here = await site.as({ handle: 'coot' });
    await site.orm.em.fork().nativeUpdate(Person, { handle: 'coot' }, { passwordHash: null, githubId: '77' });
    expect((await here.refused(partGithub)).detail).toBe('Set a password first. Without one and without GitHub you could not sign in again.');
    await here.ask(changePassword, { body: { current: '', password: 'nine copper rivets' } });
    await here.ask(partGithub);
    expect(await here.ask(readAccount)).toMatchObject({ github: false, password: true });
  });
});

describe('where one is signed in', () => {
  test('is listed with this browser marked, and ended everywhere else at one press', async () => {
    const here = await site.as({ handle: 'crake' });
    const there = await anotherBrowser('crake');
    const { sessions } = await here.ask(readAccount);
    expect(sessions).toHaveLength(2);
    expect(sessions.filter(({ current }) => current)).toHaveLength(1);
    expect((await there.ask(readAccount)).sessions.filter(({ current }) => current)).toHaveLength(1);
    expect(await here.ask(endOtherSessions)).toEqual({ ended: 1 });
    expect((await there.ask(readSession)).viewer).toBeNull();
    expect((await here.ask(readAccount)).sessions).toEqual([expect.objectContaining({ current: true })]);
  });
});

describe('a session', () => {
  const dayMs = 86_400_000;
  const change = async (handle: string, row: { expiresAt?: Date; createdAt?: Date }) => {
    await site.orm.em.fork().nativeUpdate(HttpSession, { person: (await person(handle)).id }, row);
  };
  const ofPerson = async (handle: string) => site.orm.em.fork().findOneOrFail(HttpSession, { person: (await person(handle)).id });

  test('that has run out signs nobody in', async () => {
    const here = await site.as({ handle: 'smew' });
    await change('smew', { expiresAt: new Date(Date.now() - 1) });
    expect((await here.ask(readSession)).viewer).toBeNull();
  });

  test('lasts thirty days from its last use, and ninety from its first at the most', async () => {
    const here = await site.as({ handle: 'gadwall' });
    await change('gadwall', { expiresAt: new Date(Date.now() + dayMs) });
    await here.ask(readSession);
    expect((await ofPerson('gadwall')).expiresAt.getTime()).toBeGreaterThan(Date.now() + 29.9 * dayMs);
    const begun = new Date(Date.now() - 89 * dayMs);
    await change('gadwall', { createdAt: begun, expiresAt: new Date(Date.now() + 0.5 * dayMs) });
    await here.ask(readSession);
    expect((await ofPerson('gadwall')).expiresAt.getTime()).toBe(begun.getTime() + 90 * dayMs);
  });

  test('that was just used is not written down again', async () => {
    const here = await site.as({ handle: 'scaup' });
    const { expiresAt } = await ofPerson('scaup');
    await here.ask(readSession);
    expect((await ofPerson('scaup')).expiresAt).toEqual(expiresAt);
  });
});
