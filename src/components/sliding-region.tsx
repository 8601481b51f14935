import type { ReactNode } from 'react';

export interface SlidingRegionProps {
  label: string;
  children: ReactNode;
}

/** Holds what is wider than a phone, and is reached and slid by keyboard as well as by finger. */
export function SlidingRegion({ label, children }: SlidingRegionProps) {
  return (
    // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex -- what slides sideways must be reached and slid by keyboard
    <div role="group" aria-label={label} tabIndex={0} className="overflow-x-auto wide:overflow-visible">
      {children}
    </div>
  );
}
