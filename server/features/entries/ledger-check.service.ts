import { deriveEntry, type EntryDerivation } from '#src/blocks/pure.ts';
import { Build, Cost, Entry, Movement, Receipt, ReceiptLine, TimeLine } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { verifyShelves, type LedgerReport } from '#server/features/shelf/ledger-verify.service.ts';
import { chargedToBuild, costsOf, movementsOf } from './derived-rows.ts';
import { entryContext, nothingDerived } from './entry-context.ts';
import { storedDocument } from './stored-document.ts';

type Row = Readonly<Record<string, string | number | null | undefined>>;
type RowsByName = ReadonlyMap<string, Row>;

async function storedRows(em: Em, entry: Entry): Promise<RowsByName> {
  const rows = new Map<string, Row>();
  for (const row of await em.find(Movement, { entry: entry.id }, { populate: ['shelf'] })) {
    const { key, kind, block, line, day, sequence, place, typed, amount, cost, counts } = row;
    const charged = row.build?.id ?? null;
    rows.set(`movement ${key}`, { kind, block, line, day, sequence, place, typed, amount, cost, counts, material: row.material.id, stage: row.stage?.id, shed: row.shelf.build ? 0 : 1, charged });
  }
  for (const { block, sequence, day, supplier, currency, rate, basis, discount, delivery, tax, paperTotal, total, notSorted } of await em.find(Receipt, { entry: entry.id })) {
    rows.set(`receipt ${block ?? ''}`, { sequence, day, supplier, currency, rate, basis, discount, delivery, tax, paperTotal, total, notSorted });
  }
  for (const row of await em.find(ReceiptLine, { receipt: { entry: entry.id } }, { populate: ['receipt'] })) {
    const { line, position, typed, amount, own, door, goes, arrivedOn } = row;
    rows.set(`line ${row.receipt.block ?? ''}:${line}`, { position, material: row.material?.id, typed, amount, own, door, goes, arrivedOn });
  }
  for (const row of await em.find(Cost, { entry: entry.id })) {
    const { block, line, day, sequence, category, label, money } = row;
    rows.set(`cost ${block ?? ''}:${line ?? ''}`, { day, sequence, category, label, money, stage: row.stage?.id, fromReceipt: row.receiptLine ? 1 : 0 });
  }
  for (const row of await em.find(TimeLine, { entry: entry.id })) {
    const { block, line, day, name, minutes, what, kind } = row;
    rows.set(`time ${block}:${line}`, { day, name, minutes, what, kind, stage: row.stage?.id });
  }
  return rows;
}

function derivedRows(entry: Entry, derived: EntryDerivation): RowsByName {
  const stage = entry.stage?.id;
  const build = entry.build.id;
  return new Map<string, Row>([
    ...movementsOf(entry, derived).map(({ key, on, of: _, shortage: __, ...row }) => [`movement ${key}`, {
      ...row, shed: on === 'shed' ? 1 : 0, stage: row.kind === 'bought' ? null : stage, charged: chargedToBuild({ on, kind: row.kind }) ? build : null,
    }] as const),
    ...derived.receipts.map(({ block, place: _, lines: __, ...row }) => [`receipt ${block}`, { ...row, sequence: entry.sequence }] as const),
    ...derived.receipts.flatMap(({ block, lines }) => lines.map(({ line, category: _, label: __, ...row }, position) => [`line ${block}:${line}`, { ...row, position }] as const)),
    ...costsOf(derived).map(({ block, line, fromReceipt, ...row }) => [`cost ${block}:${line}`, { ...row, sequence: entry.sequence, stage, fromReceipt: fromReceipt ? 1 : 0 }] as const),
    ...derived.times.map(({ block, line, handle: _, place: __, ...row }) => [`time ${block}:${line}`, { ...row, stage }] as const),
  ]);
}

function rowDifferences(where: string, stored: RowsByName, derived: RowsByName): string[] {
  return [...new Set([...stored.keys(), ...derived.keys()])].flatMap((name) => {
    const [there, meant] = [stored.get(name), derived.get(name)];
    if (!there) return [`${where}: ${name} is missing`];
    if (!meant) return [`${where}: ${name} stands in no document`];
    return Object.keys(meant).flatMap((field) => {
      const [is, should] = [there[field] ?? null, meant[field] ?? null];
      return is === should ? [] : [`${where}: ${name}, ${field} ${is} is stored, its document says ${should}`];
    });
  });
}

async function entryDifferences(em: Em, build: Build): Promise<{ count: number; differences: string[] }> {
  const context = await entryContext(em, build);
  const entries = await em.find(Entry, { build: build.id }, { orderBy: { number: 'asc' } });
  const differences: string[] = [];
  for (const entry of entries) {
    const derived = entry.published ? deriveEntry(storedDocument(entry.published), context) : nothingDerived;
    differences.push(...rowDifferences(`build ${build.id}, entry ${entry.number}`, await storedRows(em.fork({ keepTransactionContext: true }), entry), derivedRows(entry, derived)));
  }
  return { count: entries.length, differences };
}

/**
 * Checks the whole ledger from nothing: the rows of every entry are what its published document says, every movement's value
 * is what a replay gives, and the sum holds for every build and shed.
 * @param only.owner one restorer's builds and sheds, or nothing for all
 */
export async function verifyLedger(em: Em, only: { owner?: number } = {}): Promise<LedgerReport & { readonly entries: number }> {
  const builds = await em.find(Build, only, { populate: ['owner'], orderBy: { id: 'asc' } });
  const differences: string[] = [];
  let entries = 0;
  for (const build of builds) {
    const found = await entryDifferences(em.fork({ keepTransactionContext: true }), build);
    entries += found.count;
    differences.push(...found.differences);
  }
  const shelves = await verifyShelves(em.fork({ keepTransactionContext: true }), only);
  return { ...shelves, entries, differences: [...differences, ...shelves.differences] };
}
