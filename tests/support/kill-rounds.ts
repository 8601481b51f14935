import { setTimeout as wait } from 'node:timers/promises';
import { expect } from 'vitest';
import { KilledSite, shelfToDrawOn, writerOf, writeUntilGone, type Acknowledged } from './killed-site.ts';

/** Kills the site under writing, `rounds` times over; after each, everything it acknowledged is there and the ledger holds. */
export async function killUnderWriting(rounds: number): Promise<number> {
  const site = await KilledSite.open();
  const known: Acknowledged = { saved: new Map(), signedOff: new Set() };
  try {
    await site.start();
    await writerOf(site, true);
    const shelf = await shelfToDrawOn(site);
    for (let round = 0; round < rounds; round += 1) {
      if (round > 0) {
        await site.start();
        await writerOf(site, false);
      }
      const writing = Promise.all([writeUntilGone(site, shelf, known, '2026-06-14'), writeUntilGone(site, shelf, known, '2026-06-15')]);
      // a busy machine takes its time to write the first day; from then on the blow falls anywhere
      for (const before = known.saved.size; known.saved.size === before;) await wait(10);
      await wait((round * 137) % 400);
      await site.kill();
      await writing;
      const left = await site.left();
      expect(left.differences).toEqual([]);
      for (const [number, title] of known.saved) expect(left.titles.get(number), `entry ${number} after kill ${round + 1}`).toBe(title);
      for (const number of known.signedOff) expect(left.signedOff.has(number), `entry ${number} signed off, after kill ${round + 1}`).toBe(true);
    }
    return known.saved.size;
  } finally {
    await site.close();
  }
}
