import { Editor } from '@tiptap/core';
import { afterEach, describe, expect, test, vi } from 'vitest';
import { entryDocument, type EntryDocument } from '#src/blocks/pure.ts';
import { changeBlock, moveBlock, putBack, putInBlock, startAtEnd, takeOutBlock } from '#src/features/desk/block-commands.ts';
import { BlockIds, idsOf } from '#src/features/desk/block-ids.ts';
import { blockExtensions } from '#src/features/desk/block-node.tsx';
import { KeepsBlocks } from '#src/features/desk/keeps-blocks.ts';
import { pastedWords } from '#src/features/desk/pasted-words.ts';
import { proseExtensions } from '#src/features/desk/prose-extensions.ts';
import { editorContent, storedContent } from '#src/features/desk/stored-content.ts';
import { goneIn, type GoneBlock } from '#src/features/desk/took-out.ts';
import { documentOf, usedNode } from './desk-view.ts';

let editor: Editor | undefined;
// The node views are drawn by React elsewhere; the text itself is what these tests are about.
const plainBlocks = blockExtensions.map((block) => block.extend({ addNodeView: null }));

function open(content: EntryDocument['content']): Editor {
  // jsdom has no layout, which scrolling to the cursor asks for
  Range.prototype.getClientRects = () => Object.assign([], { item: () => null });
  Range.prototype.getBoundingClientRect = () => new DOMRect();
  editor = new Editor({ element: document.body.appendChild(document.createElement('div')), extensions: [...proseExtensions, ...plainBlocks, BlockIds, KeepsBlocks], content: editorContent(content), editorProps: { transformPastedHTML: pastedWords } });
  return editor;
}
function stored(now: Editor): EntryDocument['content'] {
  return storedContent(now.getJSON());
}
function ids(now: Editor): string[] {
  const all: string[] = [];
  now.state.doc.forEach((node) => all.push(...idsOf(node)));
  return all;
}
function paragraph(id: string, text: string): EntryDocument['content'][number] {
  return { type: 'paragraph', attrs: { id }, content: [{ type: 'text', text }] };
}
// jsdom knows no clipboard events; the editor only hands the event on
function paste(now: Editor, html: string): void {
  now.view.pasteHTML(html, new Event('paste') as ClipboardEvent);
}
function copyOf(now: Editor): string {
  now.commands.selectAll();
  return now.view.serializeForClipboard(now.state.selection.content()).dom.innerHTML;
}

afterEach(() => {
  editor?.destroy();
  document.body.replaceChildren();
});

describe('editor and stored text', () => {
  const everything: EntryDocument['content'] = [
    { type: 'heading', attrs: { id: 'head1', level: 2 }, content: [{ type: 'text', text: 'Steam' }] },
    { type: 'paragraph', attrs: { id: 'para1' }, content: [{ type: 'text', text: 'Bold', marks: [{ type: 'bold' }] }, { type: 'hardBreak' }, { type: 'text', text: 'a link', marks: [{ type: 'link', attrs: { href: 'https://elsewhere.example/' } }] }] },
    { type: 'orderedList', attrs: { id: 'list1', start: 3 }, content: [{ type: 'listItem', content: [{ type: 'paragraph', content: [{ type: 'text', text: 'one' }] }, { type: 'bulletList', content: [{ type: 'listItem', content: [{ type: 'paragraph' }] }] }] }] },
    { type: 'blockquote', attrs: { id: 'quote1' }, content: [{ type: 'paragraph', content: [{ type: 'text', text: 'said' }] }] },
    { type: 'table', attrs: { id: 'table1' }, content: [{ type: 'tableRow', content: [{ type: 'tableHeader', attrs: { colspan: 2 }, content: [{ type: 'paragraph' }] }] }, { type: 'tableRow', content: [{ type: 'tableCell', content: [{ type: 'paragraph' }] }, { type: 'tableCell', content: [{ type: 'paragraph' }] }] }] },
    usedNode('used1', [{ id: 'lineA', name: 'Resin', amount: '3' }]),
  ];

  test('what is stored comes back as it was, and the schema of the blocks takes it', () => {
    const content = stored(open(everything));
    expect(content).toEqual(everything);
    expect(entryDocument.parse(documentOf({ content })).content).toEqual(everything);
  });

  test('empty paragraphs are not stored', () => {
    expect(stored(open([{ type: 'paragraph', attrs: { id: 'para1' } }, paragraph('para2', 'Words')]))).toEqual([paragraph('para2', 'Words')]);
    expect(stored(open([]))).toEqual([]);
  });

  test('a link to a script cannot be set', () => {
    const now = open([paragraph('para1', 'Words')]);
    now.chain().selectAll().setLink({ href: 'javascript:alert(1)' }).run();
    expect(JSON.stringify(stored(now))).not.toContain('javascript');
  });

  test('a list in a quotation, or a block in a list, has no place', () => {
    const now = open([paragraph('para1', 'Words')]);
    now.chain().selectAll().toggleBulletList().toggleBlockquote().run();
    expect(() => entryDocument.parse(documentOf({ content: stored(now) }))).not.toThrow();
  });
});

