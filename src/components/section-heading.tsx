import type { ReactNode } from 'react';

export interface SectionHeadingProps {
  children: ReactNode;
  id?: string;
  /** Links or buttons at the right. */
  end?: ReactNode;
}

export function SectionHeading({ children, id, end }: SectionHeadingProps) {
  return (
    <div className="mb-4 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1">
      <h2 id={id} className="lettering-section">
        {children}
      </h2>
      {end && <div className="text-control">{end}</div>}
    </div>
  );
}
