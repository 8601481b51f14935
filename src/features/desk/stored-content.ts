import type { JSONContent } from '@tiptap/core';
import { blockTypes, isProse, type EntryDocument, type TopNode } from '#src/blocks/pure.ts';
import { proseTypes } from '#src/blocks/prose.ts';
import { isSafeAddress } from './prose-extensions.ts';

const plainMarks = new Set(['bold', 'italic', 'strike', 'code']);
const names: ReadonlySet<string> = new Set<string>(blockTypes);

type Mark = NonNullable<JSONContent['marks']>[number];

function storedMark({ type, attrs }: Mark): object[] {
  if (plainMarks.has(type)) return [{ type }];
  const href: unknown = attrs?.['href'];
  return type === 'link' && typeof href === 'string' && isSafeAddress(href) ? [{ type, attrs: { href } }] : [];
}

function storedText(node: JSONContent): object {
  const marks = (node.marks ?? []).flatMap(storedMark);
  return marks.length > 0 ? { type: 'text', text: node.text, marks } : { type: 'text', text: node.text };
}

/** Only the attributes that are stored, and only where they say something. */
function storedAttrs(node: JSONContent, top: boolean): Record<string, unknown> {
  const attrs: Record<string, unknown> = {};
  const keep = (name: string, usual?: unknown) => {
    const value: unknown = node.attrs?.[name];
    if (value !== null && value !== undefined && value !== usual) attrs[name] = value;
  };
  if (top) keep('id');
  if (node.type === 'heading') keep('level');
  if (node.type === 'orderedList') keep('start', 1);
  if (node.type === 'tableCell' || node.type === 'tableHeader') { keep('colspan', 1); keep('rowspan', 1); }
  return attrs;
}

function storedProse(node: JSONContent, top: boolean): object {
  if (node.type === 'text') return storedText(node);
  const attrs = storedAttrs(node, top);
  const content = (node.content ?? []).map((child) => storedProse(child, false));
  return { type: node.type, ...(Object.keys(attrs).length > 0 ? { attrs } : {}), ...(content.length > 0 ? { content } : {}) };
}

function isEmptyParagraph(node: JSONContent): boolean {
  return node.type === 'paragraph' && (node.content ?? []).length === 0;
}

/** What the editor holds, as it is stored: no empty paragraphs at the top, no attributes that say nothing. */
export function storedContent(doc: JSONContent): EntryDocument['content'] {
  return (doc.content ?? []).flatMap((node): TopNode[] => {
    if (isEmptyParagraph(node)) return [];
    // The editor's own schema has the same nodes; the server checks every attribute again.
    if (node.type !== undefined && proseTypes.has(node.type)) return [storedProse(node, true) as TopNode];
    if (node.type !== undefined && names.has(node.type)) return [{ type: node.type, attrs: { id: node.attrs?.['id'], version: node.attrs?.['version'], data: node.attrs?.['data'] } } as TopNode];
    return [];
  });
}

/** A stored text as the editor takes it; an empty one has a line to write on. */
export function editorContent(content: EntryDocument['content']): JSONContent {
  const nodes = content.map((node) => (isProse(node) ? node : { type: node.type, attrs: node.attrs })) as JSONContent[];
  return { type: 'doc', content: nodes.length > 0 ? nodes : [{ type: 'paragraph' }] };
}
