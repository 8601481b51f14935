import type { ReactNode } from 'react';

export interface EmptyProps {
  title: string;
  /** What to do first. */
  children: ReactNode;
  action?: ReactNode;
}

export function Empty({ title, children, action }: EmptyProps) {
  return (
    <div className="border border-dashed border-rule-strong px-5 py-6">
      <p className="lettering-row">{title}</p>
      <div className="mt-1.5 max-w-reading text-control text-ink-soft">{children}</div>
      {action && <div className="not-printed mt-4 flex flex-wrap gap-2.5">{action}</div>}
    </div>
  );
}
