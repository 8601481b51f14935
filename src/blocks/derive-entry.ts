import { dayProblem } from '#domain/day.ts';
import { mostOfDay } from '#domain/money.ts';
import { readAmountOfWork } from '#domain/work.ts';
import { workKindName } from '#domain/work-words.ts';
import type { BlockContext, BlockDerivation, DerivedCost, DerivedReceipt, DerivedTime, DerivedUse, PureBlock, ShownPicture } from './block.ts';
import { isProse, type BlockNode, type EntryDocument, type TopNode } from './entry-document.ts';
import { pureBlocks, type BlockType } from './pure-list.ts';
import { plainWords } from './plain-words.ts';

/** What stands around an entry: everything of `BlockContext` that is not in the document itself. */
export type EntryContext = Omit<BlockContext, 'day' | 'dayTo' | 'stage'>;

interface Placed { block: string; place: number }
export interface EntryDerivation {
  /** Words for beside each field, by `title`, `work.amount` or `block.line.field`. Signing off needs none. */
  faults: Record<string, string>;
  remarks: string[];
  uses: (DerivedUse & Placed)[];
  receipts: (DerivedReceipt & Placed)[];
  costs: (DerivedCost & Placed)[];
  times: (DerivedTime & Placed)[];
  pictures: (ShownPicture & Placed)[];
  /** Exact `n/d` in `unit`, with its kind; nothing where none was written up. */
  work: { amount: string; unit: string; kind: string } | null;
}

export function contextOf(document: EntryDocument, context: EntryContext): BlockContext {
  return { ...context, day: document.day, dayTo: document.dayTo, stage: document.stage };
}

// One type's data always meets its own block, which the index type cannot say.
function pureOf(type: BlockType): PureBlock<BlockType> {
  return pureBlocks[type] as unknown as PureBlock<BlockType>;
}

function entryFaults(document: EntryDocument): Record<string, string> {
  const faults: Record<string, string> = {};
  if (document.title.trim() === '') faults['title'] = 'Give the day a title.';
  for (const field of ['day', 'dayTo'] as const) {
    const problem = dayProblem(document[field] ?? document.day);
    if (problem !== null) faults[field] = problem;
  }
  if (document.dayTo !== null && document.dayTo < document.day) faults['dayTo'] = 'The last day comes before the first.';
  if (document.content.every((node) => isProse(node) && plainWords(node).trim() === '')) faults['content'] = 'Write a few words, or put in a block.';
  return faults;
}

function workOf(document: EntryDocument, faults: Record<string, string>): EntryDerivation['work'] {
  const { work } = document;
  if (!work || (work.amount.trim() === '' && work.kind.trim() === '')) return null;
  if (work.kind.trim() === '') faults['work.kind'] = 'Say what was done, such as “panel coated”.';
  const amount = readAmountOfWork(work.amount);
  if (!amount.ok) faults['work.amount'] = amount.problem;
  return amount.ok && work.kind.trim() !== '' ? { amount: amount.value, unit: work.unit, kind: workKindName(work.kind) } : null;
}

/** What each block brings in and spends, minor units of the build's currency. */
function moneyByBlock({ receipts, costs }: EntryDerivation): Map<string, number> {
  const sums = new Map<string, number>();
  for (const { block, money } of costs) sums.set(block, (sums.get(block) ?? 0) + money);
  for (const { block, total, notSorted } of receipts) sums.set(block, (sums.get(block) ?? 0) + total + notSorted);
  return sums;
}

/** A day of more money than a day can hold is a slip of the finger: said beside the block that holds the most, and none of it is counted. */
function withMoneyThatFits(derived: EntryDerivation): EntryDerivation {
  const sums = moneyByBlock(derived);
  if ([...sums.values()].reduce((sum, money) => sum + money, 0) <= mostOfDay) return derived;
  const [[block] = ['content']] = [...sums].toSorted(([, a], [, b]) => b - a);
  return { ...derived, faults: { ...derived.faults, [block]: 'That is more money than a day can hold: look at these figures again.' }, receipts: [], costs: [] };
}

/** Everything an entry says to the ledger, as one pure function of its document: movements, receipts, costs, time, work, pictures, and what bars signing off. */
export function deriveEntry(document: EntryDocument, context: EntryContext): EntryDerivation {
  const around = contextOf(document, context);
  const faults = entryFaults(document);
  const result: EntryDerivation = { faults, remarks: [], uses: [], receipts: [], costs: [], times: [], pictures: [], work: workOf(document, faults) };
  let place = 0;
  for (const node of document.content) {
    if (isProse(node)) continue;
    const block = node.attrs.id;
    const derived: BlockDerivation = pureOf(node.type).derive(node.attrs.data, around);
    for (const fault of derived.faults) faults[fault.path === '' ? block : `${block}.${fault.path}`] = fault.problem;
    result.remarks.push(...(derived.remarks ?? []));
    const placed = <T>(items: readonly T[] | undefined) => (items ?? []).map((item) => ({ ...item, block, place: place++ }));
    result.uses.push(...placed(derived.uses));
    result.costs.push(...placed(derived.costs));
    result.times.push(...placed(derived.times));
    result.pictures.push(...placed(derived.pictures));
    if (derived.receipt) {
      result.receipts.push({ ...derived.receipt, block, place });
      place += derived.receipt.lines.length;
    }
  }
  return withMoneyThatFits(result);
}

/** Reads every typed amount that is new or changed; words that stood in `kept` keep the amount they had. */
export function readEntry(document: EntryDocument, kept: readonly EntryDocument[], context: EntryContext): EntryDocument {
  const around = contextOf(document, context);
  const before = new Map<string, BlockNode>();
  for (const old of kept) for (const node of old.content) if (!isProse(node)) before.set(`${node.type}:${node.attrs.id}`, node);
  const content = document.content.map((node) => {
    if (isProse(node)) return node;
    const { read } = pureOf(node.type);
    if (!read) return node;
    const data = read(node.attrs.data, before.get(`${node.type}:${node.attrs.id}`)?.attrs.data ?? null, around);
    return { ...node, attrs: { ...node.attrs, data } } as TopNode;
  });
  return { ...document, content };
}
