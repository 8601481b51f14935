import type { FiguresView } from '#contracts/builds.ts';
import type { Build } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { summed, usedSum, wastedSum } from './sums.ts';

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

// One statement, so that a sign-off between two of them cannot make the sum look wrong.
const parts = [charged, onShelf, materialsLeft, costs, bought, receiptCount];
const allTerms = `select * from ${parts.map((part) => `(${part})`).join(', ')}`;

interface BuildSums {
  used: number; wasted: number; unsettled: number | null; movedIn: number; left: number; returned: number; sold: number;
  materialsLeft: number; costs: number; typed: number; lines: number; onOrder: number; receipts: number; notSorted: number;
}

/**
 * The terms of the sum that must hold, for one build, minor units of its currency: sums over priced rows, receipts and costs.
 * *Spent* comes from receipts and costs alone and *left* from the shelf alone, so that the sum is a check and no tautology.
 */
export async function buildFigures(em: Em, build: Pick<Build, 'id'>): Promise<FiguresView> {
  const [sums = {}] = await em.execute<Partial<BuildSums>[]>(allTerms, parts.map(() => build.id));
  const { used = 0, wasted = 0, movedIn = 0, left = 0, returned = 0, sold = 0, lines = 0, onOrder = 0, notSorted = 0 } = sums;
  return {
    spent: lines + (sums.typed ?? 0) + notSorted, used: used + (sums.costs ?? 0), wasted, left,
    movedIn, onOrder, notSorted, returned, sold, movedOut: 0,
    receipts: sums.receipts ?? 0, materialsLeft: sums.materialsLeft ?? 0, unsettled: sums.unsettled === 1,
  };
}
