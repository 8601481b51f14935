import { useState, type ReactNode } from 'react';
import type { LastTime } from '#contracts/entries.ts';
import { plural } from '#domain/format.ts';
import { useBench } from './bench.ts';
import { textButton } from './block-frame.tsx';

interface SameAsLastTimeParts<L> {
  /** The lines of the last time that this kind of block is about. */
  readonly linesOf: (last: LastTime) => readonly L[];
  readonly fill: (lines: readonly L[]) => void;
  /** Said where there are none. */
  readonly nothing: string;
}

/** Fills a block in from the last day that had one of its kind, or says beside the block that none had. */
export function useSameAsLastTime<L>({ linesOf, fill, nothing }: SameAsLastTimeParts<L>): { button: ReactNode; answer: ReactNode } {
  const bench = useBench();
  const [asking, setAsking] = useState(false);
  const [answer, setAnswer] = useState<string | null>(null);
  const taken = (last: LastTime): string | null => {
    const lines = linesOf(last);
    if (lines.length === 0) {
      bench.say(nothing);
      return nothing;
    }
    fill(lines);
    bench.say(`Filled in from “${last.title ?? 'the day before'}”: ${plural(lines.length, 'line', 'lines')}.`);
    return null;
  };
  const ask = async () => {
    if (asking) return;
    setAsking(true);
    try {
      setAnswer(taken(await bench.lastTime()));
    } catch (cause) {
      bench.say(cause instanceof Error ? cause.message : 'The last time could not be fetched.');
    } finally {
      setAsking(false);
    }
  };
  return {
    button: <button type="button" onClick={() => void ask()} aria-disabled={asking} className={textButton}>Same as last time</button>,
    answer: answer && <p className="mt-1 text-small text-ink-soft">{answer}</p>,
  };
}
