import type { CostCategory, Counts } from '#contracts/words.ts';
import type { Movement } from '#server/entities/index.ts';
import type { EntryDerivation } from '#src/blocks/pure.ts';

// The rows an entry lays down, as plain values: signing off stores them, the desk lays them over the stored ledger, and the check of the whole database compares them.

export interface DerivedMovement {
  readonly on: 'shelf' | 'shed';
  readonly material: number;
  readonly key: string;
  readonly kind: 'bought' | 'used' | 'wasted';
  readonly block: string;
  readonly line: string;
  readonly day: string;
  readonly sequence: number;
  readonly place: number;
  readonly typed: string;
  readonly amount: string;
  readonly cost: number | null;
  readonly of: null;
  readonly shortage: null;
  readonly counts: Counts | null;
}

/** Key of a line's movement, unique on its shelf and the same through every edit. */
export function movementKey(entry: number, block: string, line: string): string {
  return `${entry}:${block}:${line}`;
}

interface Source { readonly id: number; readonly sequence: number }

function usesOf({ id, sequence }: Source, derived: EntryDerivation): DerivedMovement[] {
  return derived.uses.map(({ block, line, place, material, kind, from, counts, typed, amount, day }) => ({
    on: from, material, key: movementKey(id, block, line), kind, block, line, day, sequence, place, typed, amount, cost: null, of: null, shortage: null, counts,
  }));
}

/** What was bought and is there: a line on order brings nothing in yet. */
function lotsOf({ id, sequence }: Source, derived: EntryDerivation): DerivedMovement[] {
  return derived.receipts.flatMap(({ block, place, lines }) => lines.flatMap((one, index) => {
    const { line, goes, material, amount, arrivedOn, typed, door } = one;
    if ((goes !== 'shelf' && goes !== 'shed') || material === null || amount === null || arrivedOn === null) return [];
    return [{
      on: goes, material, key: movementKey(id, block, line), kind: 'bought' as const, block, line, day: arrivedOn, sequence, place: place + index,
      typed, amount, cost: door, of: null, shortage: null, counts: null,
    }];
  }));
}

/** An entry's movements on the build's shelf and on the shed, in the place each has in the document. */
export function movementsOf(source: Source, derived: EntryDerivation): DerivedMovement[] {
  return [...lotsOf(source, derived), ...usesOf(source, derived)].toSorted((a, b) => a.place - b.place);
}

export interface DerivedCostRow {
  readonly block: string;
  readonly line: string;
  /** It came from a receipt's line, straight into use. */
  readonly fromReceipt: boolean;
  readonly day: string;
  readonly category: CostCategory;
  readonly label: string;
  readonly money: number;
}

/** An entry's costs: of its Cost blocks, and of receipt lines that went straight into use. */
export function costsOf(derived: EntryDerivation): DerivedCostRow[] {
  const straight = derived.receipts.flatMap(({ block, day, lines }) => lines
    .filter(({ goes }) => goes === 'straight')
    .map(({ line, arrivedOn, category, label, door }) => ({ block, line, fromReceipt: true, day: arrivedOn ?? day, category, label, money: door })));
  const typed = derived.costs.map(({ block, line, day, category, label, money }) => ({ block, line, fromReceipt: false, day, category, label, money }));
  return [...straight, ...typed];
}

/** The build a movement is charged to: a lot that goes to the shed is the shed's own. */
export function chargedToBuild(movement: Pick<DerivedMovement, 'on'> & Pick<Movement, 'kind'>): boolean {
  return movement.on === 'shelf' || movement.kind !== 'bought';
}
