import type { TapeView } from '#contracts/tape.ts';
import { Entry, type Build } from '#server/entities/index.ts';
import { figuresOfEntries } from '#server/features/shelf/figures.service.ts';
import type { Em } from '#server/http/context.ts';
import { entryHref } from './entry-cards.service.ts';

/** A build's whole life: a bar for each published entry, on the last day of its work. Without money where costs are hidden. */
export async function tapeOf(em: Em, build: Build, showsCosts: boolean): Promise<TapeView> {
  const entries = await em.find(Entry, { build: build.id, firstPublishedAt: { $ne: null }, published: { $ne: null } }, {
    fields: ['id', 'number', 'slug', 'title', 'day', 'dayTo'], orderBy: { day: 'asc', number: 'asc' },
  });
  const figures = await figuresOfEntries(em, entries.map((entry) => entry.id));
  const days = entries.map((entry) => {
    const sums = figures.get(entry.id);
    return {
      day: entry.dayTo ?? entry.day, number: entry.number, title: entry.title, href: entryHref(build, entry), minutes: sums?.minutes ?? 0,
      ...(showsCosts ? { money: (sums?.used ?? 0) + (sums?.wasted ?? 0) + (sums?.costs ?? 0), unsettled: sums?.unsettled ?? false } : {}),
    };
  });
  // a day of several weeks is begun before others and ends after them
  days.sort((a, b) => (a.day === b.day ? a.number - b.number : a.day < b.day ? -1 : 1));
  const first = days[0]?.day;
  const last = days.at(-1)?.day;
  const end = last && last > build.startedOn ? last : build.startedOn;
  return { from: first && first < build.startedOn ? first : build.startedOn, to: daysLater(end, daysAfterTheLast), days };
}

/** Room for the last bar, which stands across its own day. */
const daysAfterTheLast = 2;

function daysLater(day: string, count: number): string {
  return new Date(Date.parse(`${day}T00:00:00Z`) + count * 86_400_000).toISOString().slice(0, 10);
}