describe('ids', () => {
  test('splitting a paragraph leaves the first half its id and gives the second a new one', () => {
    const now = open([paragraph('para1', 'OneTwo')]);
    now.chain().setTextSelection(4).splitBlock().run();
    const [first, second] = stored(now);
    expect(first).toEqual(paragraph('para1', 'One'));
    expect(second?.attrs.id).toMatch(/^[\w-]{10}$/);
  });

  test('pasting a copy renews the ids of the block and of its lines', () => {
    const now = open([usedNode('used1', [{ id: 'lineA' }]), paragraph('para1', 'Words')]);
    const html = copyOf(now);
    now.commands.setTextSelection(now.state.doc.content.size);
    paste(now, html);
    const blocks = stored(now).filter((node) => node.type === 'used');
    expect(blocks).toHaveLength(2);
    expect(blocks[0]).toEqual(usedNode('used1', [{ id: 'lineA' }]));
    expect(new Set(ids(now)).size).toBe(ids(now).length);
  });

  test('pasted before the original, it is still the copy that gets new ids', () => {
    const now = open([paragraph('para1', 'Words'), usedNode('used1', [{ id: 'lineA' }])]);
    now.commands.setNodeSelection(now.state.doc.firstChild?.nodeSize ?? 0);
    const html = now.view.serializeForClipboard(now.state.selection.content()).dom.innerHTML;
    now.commands.setTextSelection(1);
    paste(now, html);
    expect(stored(now).filter((node) => node.type === 'used').map((node) => node.attrs.id).indexOf('used1')).toBe(1);
  });

  test('cutting and pasting keeps them', () => {
    const now = open([usedNode('used1', [{ id: 'lineA' }]), paragraph('para1', 'Words')]);
    const html = copyOf(now);
    now.commands.deleteSelection();
    paste(now, html);
    expect(ids(now)).toEqual(expect.arrayContaining(['used1', 'lineA', 'para1']));
  });

  test('a block in pasted HTML that is none of ours is left out', () => {
    const now = open([paragraph('para1', 'Words')]);
    paste(now, `<section data-block="used" data-id="evil1" data-block-data="${encodeURIComponent('{"lines":[{"id":"x"}]}')}"></section><p>After</p>`);
    expect(stored(now).some((node) => node.type === 'used')).toBe(false);
    expect(JSON.stringify(stored(now))).toContain('After');
  });
});

