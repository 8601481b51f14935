import type { Caller, Em } from '#server/http/context.ts';
import { requireEntry } from './entry-access.ts';

/** Throws away the working copy: of a published entry the changes, of a draft the whole entry. Its address, if it had one, is given to no other. */
export async function discardTyped(em: Em, caller: Caller, slug: string, number: number): Promise<void> {
  await em.transactional(async (inner) => {
    const { entry } = await requireEntry(inner, caller, slug, number);
    if (!entry.published) {
      inner.remove(entry);
      return;
    }
    entry.working = null;
    entry.workingAt = null;
  });
}
