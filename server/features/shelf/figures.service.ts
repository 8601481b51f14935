import type { Build } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { marks, summed, usedSum, wastedSum } from './sums.ts';

export { buildFigures } from './build-figures.ts';
export { shedFigures } from './shed-figures.ts';
export { figuresOfStages, type StageFigures } from './stage-figures.ts';

/** Figures of one entry, minor units of its build's currency. */
export interface EntryFigures {
  readonly used: number;
  readonly wasted: number;
  /** Hire, carriage, tools, and what went straight into use. */
  readonly costs: number;
  /** To the door, without what went to the shed or is not ours. */
  readonly bought: number;
  /** Hands on. */
  readonly minutes: number;
  readonly waiting: number;
  /** Some of what was used is not bought yet. */
  readonly unsettled: boolean;
}

/** What a line of an entry came to. */
export interface LineValue {
  /** Settled so far, minor units. */
  readonly value: number;
  /** Exact `n/d`: not bought yet. */
  readonly short: string;
}

const nothing: EntryFigures = { used: 0, wasted: 0, costs: 0, bought: 0, minutes: 0, waiting: 0, unsettled: false };

interface EntrySums { entry: number; used: number; wasted: number; unsettled: number; costs: number; bought: number; minutes: number; waiting: number }

/** Figures of many entries at once, over their priced rows; an entry without rows is absent. */
export async function figuresOfEntries(em: Em, entryIds: readonly number[]): Promise<Map<number, EntryFigures>> {
  const figures = new Map<number, EntryFigures>();
  if (entryIds.length === 0) return figures;
  const at = `(${marks(entryIds)})`;
  const queries = [
    `select entry_id as entry, ${usedSum} as used, ${wastedSum} as wasted, max(short <> '0/1') as unsettled from movement where entry_id in ${at} and kind not in ('bought', 'given') group by entry_id`,
    `select entry_id as entry, sum(money) as costs from cost where entry_id in ${at} group by entry_id`,
    `select r.entry_id as entry, sum(r.not_sorted + ifnull((select sum(l.door) from receipt_line l where l.receipt_id = r.id and l.goes in ('shelf', 'straight')), 0)) as bought from receipt r where r.entry_id in ${at} group by r.entry_id`,
    `select entry_id as entry, ${summed("kind <> 'waiting'", 'minutes')} as minutes, ${summed("kind = 'waiting'", 'minutes')} as waiting from time_line where entry_id in ${at} group by entry_id`,
  ];
  for (const query of queries) {
    for (const { entry, unsettled, ...sums } of await em.execute<Partial<EntrySums>[]>(query, [...entryIds])) {
      if (entry === undefined) continue;
      const before = figures.get(entry) ?? nothing;
      figures.set(entry, { ...before, ...sums, unsettled: before.unsettled || unsettled === 1 });
    }
  }
  return figures;
}

/** What each Used line of an entry came to, by `block:line`. */
export async function lineFigures(em: Em, entryId: number): Promise<Map<string, LineValue>> {
  const rows = await em.execute<{ block: string; line: string; value: number; short: string }[]>(
    `select block, line, value, short from movement where entry_id = ? and kind in ('used', 'wasted')`, [entryId],
  );
  return new Map(rows.map(({ block, line, value, short }) => [`${block}:${line}`, { value, short }]));
}

/** Hands-on minutes of a build. */
export async function minutesOfBuild(em: Em, build: Pick<Build, 'id'>): Promise<number> {
  const [row] = await em.execute<{ minutes: number }[]>(`select ifnull(sum(minutes), 0) as minutes from time_line where build_id = ? and kind <> 'waiting'`, [build.id]);
  return row?.minutes ?? 0;
}

/** The headline *used* of many builds: what was used off a shelf, and every cost. */
export async function usedOfBuilds(em: Em, buildIds: readonly number[]): Promise<Map<number, number>> {
  if (buildIds.length === 0) return new Map();
  const at = `(${marks(buildIds)})`;
  const rows = await em.execute<{ build: number; used: number }[]>(
    `select build, sum(used) as used from (
       select build_id as build, ${usedSum} as used from movement where build_id in ${at} group by build_id
       union all select build_id as build, sum(money) as used from cost where build_id in ${at} group by build_id
     ) group by build`, [...buildIds, ...buildIds],
  );
  return new Map(rows.map(({ build, used }) => [build, used]));
}

/** Builds with something used or wasted that is not bought yet, so that its money is still to come. */
export async function unsettledBuilds(em: Em, buildIds: readonly number[]): Promise<ReadonlySet<number>> {
  if (buildIds.length === 0) return new Set();
  const rows = await em.execute<{ build: number }[]>(`select distinct build_id as build from movement where build_id in (${marks(buildIds)}) and short <> '0/1'`, [...buildIds]);
  return new Set(rows.map(({ build }) => build));
}

/** Sums over the *for each* lines and times of an entry, of which what one takes is worked out. */
export interface ForEachSums {
  readonly money: number;
  readonly minutes: number;
  /** Some of it is not bought yet. */
  readonly unsettled: boolean;
}

/** The sums of many entries in two queries; an entry without rows is absent. */
export async function forEachOfEntries(em: Em, entryIds: readonly number[]): Promise<Map<number, ForEachSums>> {
  const sums = new Map<number, ForEachSums>();
  if (entryIds.length === 0) return sums;
  const at = `(${marks(entryIds)})`;
  const forEach = "kind = 'used' and ifnull(counts, 'each') = 'each'";
  const queries = [
    `select entry_id as entry, ${summed(forEach, 'value')} as money, max(${forEach} and short <> '0/1') as unsettled from movement where entry_id in ${at} group by entry_id`,
    `select entry_id as entry, ${summed("kind = 'each'", 'minutes')} as minutes from time_line where entry_id in ${at} group by entry_id`,
  ];
  for (const query of queries) {
    for (const { entry, money = 0, minutes = 0, unsettled = 0 } of await em.execute<{ entry: number; money?: number; minutes?: number; unsettled?: number }[]>(query, [...entryIds])) {
      const before = sums.get(entry);
      sums.set(entry, { money: money + (before?.money ?? 0), minutes: minutes + (before?.minutes ?? 0), unsettled: unsettled === 1 || before?.unsettled === true });
    }
  }
  return sums;
}
