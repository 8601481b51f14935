import { afterAll, beforeAll, expect, test } from 'vitest';
import { Workshop } from '#tests/support/workshop.ts';

// SQLite reads a row from its start (its file format, section 2.1): a long column before a short one is walked page by page by whoever wants the short one.
let shop: Workshop;
beforeAll(async () => {
  shop = await Workshop.open();
});
afterAll(() => shop.close());

test('the documents of an entry stand last in its row', async () => {
  const columns = await shop.em().execute<{ name: string }[]>('pragma table_info(entry)');
  expect(columns.slice(-2).map(({ name }) => name).toSorted()).toEqual(['published', 'working']);
});
