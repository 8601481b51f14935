import { afterAll, beforeAll, expect, test } from 'vitest';
import { startBuild } from '#contracts/builds.ts';
import { readDesk, startEntry } from '#contracts/entries.ts';
import { tooMuch } from '#contracts/sent-document.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';
import type { TestClient } from '#tests/support/test-client.ts';

// Lists in lists in lists overflowed the schema that follows them, and a document of two megabytes was drawn anew for every reader of a feed.
let site: TestServer;
let owner: TestClient;
let address: string;
let version: number;
beforeAll(async () => {
  site = await startTestServer();
  owner = await site.as({ handle: 'maud' });
  const { slug: build } = await owner.ask(startBuild, { body: { kind: 'boat', title: 'Lugger', currency: 'GBP', measures: 'imperial' } });
  const { number } = await owner.ask(startEntry, { params: { build }, body: { day: '2026-03-02' } });
  address = `/api/builds/${build}/entries/${number}`;
  ({ version } = (await owner.ask(readDesk, { params: { build, number } })).entry);
});
afterAll(() => site.close());

function nested(depth: number): unknown {
  let list: unknown = { type: 'bulletList', content: [{ type: 'listItem', content: [{ type: 'paragraph' }] }] };
  for (let count = 1; count < depth; count += 1) list = { type: 'bulletList', content: [{ type: 'listItem', content: [{ type: 'paragraph' }, list] }] };
  return { ...(list as object), attrs: { id: 'list-1' } };
}
const words = (letters: number) => Array.from({ length: Math.ceil(letters / 20_000) }, (_, at) => (
  { type: 'paragraph', attrs: { id: `para-${at}` }, content: [{ type: 'text', text: 'w'.repeat(Math.min(20_000, letters - at * 20_000)) }] }));
const documentOf = (content: readonly unknown[]) => ({ title: 'Long', lead: '', day: '2026-03-02', dayTo: null, stage: null, work: null, content });
const sent = (content: readonly unknown[]) => [
  () => owner.send('POST', `${address}/sign-off`, { version: -1, document: documentOf(content) }),
  () => owner.send('PUT', `${address}/working`, { version, document: documentOf(content) }),
];

test.each([
  ['lists nine deep', [nested(9)], /eight deep/], ['lists 500 deep', [nested(500)], /eight deep/],
  ['101,000 letters', words(101_000), /100,000 letters/],
  ['600 kB of lines', Array.from({ length: 300 }, (_, at) => ({ type: 'finding', attrs: { id: `find-${at}`, version: 1, data: { text: 'x'.repeat(2000) } } })), /500 kB/],
])('%s are refused with words that say how to mend it', async (_, content, says) => {
  for (const send of sent(content)) {
    const answer = await send();
    expect(answer.status).toBe(422);
    expect(answer.json()).toMatchObject({ code: 'bad-input', detail: expect.stringMatching(says) as string, fields: { document: expect.stringMatching(says) as string } });
  }
});

test('measuring a document follows nothing down, however deep it goes', () => {
  expect(tooMuch(documentOf([nested(20_000)]))).toMatch(/eight deep/);
});

test('what an entry can hold is kept', async () => {
  const answer = await owner.send('PUT', `${address}/working`, { version, document: documentOf([nested(8), ...words(99_000)]) });
  expect([answer.status, answer.text.slice(0, 200)]).toEqual([200, expect.stringContaining('version') as string]);
});
