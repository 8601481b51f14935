import type { Editor } from '@tiptap/core';
import { EditorContent } from '@tiptap/react';
import { useId } from 'react';
import { useBench } from '#src/blocks/bench.ts';
import { fieldId, FieldNotes } from '#src/components/field.tsx';
import { ProseToolbar } from './prose-toolbar.tsx';

/** The words, with the blocks between them. */
export function WordsEditor({ editor }: { editor: Editor }) {
  const bench = useBench();
  const keys = useId();
  return (
    <div className="mt-6">
      <ProseToolbar editor={editor} />
      <p id={keys} className="sr-only">Alt and F10 lead to the toolbar. Blocks are put in from the tray after the text.</p>
      <EditorContent editor={editor} className="desk-words" />
      <FieldNotes id={fieldId('content')} error={bench.fault('content')} />
    </div>
  );
}
