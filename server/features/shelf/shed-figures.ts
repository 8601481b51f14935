import type { BuildFigures } from '#domain/ledger/sum-check.ts';
import type { Shelf } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { summed } from './sums.ts';

const inShed = `
  select ${summed("kind in ('bought', 'given')", 'value')} as spent, ${summed("kind not in ('bought', 'given')", 'value')} as gone,
    ${summed("kind in ('used', 'wasted') and build_id is not null", 'value')} as movedOut,
    ${summed("build_id is null and (kind = 'used' or (kind = 'counted' and ifnull(shortage, 'used') = 'used'))", 'value')} as used,
    ${summed("build_id is null and (kind = 'wasted' or (kind = 'counted' and shortage = 'wasted'))", 'value')} as wasted,
    ${summed("kind = 'returned'", 'value')} as returned, ${summed("kind = 'sold'", 'value')} as sold
  from movement where shelf_id = ?`;
const receipts = `
  select ifnull(sum(l.door), 0) as spent, ${summed('l.arrived_on is null', 'l.door')} as onOrder
  from receipt_line l join receipt r on r.id = l.receipt_id join build b on b.id = r.build_id
  where l.goes = 'shed' and b.owner_id = ? and b.currency = ?`;

interface ShedSums { spent: number; gone: number; movedOut: number; used: number; wasted: number; returned: number; sold: number }

/** The terms of the sum for a person's shed: what its builds' receipts brought it, and what its builds' entries drew. */
export async function shedFigures(em: Em, shed: Shelf): Promise<BuildFigures> {
  const [rows] = await em.execute<ShedSums[]>(inShed, [shed.id]);
  const [bought] = await em.execute<{ spent: number; onOrder: number }[]>(receipts, [shed.person?.id ?? 0, shed.currency]);
  const { spent: came = 0, gone = 0, movedOut = 0, used = 0, wasted = 0, returned = 0, sold = 0 } = rows ?? {};
  return { spent: bought?.spent ?? 0, onOrder: bought?.onOrder ?? 0, left: came - gone, movedIn: 0, notSorted: 0, movedOut, used, wasted, returned, sold };
}
