import { beforeEach, expect, test, vi } from 'vitest';
import { keptHere } from '#src/features/desk/kept-here.ts';
import { documentOf } from './desk-view.ts';

const texts = vi.hoisted(() => new Map<string, unknown>());
vi.mock('idb', () => ({
  openDB: async () => ({ get: async (_: string, key: string) => texts.get(key), put: async (_: string, value: unknown, key: string) => texts.set(key, value) }),
}));

beforeEach(() => texts.clear());

test('what is kept of an entry is taken up by that entry and by that person only', async () => {
  const document = documentOf();
  const at = { handle: 'wren', guid: '0b8f3a52-6a2f-4a7e-9d0e-0a9b6d3c1f10' };
  await keptHere(at).keep({ document, version: 3, base: documentOf({ title: 'Before' }), onServer: false });
  const kept = await keptHere(at).read();
  expect([kept?.document.title, kept?.base?.title]).toEqual([document.title, 'Before']);
  expect(await keptHere({ ...at, guid: '7c1d2e63-6a2f-4a7e-9d0e-0a9b6d3c1f11' }).read()).toBeNull();
  expect(await keptHere({ ...at, handle: 'gull' }).read()).toBeNull();
});

test('a text kept before it was kept what it stands on is still taken up', async () => {
  const at = { handle: 'wren', guid: '0b8f3a52-6a2f-4a7e-9d0e-0a9b6d3c1f10' };
  texts.set(`${at.handle}/${at.guid}`, { document: documentOf(), version: 3, onServer: false, at: new Date() });
  expect((await keptHere(at).read())?.base).toBeNull();
});
