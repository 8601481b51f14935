import type { Caller, Em } from '#server/http/context.ts';
import { requireEntry, requireVersion } from './entry-access.ts';

/**
 * Throws away the working copy that `version` shows: of a published entry the changes, of a draft the whole entry. One that
 * readers once had stays, blank: its address and guid are known to others and wait for it.
 */
export async function discardTyped(em: Em, caller: Caller, slug: string, number: number, version: number): Promise<void> {
  await em.transactional(async (inner) => {
    const { entry } = await requireEntry(inner, caller, slug, number);
    requireVersion(entry, version);
    if (!entry.firstPublishedAt) {
      inner.remove(entry);
      return;
    }
    Object.assign(entry, { working: null, workingAt: null, ...(entry.published ? {} : { title: '', dayTo: null }) });
  });
}
