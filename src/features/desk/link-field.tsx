import type { Editor } from '@tiptap/core';
import { useState, type FormEvent } from 'react';
import { Button } from '#src/components/button.tsx';
import { TextField } from '#src/components/text-field.tsx';
import { isSafeAddress } from './prose-extensions.ts';

/** What somebody typed, as an address: a bare name gets https, a bare e-mail address mailto. */
export function addressFrom(typed: string): string {
  const words = typed.trim();
  if (/^[a-z][a-z\d+.-]*:/i.test(words)) return words;
  return /^[^\s@/]+@[^\s@/]+\.[^\s@/]+$/.test(words) ? `mailto:${words}` : `https://${words}`;
}

export function LinkField({ editor, onDone }: { editor: Editor; onDone: () => void }) {
  const current: unknown = editor.getAttributes('link')['href'];
  const [typed, setTyped] = useState(typeof current === 'string' ? current : '');
  const [problem, setProblem] = useState<string | undefined>(undefined);
  const set = (event: FormEvent) => {
    event.preventDefault();
    const address = addressFrom(typed);
    if (typed.trim() === '' || !isSafeAddress(address)) {
      setProblem('Links start with https://, http:// or mailto:');
      return;
    }
    const chain = editor.chain().focus().extendMarkRange('link');
    if (editor.state.selection.empty && typeof current !== 'string') chain.insertContent({ type: 'text', text: typed.trim(), marks: [{ type: 'link', attrs: { href: address } }] }).run();
    else chain.setLink({ href: address }).run();
    onDone();
  };
  const leave = () => {
    editor.commands.focus();
    onDone();
  };
  return (
    <form onSubmit={set} className="flex flex-wrap items-end gap-2.5 px-1 py-2">
      <div className="min-w-64 flex-1">
        <TextField name="link-address" label="Where it leads" value={typed} onChange={(event) => setTyped(event.target.value)} inputMode="url" autoComplete="off" ref={focusOnce} onKeyDown={(event) => { if (event.key === 'Escape') leave(); }} error={problem} />
      </div>
      <Button type="submit" size="small">Set the link</Button>
      {typeof current === 'string' && <Button kind="quiet" size="small" onClick={() => { editor.chain().focus().extendMarkRange('link').unsetLink().run(); onDone(); }}>Take the link off</Button>}
      <Button kind="quiet" size="small" onClick={leave}>Leave it</Button>
    </form>
  );
}

function focusOnce(field: HTMLInputElement | null): void {
  field?.focus();
}
