import { type ReactNode, useEffect, useRef } from 'react';

export interface MenuProps {
  label: string;
  face: ReactNode;
  children: ReactNode;
  className?: string;
}

/** A `<details>` that works without scripts; with them it also closes on Escape, a press outside and a choice made. */
export function Menu({ label, face, children, className = '' }: MenuProps) {
  const box = useRef<HTMLDetailsElement>(null);

  useEffect(() => {
    const close = () => box.current?.removeAttribute('open');
    const onPress = (event: PointerEvent) => {
      if (event.target instanceof Node && !box.current?.contains(event.target)) close();
    };
    const onKey = (event: KeyboardEvent) => {
      if (event.key !== 'Escape' || !box.current?.open) return;
      close();
      box.current.querySelector('summary')?.focus();
    };
    const onChoice = (event: MouseEvent) => {
      if (event.target instanceof Element && event.target.closest('a') && box.current?.contains(event.target)) close();
    };
    document.addEventListener('pointerdown', onPress);
    document.addEventListener('keydown', onKey);
    document.addEventListener('click', onChoice);
    return () => {
      document.removeEventListener('pointerdown', onPress);
      document.removeEventListener('keydown', onKey);
      document.removeEventListener('click', onChoice);
    };
  }, []);

  return (
    <details ref={box} className={`relative ${className}`}>
      <summary aria-label={label} className="flex min-h-9 min-w-9 items-center justify-center rounded-edge">
        {face}
      </summary>
      <div className="absolute right-0 top-full z-40 mt-3 w-64 max-w-[calc(100vw-2rem)] border border-rule-strong bg-card p-2 text-ink [--focus:var(--color-scribe)]">
        {children}
      </div>
    </details>
  );
}
