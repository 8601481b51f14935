import { type ReactNode, useEffect, useId, useRef } from 'react';

export interface DialogProps {
  open: boolean;
  title: string;
  /** Called on Escape and on Close; the owner sets `open`. */
  onClose: () => void;
  /** In place of "Close", where closing only puts it off. */
  closeWord?: string;
  children: ReactNode;
  /** The buttons at the foot; the first names what happens. */
  actions?: ReactNode;
}

/** The browser's own dialog: it keeps the focus in, gives it back, and closes on Escape. */
export function Dialog({ open, title, onClose, closeWord = 'Close', children, actions }: DialogProps) {
  const box = useRef<HTMLDialogElement>(null);
  const heading = useRef<HTMLHeadingElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = box.current;
    if (!dialog) return;
    if (open && !dialog.open) {
      dialog.showModal();
      // what it is about comes first, not the way out of it
      heading.current?.focus();
    }
    if (!open && dialog.open) dialog.close();
  }, [open]);
  return (
    <dialog
      ref={box}
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      className="dialog m-auto w-[min(34rem,calc(100vw-2rem))] border-t-[5px] border-scribe bg-card p-5 text-ink wide:p-6"
    >
      <div className="flex items-start justify-between gap-4">
        <h2 ref={heading} id={titleId} tabIndex={-1} className="lettering-row focus:outline-none">
          {title}
        </h2>
        <button type="button" onClick={onClose} className="-mt-1 min-h-8 px-1 text-control font-semibold text-scribe underline">
          {closeWord}
        </button>
      </div>
      <div className="mt-3">{open && children}</div>
      {actions && <div className="mt-5 flex flex-wrap gap-2.5">{actions}</div>}
    </dialog>
  );
}
