import { useEditor } from '@tiptap/react';
import { useCallback, useEffect, useRef, useState } from 'react';
import { fieldId } from '#src/components/field.tsx';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { startAtEnd } from './block-commands.ts';
import { BlockIds } from './block-ids.ts';
import { blockExtensions } from './block-node.tsx';
import { KeepsBlocks } from './keeps-blocks.ts';
import { pastedWords } from './pasted-words.ts';
import { proseExtensions } from './prose-extensions.ts';
import { sameText } from './same-text.ts';
import type { NewerText, Saver } from './saver.ts';
import type { DeskStart } from './desk-start.ts';
import { editorContent, storedContent } from './stored-content.ts';
import { goneIn, type GoneBlock } from './took-out.ts';

const extensions = [...proseExtensions, ...blockExtensions, BlockIds, KeepsBlocks];

export interface WritingParts {
  start: DeskStart;
  saver: Saver;
  onGone: (gone: GoneBlock[]) => void;
  /** Photos pasted or dropped among the words. */
  onFiles: (files: File[]) => void;
}

function hasWords(html: string): boolean {
  return pastedWords(html).replaceAll(/<[^>]*>/g, '').trim() !== '';
}

/** Pictures of a paste or a drop; none where it carries words as well, as programs add a picture of the words. */
export function filesOf(data: DataTransfer | null): File[] {
  const files = [...(data?.files ?? [])];
  return files.length > 0 && !hasWords(data?.getData('text/html') ?? '') ? files : [];
}

/** The text being written: one document, whose words live in the editor and whose facts live beside it. Every change goes to the saver. */
export function useWriting({ start, saver, onGone, onFiles }: WritingParts) {
  const [document, setDocument] = useState(start.document);
  const current = useRef(start.document);
  const heard = useRef({ onGone, onFiles });
  useEffect(() => { heard.current = { onGone, onFiles }; });

  const edit = useCallback((change: (now: EntryDocument) => EntryDocument) => {
    const next = change(current.current);
    const same = sameText(next, current.current);
    current.current = next;
    setDocument(next);
    if (!same) saver.change(next);
  }, [saver]);

  const editor = useEditor({
    extensions,
    // what it would write into the page stands in desk.css: the page's policy lets no script write styles
    injectCSS: false,
    content: editorContent(start.document.content),
    onCreate: ({ editor: now }) => startAtEnd(now),
    onUpdate: ({ editor: now, transaction }) => {
      edit((text) => ({ ...text, content: storedContent(now.getJSON()) }));
      const gone = goneIn(transaction, now.state.doc);
      if (gone.length > 0) heard.current.onGone(gone);
    },
    editorProps: {
      attributes: { id: fieldId('content'), role: 'textbox', 'aria-multiline': 'true', 'aria-label': 'The words of the day', class: 'prose desk-prose' },
      transformPastedHTML: pastedWords,
      handlePaste: (_view, event) => {
        const files = filesOf(event.clipboardData);
        if (files.length > 0) heard.current.onFiles(files);
        return files.length > 0;
      },
      handleDrop: (_view, event) => {
        const files = filesOf(event.dataTransfer);
        if (files.length === 0) return false;
        event.preventDefault();
        heard.current.onFiles(files);
        return true;
      },
    },
  });

  /** Goes on with another text: one of two was chosen, or put together from both. */
  const goOnWith = (newer: NewerText, text: EntryDocument) => {
    current.current = text;
    setDocument(text);
    editor.commands.setContent(editorContent(text.content), { emitUpdate: false });
    saver.settle(newer, text);
  };
  return { document, current, edit, editor, goOnWith };
}
export type Writing = ReturnType<typeof useWriting>;
