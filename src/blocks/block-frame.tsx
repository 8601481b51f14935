import type { ReactNode } from 'react';
import type { SlipKind } from '#src/components/slip.tsx';
import { BlockHandles } from './block-handles.tsx';

const edges: Record<SlipKind, string> = {
  used: 'border-l-scribe', bought: 'border-l-zinc', cost: 'border-l-zinc', time: 'border-l-ink', mix: 'border-l-verd', worked: 'border-l-verd', wrong: 'border-l-lead', measure: 'border-l-edge',
};
const words: Record<SlipKind, string> = {
  used: 'text-scribe', bought: 'text-zinc-ink', cost: 'text-zinc-ink', time: 'text-ink', mix: 'text-verd', worked: 'text-verd', wrong: 'text-lead', measure: 'text-ink',
};

export interface BlockFrameProps {
  kind: SlipKind | null;
  /** The kind in words: Used, Bought. */
  word: string;
  note?: ReactNode;
  /** At the right of the head: "Same as last time". */
  end?: ReactNode;
  children: ReactNode;
}

export const textButton = 'min-h-6 text-scribe underline underline-offset-[0.18em] hover:decoration-2 max-wide:min-h-11';
/** The card a block is written on: its kind, what it may be asked, and its place in the text. */
export function BlockFrame({ kind, word, note, end, children }: BlockFrameProps) {
  const edge = kind ? edges[kind] : 'border-l-rule-strong';
  return (
    <section role="group" aria-label={word} className={`num border border-l-[5px] border-rule ${edge} bg-card px-4 py-3.5 text-control wide:px-5`}>
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <p className="flex flex-1 flex-wrap items-baseline gap-x-2.5">
          <b className={`font-head text-[1.0625rem] font-[740] font-stretch-[110%] ${kind ? words[kind] : 'text-ink'}`}>{word}</b>
          {note && <span className="text-small text-ink-soft">{note}</span>}
        </p>
        {end && <div className="text-small">{end}</div>}
        <BlockHandles />
      </div>
      {children}
    </section>
  );
}

/** The last row of a block: what its lines come to. */
export function BlockSum({ label, value }: { label: string; value: string }) {
  return (
    <p className="mt-2 flex justify-between gap-4 border-t-2 border-ink pt-3 font-[680]">
      <span>{label}</span>
      <span>{value}</span>
    </p>
  );
}
