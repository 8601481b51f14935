import { readEntry, withUniqueIds, type EntryDocument } from '#src/blocks/pure.ts';
import type { Entry } from '#server/entities/index.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { requireEntry, requireVersion } from './entry-access.ts';
import { entryContext } from './entry-context.ts';
import { seenDocument } from './seen-document.ts';
import { keptDocuments, newNodeId } from './stored-document.ts';

export interface Saved {
  readonly version: number;
  readonly document: EntryDocument;
  readonly savedAt: string;
}

// A draft is listed by its title and day; once published, those columns are of the published document.
function nameDraft(entry: Entry, document: EntryDocument): void {
  if (entry.published) return;
  entry.title = document.title;
  entry.day = document.day;
  entry.dayTo = document.dayTo;
}

/** Keeps what somebody typed. It touches the working copy only: the ledger knows nothing of it. */
export async function saveTyped(em: Em, caller: Caller, slug: string, number: number, input: { version: number; document: EntryDocument }, now: Date): Promise<Saved> {
  return em.transactional(async (inner) => {
    const { build, entry } = await requireEntry(inner, caller, slug, number);
    requireVersion(entry, input.version);
    const document = readEntry(withUniqueIds(await seenDocument(inner, caller, build, input.document), newNodeId), keptDocuments(entry), await entryContext(inner, build));
    entry.working = document;
    entry.workingAt = now;
    nameDraft(entry, document);
    await inner.flush();
    return { version: entry.version, document, savedAt: now.toISOString() };
  });
}
