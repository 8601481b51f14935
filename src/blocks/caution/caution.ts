import { z } from 'zod';
import { hazardTags } from '#contracts/words.ts';
import { pureBlock, type BlockDerivation } from '../block.ts';

/** A warning from the caution list, or in the writer's own words. */
export const cautionData = z.object({
  hazard: z.enum(hazardTags).nullable(),
  title: z.string().max(160),
  words: z.string().max(2000),
});
export type CautionData = z.output<typeof cautionData>;

export function blankCaution(): CautionData {
  return { hazard: null, title: '', words: '' };
}

function deriveCaution(data: CautionData): BlockDerivation {
  const empty = data.hazard === null && data.words.trim() === '' && data.title.trim() === '';
  return { faults: empty ? [{ path: 'words', problem: 'Say what to beware of, or pick one from the list.' }] : [] };
}

export const caution = pureBlock({ type: 'caution', version: 1, schema: cautionData, stepsUp: {}, derive: deriveCaution });
