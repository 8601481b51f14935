import { z } from 'zod';
import { plainDay } from '#contracts/fields.ts';
import { nodeId, proseNode, proseTypes, type ProseNode } from './prose.ts';
import { pureBlocks, type BlockType } from './pure-list.ts';

function blockNode<T extends string, S extends z.ZodType>(block: { readonly type: T; readonly version: number; readonly schema: S }) {
  return z.object({ type: z.literal(block.type), attrs: z.object({ id: nodeId, version: z.literal(block.version), data: block.schema }) });
}

/** A block as stored: `type`, `version`, `id` and its data. */
export interface BlockNode<T extends BlockType = BlockType> {
  type: T;
  attrs: { id: string; version: number; data: BlockData<T> };
}
export type BlockData<T extends BlockType> = z.output<(typeof pureBlocks)[T]['schema']>;
export type TopNode = ProseNode | { [T in BlockType]: BlockNode<T> }[BlockType];

const blockNodes = z.union([
  blockNode(pureBlocks.photos), blockNode(pureBlocks.used), blockNode(pureBlocks.bought), blockNode(pureBlocks.cost),
  blockNode(pureBlocks.time), blockNode(pureBlocks.finding), blockNode(pureBlocks.caution),
]);
const topNode: z.ZodType<TopNode> = z.union([proseNode, blockNodes]);

export const workUnits = ['piece', 'm', 'm2', 'ft', 'ft2', 'h'] as const;
export const workDone = z.object({
  /** As typed: "17", "3.2", "4 1/2". */
  amount: z.string().max(20),
  unit: z.enum(workUnits),
  /** The kind of work, singular: "steamed rib", "panel coated". */
  kind: z.string().max(60),
});
export type WorkDone = z.output<typeof workDone>;

const mostLines = 2000;
function linesOf(node: TopNode): number {
  if (isProse(node)) return 0;
  return Object.values(node.attrs.data).reduce((sum: number, value: unknown) => sum + (Array.isArray(value) ? value.length : 0), 0);
}
function holdsSoManyLines(content: readonly TopNode[]): boolean {
  return content.reduce((sum, node) => sum + linesOf(node), 0) <= mostLines;
}

/** One write-up as the desk holds it: the words, the blocks, and the few facts above them. */
export const entryDocument = z.object({
  title: z.string().max(140),
  lead: z.string().max(600),
  day: plainDay,
  dayTo: plainDay.nullable(),
  stage: z.number().int().positive().nullable(),
  work: workDone.nullable(),
  content: z.array(topNode).max(600).refine(holdsSoManyLines, 'A day holds 2,000 lines at most: write the rest up as another day.'),
});
export type EntryDocument = z.output<typeof entryDocument>;

export function isProse(node: TopNode): node is ProseNode {
  return proseTypes.has(node.type);
}

/** Brings stored blocks up to the version of today, one step at a time, before they are parsed. */
export function steppedUp(content: readonly unknown[]): unknown[] {
  return content.map((node) => {
    const stored = node as { type?: unknown; attrs?: { version?: unknown; data?: unknown } };
    const block = typeof stored.type === 'string' && stored.type in pureBlocks ? pureBlocks[stored.type as BlockType] : undefined;
    if (!block || typeof stored.attrs?.version !== 'number') return node;
    let { version, data } = stored.attrs as { version: number; data: unknown };
    const steps: Readonly<Record<number, (old: unknown) => unknown>> = block.stepsUp;
    for (let step = steps[version]; version < block.version && step; step = steps[version]) {
      data = step(data);
      version += 1;
    }
    return { ...stored, attrs: { ...stored.attrs, version, data } };
  });
}

/** A stored document with its blocks at the versions of today. */
export function currentDocument(stored: EntryDocument): EntryDocument {
  return { ...stored, content: steppedUp(stored.content) as TopNode[] };
}

/** Renews ids that occur twice: of two equal ones the later gets a new one (`renew` makes it). Lines likewise, within the entry. */
export function withUniqueIds(document: EntryDocument, renew: () => string): EntryDocument {
  const taken = new Set<string>();
  const fresh = (id: string) => {
    const unique = taken.has(id) ? renew() : id;
    taken.add(unique);
    return unique;
  };
  const content = document.content.map((node) => {
    const id = fresh(node.attrs.id);
    if (isProse(node)) return { ...node, attrs: { ...node.attrs, id } };
    const data: unknown = Object.fromEntries(Object.entries(node.attrs.data).map(([field, value]) => [
      field, Array.isArray(value) ? value.map((line: { id: string }) => ({ ...line, id: fresh(line.id) })) : value,
    ]));
    return { ...node, attrs: { ...node.attrs, id, data } };
  });
  return { ...document, content: content as TopNode[] };
}
