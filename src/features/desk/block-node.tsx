import { mergeAttributes, Node } from '@tiptap/core';
import { NodeViewWrapper, ReactNodeViewRenderer, useEditorState, type ReactNodeViewProps } from '@tiptap/react';
import { fieldId } from '#src/components/field.tsx';
import { BlockHandleProvider } from '#src/blocks/block-frame.tsx';
import type { DeskBlock } from '#src/blocks/desk-block.ts';
import { deskBlocks } from '#src/blocks/desk.ts';
import { blockTypes, pureBlocks, type BlockType } from '#src/blocks/pure.ts';
import { changeBlock, moveBlock, placeOfBlock, takeOutBlock } from './block-commands.ts';

// One type's data always meets its own desk, which an index type cannot say.
export function deskBlockOf(type: string): DeskBlock<unknown> | undefined {
  return type in deskBlocks ? (deskBlocks[type as BlockType] as unknown as DeskBlock<unknown>) : undefined;
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
    <NodeViewWrapper id={fieldId(id)} data-block-view={id} tabIndex={-1} className="scroll-mt-16 focus:outline-none">
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

const controls = 'input, button, select, textarea, label, a, [role="listbox"], [role="option"]';

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
      stopEvent: ({ event }) => event.target instanceof Element && event.target.closest(controls) !== null,
    }),
  });
}

export const blockExtensions = blockTypes.map(blockNode);
