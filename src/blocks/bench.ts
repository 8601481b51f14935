import { createContext, useContext, useSyncExternalStore } from 'react';
import type { LastTime } from '#contracts/entries.ts';
import type { DeskPicture } from '#contracts/pictures.ts';
import type { InputOf } from '#contracts/endpoint.ts';
import type { addMaterial } from '#contracts/materials.ts';
import type { BlockContext, MaterialFacts } from './block.ts';
import type { Figures, FiguresStore, LineReckoning } from './figures-store.ts';

/** A picture on its way up, or stopped on it. */
export interface PictureUpload {
  readonly id: string;
  readonly block: string;
  readonly name: string;
  readonly size: number;
  readonly sent: number;
  readonly state: 'waiting' | 'going' | 'checking' | 'stopped' | 'failed' | 'refused';
  readonly problem: string | null;
  /** Address of the picture in this browser, to show meanwhile. */
  readonly preview: string | null;
}

export interface PicturesOnBench {
  readonly uploads: readonly PictureUpload[];
  readonly add: (block: string, files: readonly File[]) => void;
  readonly retry: (id: string) => void;
  readonly stop: (id: string) => void;
  readonly dismiss: (id: string) => void;
  readonly of: (key: string) => DeskPicture | undefined;
}

export type MaterialInput = Omit<InputOf<typeof addMaterial>['body'], 'build'>;
export type MaterialOutcome = { ok: true; material: MaterialFacts } | { ok: false; problem: string; fields: Readonly<Record<string, string>> };

/** What the desk lends to the blocks on it: figures, materials, people, and the few things they may ask for. It stays the same while somebody types. */
export interface Bench {
  readonly context: BlockContext;
  readonly buildTitle: string;
  readonly people: readonly { handle: string; name: string }[];
  /** Most used first. */
  readonly materials: readonly MaterialFacts[];
  readonly figures: FiguresStore;
  readonly touch: (path: string) => void;
  readonly addMaterial: (material: MaterialInput) => Promise<MaterialOutcome>;
  readonly lastTime: () => Promise<LastTime>;
  /** Said and shown. */
  readonly say: (words: string) => void;
  /** Says what was taken out, and offers to put it back. */
  readonly tookOut: (words: string, putBack: () => void) => void;
}

const BenchContext = createContext<Bench | null>(null);
export const BenchProvider = BenchContext.Provider;

export function useBench(): Bench {
  const bench = useContext(BenchContext);
  if (!bench) throw new Error('A block stands outside the desk');
  return bench;
}

// Apart from the bench, as it changes with every part of a picture that goes up.
const PicturesContext = createContext<PicturesOnBench | null>(null);
export const PicturesProvider = PicturesContext.Provider;

export function usePictures(): PicturesOnBench {
  const pictures = useContext(PicturesContext);
  if (!pictures) throw new Error('A Photos block stands outside the desk');
  return pictures;
}

/** One figure, drawn again only when it changes: `pick` gives a plain value or an object out of the store. */
export function useFigure<T>(pick: (figures: Figures) => T): T {
  const { figures } = useBench();
  return useSyncExternalStore(figures.subscribe, () => pick(figures.read()));
}
export function useFault(path: string): string | undefined {
  return useFigure(({ fault }) => fault(path));
}
export function useLineReckoning(block: string, line: string): LineReckoning | undefined {
  return useFigure(({ lines }) => lines.get(`${block}:${line}`));
}
