import type { ReactNode } from 'react';

export interface CautionProps {
  title: string;
  children: ReactNode;
  /** Where the warning comes from. */
  source?: { label: string; href?: string };
}

export function Caution({ title, children, source }: CautionProps) {
  return (
    <aside aria-label="Caution" className="max-w-reading border border-l-[5px] border-lead bg-card px-4 py-[13px] text-control">
      <b className="text-lead">{/[.?]$/.test(title) ? title : `${title}.`}</b> {children}
      {source && (
        <p className="mt-2 text-note text-ink-soft">
          Source: {source.href ? <a href={source.href} rel="noopener" className="text-inherit">{source.label}</a> : source.label}
        </p>
      )}
    </aside>
  );
}
