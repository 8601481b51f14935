import type { DeskView } from '#contracts/entries.ts';
import { priceMaterial, type MaterialLedger, type PricingMethod } from '#domain/ledger/price.ts';
import type { Movement, MovementKind } from '#domain/ledger/movement.ts';
import { exactFrom } from '#domain/quantity.ts';
import type { EntryDerivation } from '#src/blocks/pure.ts';

export type ShelfName = 'shelf' | 'shed';

/** One material on one shelf: the unit in which anything is priced. */
export function shelfKey(material: number | string, shelf: ShelfName): string {
  return `${shelf}:${material}`;
}

/** Key of a line's movement; the history holds none of this entry's own, so nothing clashes. */
export function lineKey(block: string, line: string): string {
  return `${block}:${line}`;
}

const kinds: ReadonlySet<string> = new Set<MovementKind>(['bought', 'given', 'used', 'wasted', 'returned', 'sold', 'counted']);
function isMovementKind(kind: string): kind is MovementKind {
  return kinds.has(kind);
}

function pastMovements(view: DeskView): Map<string, Movement[]> {
  return new Map(view.history.map(({ material, shelf, rows }) => [
    shelfKey(material, shelf),
    rows.flatMap((row) => isMovementKind(row.kind) ? [{
      key: `past:${row.key}`, kind: row.kind, material: String(material), day: row.day, sequence: row.sequence, place: row.place, amount: exactFrom(row.amount),
      ...(row.cost === null ? {} : { cost: row.cost }), ...(row.of === null ? {} : { of: `past:${row.of}` }), ...(row.shortage === null ? {} : { shortage: row.shortage }),
    }] : []),
  ]));
}

/** What this entry does to each shelf: its uses, and what it bought and already has. */
function ownMovements(derived: EntryDerivation, sequence: number): Map<string, Movement[]> {
  const own = new Map<string, Movement[]>();
  const add = (shelf: ShelfName, movement: Movement) => {
    const key = shelfKey(movement.material, shelf);
    own.set(key, [...(own.get(key) ?? []), movement]);
  };
  for (const use of derived.uses) {
    add(use.from, { key: lineKey(use.block, use.line), kind: use.kind, material: String(use.material), day: use.day, sequence, place: use.place, amount: exactFrom(use.amount) });
  }
  for (const receipt of derived.receipts) {
    receipt.lines.forEach((line, index) => {
      if ((line.goes !== 'shelf' && line.goes !== 'shed') || line.material === null || line.amount === null || line.arrivedOn === null) return;
      add(line.goes, { key: lineKey(receipt.block, line.line), kind: 'bought', material: String(line.material), day: line.arrivedOn, sequence, place: receipt.place + index, amount: exactFrom(line.amount), cost: line.door });
    });
  }
  return own;
}

function stateOf(movements: readonly Movement[], method: PricingMethod): string {
  return `${method} ${movements.map((one) => [one.key, one.kind, one.day, one.sequence, one.place, `${one.amount.n}/${one.amount.d}`, one.cost ?? ''].join(' ')).join(';')}`;
}

export interface ShelfReplay {
  /** Replays what the entry touches, each material of each shelf by itself; what has not changed since is not replayed again. */
  readonly price: (derived: EntryDerivation) => ReadonlyMap<string, MaterialLedger>;
  /** Movements replayed so far: work counted. */
  readonly replayed: () => number;
}

/** Lays an entry's own movements over what stands in the ledger without it. */
export function shelfReplay(view: DeskView): ShelfReplay {
  const past = pastMovements(view);
  const kept = new Map<string, { state: string; ledger: MaterialLedger }>();
  let replayed = 0;

  const ledgerOf = (key: string, own: readonly Movement[]): MaterialLedger => {
    const [shelf = '', material = ''] = key.split(':');
    const method = shelf === 'shed' ? view.shedMethod : view.build.method;
    const state = stateOf(own, method);
    const before = kept.get(key);
    if (before?.state === state) return before.ledger;
    const ledger = priceMaterial(material, [...(past.get(key) ?? []), ...own], method);
    replayed += ledger.replayed;
    kept.set(key, { state, ledger });
    return ledger;
  };

  return {
    price: (derived) => new Map([...ownMovements(derived, view.entry.sequence)].map(([key, own]) => [key, ledgerOf(key, own)])),
    replayed: () => replayed,
  };
}
