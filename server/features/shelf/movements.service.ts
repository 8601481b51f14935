import { AppError } from '#contracts/errors.ts';
import { haveCommonParts } from '#domain/ledger/parts.ts';
import { priceMaterial } from '#domain/ledger/price.ts';
import { exactFrom, exactText } from '#domain/quantity.ts';
import { Material, Movement, type Build, type Entry, type ReceiptLine, type Shelf, type Stage } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { fallsShort } from './falls-short.ts';
import { ledgerMovement, type StoredMovement } from './ledger-movement.service.ts';

/** A movement to be laid down, before it is priced. */
export interface NewMovement extends StoredMovement {
  readonly shelf: Shelf;
  readonly build: Build | null;
  readonly material: number;
  readonly block: string;
  readonly line: string;
  readonly typed: string;
  readonly counts: Movement['counts'];
  readonly stage: Stage | null;
  readonly receiptLine: ReceiptLine | null;
}

const unpriced = { value: 0, short: '0/1' };

function byMaterial(rows: readonly Movement[]): Map<number, Movement[]> {
  const groups = new Map<number, Movement[]>();
  for (const row of rows) {
    const own = groups.get(row.material.id);
    if (own) own.push(row);
    else groups.set(row.material.id, [row]);
  }
  return groups;
}

async function tooFine(em: Em, material: number): Promise<AppError> {
  const { name } = await em.findOneOrFail(Material, { id: material });
  return new AppError('bad-input', `${name}: its amounts are too fine to be added up. Write rounder figures, like 0.25 or 1/3.`);
}

/**
 * Prices all movements of some materials of one shelf from nothing, and puts value and shortfall on their rows;
 * the flush that follows writes those that changed.
 * @throws AppError `falls-short` where a return or sale would be of more than there is, `bad-input` for amounts too fine to add up
 */
async function price(em: Em, shelf: Shelf, rows: readonly Movement[]): Promise<void> {
  const byKey = new Map(rows.map((row) => [row.key, row]));
  for (const [material, own] of byMaterial(rows)) {
    if (!haveCommonParts(own.map(({ amount }) => exactFrom(amount)))) throw await tooFine(em, material);
    const ledger = priceMaterial(String(material), own.map((row) => ledgerMovement(row, material)), shelf.method);
    const [refusal] = ledger.refusals;
    const refused = refusal && byKey.get(refusal.key);
    if (refused) throw await fallsShort(em, shelf, refused, refusal);
    for (const priced of ledger.movements) {
      const row = byKey.get(priced.key);
      if (row) Object.assign(row, { value: priced.value, short: exactText(priced.short) });
    }
  }
}

/** Prices some materials of a shelf again; the caller flushes. */
export async function reprice(em: Em, shelf: Shelf, materials: readonly number[]): Promise<void> {
  if (materials.length === 0) return;
  await price(em, shelf, await em.find(Movement, { shelf: shelf.id, material: { $in: [...materials] } }));
}

interface Touched { shelf: Shelf; materials: Set<number> }

/** Which materials of which shelves a change touches: those there were, and those there will be. */
function touchedBy(stored: readonly Movement[], rows: readonly NewMovement[]): Touched[] {
  const touched = new Map<number, Touched>();
  const touch = (shelf: Shelf, material: number) => {
    const one = touched.get(shelf.id) ?? { shelf, materials: new Set<number>() };
    one.materials.add(material);
    touched.set(shelf.id, one);
  };
  for (const row of stored) touch(row.shelf, row.material.id);
  for (const row of rows) touch(row.shelf, row.material);
  return [...touched.values()];
}

/** Lays an entry's rows over those it had: a row keeps its identity by its key, which a return may name. */
function layDown(em: Em, entry: Entry, stored: readonly Movement[], rows: readonly NewMovement[]): Movement[] {
  const before = new Map(stored.map((row) => [row.key, row]));
  const laid = rows.map(({ material, ...fields }) => {
    const row = before.get(fields.key);
    before.delete(fields.key);
    const values = { ...fields, material: em.getReference(Material, material) };
    const now = row ? em.assign(row, values) : em.create(Movement, { ...values, entry, ...unpriced });
    em.persist(now);
    return now;
  });
  for (const row of before.values()) em.remove(row);
  return laid;
}

/**
 * Puts an entry's movements in place of those it had, on whichever shelf each belongs, and prices every material
 * that is touched, and nothing else. The caller flushes, in the transaction this runs in.
 * @throws AppError `falls-short` where a return or sale would be of more than there is
 */
export async function replaceMovements(em: Em, entry: Entry, rows: readonly NewMovement[]): Promise<void> {
  const stored = await em.find(Movement, { entry: entry.id }, { populate: ['shelf'] });
  const touched = touchedBy(stored, rows);
  const standing: Movement[] = [];
  for (const { shelf, materials } of touched) {
    standing.push(...await em.find(Movement, { shelf: shelf.id, material: { $in: [...materials] } }));
  }
  const laid = layDown(em, entry, stored, rows);
  const now = [...standing.filter((row) => row.entry?.id !== entry.id), ...laid];
  for (const { shelf } of touched) await price(em, shelf, now.filter((row) => row.shelf.id === shelf.id));
}
