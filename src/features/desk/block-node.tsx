import { mergeAttributes, Node, type Editor } from '@tiptap/core';
import { NodeViewWrapper, ReactNodeViewRenderer, useEditorState, type ReactNodeViewProps } from '@tiptap/react';
import { fieldId } from '#src/components/field.tsx';
import { BlockHandleProvider } from '#src/blocks/block-handles.tsx';
import type { DeskBlock } from '#src/blocks/desk-block.ts';
import { deskBlocks } from '#src/blocks/desk.ts';
import { blockTypes, pureBlocks, type BlockType } from '#src/blocks/pure.ts';
import type { ClipboardEvent, KeyboardEvent } from 'react';
import { changeBlock, moveBlock, placeOfBlock, takeOutBlock, writeAfterBlock } from './block-commands.ts';

// One type's data always meets its own desk, which an index type cannot say.
export function deskBlockOf(type: string): DeskBlock<unknown> | undefined {
  return type in deskBlocks ? (deskBlocks[type as BlockType] as unknown as DeskBlock<unknown>) : undefined;
}

const controls = 'input, button, select, textarea, summary, label, a, [role="listbox"], [role="option"]';

/** A press beside a block's fields gives the block the focus, not a place in its stead: what is written then goes into a paragraph after it. */
function afterBlock(editor: Editor, id: string) {
  return {
    onKeyDown: (event: KeyboardEvent) => {
      if (event.target !== event.currentTarget || event.key.length !== 1 || event.ctrlKey || event.metaKey || event.altKey) return;
      event.preventDefault();
      writeAfterBlock(editor, id);
      editor.view.dispatch(editor.state.tr.insertText(event.key));
    },
    onPaste: (event: ClipboardEvent) => {
      const { target, nativeEvent, clipboardData } = event;
      if (!(target instanceof Element) || target.closest(controls) || clipboardData.files.length > 0) return;
      event.preventDefault();
      writeAfterBlock(editor, id);
      const html = clipboardData.getData('text/html');
      if (html) editor.view.pasteHTML(html, nativeEvent);
      else editor.view.pasteText(clipboardData.getData('text/plain'), nativeEvent);
    },
  };
}

function BlockView({ node, editor }: ReactNodeViewProps) {
  const id = String(node.attrs['id']);
  const block = deskBlockOf(node.type.name);
  const place = useEditorState({ editor, selector: ({ editor: now }) => placeOfBlock(now.state.doc, id) });
  if (!block) return null;
  const { Desk } = block;
  const handle = {
    word: block.word, canUp: place.canUp, canDown: place.canDown,
    up: () => moveBlock(editor, id, -1), down: () => moveBlock(editor, id, 1), takeOut: () => takeOutBlock(editor, id),
  };
  return (
    <NodeViewWrapper id={fieldId(id)} data-block-view={id} tabIndex={-1} className="scroll-mt-16 focus:outline-none" {...afterBlock(editor, id)}>
      <BlockHandleProvider value={handle}>
        <Desk id={id} data={node.attrs['data'] as unknown} onChange={(change) => changeBlock(editor, id, change)} />
      </BlockHandleProvider>
    </NodeViewWrapper>
  );
}

function storedData(element: HTMLElement): unknown {
  const type = element.getAttribute('data-block');
  const text = element.getAttribute('data-block-data');
  if (!type || !text || !blockTypes.some((one) => one === type)) return null;
  try {
    const parsed = pureBlocks[type as BlockType].schema.safeParse(JSON.parse(decodeURIComponent(text)));
    return parsed.success ? parsed.data : null;
  } catch (cause) {
    // anybody can write such an element: what is not ours is not taken
    if (cause instanceof SyntaxError || cause instanceof URIError) return null;
    throw cause;
  }
}

/** A block in the editor: one atom with its id, version and data, drawn by its desk. */
function blockNode(type: BlockType) {
  return Node.create({
    name: type,
    group: 'block',
    atom: true,
    selectable: true,
    draggable: false,
    isolating: true,
    addAttributes: () => ({
      id: { default: null, parseHTML: (element) => element.getAttribute('data-id') },
      version: { default: pureBlocks[type].version, parseHTML: () => pureBlocks[type].version },
      data: { default: null, parseHTML: storedData },
    }),
    parseHTML: () => [{ tag: `section[data-block="${type}"]`, getAttrs: (element) => (storedData(element) === null ? false : null) }],
    renderHTML: ({ node }) => ['section', mergeAttributes({
      'data-block': type, 'data-id': String(node.attrs['id']), 'data-block-data': encodeURIComponent(JSON.stringify(node.attrs['data'])),
    })],
    // What goes to programs that take words only.
    renderText: ({ node }) => `[${deskBlockOf(type)?.word ?? type}: ${Object.keys((node.attrs['data'] ?? {}) as object).length > 0 ? 'a block' : 'empty'}]`,
    addNodeView: () => ReactNodeViewRenderer(BlockView, {
      className: 'max-w-none! font-ui text-control',
      // what happens in a block is its own; only what is dragged over it may be for the text
      stopEvent: ({ event }) => !event.type.startsWith('dr') || (event.target instanceof Element && event.target.closest(controls) !== null),
    }),
  });
}

export const blockExtensions = blockTypes.map(blockNode);
