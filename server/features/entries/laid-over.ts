import type { MovementKind } from '#domain/ledger/movement.ts';
import { deriveEntry } from '#src/blocks/pure.ts';
import { CrewMember, Entry, type Build, type Shelf } from '#server/entities/index.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { movementsOf, type DerivedMovement } from './derived-rows.ts';
import { entryContext } from './entry-context.ts';
import { storedDocument } from './stored-document.ts';

/** A movement as it is replayed for crew: stored, or of somebody's working copy. */
export interface LaidMovement {
  readonly key: string;
  readonly kind: MovementKind;
  readonly material: number;
  readonly day: string;
  readonly sequence: number;
  readonly place: number;
  readonly amount: string;
  readonly cost: number | null;
  readonly of: string | null;
  readonly shortage: 'used' | 'wasted' | null;
}
type StoredRow = LaidMovement & { readonly entry: number | null };

/** What the stored ledger holds on a shelf, but for the entries named. @param only some materials, or nothing for all */
export async function storedMovements(em: Em, shelf: Shelf, without: ReadonlySet<number>, only: readonly number[] | null = null): Promise<LaidMovement[]> {
  const some = only === null ? '' : ` and material_id in (${only.map(() => '?').join(', ')})`;
  const rows = await em.execute<StoredRow[]>(
    `select key, kind, material_id as material, day, sequence, place, amount, cost, "of", shortage, entry_id as entry from movement where shelf_id = ?${some}`, [shelf.id, ...(only ?? [])],
  );
  return rows.filter(({ entry }) => entry === null || !without.has(entry));
}

/** A working copy and what it would say to the ledger. */
export interface Draft {
  readonly entry: number;
  readonly build: number;
  readonly movements: readonly DerivedMovement[];
}

/**
 * Other people's and other days' working copies that touch the build's shelf or its owner's shed, as far as the caller may see them:
 * of this build, and of the owner's builds in its currency that the caller works on too.
 */
export async function draftsAround(em: Em, caller: Caller, build: Build, without: Entry): Promise<Draft[]> {
  const entries = await em.find(Entry, {
    id: { $ne: without.id }, workingAt: { $ne: null }, build: { owner: build.owner.id, currency: build.currency },
  }, { populate: ['build'] });
  const crewOf = new Set((await em.find(CrewMember, { person: caller.id })).map((member) => member.build.id));
  const context = await entryContext(em, build);
  return entries.flatMap((entry) => {
    if (!entry.working || !(build.owner.id === caller.id || crewOf.has(entry.build.id))) return [];
    const derived = deriveEntry(storedDocument(entry.working), { ...context, measures: entry.build.measures });
    return [{ entry: entry.id, build: entry.build.id, movements: movementsOf(entry, derived) }];
  });
}

/** What drafts lay on one of the two shelves: on the build's only those of the build itself. */
export function draftMovements(drafts: readonly Draft[], on: 'shelf' | 'shed', build: Build): LaidMovement[] {
  return drafts
    .filter((draft) => on === 'shed' || draft.build === build.id)
    .flatMap(({ movements }) => movements.filter((movement) => movement.on === on).map(
      ({ key, kind, material, day, sequence, place, amount, cost, of, shortage }) => ({ key, kind, material, day, sequence, place, amount, cost, of, shortage }),
    ));
}
