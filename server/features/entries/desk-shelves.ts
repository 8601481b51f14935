import type { MaterialHistory, ShelfRow } from '#contracts/entries.ts';
import { priceShelf } from '#domain/ledger/price.ts';
import { exactText } from '#domain/quantity.ts';
import type { EntryDocument } from '#src/blocks/pure.ts';
import type { Build, Entry, Shelf } from '#server/entities/index.ts';
import { materialsSeen, sees } from '#server/features/shelf/build-materials.service.ts';
import { ledgerMovement } from '#server/features/shelf/ledger-movement.service.ts';
import { findShed, shelfOfBuild } from '#server/features/shelf/shelves.service.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { draftMovements, draftsAround, storedMovements, type LaidMovement } from './laid-over.ts';

// So many rows of history go to the desk beside those of the entry's own materials: the next material picked is priced at once.
const rowsBeside = 2000;

/** The build's shelf and its owner's shed as those who write see them: the stored ledger without one entry, with all other working copies laid over. Of the shed, crew see only what the build has to do with. */
export interface DeskShelves {
  /** The materials the caller may see, or null for all of them. */
  readonly seen: ReadonlySet<number> | null;
  readonly shelf: Shelf;
  readonly shed: Shelf | null;
  readonly onShelf: readonly LaidMovement[];
  readonly inShed: readonly LaidMovement[];
}

export async function deskShelves(em: Em, caller: Caller, build: Build, entry: Entry): Promise<DeskShelves> {
  const drafts = await draftsAround(em, caller, build, entry);
  const replaced = new Set([entry.id, ...drafts.map((draft) => draft.entry)]);
  const seen = await materialsSeen(em, caller, build);
  const shelf = await shelfOfBuild(em, build);
  const shed = await findShed(em, build.owner, build.currency);
  return {
    seen, shelf, shed,
    onShelf: [...await storedMovements(em, shelf, replaced), ...draftMovements(drafts, 'shelf', build)],
    inShed: [...(shed ? await storedMovements(em, shed, replaced) : []), ...draftMovements(drafts, 'shed', build)].filter(({ material }) => sees(seen, material)),
  };
}

/** What is on hand of every material, this entry left out. */
export function shelfRows(shelves: DeskShelves): ShelfRow[] {
  const rows = (on: ShelfRow['shelf'], movements: readonly LaidMovement[], method: Shelf['method']) =>
    [...priceShelf(movements.map((row) => ledgerMovement(row, row.material)), method).values()].map(({ material, left, notBoughtYet, figures }) => ({
      material: Number(material), shelf: on, left: exactText(left), short: exactText(notBoughtYet), worth: figures.left,
    }));
  return [...rows('shelf', shelves.onShelf, shelves.shelf.method), ...rows('shed', shelves.inShed, shelves.shed?.method ?? 'fifo')];
}

function materialsIn(document: EntryDocument): Set<number> {
  return new Set(document.content.flatMap((node) => (node.type === 'used' || node.type === 'bought' ? node.attrs.data.lines.flatMap(({ material }) => material ?? []) : [])));
}

interface Group { readonly material: number; readonly on: MaterialHistory['shelf']; readonly movements: LaidMovement[] }

function byMaterial(on: Group['on'], movements: readonly LaidMovement[]): Group[] {
  const groups = new Map<number, Group>();
  for (const movement of movements) {
    const group = groups.get(movement.material);
    if (group) group.movements.push(movement);
    else groups.set(movement.material, { material: movement.material, on, movements: [movement] });
  }
  return [...groups.values()];
}

function lastDay({ movements }: Group): string {
  return movements.reduce((latest, { day }) => (day > latest ? day : latest), '');
}

function historyOf({ material, on, movements }: Group): MaterialHistory {
  const rows = movements.map(({ key, kind, day, sequence, place, amount, cost, of, shortage }) => ({ key, kind, day, sequence, place, amount, cost, of, shortage }));
  return { material, shelf: on, rows };
}

/**
 * What the desk replays: the whole history of every material in the documents, and of others, those last touched first, while there is room.
 * A material that has a shelf row and no history here was left out, and comes with the next reading once it stands in the working copy.
 */
export function materialHistories(shelves: DeskShelves, documents: readonly EntryDocument[]): MaterialHistory[] {
  const own = new Set(documents.flatMap((document) => [...materialsIn(document)]));
  const all = [...byMaterial('shelf', shelves.onShelf), ...byMaterial('shed', shelves.inShed)];
  const others = all.filter(({ material }) => !own.has(material)).toSorted((a, b) => lastDay(b).localeCompare(lastDay(a)));
  let room = rowsBeside;
  return [...all.filter(({ material }) => own.has(material)), ...others.filter(({ movements }) => (room -= movements.length) >= 0)].map(historyOf);
}
