import type { LastPaid } from '#domain/ledger/estimate.ts';
import { exactFrom } from '#domain/quantity.ts';
import type { Build } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { findShed, shelfOfBuild } from './shelves.service.ts';
import { marks } from './sums.ts';

export type ShelfName = 'shelf' | 'shed';
export const paidKey = (material: number, on: ShelfName) => `${on}:${material}`;

// The order of the ledger among what was bought, last first.
const lastFirst = 'day desc, sequence desc, place desc, key desc';

async function lastOn(em: Em, shelf: number, materials: readonly number[]): Promise<{ material: number; cost: number; amount: string }[]> {
  return em.execute(
    `select material, cost, amount from (
       select material_id as material, ifnull(cost, 0) as cost, amount, row_number() over (partition by material_id order by ${lastFirst}) as place_from_last
       from movement where shelf_id = ? and kind = 'bought' and material_id in (${marks(materials)})
     ) where place_from_last = 1`, [shelf, ...materials],
  );
}

/** The last price paid for some materials on a build's shelf and its owner's shed, for estimates of what is not bought yet. */
export async function lastPaidFor(em: Em, build: Build, wanted: readonly { readonly material: number; readonly from: ShelfName }[]): Promise<Map<string, LastPaid>> {
  const paid = new Map<string, LastPaid>();
  for (const on of ['shelf', 'shed'] as const) {
    const materials = [...new Set(wanted.filter(({ from }) => from === on).map(({ material }) => material))];
    if (materials.length === 0) continue;
    const shelf = on === 'shelf' ? await shelfOfBuild(em, build) : await findShed(em, build.owner, build.currency);
    for (const { material, cost, amount } of shelf ? await lastOn(em, shelf.id, materials) : []) paid.set(paidKey(material, on), { cost, amount: exactFrom(amount) });
  }
  return paid;
}
