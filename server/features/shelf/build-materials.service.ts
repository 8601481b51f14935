import type { Build } from '#server/entities/index.ts';
import type { Caller, Em } from '#server/http/context.ts';

/**
 * The restorer's materials that somebody who writes in a build may see: of the crew, those this build has to do with, by its
 * ledger, its receipts and its working copies, and those added for it. What is published stands in the ledger.
 * @returns null for the restorer, who sees all of them
 */
export async function materialsSeen(em: Em, caller: Caller, build: Build): Promise<ReadonlySet<number> | null> {
  if (build.owner.id === caller.id) return null;
  const rows = await em.execute<{ material: number }[]>(
    `select material_id as material from movement where build_id = ? or shelf_id in (select id from shelf where build_id = ?)
     union select l.material_id from receipt_line l join receipt r on r.id = l.receipt_id where r.build_id = ? and l.material_id is not null
     union select j.value from entry e, json_tree(e.working) j where e.build_id = ? and e.working is not null and j.key = 'material' and j.type = 'integer'
     union select id from material where added_for_id = ?`,
    [build.id, build.id, build.id, build.id, build.id],
  );
  return new Set(rows.map(({ material }) => material));
}

/** Whether somebody with this sight of the materials sees one of them. */
export function sees(seen: ReadonlySet<number> | null, material: number): boolean {
  return seen === null || seen.has(material);
}
