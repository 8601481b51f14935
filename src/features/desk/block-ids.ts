import { Extension } from '@tiptap/core';
import { Fragment, Slice, type Node } from '@tiptap/pm/model';
import { Plugin, PluginKey } from '@tiptap/pm/state';
import { nanoid } from 'nanoid';
import { proseTypes } from '#src/blocks/prose.ts';

export function newId(): string {
  return nanoid(10);
}

function isLine(value: unknown): value is { id: string } {
  return typeof value === 'object' && value !== null && 'id' in value && typeof value.id === 'string';
}

/** The ids a top-level node holds: its own, and those of its lines. */
export function idsOf(node: Node): string[] {
  const own: unknown = node.attrs['id'];
  const lines = Object.values((node.attrs['data'] ?? {}) as Record<string, unknown>).flatMap((value) => (Array.isArray(value) ? value.filter(isLine).map(({ id }) => id) : []));
  return [...(typeof own === 'string' ? [own] : []), ...lines];
}

/** Attributes of a node with every id that is missing or taken made new; the same object where nothing had to change. Adds its ids to `taken`. */
function attrsWithFreshIds(node: Node, taken: Set<string>): Node['attrs'] {
  let changed = false;
  const fresh = (id: unknown): string => {
    const kept = typeof id === 'string' && !taken.has(id) ? id : newId();
    if (kept !== id) changed = true;
    taken.add(kept);
    return kept;
  };
  const id = fresh(node.attrs['id']);
  const data: unknown = node.attrs['data'];
  if (typeof data !== 'object' || data === null) return changed ? { ...node.attrs, id } : node.attrs;
  const renewed = Object.fromEntries(Object.entries(data).map(([field, value]: [string, unknown]) => [
    field, Array.isArray(value) ? value.map((line: unknown) => (isLine(line) ? { ...line, id: fresh(line.id) } : line)) : value,
  ]));
  return changed ? { ...node.attrs, id, data: renewed } : node.attrs;
}

function carriesIds(node: Node): boolean {
  return proseTypes.has(node.type.name) || node.type.spec.atom === true;
}

/** Pasted nodes whose ids stand in the text already get new ones; what was cut and pasted keeps its own. */
export function withoutTakenIds(slice: Slice, taken: ReadonlySet<string>): Slice {
  const seen = new Set(taken);
  const nodes: Node[] = [];
  slice.content.forEach((node) => {
    // A node that is cut open is joined to the text around it, and takes the id of that.
    nodes.push(carriesIds(node) ? node.type.create(attrsWithFreshIds(node, seen), node.content, node.marks) : node);
  });
  return new Slice(Fragment.from(nodes), slice.openStart, slice.openEnd);
}

function idsIn(doc: Node): Set<string> {
  const ids = new Set<string>();
  doc.forEach((node) => { for (const id of idsOf(node)) ids.add(id); });
  return ids;
}

/** Every top-level node and every line has an id unique within its entry: new nodes get one, of two equal ones the later gets another. */
export const BlockIds = Extension.create({
  name: 'blockIds',
  addProseMirrorPlugins() {
    return [new Plugin({
      key: new PluginKey('blockIds'),
      props: {
        // A node that is being dragged is still in the text while it is dropped, and keeps its id.
        transformPasted: (slice, view) => (view.dragging ? slice : withoutTakenIds(slice, idsIn(view.state.doc))),
      },
      appendTransaction: (transactions, _before, { doc, tr }) => {
        if (!transactions.some((transaction) => transaction.docChanged)) return null;
        const taken = new Set<string>();
        doc.forEach((node, offset) => {
          const attrs = attrsWithFreshIds(node, taken);
          if (attrs !== node.attrs) tr.setNodeMarkup(offset, undefined, attrs);
        });
        return tr.docChanged ? tr : null;
      },
    })];
  },
});
