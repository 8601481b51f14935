import type { EntryDocument } from '#src/blocks/pure.ts';

// What the server reads from a typed amount is not part of the text.
const readBack = new Set(['exact', 'read']);

function canonical(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(canonical);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).filter(([key, one]) => !readBack.has(key) && one !== undefined).toSorted(([a], [b]) => (a < b ? -1 : 1)).map(([key, one]) => [key, canonical(one)]),
  );
}

/** A value for comparing: the order of its fields and what was only read back do not count. */
export function comparable(value: unknown): string {
  return JSON.stringify(canonical(value));
}

export function sameText(a: EntryDocument, b: EntryDocument): boolean {
  return comparable(a) === comparable(b);
}
