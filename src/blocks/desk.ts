import type { BlockData } from './entry-document.ts';
import type { BlockType } from './pure-list.ts';
import type { DeskBlock } from './desk-block.ts';
import { boughtDesk } from './bought/desk.tsx';
import { cautionDesk } from './caution/desk.tsx';
import { costDesk } from './cost/desk.tsx';
import { findingDesk } from './finding/desk.tsx';
import { photosDesk } from './photos/desk.tsx';
import { timeDesk } from './time/desk.tsx';
import { usedDesk } from './used/desk.tsx';

/** The editing half of every block, in the order of the tray. One line a block type; loaded only by the desk. */
export const deskBlocks: { readonly [T in BlockType]: DeskBlock<BlockData<T>> } = {
  photos: photosDesk, used: usedDesk, bought: boughtDesk, cost: costDesk, time: timeDesk, finding: findingDesk, caution: cautionDesk,
};
