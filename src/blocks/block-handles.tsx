import { createContext, useContext, useEffect, useId, useRef, useState } from 'react';

/** What the editor lets a block do with itself. */
export interface BlockHandle {
  readonly word: string;
  readonly canUp: boolean;
  readonly canDown: boolean;
  readonly up: () => void;
  readonly down: () => void;
  readonly takeOut: () => void;
}
const HandleContext = createContext<BlockHandle | null>(null);
export const BlockHandleProvider = HandleContext.Provider;

const button = 'min-h-8 min-w-8 rounded-edge px-2 text-small text-ink-soft hover:bg-hover hover:text-ink aria-disabled:opacity-40 max-wide:min-h-11 max-wide:min-w-24 max-wide:px-4 max-wide:text-left';
const folded = 'max-wide:absolute max-wide:top-full max-wide:right-0 max-wide:z-20 max-wide:flex-col max-wide:border max-wide:border-rule-strong max-wide:bg-card';

/** Closes on Escape and on a press elsewhere; the focus goes back to what opened it. */
function useMenu() {
  const [open, setOpen] = useState(false);
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (!open) return undefined;
    const onPress = (event: PointerEvent) => {
      if (!(event.target instanceof Node) || !box.current?.contains(event.target)) setOpen(false);
    };
    const onKey = (event: KeyboardEvent) => {
      if (event.key !== 'Escape') return;
      setOpen(false);
      box.current?.querySelector('button')?.focus();
    };
    document.addEventListener('pointerdown', onPress);
    document.addEventListener('keydown', onKey);
    return () => {
      document.removeEventListener('pointerdown', onPress);
      document.removeEventListener('keydown', onKey);
    };
  }, [open]);
  return { open, setOpen, box };
}

/** A block's place in the text: three words at the right of its head, folded into a small menu on a phone. */
export function BlockHandles() {
  const handle = useContext(HandleContext);
  const { open, setOpen, box } = useMenu();
  const id = useId();
  if (!handle) return null;
  const { word, canUp, canDown, up, down, takeOut } = handle;
  return (
    <div ref={box} className="relative -mr-2">
      <button
        type="button" data-place-menu aria-label={`Move ${word}, or take it out`} aria-expanded={open} aria-controls={id} onClick={() => setOpen(!open)}
        className="flex size-11 items-center justify-center rounded-edge text-ink-soft hover:bg-hover wide:hidden"
      >
        <svg viewBox="0 0 20 4" width="20" height="4" aria-hidden="true" fill="currentColor"><circle cx="2" cy="2" r="2" /><circle cx="10" cy="2" r="2" /><circle cx="18" cy="2" r="2" /></svg>
      </button>
      <div id={id} role="group" aria-label={`Place of this ${word} block`} className={`flex ${folded} ${open ? '' : 'max-wide:hidden'}`}>
        <button type="button" aria-disabled={!canUp} onClick={canUp ? up : undefined} className={button}>Up</button>
        <button type="button" aria-disabled={!canDown} onClick={canDown ? down : undefined} className={button}>Down</button>
        <button type="button" onClick={takeOut} className={button}>Take out</button>
      </div>
    </div>
  );
}
