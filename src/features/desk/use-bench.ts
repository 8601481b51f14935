import { useQueryClient } from '@tanstack/react-query';
import { useLayoutEffect, useMemo, useState } from 'react';
import type { DeskView } from '#contracts/entries.ts';
import { wordsForQuantity } from '#domain/quantity-words.ts';
import type { Bench, MaterialInput, MaterialOutcome } from '#src/blocks/bench.ts';
import type { Figures } from '#src/blocks/figures-store.ts';
import { makeFiguresStore } from '#src/blocks/figures-store.ts';
import type { EntryDocument, MaterialFacts } from '#src/blocks/pure.ts';
import { lastTimeQuery } from '#src/queries/entries.ts';
import type { DeskReckoning } from './desk-ledger.ts';

export interface BenchParts {
  view: DeskView;
  document: EntryDocument;
  materials: readonly MaterialFacts[];
  byId: ReadonlyMap<number, MaterialFacts>;
  addMaterial: (input: MaterialInput) => Promise<MaterialOutcome>;
  touch: Bench['touch'];
  say: Bench['say'];
  tookOut: Bench['tookOut'];
}

/** Puts together what the desk lends to its blocks; it stays the same object while words and amounts are typed. */
export function useBenchOf({ view, document, materials, byId, addMaterial, touch, say, tookOut }: BenchParts, figuresNow: Figures): Bench {
  const client = useQueryClient();
  const { day, dayTo, stage } = document;
  const [figures] = useState(() => makeFiguresStore(figuresNow));
  useLayoutEffect(() => figures.publish(figuresNow), [figures, figuresNow]);
  return useMemo(() => ({
    context: { measures: view.build.measures, currency: view.build.currency, materials: byId, day, dayTo, stage },
    buildTitle: view.build.title, people: view.people, materials, figures, addMaterial, touch, say, tookOut,
    lastTime: () => client.fetchQuery(lastTimeQuery({ build: view.build.slug, number: view.entry.number }, stage)),
  }), [view, day, dayTo, stage, figures, materials, byId, addMaterial, touch, say, tookOut, client]);
}

/** What changes with every keystroke, as the blocks read it. */
export function useFiguresOf(view: DeskView, reckoning: DeskReckoning, byId: ReadonlyMap<number, MaterialFacts>, fault: Figures['fault']): Figures {
  return useMemo(() => {
    const left = new Map(view.shelf.filter(({ shelf }) => shelf === 'shelf').map((row) => [row.material, row.left]));
    for (const row of reckoning.shelf) if (row.shelf === 'shelf') left.set(row.material, row.left);
    return {
      lines: reckoning.lines, fault,
      leftWords: (id) => {
        const [material, exact] = [byId.get(id), left.get(id)];
        return material && exact !== undefined ? `${wordsForQuantity(exact, material.dimension, { measures: view.build.measures, packs: material.packs, unit: material.unit })} left` : null;
      },
    };
  }, [view, reckoning, byId, fault]);
}
