import type { Editor } from '@tiptap/core';
import { Button } from '#src/components/button.tsx';
import { deskBlocks } from '#src/blocks/desk.ts';
import { deskBlockOf } from './block-node.tsx';
import { newId } from './block-ids.ts';
import { goOnWriting, putInBlock } from './block-commands.ts';

const choices = Object.entries(deskBlocks).map(([type, { word }]) => ({ type, word }));

/** Makes a blank block and puts it in; gives the id it has. */
export function putIn(editor: Editor, type: string, here: boolean): string {
  const block = deskBlockOf(type);
  const id = newId();
  if (block) putInBlock(editor, type, { id, version: block.version, data: block.blank() }, here);
  return id;
}

/** What can be put in next, at the end of the text. */
export function Tray({ editor }: { editor: Editor }) {
  return (
    <section aria-labelledby="tray-title" className="mt-5 border-2 border-dashed border-rule-strong px-4 py-3.5">
      <h2 id="tray-title" className="text-small text-ink-soft">Put in next</h2>
      <div className="mt-2 flex flex-wrap gap-2">
        <TrayButton onPut={() => goOnWriting(editor)}>Words</TrayButton>
        {choices.map(({ type, word }) => <TrayButton key={type} onPut={() => putIn(editor, type, false)}>{word}</TrayButton>)}
      </div>
    </section>
  );
}

function TrayButton({ children, onPut }: { children: string; onPut: () => void }) {
  return <span className="tray-button"><Button kind="quiet" size="small" onClick={onPut}>{children}</Button></span>;
}

/** The same from the toolbar, after the paragraph that is being written. */
export function PutInHere({ editor }: { editor: Editor }) {
  return (
    <select
      aria-label="Put in after this paragraph" value="" onChange={(event) => { if (event.target.value !== '') putIn(editor, event.target.value, true); }}
      className="ml-auto min-h-8 rounded-edge border-0 bg-transparent px-2 text-small text-ink-soft hover:bg-hover hover:text-ink max-wide:min-h-11"
    >
      <option value="">Put in here</option>
      {choices.map(({ type, word }) => <option key={type} value={type}>{word}</option>)}
    </select>
  );
}
