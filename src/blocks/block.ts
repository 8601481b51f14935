import type { z } from 'zod';
import type { SlipView } from '#contracts/slip.ts';
import type { Basis, CostCategory, Counts, HazardTag, LineGoes, TimeKind } from '#contracts/words.ts';
import type { Pack, Ratio } from '#domain/quantity-reading.ts';
import type { Dimension, Measures } from '#domain/units.ts';

/** What a block needs to know of a material to read, derive and show a line of it. */
export interface MaterialFacts {
  readonly id: number;
  readonly name: string;
  readonly dimension: Dimension;
  readonly unit: string;
  readonly packs: readonly Pack[];
  readonly ratio: Ratio | null;
  readonly hazards: readonly HazardTag[];
}

/** What stands around a block in its entry and build. */
export interface BlockContext {
  readonly measures: Measures;
  /** The build's currency. */
  readonly currency: string;
  readonly day: string;
  readonly dayTo: string | null;
  readonly stage: number | null;
  readonly materials: ReadonlyMap<number, MaterialFacts>;
}

/** Something that must be mended before the day can be signed off; `path` is `line.field`, `field` or empty. */
export interface BlockFault {
  readonly path: string;
  readonly problem: string;
}

export interface DerivedUse {
  readonly line: string;
  readonly material: number;
  readonly kind: 'used' | 'wasted';
  readonly from: 'shelf' | 'shed';
  readonly counts: Counts;
  readonly typed: string;
  /** Exact `n/d` in the material's base unit. */
  readonly amount: string;
  readonly day: string;
}

export interface DerivedReceiptLine {
  readonly line: string;
  readonly label: string;
  readonly material: number | null;
  readonly typed: string;
  readonly amount: string | null;
  /** Minor units of the receipt's currency. */
  readonly own: number;
  /** Cost to the door, minor units of the build's currency. */
  readonly door: number;
  readonly goes: LineGoes;
  readonly category: CostCategory;
  /** Nothing while on order. */
  readonly arrivedOn: string | null;
}

export interface DerivedReceipt {
  readonly day: string;
  readonly supplier: string;
  readonly currency: string;
  readonly rate: string;
  readonly basis: Basis;
  readonly discount: number;
  readonly delivery: number;
  readonly tax: number;
  readonly paperTotal: number | null;
  readonly total: number;
  readonly notSorted: number;
  readonly lines: readonly DerivedReceiptLine[];
}

export interface DerivedCost {
  readonly line: string;
  readonly day: string;
  readonly category: CostCategory;
  readonly label: string;
  readonly money: number;
}

export interface DerivedTime {
  readonly line: string;
  readonly day: string;
  /** Handle of a member, or nothing for just a name. */
  readonly handle: string | null;
  readonly name: string;
  readonly minutes: number;
  readonly what: string;
  readonly kind: TimeKind;
}

export interface ShownPicture {
  readonly line: string;
  readonly key: string;
  readonly alt: string;
  readonly caption: string;
  readonly cover: boolean;
}

/** Everything one block says to the ledger. */
export interface BlockDerivation {
  readonly faults: readonly BlockFault[];
  readonly uses?: readonly DerivedUse[];
  readonly receipt?: DerivedReceipt;
  readonly costs?: readonly DerivedCost[];
  readonly times?: readonly DerivedTime[];
  readonly pictures?: readonly ShownPicture[];
  /** Worth a look, but no bar to signing off. */
  readonly remarks?: readonly string[];
}

/** Priced figures of an entry's lines, as a block's projection reads them. */
export interface LineFigures {
  /** Settled so far, minor units of the build's currency; absent where costs are hidden. */
  readonly value: number | null;
  /** Exact `n/d`: not bought yet. */
  readonly short: string;
  /** What the short part would cost at the last price paid; nothing where none is known, or costs are hidden. */
  readonly estimate: number | null;
}

export interface ProjectionContext extends BlockContext {
  readonly costsShown: boolean;
  /** By `block:line`. */
  readonly figures: ReadonlyMap<string, LineFigures>;
  /** "17 steamed ribs", where work done was written up. */
  readonly workWords: string | null;
  readonly names: ReadonlyMap<string, string>;
}

/** One block type, its pure half: the schema of what is stored, the steps up from older versions, what it says to the ledger and to readers. */
export interface PureBlock<Type extends string = string, Data = unknown> {
  readonly type: Type;
  readonly version: number;
  readonly schema: z.ZodType<Data>;
  /** `stepsUp[n]` turns data of version n into version n + 1. */
  readonly stepsUp: Readonly<Record<number, (old: unknown) => unknown>>;
  /** Reads the typed amounts; a line whose words are those of `kept` keeps the amount it had. */
  readonly read?: (data: Data, kept: Data | null, context: BlockContext) => Data;
  readonly derive: (data: Data, context: BlockContext) => BlockDerivation;
  /** A slip for the tally margin; blocks that stand in the text have none. */
  readonly slip?: (id: string, data: Data, context: ProjectionContext) => SlipView | null;
}

export function pureBlock<const Type extends string, Data>(block: PureBlock<Type, Data>): PureBlock<Type, Data> {
  return block;
}
