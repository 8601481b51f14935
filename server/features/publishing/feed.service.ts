import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { formatDayLong } from '#domain/format.ts';
import { FeedEntry } from '#src/blocks/views.ts';
import { Entry, type Build } from '#server/entities/index.ts';
import { figuresOfEntries } from '#server/features/shelf/figures.service.ts';
import { materialFacts } from '#server/features/shelf/materials.service.ts';
import { requireVisibleBuild } from '#server/features/builds/build-access.service.ts';
import type { Em } from '#server/http/context.ts';
import { entryHref } from './entry-cards.service.ts';
import { noFigures, projectedEntry, tallyOf, type EntrySource } from './entry-page.service.ts';
import { freshEntries } from './home.service.ts';

const itemsAFeed = 20;

export interface FeedItem {
  /** Permanent through edits and renames. */
  readonly guid: string;
  readonly title: string;
  readonly url: string;
  readonly lead: string;
  /** The whole entry: plain HTML with absolute addresses. */
  readonly html: string;
  readonly author: string;
  readonly published: Date;
  readonly modified: Date;
  readonly picture: string | null;
  readonly tags: readonly string[];
}
export interface Feed {
  readonly title: string;
  readonly description: string;
  readonly homeUrl: string;
  readonly path: string;
  readonly items: readonly FeedItem[];
  readonly modified: Date | null;
  /** Whether crawlers may list it: an unlisted build's feed stands at its own address and nowhere else. */
  readonly listed: boolean;
}

// XML 1.0, section 2.2, the production of Char
function allowedInXml(code: number): boolean {
  return code === 0x9 || code === 0xa || code === 0xd || (code >= 0x20 && code !== 0xfffe && code !== 0xffff);
}

/** A text without the characters XML has no place for, and without half surrogates. */
export function wellFormed(text: string): string {
  return [...text.toWellFormed()].filter((letter) => allowedInXml(letter.codePointAt(0) ?? 0)).join('');
}

function daysInWords({ day, dayTo }: Pick<Entry, 'day' | 'dayTo'>): string {
  return dayTo && dayTo !== day ? `${formatDayLong(day)} to ${formatDayLong(dayTo)}` : formatDayLong(day);
}

async function feedItem(em: Em, entry: Entry, publicUrl: string, materials: NonNullable<EntrySource['materials']>): Promise<FeedItem | null> {
  const build = entry.build;
  if (!entry.published || !entry.firstPublishedAt) return null;
  // a feed has no reader it knows: costs kept to the crew are absent from it whoever asks
  const source: EntrySource = { build, entry, document: entry.published, costsShown: build.costsShown, writes: false, materials };
  const { rows, pictures, derived, plural } = await projectedEntry(em, source);
  const sums = (await figuresOfEntries(em, [entry.id])).get(entry.id) ?? noFigures;
  const cover = derived.pictures.find((picture) => picture.cover) ?? derived.pictures[0];
  const src = cover ? pictures.get(cover.key)?.src : undefined;
  return {
    guid: `urn:uuid:${entry.guid}`, title: wellFormed(entry.title), url: `${publicUrl}${entryHref(build, entry)}`, lead: wellFormed(entry.published.lead),
    html: wellFormed(renderToStaticMarkup(createElement(FeedEntry, {
      page: { lead: entry.published.lead, rows }, build: { title: build.title, url: `${publicUrl}/builds/${build.slug}` }, days: daysInWords(entry),
      tally: await tallyOf(em, source, derived, sums, plural), publicUrl,
    }))),
    author: wellFormed(entry.author.name), published: entry.firstPublishedAt, modified: entry.editedAt ?? entry.firstPublishedAt,
    picture: src ? `${publicUrl}${src}` : null, tags: entry.stage ? [wellFormed(entry.stage.title)] : [],
  };
}

async function feedOf(em: Em, entries: readonly Entry[], publicUrl: string, about: Omit<Feed, 'items' | 'modified'>): Promise<Feed> {
  const items: FeedItem[] = [];
  const owners = new Map<number, Awaited<ReturnType<typeof materialFacts>>>();
  for (const entry of entries) {
    const owner = entry.build.owner.id;
    const materials = owners.get(owner) ?? (await materialFacts(em, owner));
    owners.set(owner, materials);
    const item = await feedItem(em, entry, publicUrl, materials);
    if (item) items.push(item);
  }
  const modified = items.reduce<Date | null>((latest, item) => (latest && latest > item.modified ? latest : item.modified), null);
  return { ...about, items, modified };
}

/** Everything fresh, by first publication. */
export async function siteFeed(em: Em, publicUrl: string): Promise<Feed> {
  return feedOf(em, await freshEntries(em, itemsAFeed), publicUrl, {
    title: 'Tallywright, everything fresh', description: 'Write up the work. Know what it cost.', homeUrl: `${publicUrl}/`, path: '/feed', listed: true,
  });
}

/** One build's days, by first publication. An unlisted build's feed stands at its own address like its pages; a private one has none. */
export async function buildFeed(em: Em, slug: string, publicUrl: string): Promise<Feed> {
  const { build } = await requireVisibleBuild(em, null, slug);
  return feedOf(em, await publishedOf(em, build), publicUrl, {
    title: wellFormed(build.title), description: wellFormed(build.lead) || `${wellFormed(build.title)}, day by day.`, homeUrl: `${publicUrl}/builds/${build.slug}`, path: `/builds/${build.slug}/feed`,
    listed: build.visibility === 'public',
  });
}

async function publishedOf(em: Em, build: Build): Promise<Entry[]> {
  return em.find(Entry, { build: build.id, published: { $ne: null } }, {
    populate: ['build.owner', 'author', 'stage'], orderBy: { firstPublishedAt: 'desc', id: 'desc' }, limit: itemsAFeed,
  });
}
