import { expect, test } from 'vitest';
import { killUnderWriting } from '#tests/support/kill-rounds.ts';

// Needs the built site, as the browser tests do. The long run is in tests/long.
test('killed under writing: every acknowledged write is there, and the ledger holds', { timeout: 180_000 }, async () => {
  expect(await killUnderWriting(2)).toBeGreaterThan(0);
});