describe('blocks in the text', () => {
  test('a block taken out is noticed, whichever way it went, and can be put back where it stood', () => {
    const now = open([paragraph('para1', 'Before'), usedNode('used1', [{ id: 'lineA', amount: '3' }]), paragraph('para2', 'After')]);
    const gone: GoneBlock[] = [];
    now.on('update', ({ transaction }) => gone.push(...goneIn(transaction, now.state.doc)));
    const before = stored(now);
    takeOutBlock(now, 'used1');
    expect(gone.map(({ word }) => word)).toEqual(['Used']);
    putBack(now, gone);
    expect(stored(now)).toEqual(before);
    now.chain().selectAll().deleteSelection().run();
    expect(gone).toHaveLength(2);
  });

  test('moving a block loses nothing and says nothing', () => {
    vi.stubGlobal('requestAnimationFrame', () => 0);
    const now = open([paragraph('para1', 'Before'), usedNode('used1', [{ id: 'lineA' }]), paragraph('para2', 'After')]);
    const gone: GoneBlock[] = [];
    now.on('update', ({ transaction }) => gone.push(...goneIn(transaction, now.state.doc)));
    moveBlock(now, 'used1', 1);
    expect(stored(now).map((node) => node.attrs.id)).toEqual(['para1', 'para2', 'used1']);
    moveBlock(now, 'used1', -1);
    moveBlock(now, 'used1', -1);
    expect(stored(now).map((node) => node.attrs.id)).toEqual(['used1', 'para1', 'para2']);
    expect(gone).toEqual([]);
    vi.unstubAllGlobals();
  });

  test('a text that begins with a block opens with the cursor at the end, not with the block selected', () => {
    const now = open([usedNode('used1', [{ id: 'lineA' }])]);
    startAtEnd(now);
    now.commands.insertContent('x');
    expect(stored(now).map((node) => node.type)).toEqual(['used', 'paragraph']);
  });

  describe('typed over', () => {
    const text = (): EntryDocument['content'] => [paragraph('para1', 'Before'), usedNode('used1', [{ id: 'lineA', amount: '3' }]), paragraph('para2', 'After')];
    const said = (now: Editor) => stored(now).map((node) => (node.type === 'used' ? node.attrs.id : JSON.stringify(node).match(/"text":"([^"]*)"/)?.[1] ?? ''));
    const selectBlock = (now: Editor) => now.commands.setNodeSelection(now.state.doc.firstChild?.nodeSize ?? 0);
    // what the editor makes of a key that stands for a character
    const press = (now: Editor, key: string) => now.view.dom.dispatchEvent(new KeyboardEvent('keypress', { key, charCode: key.charCodeAt(0), bubbles: true, cancelable: true }));

    test('a letter typed while a block is selected starts a paragraph after it', () => {
      const now = open(text());
      selectBlock(now);
      press(now, 'x');
      now.commands.insertContent('y');
      expect(said(now)).toEqual(['Before', 'used1', 'xy', 'After']);
    });

    test('what is pasted while a block is selected stands after it, words in one line or several', () => {
      for (const [html, becomes] of [['one line', ['one line']], ['<p>two</p><p>lines</p>', ['two', 'lines']]] as const) {
        const now = open(text());
        selectBlock(now);
        paste(now, html);
        expect(said(now)).toEqual(['Before', 'used1', ...becomes, 'After']);
        now.destroy();
      }
    });

    test('with everything selected a letter or a paste takes the words and leaves the block', () => {
      const now = open(text());
      now.commands.selectAll();
      press(now, 'x');
      expect(said(now)).toEqual(['x', 'used1']);
      now.commands.selectAll();
      paste(now, 'y');
      expect(said(now)).toEqual(['y', 'used1']);
    });

    test('a selected block goes with Backspace and is back with undo', () => {
      const now = open(text());
      selectBlock(now);
      now.commands.keyboardShortcut('Backspace');
      expect(said(now)).toEqual(['Before', 'After']);
      now.commands.undo();
      expect(stored(now)).toEqual(text());
    });

    test('a block taken out is back with one undo, with what was typed in it just before', () => {
      const now = open(text());
      const data = { day: null, lines: [] };
      changeBlock(now, 'used1', () => data);
      takeOutBlock(now, 'used1');
      now.commands.undo();
      expect(stored(now)).toEqual([paragraph('para1', 'Before'), { type: 'used', attrs: { id: 'used1', version: 1, data } }, paragraph('para2', 'After')]);
    });
  });

  test('what is put in stands at the end, before the line to write on', () => {
    vi.stubGlobal('requestAnimationFrame', () => 0);
    const now = open([paragraph('para1', 'Before')]);
    putInBlock(now, 'used', { id: 'used1', version: 1, data: { day: null, lines: [] } }, false);
    putInBlock(now, 'used', { id: 'used2', version: 1, data: { day: null, lines: [] } }, false);
    expect(stored(now).map((node) => node.attrs.id)).toEqual(['para1', 'used1', 'used2']);
    expect(now.state.doc.lastChild?.type.name).toBe('paragraph');
    vi.unstubAllGlobals();
  });
});
