import { useQueryClient } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { DeskView } from '#contracts/entries.ts';
import { wordsForQuantity } from '#domain/quantity-words.ts';
import type { Bench, MaterialInput, MaterialOutcome, PicturesOnBench } from '#src/blocks/bench.ts';
import { contextOf } from '#src/blocks/derive-entry.ts';
import type { EntryDocument, MaterialFacts } from '#src/blocks/pure.ts';
import { lastTimeQuery } from '#src/queries/entries.ts';
import type { DeskReckoning } from './desk-ledger.ts';

export interface BenchParts {
  view: DeskView;
  document: EntryDocument;
  reckoning: DeskReckoning;
  materials: readonly MaterialFacts[];
  byId: ReadonlyMap<number, MaterialFacts>;
  addMaterial: (input: MaterialInput) => Promise<MaterialOutcome>;
  pictures: PicturesOnBench;
  fault: Bench['fault'];
  touch: Bench['touch'];
  say: Bench['say'];
  tookOut: Bench['tookOut'];
}

/** Puts together what the desk lends to its blocks. */
export function useBenchOf(parts: BenchParts): Bench {
  const { view, document, reckoning, materials, byId, addMaterial, pictures, fault, touch, say, tookOut } = parts;
  const client = useQueryClient();
  const { day, dayTo, stage } = document;
  return useMemo(() => {
    const left = new Map(view.shelf.filter(({ shelf }) => shelf === 'shelf').map((row) => [row.material, row.left]));
    for (const row of reckoning.shelf) if (row.shelf === 'shelf') left.set(row.material, row.left);
    return {
      context: contextOf({ ...reckoning.document, day, dayTo, stage }, { measures: view.build.measures, currency: view.build.currency, materials: byId }),
      buildTitle: view.build.title, people: view.people, materials, lines: reckoning.lines, addMaterial, pictures, fault, touch, say, tookOut,
      leftWords: (id) => {
        const [material, exact] = [byId.get(id), left.get(id)];
        return material && exact !== undefined ? `${wordsForQuantity(exact, material.dimension, { measures: view.build.measures, packs: material.packs, unit: material.unit })} left` : null;
      },
      lastTime: () => client.fetchQuery(lastTimeQuery({ build: view.build.slug, number: view.entry.number }, stage)),
    };
  }, [view, day, dayTo, stage, reckoning, materials, byId, addMaterial, pictures, fault, touch, say, tookOut, client]);
}
