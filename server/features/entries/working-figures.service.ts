import { priceMaterial } from '#domain/ledger/price.ts';
import { exactFrom, exactText } from '#domain/quantity.ts';
import { deriveEntry, type EntryDerivation, type EntryDocument } from '#src/blocks/pure.ts';
import type { Build, Entry } from '#server/entities/index.ts';
import type { EntryFigures, LineValue } from '#server/features/shelf/figures.service.ts';
import { ledgerMovement } from '#server/features/shelf/ledger-movement.service.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { costsOf, movementsOf, type DerivedMovement } from './derived-rows.ts';
import { deskShelves } from './desk-shelves.ts';
import { entryContext } from './entry-context.ts';
import type { LaidMovement } from './laid-over.ts';

/** What a working copy would come to if it were signed off now: nothing of it is stored. */
export interface WorkingFigures {
  readonly lines: ReadonlyMap<string, LineValue>;
  readonly sums: EntryFigures;
}

function pricedLines(own: readonly DerivedMovement[], standing: readonly LaidMovement[], method: 'fifo' | 'average'): Map<string, LineValue> {
  const lines = new Map<string, LineValue>();
  for (const material of new Set(own.map((movement) => movement.material))) {
    const laid = [...standing, ...own].filter((movement) => movement.material === material).map((movement) => ledgerMovement(movement, material));
    const priced = new Map(priceMaterial(String(material), laid, method).movements.map((movement) => [movement.key, movement]));
    for (const { key, kind, block, line } of own) {
      const movement = priced.get(key);
      if (movement && kind !== 'bought') lines.set(`${block}:${line}`, { value: movement.value, short: exactText(movement.short) });
    }
  }
  return lines;
}

function sumsOf(derived: EntryDerivation, lines: ReadonlyMap<string, LineValue>): EntryFigures {
  const valueOf = (kind: 'used' | 'wasted') => derived.uses.reduce((sum, use) => sum + (use.kind === kind ? lines.get(`${use.block}:${use.line}`)?.value ?? 0 : 0), 0);
  const minutesOf = (waiting: boolean) => derived.times.reduce((sum, time) => sum + ((time.kind === 'waiting') === waiting ? time.minutes : 0), 0);
  return {
    used: valueOf('used'), wasted: valueOf('wasted'), costs: costsOf(derived).reduce((sum, cost) => sum + cost.money, 0),
    bought: derived.receipts.reduce((sum, receipt) => sum + receipt.notSorted + receipt.lines.reduce((door, line) => door + (line.goes === 'not-mine' ? 0 : line.door), 0), 0),
    minutes: minutesOf(false), waiting: minutesOf(true), unsettled: [...lines.values()].some((line) => exactFrom(line.short).n > 0n),
  };
}

/** Prices a working copy over the stored ledger and the other working copies the caller may see. */
export async function workingFigures(em: Em, caller: Caller, build: Build, entry: Entry, document: EntryDocument): Promise<WorkingFigures> {
  const derived = deriveEntry(document, await entryContext(em, build));
  const shelves = await deskShelves(em, caller, build, entry);
  const own = movementsOf(entry, derived);
  const lines = new Map([
    ...pricedLines(own.filter((movement) => movement.on === 'shelf'), shelves.onShelf, shelves.shelf.method),
    ...pricedLines(own.filter((movement) => movement.on === 'shed'), shelves.inShed, shelves.shed?.method ?? 'fifo'),
  ]);
  return { lines, sums: sumsOf(derived, lines) };
}
