import { nanoid } from 'nanoid';
import { useEffect, useMemo, useRef } from 'react';
import { fieldId } from '#src/components/field.tsx';
import { useBench } from './bench.ts';
import type { BlockDeskProps } from './desk-block.ts';

interface Line { id: string }

export function newId(): string {
  return nanoid(10);
}

export interface LineActions<L extends Line> {
  readonly add: (lines?: L[]) => void;
  /** Adds lines in place of those nothing was written on yet. */
  readonly fill: (lines: L[], isBlank: (line: L) => boolean) => void;
  readonly change: (line: string, change: Partial<L>) => void;
  /** Enter in a line: on to the next, or a new one after the last. */
  readonly goOn: (line: string) => void;
  readonly goTo: (line: string, field: string) => void;
  readonly takeOut: (line: string, words: string) => void;
}

/** Adding, changing and taking out the lines of a block; the focus follows the hand. The actions stay the same while lines change. */
export function useLines<L extends Line, D extends { lines: L[] }>(props: BlockDeskProps<D>, blank: (id: string) => L, firstField: string): LineActions<L> {
  const { tookOut } = useBench();
  const latest = useRef(props);
  const wanted = useRef<string | null>(null);
  useEffect(() => {
    latest.current = props;
    if (wanted.current === null) return;
    const field = document.getElementById(fieldId(wanted.current));
    if (!field) return;
    wanted.current = null;
    field.focus();
  });

  return useMemo(() => {
    const withLines = (change: (lines: L[]) => L[]) => latest.current.onChange((now) => ({ ...now, lines: change(now.lines) }));
    const path = (line: string, field: string) => `${latest.current.id}.${line}.${field}`;
    const goTo = (line: string, field: string) => document.getElementById(fieldId(path(line, field)))?.focus();
    const add = (lines: L[] = [blank(newId())]) => {
      const first = lines[0];
      if (!first) return;
      wanted.current = path(first.id, firstField);
      withLines((now) => [...now, ...lines]);
    };
    return {
      add, goTo,
      fill: (lines, isBlank) => withLines((now) => [...now.filter((line) => !isBlank(line)), ...lines]),
      change: (line, change) => withLines((now) => now.map((one) => (one.id === line ? { ...one, ...change } : one))),
      goOn: (line) => {
        const { lines } = latest.current.data;
        const next = lines[lines.findIndex((one) => one.id === line) + 1];
        if (next) goTo(next.id, firstField);
        else add();
      },
      takeOut: (line, words) => {
        const { lines } = latest.current.data;
        const place = lines.findIndex((one) => one.id === line);
        const taken = lines[place];
        if (!taken) return;
        const neighbour = lines[place + 1] ?? lines[place - 1];
        if (neighbour) wanted.current = path(neighbour.id, firstField);
        withLines((now) => now.filter((one) => one.id !== line));
        tookOut(`${words} taken out`, () => withLines((now) => (now.some((one) => one.id === line) ? now : [...now.slice(0, place), taken, ...now.slice(place)])));
      },
    };
  }, [blank, firstField, tookOut]);
}
