import { expect, test } from 'vitest';
import { killUnderWriting } from '#tests/support/kill-rounds.ts';

test('killed a hundred times under writing: every acknowledged write is there, and the ledger holds', async () => {
  expect(await killUnderWriting(100)).toBeGreaterThanOrEqual(100);
});
