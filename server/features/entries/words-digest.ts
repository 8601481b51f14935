import { createHash } from 'node:crypto';
import type { EntryDocument } from '#src/blocks/pure.ts';

/** Fields in one order, so that the digest is of what is said and not of how it was put together. */
function ordered(_: string, value: unknown): unknown {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return value;
  return Object.fromEntries(Object.entries(value).toSorted(([a], [b]) => (a < b ? -1 : 1)));
}

/** Tells the words of one document from those of another, where the other is not kept. */
export function wordsDigest(document: EntryDocument): string {
  return createHash('sha256').update(JSON.stringify(document, ordered)).digest('base64url');
}
