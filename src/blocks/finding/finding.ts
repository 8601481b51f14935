import { z } from 'zod';
import type { SlipView } from '#contracts/slip.ts';
import { pureBlock, type BlockDerivation } from '../block.ts';

/** Something learnt: what was tried, what happened, what to do instead. */
export const findingData = z.object({
  verdict: z.enum(['worked', 'wrong']),
  tried: z.string().max(2000),
  happened: z.string().max(2000),
  instead: z.string().max(2000),
});
export type FindingData = z.output<typeof findingData>;

export function blankFinding(): FindingData {
  return { verdict: 'wrong', tried: '', happened: '', instead: '' };
}

function deriveFinding(data: FindingData): BlockDerivation {
  const empty = [data.tried, data.happened, data.instead].every((words) => words.trim() === '');
  return { faults: empty ? [{ path: 'happened', problem: 'Say what happened, or take this block out.' }] : [] };
}

function findingSlip(_id: string, data: FindingData): SlipView {
  const parts = [
    { lead: 'Tried', words: data.tried.trim() },
    { lead: data.verdict === 'wrong' ? 'What happened' : 'What came of it', words: data.happened.trim() },
    { lead: data.verdict === 'wrong' ? 'Instead' : 'Next time', words: data.instead.trim() },
  ].filter((part) => part.words !== '');
  return { kind: data.verdict, word: data.verdict === 'wrong' ? 'Went wrong' : 'Worked', lines: [], text: parts.length === 1 ? parts.map(({ words }) => ({ words })) : parts };
}

export const finding = pureBlock({ type: 'finding', version: 1, schema: findingData, stepsUp: {}, derive: deriveFinding, slip: findingSlip });
