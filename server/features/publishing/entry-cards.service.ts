import type { EntryCard } from '#contracts/builds.ts';
import type { Entry } from '#server/entities/index.ts';
import { figuresOfEntries } from '#server/features/shelf/figures.service.ts';
import type { Em } from '#server/http/context.ts';
import { picturesOfEntries } from './covers.service.ts';

export function entryHref(build: { slug: string }, entry: { slug?: string | null | undefined; number: number }): string {
  return entry.slug ? `/builds/${build.slug}/${entry.slug}` : `/builds/${build.slug}/edit/${entry.number}`;
}

/** What a list of entries shows of each. Entries come with build, author and stage populated; `showsCosts` is asked per build. */
export async function entryCards(em: Em, entries: readonly Entry[], showsCosts: (entry: Entry) => boolean): Promise<EntryCard[]> {
  const ids = entries.map((entry) => entry.id);
  const figures = await figuresOfEntries(em, ids);
  const pictures = await picturesOfEntries(em, ids);
  return entries.map((entry) => {
    const build = entry.build;
    const sums = figures.get(entry.id);
    const shown = pictures.get(entry.id);
    const published = entry.published != null;
    return {
      href: entryHref(build, entry), number: entry.number, title: entry.title, lead: entry.published?.lead ?? '',
      day: entry.day, dayTo: entry.dayTo ?? null, stage: entry.stage?.title ?? null,
      build: { slug: build.slug, title: build.title }, author: { handle: entry.author.handle, name: entry.author.name },
      picture: shown?.cover ?? null, photos: shown?.count ?? 0, currency: build.currency,
      ...(showsCosts(entry) && published ? { money: (sums?.used ?? 0) + (sums?.wasted ?? 0) + (sums?.costs ?? 0), unsettled: sums?.unsettled ?? false } : {}),
      minutes: sums?.minutes ?? 0, draft: !published,
    };
  });
}
