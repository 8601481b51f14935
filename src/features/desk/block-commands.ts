import type { Editor, JSONContent } from '@tiptap/core';
import type { Node } from '@tiptap/pm/model';
import { closeHistory } from '@tiptap/pm/history';
import { TextSelection } from '@tiptap/pm/state';
import { toParagraphAt } from './keeps-blocks.ts';

interface Placed { node: Node; index: number; pos: number }

function find(doc: Node, id: string): Placed | null {
  let found: Placed | null = null;
  doc.forEach((node, pos, index) => {
    if (node.attrs['id'] === id && !found) found = { node, index, pos };
  });
  return found;
}

function isEmptyParagraph(node: Node | null | undefined): boolean {
  return node?.type.name === 'paragraph' && node.content.size === 0;
}

/** Whether a block can go up or down; the line to write on at the very end stays there. */
export function placeOfBlock(doc: Node, id: string): { canUp: boolean; canDown: boolean } {
  const placed = find(doc, id);
  if (!placed) return { canUp: false, canDown: false };
  const next = doc.maybeChild(placed.index + 1);
  return { canUp: placed.index > 0, canDown: next !== null && !(placed.index + 2 === doc.childCount && isEmptyParagraph(next)) };
}

/** Changes what a block holds, wherever it stands by now. */
export function changeBlock(editor: Editor, id: string, change: (data: unknown) => unknown): void {
  const placed = find(editor.state.doc, id);
  if (!placed) return;
  editor.view.dispatch(editor.state.tr.setNodeMarkup(placed.pos, undefined, { ...placed.node.attrs, data: change(placed.node.attrs['data']) }));
}

export const movedBlock = 'movedBlock';

export function moveBlock(editor: Editor, id: string, by: -1 | 1): void {
  const { doc, tr } = editor.state;
  const placed = find(doc, id);
  const other = placed && doc.maybeChild(placed.index + by);
  if (!placed || !other) return;
  const to = by === -1 ? placed.pos - other.nodeSize : placed.pos + other.nodeSize;
  const focused = document.activeElement?.textContent;
  editor.view.dispatch(tr.delete(placed.pos, placed.pos + placed.node.nodeSize).insert(to, placed.node).setMeta(movedBlock, true));
  requestAnimationFrame(() => {
    const view = blockElement(id);
    view?.scrollIntoView({ block: 'nearest' });
    const buttons = [...(view?.querySelectorAll('button') ?? [])];
    // on a phone the words are folded away again: then what opens them has the focus
    const shown = buttons.filter((button) => button.offsetParent !== null);
    (shown.find((button) => button.textContent === focused) ?? shown.find((button) => button.hasAttribute('data-place-menu')))?.focus();
  });
}

/** Taken out at once, as one step back; the desk sees it go and offers to put it back. */
export function takeOutBlock(editor: Editor, id: string): void {
  const placed = find(editor.state.doc, id);
  if (placed) editor.view.dispatch(closeHistory(editor.state.tr).delete(placed.pos, placed.pos + placed.node.nodeSize));
}

/** Leads the cursor to an empty paragraph after a block. */
export function writeAfterBlock(editor: Editor, id: string): void {
  const placed = find(editor.state.doc, id);
  if (!placed) return;
  editor.view.dispatch(toParagraphAt(editor.state.tr, placed.pos + placed.node.nodeSize));
  editor.view.focus();
}

export function positionOfIndex(doc: Node, index: number): number {
  let position = 0;
  for (let at = 0; at < Math.min(index, doc.childCount); at += 1) position += doc.child(at).nodeSize;
  return position;
}

/** Puts nodes back where they stood, those that are not back already. */
export function putBack(editor: Editor, taken: readonly { json: JSONContent; index: number; id: string }[]): void {
  const { tr, schema } = editor.state;
  for (const { json, index, id } of taken) {
    if (find(tr.doc, id)) continue;
    tr.insert(positionOfIndex(tr.doc, index), schema.nodeFromJSON(json));
  }
  if (tr.docChanged) editor.view.dispatch(tr);
}

/** Where something new goes: after the paragraph being written when `here`, else at the end of the text. */
function placeFor(editor: Editor, here: boolean): { from: number; to: number } {
  const { doc, selection } = editor.state;
  if (here) {
    const at = selection.$from.index(0);
    const node = doc.maybeChild(at);
    const from = positionOfIndex(doc, at);
    if (node) return isEmptyParagraph(node) ? { from, to: from + node.nodeSize } : { from: from + node.nodeSize, to: from + node.nodeSize };
  }
  const last = doc.lastChild;
  const end = doc.content.size;
  return last && isEmptyParagraph(last) ? { from: end - last.nodeSize, to: end - last.nodeSize } : { from: end, to: end };
}

/** Puts a new block in and leads to its first field. */
export function putInBlock(editor: Editor, type: string, attrs: { id: string; version: number; data: unknown }, here: boolean): void {
  const { tr, schema } = editor.state;
  const { from, to } = placeFor(editor, here);
  const nodeType = schema.nodes[type];
  if (!nodeType) return;
  editor.view.dispatch(tr.replaceWith(from, to, nodeType.create(attrs)));
  requestAnimationFrame(() => {
    const view = blockElement(attrs.id);
    view?.scrollIntoView({ block: 'nearest' });
    view?.querySelector<HTMLElement>('input:not([hidden]):not([type="radio"]), textarea, [data-first]')?.focus();
  });
}

/** A text that begins with a block would open with that block selected, and the first key typed would take its place: the cursor starts at the end. */
export function startAtEnd(editor: Editor): void {
  // the first change of any kind brings the line to write on
  editor.view.dispatch(editor.state.tr.setMeta('addToHistory', false));
  const { doc, tr } = editor.state;
  editor.view.dispatch(tr.setSelection(TextSelection.atEnd(doc)).setMeta('addToHistory', false));
}

/** The cursor to the line at the end of the text. */
export function goOnWriting(editor: Editor): void {
  const { doc, tr, schema } = editor.state;
  if (!isEmptyParagraph(doc.lastChild)) {
    const paragraph = schema.nodes['paragraph']?.create();
    if (paragraph) tr.insert(doc.content.size, paragraph);
  }
  tr.setSelection(TextSelection.atEnd(tr.doc)).scrollIntoView();
  editor.view.dispatch(tr);
  editor.view.focus();
}

export function blockElement(id: string): HTMLElement | null {
  return document.querySelector<HTMLElement>(`[data-block-view="${CSS.escape(id)}"]`);
}
