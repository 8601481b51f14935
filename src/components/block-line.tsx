import type { ReactNode } from 'react';

export interface BlockLineProps {
  /** The material or person: words, or the box to choose one in. */
  label: ReactNode;
  /** Amount and unit, minutes, price. */
  controls: ReactNode;
  /** "2 left", "not bought yet". */
  note?: ReactNode;
  value?: string;
  /** The line's faults, and its smaller controls. */
  children?: ReactNode;
}

/** One line of a block while it is written: in a row on a wide screen, label and figure over the controls on a phone. */
export function BlockLine({ label, controls, note, value, children }: BlockLineProps) {
  return (
    <div className="border-b border-rule py-2.5 text-control">
      <div className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-3.5 gap-y-1.5 wide:grid-cols-[minmax(0,1fr)_auto_6.5rem_6rem]">
        <div className="min-w-0 font-semibold">{label}</div>
        <div className="col-start-1 row-start-2 wide:col-start-2 wide:row-start-1">{controls}</div>
        <div className="num text-right text-small text-ink-soft wide:text-left">{note}</div>
        <div className="num col-start-2 row-start-1 text-right wide:col-start-4">{value}</div>
      </div>
      {children}
    </div>
  );
}
