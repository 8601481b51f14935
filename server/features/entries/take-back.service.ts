import { AppError } from '#contracts/errors.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { requireEntry, requireVersion } from './entry-access.ts';
import { nothingDerived } from './entry-context.ts';
import { replaceRows } from './entry-rows.ts';
import { storedDocument } from './stored-document.ts';
import { wordsDigest } from './words-digest.ts';

/**
 * Takes a published entry back: its rows leave the ledger, and its document becomes the working copy, unless a newer one
 * stands there already. Its address and the day it was first published stay its own.
 */
export async function takeBack(em: Em, caller: Caller, slug: string, number: number, version: number, now: Date): Promise<number> {
  return em.transactional(async (inner) => {
    const { build, entry } = await requireEntry(inner, caller, slug, number);
    requireVersion(entry, version);
    if (!entry.published) throw new AppError('bad-input', 'This entry is not signed off, so there is nothing to take back.');
    await replaceRows(inner, { build, entry, stage: null, derived: nothingDerived });
    const working = entry.working ?? entry.published;
    Object.assign(entry, {
      working, workingAt: entry.workingAt ?? now, published: null, title: working.title, day: working.day, dayTo: working.dayTo,
      takenBack: wordsDigest(storedDocument(entry.published)), stage: null, workAmount: null, workUnit: null, workKind: null,
    });
    await inner.flush();
    return entry.version;
  });
}
