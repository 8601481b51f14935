import type { ComponentType } from 'react';
import type { SlipKind } from '#src/components/slip.tsx';
import type { EntryContext } from './derive-entry.ts';

export interface BlockDeskProps<Data> {
  readonly id: string;
  readonly data: Data;
  /** Gives what the block holds now; `change` gets the newest data, so that late answers overwrite nothing. */
  readonly onChange: (change: (data: Data) => Data) => void;
}

/** One block type as the desk shows it. */
export interface DeskBlock<Data> {
  /** On the tray and in messages: "Used", "Worked, or went wrong". */
  readonly word: string;
  /** Colour of its edge; blocks that stand in the text have none. */
  readonly kind: (data: Data) => SlipKind | null;
  readonly version: number;
  readonly blank: () => Data;
  readonly Desk: ComponentType<BlockDeskProps<Data>>;
  /** What it holds in plain words, to compare two texts. */
  readonly words: (data: Data, context: EntryContext) => string;
}

export function deskBlock<Data>(block: DeskBlock<Data>): DeskBlock<Data> {
  return block;
}
