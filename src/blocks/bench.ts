import { createContext, useContext } from 'react';
import type { LastTime } from '#contracts/entries.ts';
import type { DeskPicture } from '#contracts/pictures.ts';
import type { InputOf } from '#contracts/endpoint.ts';
import type { addMaterial } from '#contracts/materials.ts';
import type { BlockContext, MaterialFacts } from './block.ts';

/** What a line of a block comes to, with everything before it in the ledger counted. */
export interface LineReckoning {
  /** Minor units of the build's currency; settled so far. */
  readonly value: number;
  /** Exact `n/d`: not bought yet. */
  readonly short: string;
  /** Exact `n/d`: on its shelf after this line; nothing where it reaches no shelf. */
  readonly left: string | null;
}

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

/** What the desk lends to the blocks on it: figures, materials, people, and the few things they may ask for. */
export interface Bench {
  readonly context: BlockContext;
  readonly buildTitle: string;
  readonly people: readonly { handle: string; name: string }[];
  /** Most used first. */
  readonly materials: readonly MaterialFacts[];
  /** By `block:line`. */
  readonly lines: ReadonlyMap<string, LineReckoning>;
  /** "650 ml left", on the build's shelf as it would stand after this entry; nothing where none was ever there. */
  readonly leftWords: (material: number) => string | null;
  /** Words for beside a field, once it has been left or signing off was tried. */
  readonly fault: (path: string) => string | undefined;
  readonly touch: (path: string) => void;
  readonly addMaterial: (material: MaterialInput) => Promise<MaterialOutcome>;
  readonly lastTime: () => Promise<LastTime>;
  readonly pictures: PicturesOnBench;
  /** Said aloud by a screen reader. */
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
