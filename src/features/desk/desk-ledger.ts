import Fraction from 'fraction.js';
import type { DeskView } from '#contracts/entries.ts';
import { estimateOf } from '#domain/ledger/estimate.ts';
import type { MaterialLedger } from '#domain/ledger/price.ts';
import { whatOneTakes } from '#domain/one-takes.ts';
import { exactFrom, exactText } from '#domain/quantity.ts';
import { broughtToBuild, deriveEntry, readEntry, type EntryDerivation, type EntryDocument, type MaterialFacts } from '#src/blocks/pure.ts';
import { readBought } from '#src/blocks/bought/bought.ts';
import { contextOf, type EntryContext } from '#src/blocks/derive-entry.ts';
import type { LineReckoning } from '#src/blocks/figures-store.ts';
import { lineKey, shelfKey, shelfReplay, type ShelfName } from './shelf-replay.ts';
import { stageReckoning, type StageReckoning } from './stage-reckoning.ts';

/** The day's figures, minor units of the build's currency. */
export interface DayFigures {
  readonly used: number;
  readonly wasted: number;
  /** Hire, carriage, tools, and what went straight into use. */
  readonly costs: number;
  /** used + wasted + costs */
  readonly day: number;
  /** To the door, without what went to the shed or is not ours. */
  readonly bought: number;
  /** A figure of a receipt cannot be read, so that what was bought cannot be told. */
  readonly boughtUnread: boolean;
  /** Lines not bought yet, or not all of it: their money is not settled. */
  readonly linesShort: number;
  /** What those would cost at the last prices paid, as far as any is known; in no sum. */
  readonly estimate: number | null;
  readonly minutes: number;
  readonly waiting: number;
  readonly people: number;
}

export interface OneTakesFigures {
  readonly kind: string;
  readonly unit: string;
  readonly money: number;
  readonly minutes: number;
  /** Some of it is not bought yet. */
  readonly unsettled: boolean;
}

export interface ShelfAfter {
  readonly material: number;
  readonly shelf: ShelfName;
  /** Exact `n/d`. */
  readonly left: string;
  readonly short: string;
}

export interface DeskReckoning {
  /** The document with every typed amount read. */
  readonly document: EntryDocument;
  readonly derived: EntryDerivation;
  readonly lines: ReadonlyMap<string, LineReckoning>;
  readonly figures: DayFigures;
  readonly one: OneTakesFigures | null;
  readonly stage: StageReckoning | null;
  /** What this entry touches, as it would stand. */
  readonly shelf: readonly ShelfAfter[];
}

export interface DeskLedger {
  readonly reckon: (document: EntryDocument, materials: ReadonlyMap<number, MaterialFacts>) => DeskReckoning;
  readonly replayed: () => number;
}

const noughtText = '0/1';

function lineReckonings(derived: EntryDerivation, ledgers: ReadonlyMap<string, MaterialLedger>): Map<string, LineReckoning> {
  const priced = new Map([...ledgers.values()].flatMap(({ movements, lastPaid }) => movements.map((movement) => [movement.key, { ...movement, lastPaid }] as const)));
  const lines = new Map<string, LineReckoning>();
  for (const use of derived.uses) {
    const movement = priced.get(lineKey(use.block, use.line));
    if (movement) lines.set(lineKey(use.block, use.line), { value: movement.value, short: exactText(movement.short), estimate: estimateOf(movement.short, movement.lastPaid), left: exactText(movement.left) });
  }
  for (const receipt of derived.receipts) {
    for (const line of receipt.lines) {
      const movement = priced.get(lineKey(receipt.block, line.line));
      lines.set(lineKey(receipt.block, line.line), { value: line.door, short: noughtText, estimate: null, left: movement ? exactText(movement.left) : null });
    }
  }
  return lines;
}

function sumOf(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0);
}

