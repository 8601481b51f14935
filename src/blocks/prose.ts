import { z } from 'zod';

// The prose of an entry, node by node. ProseMirror checks structure but not attribute values, so both are checked here.

const safeHref = z.string().max(2000).regex(/^(https?:\/\/|mailto:)[^\s]+$/i, 'Links start with https:// or mailto:');
const mark = z.discriminatedUnion('type', [
  z.object({ type: z.literal('bold') }),
  z.object({ type: z.literal('italic') }),
  z.object({ type: z.literal('strike') }),
  z.object({ type: z.literal('code') }),
  z.object({ type: z.literal('link'), attrs: z.object({ href: safeHref }) }),
]);
const text = z.object({ type: z.literal('text'), text: z.string().min(1).max(20_000), marks: z.array(mark).max(5).optional() });
const hardBreak = z.object({ type: z.literal('hardBreak') });
const inline = z.array(z.discriminatedUnion('type', [text, hardBreak])).max(2000).optional();

export const nodeId = z.string().regex(/^[A-Za-z0-9_-]{4,40}$/);
const identified = z.object({ id: nodeId });

const innerParagraph = z.object({ type: z.literal('paragraph'), content: inline });
interface ListItem { type: 'listItem'; content: (z.infer<typeof innerParagraph> | List)[] }
interface List { type: 'bulletList' | 'orderedList'; attrs?: { start?: number | undefined } | undefined; content: ListItem[] }
const innerList: z.ZodType<List> = z.lazy(() => z.object({
  type: z.enum(['bulletList', 'orderedList']),
  attrs: z.object({ start: z.number().int().min(0).max(9999).optional() }).optional(),
  content: z.array(listItem).min(1).max(200),
}));
const listItem: z.ZodType<ListItem> = z.lazy(() => z.object({ type: z.literal('listItem'), content: z.array(z.union([innerParagraph, innerList])).min(1).max(20) }));
const cellAttrs = z.object({ colspan: z.number().int().min(1).max(20).optional(), rowspan: z.number().int().min(1).max(50).optional() }).optional();
const cell = z.object({ type: z.enum(['tableCell', 'tableHeader']), attrs: cellAttrs, content: z.array(innerParagraph).min(1).max(10) });
const row = z.object({ type: z.literal('tableRow'), content: z.array(cell).min(1).max(20) });

/** Top-level prose nodes; each carries an id unique within its entry. */
export const proseNode = z.discriminatedUnion('type', [
  z.object({ type: z.literal('paragraph'), attrs: identified, content: inline }),
  z.object({ type: z.literal('heading'), attrs: identified.extend({ level: z.union([z.literal(2), z.literal(3)]) }), content: inline }),
  z.object({ type: z.literal('bulletList'), attrs: identified, content: z.array(listItem).min(1).max(200) }),
  z.object({ type: z.literal('orderedList'), attrs: identified.extend({ start: z.number().int().min(0).max(9999).optional() }), content: z.array(listItem).min(1).max(200) }),
  z.object({ type: z.literal('blockquote'), attrs: identified, content: z.array(innerParagraph).min(1).max(50) }),
  z.object({ type: z.literal('table'), attrs: identified, content: z.array(row).min(1).max(200) }),
]);
export type ProseNode = z.output<typeof proseNode>;
export const proseTypes: ReadonlySet<string> = new Set(['paragraph', 'heading', 'bulletList', 'orderedList', 'blockquote', 'table']);
