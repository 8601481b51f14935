import { nanoid } from 'nanoid';
import { entryDocument, steppedUp, type EntryDocument } from '#src/blocks/pure.ts';
import type { Entry } from '#server/entities/index.ts';

const idLength = 10;

/** An id for a node or a line; ids are unique within their entry. */
export function newNodeId(): string {
  return nanoid(idLength);
}

/** A new write-up: a day, and one empty paragraph to start typing in. */
export function blankDocument(day: string, stage: number | null): EntryDocument {
  return { title: '', lead: '', day, dayTo: null, stage, work: null, content: [{ type: 'paragraph', attrs: { id: newNodeId() } }] };
}

/** A stored document with its blocks brought up to the versions of today. */
export function storedDocument(stored: EntryDocument): EntryDocument {
  return entryDocument.parse({ ...stored, content: steppedUp(stored.content) });
}

/** What the desk opens: the working copy, else what is published. */
export function standingDocument(entry: Entry): EntryDocument {
  const stored = entry.working ?? entry.published;
  return stored ? storedDocument(stored) : blankDocument(entry.day, entry.stage?.id ?? null);
}

/** The documents whose read amounts are kept while their words stand; the working copy's win. */
export function keptDocuments(entry: Entry): EntryDocument[] {
  return [entry.published, entry.working].flatMap((stored) => (stored ? [storedDocument(stored)] : []));
}
