import type { Editor } from '@tiptap/core';
import { useEffect } from 'react';

const fields = 'input, textarea, select, [contenteditable="true"], dialog';

/** Ctrl+Z takes back the last step of the text wherever the focus is, as a button that takes a block out goes with it; a field keeps its own. */
export function useUndoAnywhere(editor: Editor): void {
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      const letter = event.key.toLowerCase();
      if (event.defaultPrevented || event.altKey || !(event.ctrlKey || event.metaKey) || (letter !== 'z' && letter !== 'y')) return;
      // a block stands inside the text without being part of its words
      const place = event.target instanceof Element ? event.target.closest(`${fields}, [data-block-view]`) : null;
      if (place && !place.matches('[data-block-view]')) return;
      event.preventDefault();
      if (letter === 'y' || event.shiftKey) editor.commands.redo();
      else editor.commands.undo();
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, [editor]);
}
