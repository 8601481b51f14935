import type { EntryCard } from '#contracts/builds.ts';
import type { HomeView } from '#contracts/home.ts';
import type { SlipView } from '#contracts/slip.ts';
import { formatMinutes, formatMoneySoFar } from '#domain/format.ts';
import { oneOfWork } from '#domain/work-words.ts';
import { Entry } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { countByKind, listedBuilds } from './builds-list.service.ts';
import { entryCards, entryHref } from './entry-cards.service.ts';
import { projectedEntry } from './entry-page.service.ts';
import { takesOfEntries } from './takes.service.ts';

const freshCount = 12;
const takesCount = 6;

/** Published entries of listed builds, by first publication, newest first. */
export async function freshEntries(em: Em, limit: number, offset = 0): Promise<Entry[]> {
  return em.find(Entry, { published: { $ne: null }, build: listedBuilds }, {
    populate: ['build.owner', 'author', 'stage', 'workKind'], orderBy: { firstPublishedAt: 'desc', id: 'desc' }, limit, offset,
  });
}

/** The slip of the opening day: its Used block, with what one took as the last word. */
async function openingSlip(em: Em, entry: Entry): Promise<SlipView | null> {
  if (!entry.published) return null;
  const { build } = entry;
  const { rows, derived } = await projectedEntry(em, { build, entry, document: entry.published, costsShown: build.costsShown, writes: false });
  const slip = rows.flatMap((row) => row.slips).find((one) => one.type === 'used')?.slip;
  if (!slip) return null;
  const takes = derived.work && (await takesOfEntries(em, [{ entry: entry.id, amount: derived.work.amount }])).get(entry.id);
  if (!derived.work || !takes) return slip;
  const figures = [build.costsShown ? formatMoneySoFar(takes.money, build.currency, takes.unsettled) : '', takes.minutes > 0 ? formatMinutes(takes.minutes) : ''].filter(Boolean);
  return figures.length > 0 ? { ...slip, footnote: undefined, sum: { label: `One ${oneOfWork(derived.work)} takes`, value: figures.join(', ') } } : slip;
}

async function latestTakes(em: Em, entries: readonly Entry[]): Promise<HomeView['takes']> {
  const ones = await takesOfEntries(em, entries.flatMap(({ id, workKind, workAmount }) => (workKind && workAmount ? [{ entry: id, amount: workAmount }] : [])));
  const takes: HomeView['takes'] = [];
  const seen = new Set<number>();
  for (const entry of entries) {
    const { build, workKind } = entry;
    const one = ones.get(entry.id);
    if (takes.length === takesCount || !workKind || !one || seen.has(workKind.id)) continue;
    // where costs are kept to the crew, that there was money says nothing either
    const money = build.costsShown ? one.money : null;
    const minutes = one.minutes > 0 ? one.minutes : null;
    if (!money && minutes === null) continue;
    seen.add(workKind.id);
    const unit = entry.workUnit ?? 'piece';
    const words = oneOfWork({ unit, kind: workKind.one });
    takes.push({
      one: unit === 'piece' ? `${words.charAt(0).toUpperCase()}${words.slice(1)}` : words, href: entryHref(build, entry), build: build.title, currency: build.currency,
      money, unsettled: money !== null && one.unsettled, minutes,
    });
  }
  return takes;
}

/** The day the front page opens on: the freshest with a picture. */
function openingOf(cards: readonly EntryCard[]): number {
  const pictured = cards.findIndex((card) => card.picture !== null);
  return pictured < 0 ? 0 : pictured;
}

export async function readFrontPage(em: Em): Promise<HomeView> {
  const entries = await freshEntries(em, 40);
  const cards = await entryCards(em, entries, (entry) => entry.build.costsShown);
  const at = openingOf(cards);
  const opening = cards[at];
  const entry = entries[at];
  return {
    opening: opening && entry ? { entry: opening, slip: await openingSlip(em, entry) } : null,
    fresh: cards.filter((_, index) => index !== at).slice(0, freshCount),
    takes: await latestTakes(em, entries),
    kinds: await countByKind(em),
  };
}
