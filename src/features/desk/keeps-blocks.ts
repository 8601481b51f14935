import { Extension } from '@tiptap/core';
import type { Node } from '@tiptap/pm/model';
import { NodeSelection, Plugin, PluginKey, TextSelection, type EditorState, type Transaction } from '@tiptap/pm/state';
import type { EditorView } from '@tiptap/pm/view';

function isBlock(node: Node | null | undefined): boolean {
  return node?.type.spec.atom === true && node.isBlock;
}

/** Leads the cursor to an empty paragraph at a place between two top-level nodes, made where none stands there. */
export function toParagraphAt(tr: Transaction, at: number): Transaction {
  const next = tr.doc.resolve(at).nodeAfter;
  const waits = next?.type.name === 'paragraph' && next.content.size === 0;
  const paragraph = waits ? undefined : tr.doc.type.schema.nodes['paragraph']?.create();
  if (paragraph) tr.insert(at, paragraph);
  return tr.setSelection(TextSelection.create(tr.doc, at + 1)).scrollIntoView();
}

/** Stretches of a selection between the blocks that are whole in it; nothing where there are none. */
function stretches({ doc, selection: { from, to } }: EditorState): { from: number; to: number }[] | null {
  const found: { from: number; to: number }[] = [];
  let start = from;
  let blocks = 0;
  doc.forEach((node, pos) => {
    if (!isBlock(node) || pos < from || pos + node.nodeSize > to) return;
    found.push({ from: start, to: pos });
    start = pos + node.nodeSize;
    blocks += 1;
  });
  return blocks === 0 ? null : [...found, { from: start, to }];
}

/** Makes room for what is typed or pasted without taking a block out: after a selected one, else in place of the selected words around them. Nothing where no block is in the way. */
export function roomBesideBlocks(state: EditorState): Transaction | null {
  const { selection, tr } = state;
  if (selection instanceof NodeSelection) return isBlock(selection.node) ? toParagraphAt(tr, selection.to) : null;
  const words = stretches(state);
  if (words === null) return null;
  for (const { from, to } of words.toReversed()) if (to > from) tr.delete(from, to);
  const at = tr.doc.resolve(Math.min(tr.mapping.map(selection.from, -1), tr.doc.content.size));
  return at.parent.inlineContent ? tr.setSelection(TextSelection.create(tr.doc, at.pos)).scrollIntoView() : toParagraphAt(tr, at.pos);
}

function typed(view: EditorView, text: string): boolean {
  const tr = roomBesideBlocks(view.state);
  if (tr) view.dispatch(tr.insertText(text));
  return tr !== null;
}

/** No letter and no paste takes a block's place: a block goes only by its own button, or by a key that takes away. */
export const KeepsBlocks = Extension.create({
  name: 'keepsBlocks',
  // before the extensions that paste links and split paragraphs
  priority: 1000,
  addProseMirrorPlugins() {
    return [new Plugin({
      key: new PluginKey('keepsBlocks'),
      props: {
        handleTextInput: (view, _from, _to, text) => typed(view, text),
        handlePaste: (view, _event, slice) => {
          const tr = roomBesideBlocks(view.state);
          if (tr) view.dispatch(tr.replaceSelection(slice).scrollIntoView().setMeta('paste', true).setMeta('uiEvent', 'paste'));
          return tr !== null;
        },
        handleKeyDown: (view, event) => {
          if (event.key !== 'Enter' || view.state.selection instanceof NodeSelection) return false;
          return typed(view, '');
        },
        handleDOMEvents: {
          // phones and input methods send no key for a letter
          compositionstart: (view) => {
            typed(view, '');
            return false;
          },
          beforeinput: (view, event) => {
            if (event.inputType !== 'insertText' || event.isComposing || !event.data || !typed(view, event.data)) return false;
            event.preventDefault();
            return true;
          },
        },
      },
    })];
  },
});
