import { useEffect, useRef, type ReactNode } from 'react';

/** What just happened, above the page's body: takes the focus, so that it is read out first. */
export function Notice({ good, children }: { good: boolean; children: ReactNode }) {
  const box = useRef<HTMLParagraphElement>(null);
  useEffect(() => box.current?.focus(), []);
  return (
    <p ref={box} role="status" tabIndex={-1} className={`mb-6 max-w-reading border border-l-[5px] bg-card px-4 py-3 text-control font-semibold ${good ? 'border-verd' : 'border-lead'}`}>
      {children}
    </p>
  );
}
