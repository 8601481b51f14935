import { expect, test } from 'vitest';
import { startOf } from '#src/features/desk/desk-start.ts';
import { documentOf, viewOf } from './desk-view.ts';

const view = viewOf();
const kept = { document: documentOf({ title: 'Typed here' }), base: documentOf({ title: 'Before' }), onServer: false, at: new Date() };

test('a text kept here that stands on an older one says so until the two are brought together', () => {
  const start = startOf(view, { ...kept, version: 2 }, []);
  expect(start.newer).toEqual({ version: 3, document: view.entry.document });
  // kept again under the newer version, it would pass for a text written on top of that
  expect([start.version, start.base]).toEqual([2, kept.base]);
});

test('one that stands on the server\'s own is simply taken up', () => {
  const start = startOf(view, { ...kept, version: 3 }, []);
  expect([start.newer, start.version, start.base, start.document.title]).toEqual([null, 3, view.entry.document, 'Typed here']);
});
