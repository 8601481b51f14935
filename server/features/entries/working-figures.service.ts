import { priceShelf } from '#domain/ledger/price.ts';
import { exactText } from '#domain/quantity.ts';
import { broughtToBuild, deriveEntry, type EntryDerivation, type EntryDocument } from '#src/blocks/pure.ts';
import type { Build, Entry, Shelf } from '#server/entities/index.ts';
import type { EntryFigures, LineValue } from '#server/features/shelf/figures.service.ts';
import { ledgerMovement } from '#server/features/shelf/ledger-movement.service.ts';
import { findShed, shelfOfBuild } from '#server/features/shelf/shelves.service.ts';
import type { Em } from '#server/http/context.ts';
import { costsOf, movementsOf, type DerivedMovement } from './derived-rows.ts';
import { entryContext } from './entry-context.ts';
import { storedMovements } from './laid-over.ts';

/** What a working copy would come to if it were signed off now: nothing of it is stored. */
export interface WorkingFigures {
  readonly lines: ReadonlyMap<string, LineValue>;
  readonly sums: EntryFigures;
}

/** Prices an entry's movements on one shelf over what is stored there without it, for the materials it touches. */
async function pricedLines(em: Em, entry: Entry, shelf: Shelf | null, own: readonly DerivedMovement[]): Promise<[string, LineValue][]> {
  const materials = [...new Set(own.map(({ material }) => material))];
  const stored = shelf ? await storedMovements(em, shelf, new Set([entry.id]), materials) : [];
  const ledgers = priceShelf([...stored, ...own].map((row) => ledgerMovement(row, row.material)), shelf?.method ?? 'fifo');
  const priced = new Map([...ledgers.values()].flatMap(({ movements }) => movements.map((movement) => [movement.key, movement] as const)));
  return own.flatMap(({ key, kind, block, line }) => {
    const movement = priced.get(key);
    return movement && kind !== 'bought' ? [[`${block}:${line}`, { value: movement.value, short: exactText(movement.short) }] satisfies [string, LineValue]] : [];
  });
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

function sumsOf(derived: EntryDerivation, lines: ReadonlyMap<string, LineValue>): EntryFigures {
  const valueOf = (kind: 'used' | 'wasted') => sum(derived.uses.filter((use) => use.kind === kind).map(({ block, line }) => lines.get(`${block}:${line}`)?.value ?? 0));
  const minutesOf = (waiting: boolean) => sum(derived.times.filter(({ kind }) => (kind === 'waiting') === waiting).map(({ minutes }) => minutes));
  return {
    used: valueOf('used'), wasted: valueOf('wasted'), costs: sum(costsOf(derived).map(({ money }) => money)),
    bought: sum(derived.receipts.map(broughtToBuild)),
    minutes: minutesOf(false), waiting: minutesOf(true), unsettled: [...lines.values()].some(({ short }) => short !== '0/1'),
  };
}

/** Prices a working copy over the stored ledger alone, in place of what its entry has there: what readers would see, whatever stands in other drafts. */
export async function workingFigures(em: Em, build: Build, entry: Entry, document: EntryDocument): Promise<WorkingFigures> {
  const derived = deriveEntry(document, await entryContext(em, build));
  const own = movementsOf(entry, derived);
  const on = (name: DerivedMovement['on']) => own.filter((movement) => movement.on === name);
  const lines = new Map([
    ...await pricedLines(em, entry, await shelfOfBuild(em, build), on('shelf')),
    ...await pricedLines(em, entry, await findShed(em, build.owner, build.currency), on('shed')),
  ]);
  return { lines, sums: sumsOf(derived, lines) };
}
