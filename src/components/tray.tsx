import type { ReactNode } from 'react';

/** What can be put in next, at the end of the text: a row of quiet small buttons. */
export function Tray({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div role="group" aria-label={label} className="border-2 border-dashed border-rule-strong px-4 py-3.5">
      <p aria-hidden="true" className="mb-2 text-small text-ink-soft">
        {label}
      </p>
      <div className="flex flex-wrap gap-2">{children}</div>
    </div>
  );
}
