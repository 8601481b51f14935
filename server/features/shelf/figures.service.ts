import type { FiguresView } from '#contracts/builds.ts';
import type { BuildFigures } from '#domain/ledger/sum-check.ts';
import type { Build, Shelf } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { marks, summed, usedSum, wastedSum } from './sums.ts';

export { figuresOfStages, type StageFigures } from './stage-figures.ts';

/** Figures of one entry, minor units of its build's currency. */
export interface EntryFigures {
  readonly used: number;
  readonly wasted: number;
  /** Hire, carriage, tools, and what went straight into use. */
  readonly costs: number;
  /** To the door, without what is not ours. */
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
    `select r.entry_id as entry, sum(r.not_sorted + ifnull((select sum(l.door) from receipt_line l where l.receipt_id = r.id and l.goes <> 'not-mine'), 0)) as bought from receipt r where r.entry_id in ${at} group by r.entry_id`,
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

// A use on the shed charged to a build is moved in and used there; it never enters the build's own stock.
const charged = `
  select ${usedSum} as used, ${wastedSum} as wasted, max(m.short <> '0/1') as unsettled,
    ${summed('s.person_id is not null', 'value')} as movedIn
  from movement m join shelf s on s.id = m.shelf_id where m.build_id = ? and m.kind in ('used', 'wasted', 'counted')`;
const onShelf = `
  select ${summed("kind in ('bought', 'given')", 'value')} - ${summed("kind not in ('bought', 'given')", 'value')} as left,
    ${summed("kind = 'returned'", 'value')} as returned, ${summed("kind = 'sold'", 'value')} as sold
  from movement where shelf_id = (select id from shelf where build_id = ?)`;
const materialsLeft = `
  select count(*) as materialsLeft from (
    select material_id from movement where shelf_id = (select id from shelf where build_id = ?) group by material_id
    having sum(case when kind in ('bought', 'given') then value else -value end) > 0)`;
const costs = `select ifnull(sum(money), 0) as costs, ${summed('receipt_line_id is null', 'money')} as typed from cost where build_id = ?`;
const bought = `
  select ${summed("l.goes in ('shelf', 'straight')", 'l.door')} as lines, ${summed("l.goes = 'shelf' and l.arrived_on is null", 'l.door')} as onOrder
  from receipt_line l join receipt r on r.id = l.receipt_id where r.build_id = ?`;
const receiptCount = `select count(*) as receipts, ifnull(sum(not_sorted), 0) as notSorted from receipt where build_id = ?`;

interface BuildSums {
  used: number; wasted: number; unsettled: number | null; movedIn: number; left: number; returned: number; sold: number;
  materialsLeft: number; costs: number; typed: number; lines: number; onOrder: number; receipts: number; notSorted: number;
}

/**
 * The terms of the sum that must hold, for one build, minor units of its currency: sums over priced rows, receipts and costs.
 * *Spent* comes from receipts and costs alone and *left* from the shelf alone, so that the sum is a check and no tautology.
 */
export async function buildFigures(em: Em, build: Pick<Build, 'id'>): Promise<FiguresView> {
  const sums: Partial<BuildSums> = {};
  for (const query of [charged, onShelf, materialsLeft, costs, bought, receiptCount]) {
    Object.assign(sums, (await em.execute<Partial<BuildSums>[]>(query, [build.id]))[0]);
  }
  const { used = 0, wasted = 0, movedIn = 0, left = 0, returned = 0, sold = 0, lines = 0, onOrder = 0, notSorted = 0 } = sums;
  return {
    spent: lines + (sums.typed ?? 0) + notSorted, used: used + (sums.costs ?? 0), wasted, left,
    movedIn, onOrder, notSorted, returned, sold, movedOut: 0,
    receipts: sums.receipts ?? 0, materialsLeft: sums.materialsLeft ?? 0, unsettled: sums.unsettled === 1,
  };
}

const inShed = `
  select ${summed("kind in ('bought', 'given')", 'value')} as spent, ${summed("kind not in ('bought', 'given')", 'value')} as gone,
    ${summed("kind in ('used', 'wasted') and build_id is not null", 'value')} as movedOut,
    ${summed("build_id is null and (kind = 'used' or (kind = 'counted' and ifnull(shortage, 'used') = 'used'))", 'value')} as used,
    ${summed("build_id is null and (kind = 'wasted' or (kind = 'counted' and shortage = 'wasted'))", 'value')} as wasted,
    ${summed("kind = 'returned'", 'value')} as returned, ${summed("kind = 'sold'", 'value')} as sold
  from movement where shelf_id = ?`;
const boughtForShed = `
  select ifnull(sum(l.door), 0) as spent, ${summed('l.arrived_on is null', 'l.door')} as onOrder
  from receipt_line l join receipt r on r.id = l.receipt_id join build b on b.id = r.build_id
  where l.goes = 'shed' and b.owner_id = ? and b.currency = ?`;

interface ShedSums { spent: number; gone: number; movedOut: number; used: number; wasted: number; returned: number; sold: number }

/** The terms of the sum for a person's shed: what its builds' receipts brought it, and what its builds' entries drew. */
export async function shedFigures(em: Em, shed: Shelf): Promise<BuildFigures> {
  const [rows] = await em.execute<ShedSums[]>(inShed, [shed.id]);
  const [bought] = await em.execute<{ spent: number; onOrder: number }[]>(boughtForShed, [shed.person?.id ?? 0, shed.currency]);
  const { spent: came = 0, gone = 0, movedOut = 0, used = 0, wasted = 0, returned = 0, sold = 0 } = rows ?? {};
  return { spent: bought?.spent ?? 0, onOrder: bought?.onOrder ?? 0, left: came - gone, movedIn: 0, notSorted: 0, movedOut, used, wasted, returned, sold };
}