/** What went straight into use from a receipt is a cost of the day. */
function costsOf(derived: EntryDerivation): number {
  const straight = derived.receipts.flatMap(({ lines }) => lines.filter(({ goes }) => goes === 'straight').map(({ door }) => door));
  return sumOf(derived.costs.map(({ money }) => money)) + sumOf(straight);
}

function isShort(line: LineReckoning | undefined): boolean {
  return line !== undefined && exactFrom(line.short).gt(0);
}

function figuresOf(derived: EntryDerivation, lines: ReadonlyMap<string, LineReckoning>, boughtUnread: boolean): DayFigures {
  const valueOf = (kind: 'used' | 'wasted') => sumOf(derived.uses.filter((use) => use.kind === kind).map((use) => lines.get(lineKey(use.block, use.line))?.value ?? 0));
  const [used, wasted, costs] = [valueOf('used'), valueOf('wasted'), costsOf(derived)];
  const short = derived.uses.map((use) => lines.get(lineKey(use.block, use.line))).filter(isShort);
  const estimates = short.flatMap((line) => line?.estimate ?? []);
  const handsOn = derived.times.filter(({ kind }) => kind !== 'waiting');
  return {
    used, wasted, costs, day: used + wasted + costs,
    bought: sumOf(derived.receipts.map(broughtToBuild)), boughtUnread,
    linesShort: short.length,
    estimate: estimates.length === 0 ? null : sumOf(estimates),
    minutes: sumOf(handsOn.map(({ minutes }) => minutes)),
    waiting: sumOf(derived.times.filter(({ kind }) => kind === 'waiting').map(({ minutes }) => minutes)),
    people: new Set(handsOn.map(({ handle, name }) => handle ?? name.toLowerCase())).size,
  };
}

function oneOf(derived: EntryDerivation, lines: ReadonlyMap<string, LineReckoning>): OneTakesFigures | null {
  if (!derived.work) return null;
  const uses = derived.uses.map((use) => ({
    material: String(use.material), kind: use.kind, counts: use.counts, amount: exactFrom(use.amount), value: lines.get(lineKey(use.block, use.line))?.value ?? 0,
  }));
  const one = whatOneTakes({ work: new Fraction(exactFrom(derived.work.amount)), uses, times: derived.times });
  const unsettled = derived.uses.some((use) => use.kind === 'used' && use.counts === 'each' && isShort(lines.get(lineKey(use.block, use.line))));
  return one && { kind: derived.work.kind, unit: derived.work.unit, money: one.money, minutes: one.minutes, unsettled };
}

function shelfAfter(ledgers: ReadonlyMap<string, MaterialLedger>): ShelfAfter[] {
  return [...ledgers].map(([key, ledger]) => ({
    material: Number(ledger.material), shelf: key.startsWith('shed:') ? 'shed' as const : 'shelf' as const, left: exactText(ledger.left), short: exactText(ledger.notBoughtYet),
  }));
}

/**
 * Figures while somebody types: the same domain code as the server's, over the history the desk was given.
 * One is made per desk view; it keeps what it has priced, so that a keystroke replays only the material it touches.
 */
export function deskLedger(view: DeskView): DeskLedger {
  const replay = shelfReplay(view);
  return {
    reckon: (typed, materials) => {
      const context: EntryContext = { measures: view.build.measures, currency: view.build.currency, materials };
      const document = readEntry(typed, [view.entry.document], context);
      const derived = deriveEntry(document, context);
      const ledgers = replay.price(derived);
      const lines = lineReckonings(derived, ledgers);
      const unread = document.content.some((node) => node.type === 'bought' && readBought(node.attrs.data, contextOf(document, context)).unread.length > 0);
      const figures = figuresOf(derived, lines, unread);
      return { document, derived, lines, figures, one: oneOf(derived, lines), stage: stageReckoning(view, document, derived, figures, lines), shelf: shelfAfter(ledgers) };
    },
    replayed: replay.replayed,
  };
}

export { lineKey, shelfKey };
