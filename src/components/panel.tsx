import type { ReactNode } from 'react';

/** A sheet of card on the bench, for tables and forms. */
export function Panel({ children, flush = false }: { children: ReactNode; flush?: boolean }) {
  return <div className={`border border-rule bg-card [--table-ground:var(--color-card)] ${flush ? '' : 'p-4 wide:px-6 wide:py-[22px]'}`}>{children}</div>;
}
