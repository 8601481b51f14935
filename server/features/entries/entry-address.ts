import { EntryAddress, type Build, type Entry } from '#server/entities/index.ts';
import { slugOf } from '#server/features/builds/build-address.service.ts';
import type { Em } from '#server/http/context.ts';

/** Words that are pages of ours beside a build's entries. */
const reserved = new Set([
  'costs', 'record', 'feed', 'edit', 'shelf', 'receipts', 'plan', 'crew', 'settings', 'new', 'entries', 'stages', 'pictures', 'materials', 'export', 'search', 'followers',
]);

/**
 * Gives an entry the address its title asks for: at first sign-off, and when the title changed; the old one redirects.
 * An address that was ever another entry's is not given again; one of its own it may take back. The unique index closes the race.
 */
export async function giveAddress(em: Em, build: Build, entry: Entry, title: string): Promise<void> {
  const base = slugOf(title, `day-${entry.number}`);
  const alike = await em.find(EntryAddress, { build: build.id, slug: { $like: `${base}%` } });
  const taken = new Map(alike.map((address) => [address.slug, address.entry?.id ?? null]));
  for (let count = 1; ; count += 1) {
    const slug = count === 1 ? base : `${base}-${count}`;
    if (reserved.has(slug)) continue;
    const holder = taken.get(slug);
    if (holder !== undefined && holder !== entry.id) continue;
    if (holder === undefined) em.persist(em.create(EntryAddress, { build, slug, entry }));
    entry.slug = slug;
    return;
  }
}
