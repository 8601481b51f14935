import type { Editor } from '@tiptap/core';
import { useEditorState } from '@tiptap/react';
import { useRef, useState, type KeyboardEvent, type ReactNode } from 'react';
import { roomBesideBlocks } from './keeps-blocks.ts';
import { LinkField } from './link-field.tsx';
import { PutInHere } from './tray.tsx';

interface Tool {
  label: string;
  face: ReactNode;
  active: boolean;
  act: () => void;
}

function useTools(editor: Editor, askForLink: () => void): Tool[] {
  const on = useEditorState({
    editor,
    selector: ({ editor: now }) => ({
      heading: now.isActive('heading', { level: 2 }), small: now.isActive('heading', { level: 3 }), bold: now.isActive('bold'), italic: now.isActive('italic'),
      bullets: now.isActive('bulletList'), numbers: now.isActive('orderedList'), quote: now.isActive('blockquote'), link: now.isActive('link'), table: now.isActive('table'),
    }),
  });
  const chain = () => editor.chain().focus();
  return [
    { label: 'Heading', face: 'Heading', active: on.heading, act: () => chain().toggleHeading({ level: 2 }).run() },
    { label: 'Smaller heading', face: 'Smaller', active: on.small, act: () => chain().toggleHeading({ level: 3 }).run() },
    { label: 'Bold', face: <b>B</b>, active: on.bold, act: () => chain().toggleBold().run() },
    { label: 'Italic', face: <i className="font-read">I</i>, active: on.italic, act: () => chain().toggleItalic().run() },
    { label: 'List', face: 'List', active: on.bullets, act: () => chain().toggleBulletList().run() },
    { label: 'Numbered list', face: '1, 2, 3', active: on.numbers, act: () => chain().toggleOrderedList().run() },
    { label: 'Quotation', face: 'Quote', active: on.quote, act: () => chain().toggleBlockquote().run() },
    { label: 'Link', face: 'Link', active: on.link, act: askForLink },
    { label: on.table ? 'Take the table out' : 'Table', face: 'Table', active: on.table, act: () => (on.table ? chain().deleteTable().run() : putTableIn(editor)) },
  ];
}

function putTableIn(editor: Editor): void {
  const room = roomBesideBlocks(editor.state);
  if (room) editor.view.dispatch(room);
  editor.chain().focus().insertTable({ rows: 3, cols: 3, withHeaderRow: true }).run();
}

const tableTools: { label: string; act: (editor: Editor) => void }[] = [
  { label: 'Row below', act: (editor) => editor.chain().focus().addRowAfter().run() },
  { label: 'Column after', act: (editor) => editor.chain().focus().addColumnAfter().run() },
  { label: 'Take the row out', act: (editor) => editor.chain().focus().deleteRow().run() },
  { label: 'Take the column out', act: (editor) => editor.chain().focus().deleteColumn().run() },
];

const toolClass = 'flex-none min-h-8 min-w-8 rounded-edge px-2 text-small text-ink-soft hover:bg-hover hover:text-ink aria-pressed:bg-scribe-wash aria-pressed:font-semibold aria-pressed:text-scribe-text max-wide:min-h-11 max-wide:min-w-11';

/** A few tools for prose. One stop of the Tab key; arrows go along it, as the ARIA pattern "toolbar" asks. */
export function ProseToolbar({ editor }: { editor: Editor }) {
  const [linking, setLinking] = useState(false);
  const [at, setAt] = useState(0);
  const bar = useRef<HTMLDivElement>(null);
  const tools = useTools(editor, () => setLinking(true));
  const inTable = useEditorState({ editor, selector: ({ editor: now }) => now.isActive('table') });
  const along = (event: KeyboardEvent) => {
    const step = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0;
    if (step === 0 || event.target instanceof HTMLSelectElement) return;
    event.preventDefault();
    const buttons = [...(bar.current?.querySelectorAll<HTMLElement>('button') ?? [])];
    const next = (at + step + buttons.length) % buttons.length;
    setAt(next);
    buttons[next]?.focus();
  };
  const extra = inTable ? tableTools : [];
  return (
    <div className="desk-toolbar sticky top-0 z-10 -mx-2 mb-3 border-b border-rule bg-sheet px-1 py-1">
      <div ref={bar} role="toolbar" aria-label="Words" aria-controls="field-content" tabIndex={-1} onKeyDown={along} className="flex items-center gap-x-0.5 overflow-x-auto wide:flex-wrap">
        {tools.map((tool, index) => (
          <button key={tool.label} type="button" aria-label={tool.label} aria-pressed={tool.active} tabIndex={index === at ? 0 : -1} onFocus={() => setAt(index)} onMouseDown={(event) => event.preventDefault()} onClick={tool.act} className={toolClass}>
            {tool.face}
          </button>
        ))}
        {extra.map((tool, index) => (
          <button key={tool.label} type="button" tabIndex={tools.length + index === at ? 0 : -1} onFocus={() => setAt(tools.length + index)} onMouseDown={(event) => event.preventDefault()} onClick={() => tool.act(editor)} className={toolClass}>
            {tool.label}
          </button>
        ))}
        <PutInHere editor={editor} />
      </div>
      {linking && <LinkField editor={editor} onDone={() => setLinking(false)} />}
    </div>
  );
}
