import type { ReactNode } from 'react';

/** Words as the restorer wrote them, 64 characters to the line. */
export function Prose({ children }: { children: ReactNode }) {
  return <div className="prose">{children}</div>;
}
