import { afterAll, beforeAll, expect, test } from 'vitest';
import { signIn } from '#contracts/session.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

// A form sent after the session had ended led to the sign-in, and everything typed in it was gone.
let site: TestServer;
beforeAll(async () => {
  site = await startTestServer({ pages: 'source' });
});
afterAll(() => site.close());

const unescaped = (text: string) => text.replaceAll('&quot;', '"').replaceAll('&#x27;', "'").replaceAll('&lt;', '<').replaceAll('&gt;', '>').replaceAll('&amp;', '&');
function hiddenFields(html: string): Record<string, string> {
  const inputs = html.matchAll(/<input type="hidden" name="([^"]*)" value="([^"]*)"/g);
  return Object.fromEntries([...inputs].map(([, name = '', value = '']) => [unescaped(name), unescaped(value)]));
}

test('a form sent while signed out comes back with all that was typed, to be sent again after signing in', async () => {
  await site.as({ handle: 'wren' });
  const browser = site.visitor();
  const typed = { title: 'Teal & “Gull” <two>', lead: 'First line.\r\nSecond line.', kind: 'boat', currency: 'GBP', measures: 'imperial', method: 'fifo', visibility: 'public', startedOn: '2026-02-01', 'costsShown-asked': '1' };
  const answer = await browser.submit('/builds/new', typed);
  expect(answer.status).toBe(401);
  expect(answer.text).toMatch(/<a [^>]*href="\/sign-in"[^>]*target="_blank"|<a [^>]*target="_blank"[^>]*href="\/sign-in"/);
  const kept = hiddenFields(answer.text);
  expect(kept).toEqual(typed);
  await browser.ask(signIn, { body: { email: 'wren@people.example', password: 'four brass cleats of wren' } });
  const sent = await browser.submit('/builds/new', kept);
  expect([sent.status, sent.headers.get('location')]).toEqual([303, '/builds/teal-and-gull-two']);
  expect((await browser.get('/builds/teal-and-gull-two')).text).toContain('Second line.');
});

test('passwords do not come back', async () => {
  const answer = await site.visitor().submit('/settings', { form: 'password', current: 'four brass cleats', password: 'five brass cleats' });
  expect(answer.status).toBe(401);
  expect(answer.text).not.toContain('brass cleats');
  expect(hiddenFields(answer.text)).toEqual({ form: 'password' });
});

test('a page that is asked for, not sent, leads to the sign-in as before', async () => {
  const answer = await site.visitor().get('/builds/new');
  expect([answer.status, answer.headers.get('location')]).toEqual([302, '/sign-in?next=%2Fbuilds%2Fnew']);
});
