import { nanoid } from 'nanoid';
import { useEffect, useRef } from 'react';
import { fieldId } from '#src/components/field.tsx';
import { useBench } from './bench.ts';
import type { BlockDeskProps } from './desk-block.ts';

interface Line { id: string }

export function newId(): string {
  return nanoid(10);
}

/** Adding, changing and taking out the lines of a block; the focus follows the hand. */
export function useLines<L extends Line, D extends { lines: L[] }>({ id: block, data, onChange }: BlockDeskProps<D>, blank: (id: string) => L, firstField: string) {
  const bench = useBench();
  const wanted = useRef<string | null>(null);
  useEffect(() => {
    if (wanted.current === null) return;
    const field = document.getElementById(fieldId(wanted.current));
    if (!field) return;
    wanted.current = null;
    field.focus();
  });

  const withLines = (change: (lines: L[]) => L[]) => onChange((now) => ({ ...now, lines: change(now.lines) }));
  const focus = (line: string, field: string) => { wanted.current = `${block}.${line}.${field}`; };

  const add = (lines: L[] = [blank(newId())]) => {
    const first = lines[0];
    if (!first) return;
    focus(first.id, firstField);
    withLines((now) => [...now, ...lines]);
  };
  return {
    add,
    change: (line: string, change: Partial<L>) => withLines((now) => now.map((one) => (one.id === line ? { ...one, ...change } : one))),
    /** Enter in a line: on to the next, or a new one after the last. */
    goOn: (line: string) => {
      const next = data.lines[data.lines.findIndex((one) => one.id === line) + 1];
      if (!next) add();
      else document.getElementById(fieldId(`${block}.${next.id}.${firstField}`))?.focus();
    },
    goTo: (line: string, field: string) => document.getElementById(fieldId(`${block}.${line}.${field}`))?.focus(),
    takeOut: (line: string, words: string) => {
      const place = data.lines.findIndex((one) => one.id === line);
      const taken = data.lines[place];
      if (!taken) return;
      const neighbour = data.lines[place + 1] ?? data.lines[place - 1];
      if (neighbour) focus(neighbour.id, firstField);
      withLines((now) => now.filter((one) => one.id !== line));
      bench.tookOut(`${words} taken out`, () => withLines((now) => (now.some((one) => one.id === line) ? now : [...now.slice(0, place), taken, ...now.slice(place)])));
    },
  };
}
