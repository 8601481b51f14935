import { Cost, CrewMember, Material, Person, Receipt, ReceiptLine, TimeLine, type Build, type Entry, type Stage } from '#server/entities/index.ts';
import { setPublishedPictures } from '#server/features/media/pictures.service.ts';
import { replaceMovements, type NewMovement } from '#server/features/shelf/movements.service.ts';
import { shedOf, shelfOfBuild } from '#server/features/shelf/shelves.service.ts';
import type { Em } from '#server/http/context.ts';
import type { EntryDerivation } from '#src/blocks/pure.ts';
import { chargedToBuild, costsOf, movementsOf } from './derived-rows.ts';

interface Told {
  readonly build: Build;
  readonly entry: Entry;
  readonly stage: Stage | null;
  readonly derived: EntryDerivation;
}
type LinesByKey = ReadonlyMap<string, ReceiptLine>;

const lineKey = (block: string, line: string) => `${block}:${line}`;

/** Receipts keep their rows through edits, since papers hang on them; what the document no longer tells goes. */
async function replaceReceipts(em: Em, { build, entry, derived }: Told): Promise<LinesByKey> {
  const receipts = new Map((await em.find(Receipt, { entry: entry.id })).map((receipt) => [receipt.block, receipt]));
  const lines = new Map((await em.find(ReceiptLine, { receipt: { entry: entry.id } })).map((line) => [`${line.receipt.id}:${line.line}`, line]));
  const told = new Map<string, ReceiptLine>();
  for (const { block, place, lines: derivedLines, ...fields } of derived.receipts) {
    const before = receipts.get(block);
    receipts.delete(block);
    const receipt = before ? em.assign(before, fields) : em.create(Receipt, { build, entry, block, sequence: entry.sequence, ...fields });
    em.persist(receipt);
    derivedLines.forEach(({ material, category: _, ...own }, position) => {
      const key = before ? `${before.id}:${own.line}` : '';
      const values = { ...own, position, receipt, material: material === null ? null : em.getReference(Material, material) };
      const lineBefore = lines.get(key);
      lines.delete(key);
      const line = lineBefore ? em.assign(lineBefore, values) : em.create(ReceiptLine, values);
      em.persist(line);
      told.set(lineKey(block, own.line), line);
    });
  }
  for (const gone of [...lines.values(), ...receipts.values()]) em.remove(gone);
  return told;
}

async function replaceCosts(em: Em, { build, entry, stage, derived }: Told, lines: LinesByKey): Promise<void> {
  await em.nativeDelete(Cost, { entry: entry.id });
  for (const { fromReceipt, ...cost } of costsOf(derived)) {
    const receiptLine = fromReceipt ? lines.get(lineKey(cost.block, cost.line)) ?? null : null;
    em.persist(em.create(Cost, { ...cost, build, entry, stage, receiptLine, sequence: entry.sequence }));
  }
}

/** Members named in a Time block: the owner, the crew, and who already has time on this build, so that leaving a crew takes no hours away. */
async function peopleNamed(em: Em, build: Build, handles: readonly string[]): Promise<Map<string, Person>> {
  if (handles.length === 0) return new Map();
  const crew = (await em.find(CrewMember, { build: build.id })).map((member) => member.person.id);
  const before = await em.execute<{ person: number }[]>('select distinct person_id as person from time_line where build_id = ? and person_id is not null', [build.id]);
  const known = new Set([build.owner.id, ...crew, ...before.map(({ person }) => person)]);
  const named = await em.find(Person, { handle: { $in: [...handles] } });
  return new Map(named.filter(({ id }) => known.has(id)).map((person) => [person.handle, person]));
}

async function replaceTimes(em: Em, { build, entry, stage, derived }: Told): Promise<void> {
  const people = await peopleNamed(em, build, derived.times.flatMap(({ handle }) => handle ?? []));
  await em.nativeDelete(TimeLine, { entry: entry.id });
  for (const { handle, place: _, ...time } of derived.times) {
    em.persist(em.create(TimeLine, { ...time, build, entry, stage, person: handle === null ? null : people.get(handle) ?? null }));
  }
}

async function newMovements(em: Em, { build, entry, stage, derived }: Told, lines: LinesByKey): Promise<NewMovement[]> {
  const movements = movementsOf(entry, derived);
  const shelf = await shelfOfBuild(em, build);
  const shed = movements.some(({ on }) => on === 'shed') ? await shedOf(em, build.owner, build.currency) : shelf;
  return movements.map(({ on, ...movement }) => ({
    ...movement, shelf: on === 'shed' ? shed : shelf, build: chargedToBuild({ on, kind: movement.kind }) ? build : null,
    stage: movement.kind === 'bought' ? null : stage, receiptLine: lines.get(lineKey(movement.block, movement.line)) ?? null,
  }));
}

/**
 * Puts everything an entry says to the ledger in place of what it said before, and prices what that touches.
 * Inside a transaction; the caller flushes.
 * @throws AppError `falls-short`, or `bad-input` for a picture that is not there
 */
export async function replaceRows(em: Em, told: Told): Promise<void> {
  await setPublishedPictures(em, told.entry, told.derived.pictures);
  const lines = await replaceReceipts(em, told);
  await replaceCosts(em, told, lines);
  await replaceTimes(em, told);
  await replaceMovements(em, told.entry, await newMovements(em, told, lines));
}
