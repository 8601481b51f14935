import type { BuildKind, HazardTag, Stands, Visibility } from '#contracts/words.ts';
import type { Dimension, Measures } from '#domain/units.ts';
import type { WorkDone } from '#src/blocks/pure.ts';
import type { EntryPart } from './entry-words.ts';

/** The demo people who write; their halves of an address. */
export type DemoWriter = 'restorer' | 'crew';

export interface DemoStage {
  readonly title: string;
  readonly money: string;
  readonly time: string;
  readonly work?: WorkDone;
  readonly done?: true;
}

export interface DemoMaterial {
  readonly name: string;
  readonly dimension: Exclude<Dimension, 'time'>;
  /** What amounts are shown in: a unit, or a pack by its name. */
  readonly unit: string;
  /** Name and what is in it, as typed. */
  readonly packs?: Readonly<Record<string, string>>;
  readonly hazards?: readonly HazardTag[];
  /** Exact `n/d` of the other dimension's base unit in one of its own; always *about*. */
  readonly ratio?: { readonly to: Dimension; readonly amount: string };
}

export interface DemoEntry {
  /** Short and different in each entry of a build: the ids of its blocks start with it. */
  readonly key: string;
  readonly by: DemoWriter;
  /** Days before the day of loading. */
  readonly daysAgo: number;
  /** The last day, where the work went on for several. */
  readonly daysAgoTo?: number;
  readonly stage: string;
  readonly title: string;
  readonly lead: string;
  readonly work?: WorkDone;
  readonly content: readonly EntryPart[];
  /** Left as a working copy. */
  readonly draft?: true;
}

export interface DemoBuild {
  readonly owner: DemoWriter;
  readonly crew: readonly DemoWriter[];
  readonly startedDaysAgo: number;
  readonly kind: BuildKind;
  readonly title: string;
  readonly lead: string;
  readonly year: number;
  readonly yearAbout: boolean;
  readonly serialNumber?: string;
  readonly stands: Stands;
  readonly standsNote?: string;
  readonly currency: string;
  readonly measures: Measures;
  readonly method: 'fifo' | 'average';
  readonly visibility: Visibility;
  readonly costsShown: boolean;
  /** Files of the pictures that show it before and as it stands. */
  readonly before?: string;
  readonly after?: string;
  readonly stages: readonly DemoStage[];
  /** By the key its entries name it by. */
  readonly materials: Readonly<Record<string, DemoMaterial>>;
  /** In the order they were begun. */
  readonly entries: readonly DemoEntry[];
}
