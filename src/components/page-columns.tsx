import type { ReactNode } from 'react';

export interface PageColumnsProps {
  children: ReactNode;
  aside: ReactNode;
  /** 300 px, the tally margin, or 420 px for tables. */
  asideWidth?: 'narrow' | 'wide';
  /** Keep the aside in view while the other column goes by (the desk). */
  sticky?: boolean;
}

const columns = { narrow: 'wide:grid-cols-[minmax(0,1fr)_300px]', wide: 'wide:grid-cols-[minmax(0,1fr)_420px]' };

export function PageColumns({ children, aside, asideWidth = 'narrow', sticky = false }: PageColumnsProps) {
  return (
    <div className={`grid gap-x-14 gap-y-8 ${columns[asideWidth]}`}>
      <div className="min-w-0">{children}</div>
      <div className={`min-w-0 ${sticky ? 'self-start wide:sticky wide:top-5' : ''}`}>{aside}</div>
    </div>
  );
}
