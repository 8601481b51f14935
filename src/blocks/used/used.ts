import { z } from 'zod';
import { exactFrom } from '#domain/quantity.ts';
import { formatMoney } from '#domain/format.ts';
import { wordsForQuantity } from '#domain/quantity-words.ts';
import type { SlipView } from '#contracts/slip.ts';
import { countsList } from '#contracts/words.ts';
import { amountFaults, amountLineShape, materialOf, readLine, typedAmount } from '../amount-line.ts';
import { ownDay, ownDayFaults, ownDayWords, standsOn } from '../own-day.ts';
import { pureBlock, type BlockContext, type ProjectionContext } from '../block.ts';

export const usedLine = z.object({
  ...amountLineShape,
  fate: z.enum(['used', 'wasted']),
  counts: z.enum(countsList),
  from: z.enum(['shelf', 'shed']),
});
export type UsedLine = z.output<typeof usedLine>;
/** Materials drawn from the build's shelf or the shed, used or wasted. */
export const usedData = z.object({ day: ownDay, lines: z.array(usedLine).max(200) });
export type UsedData = z.output<typeof usedData>;

export function blankUsedLine(id: string): UsedLine {
  return { id, material: null, name: '', amount: '', unit: '', exact: null, read: '', fate: 'used', counts: 'each', from: 'shelf' };
}

function deriveUsed(data: UsedData, context: BlockContext) {
  const lineFaults = data.lines.length === 0 ? [{ path: '', problem: 'Add a line, or take this block out.' }] : data.lines.flatMap((line) => amountFaults(line, context));
  const faults = [...ownDayFaults(data.day, context), ...lineFaults];
  const uses = data.lines.flatMap((line) => line.exact === null || line.material === null ? [] : [{
    line: line.id, material: line.material, kind: line.fate, from: line.from, counts: line.counts,
    typed: typedAmount(line), amount: line.exact, day: standsOn(data.day, context),
  }]);
  return { faults, uses };
}

function lineView(id: string, line: UsedLine, context: ProjectionContext) {
  const figures = context.figures.get(`${id}:${line.id}`);
  const material = materialOf(line, context);
  const amount = material && line.exact ? wordsForQuantity(line.exact, material.dimension, { measures: context.measures, packs: material.packs, unit: material.unit }) : typedAmount(line);
  const notes = [
    amount,
    line.fate === 'wasted' ? 'wasted' : '',
    line.counts === 'whole' ? 'for the whole job' : line.counts === 'opened' ? 'opened, not counted' : '',
    line.from === 'shed' ? 'from the shed' : '',
    figures && exactFrom(figures.short).compare(0) > 0 ? 'not bought yet' : '',
  ].filter(Boolean);
  return { label: material?.name ?? line.name, small: notes.join(', '), ...(figures?.value != null ? { value: formatMoney(figures.value, context.currency) } : {}) };
}

function sumOf(id: string, lines: readonly UsedLine[], context: ProjectionContext): number {
  return lines.reduce((sum, line) => sum + (context.figures.get(`${id}:${line.id}`)?.value ?? 0), 0);
}

function usedSlip(id: string, data: UsedData, context: ProjectionContext): SlipView {
  const wasted = data.lines.filter((line) => line.fate === 'wasted');
  const used = data.lines.filter((line) => line.fate === 'used');
  const wastedWords = wasted.length > 0 && context.costsShown ? `${formatMoney(sumOf(id, wasted, context), context.currency)} wasted beside it` : undefined;
  const note = [context.workWords ? `for ${context.workWords}` : '', ownDayWords(data.day, context)].filter(Boolean).join(', ');
  return {
    kind: 'used', word: used.length > 0 ? 'Used' : 'Wasted',
    ...(note ? { note } : {}),
    lines: data.lines.map((line) => lineView(id, line, context)),
    sum: context.costsShown ? { label: used.length > 0 ? 'Used' : 'Wasted', value: formatMoney(sumOf(id, used.length > 0 ? used : wasted, context), context.currency) } : null,
    ...(wastedWords && used.length > 0 ? { footnote: wastedWords } : {}),
  };
}

export const used = pureBlock({
  type: 'used', version: 1, schema: usedData, stepsUp: {},
  read: (data: UsedData, kept, context) => ({ ...data, lines: data.lines.map((line) => readLine(line, kept?.lines.find((old) => old.id === line.id), context)) }),
  derive: deriveUsed,
  slip: usedSlip,
});
