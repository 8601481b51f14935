import { bought } from './bought/bought.ts';
import { caution } from './caution/caution.ts';
import { cost } from './cost/cost.ts';
import { finding } from './finding/finding.ts';
import { photos } from './photos/photos.ts';
import { time } from './time/time.ts';
import { used } from './used/used.ts';

/** One line a block type. */
export const pureBlocks = { photos, used, bought, cost, time, finding, caution } as const;
export type BlockType = keyof typeof pureBlocks;
export const blockTypes = Object.keys(pureBlocks) as BlockType[];
