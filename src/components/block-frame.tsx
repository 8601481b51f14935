import type { ReactNode } from 'react';
import type { SlipKind } from './slip.tsx';

export interface BlockFrameProps {
  kind: SlipKind | 'photos' | 'caution';
  /** The kind in words: Used, Bought, Photos … */
  word: string;
  note?: string;
  /** At the right of the head: "Same as last time", a way to move or take out the block. */
  end?: ReactNode;
  children: ReactNode;
  /** The sum at the foot, as the slip will show it. */
  sum?: { label: string; value: string } | null;
}

/** A block while it is written: the slip laid open, wide enough to type in. */
export function BlockFrame({ kind, word, note, end, children, sum }: BlockFrameProps) {
  return (
    <section data-kind={kind} aria-label={note ? `${word}, ${note}` : word} className="border border-l-[5px] border-rule border-l-[var(--kind)] bg-card p-4 pl-5">
      <div className="mb-2 flex flex-wrap items-baseline gap-x-2.5 gap-y-1">
        <b className="font-head text-[1.0625rem] font-[740] text-[var(--kind-text)] font-stretch-[110%]">{word}</b>
        {note && <span className="text-small text-ink-soft">{note}</span>}
        {end && <span className="ml-auto flex flex-wrap items-baseline gap-x-3 text-control">{end}</span>}
      </div>
      {children}
      {sum && (
        <p className="num mt-3 flex justify-between gap-3 border-t-2 border-ink pt-2.5 font-[680]">
          <span>{sum.label}</span>
          <span>{sum.value}</span>
        </p>
      )}
    </section>
  );
}
