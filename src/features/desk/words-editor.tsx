import type { Editor } from '@tiptap/core';
import { EditorContent } from '@tiptap/react';
import { useFault } from '#src/blocks/bench.ts';
import { fieldId, FieldNotes } from '#src/components/field.tsx';
import { ProseToolbar } from './prose-toolbar.tsx';
import { useUndoAnywhere } from './use-undo-anywhere.ts';

/** The words, with the blocks between them. */
export function WordsEditor({ editor }: { editor: Editor }) {
  const error = useFault('content');
  useUndoAnywhere(editor);
  return (
    <div className="mt-6">
      <ProseToolbar editor={editor} />
      <EditorContent editor={editor} className="desk-words" />
      <FieldNotes id={fieldId('content')} error={error} />
    </div>
  );
}
