import { z } from 'zod';
import { exactFrom } from '#domain/quantity.ts';
import { formatMoney, formatMoneySoFar } from '#domain/format.ts';
import { wordsForQuantity } from '#domain/quantity-words.ts';
import type { SlipView } from '#contracts/slip.ts';
import { countsList } from '#contracts/words.ts';
import { amountFaults, amountLineShape, materialOf, readLine, typedAmount } from '../amount-line.ts';
import { ownDay, ownDayFaults, ownDayWords, standsOn } from '../own-day.ts';
import { pureBlock, type BlockContext, type LineFigures, type ProjectionContext } from '../block.ts';

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

function isShort(figures: LineFigures | undefined): boolean {
  return figures !== undefined && exactFrom(figures.short).gt(0);
}

/** "not bought yet, about £4.20 at the last price". */
export function notBoughtYet(estimate: number | null, currency: string): string {
  return estimate === null ? 'not bought yet' : `not bought yet, about ${formatMoney(estimate, currency)} at the last price`;
}

function lineView(id: string, line: UsedLine, context: ProjectionContext) {
  const figures = context.figures.get(`${id}:${line.id}`);
  const material = materialOf(line, context);
  const amount = material && line.exact ? wordsForQuantity(line.exact, material.dimension, { measures: context.measures, packs: material.packs, unit: material.unit }) : typedAmount(line);
  const short = isShort(figures);
  const notes = [
    amount,
    line.fate === 'wasted' ? 'wasted' : '',
    line.counts === 'whole' ? 'for the whole job' : line.counts === 'opened' ? 'opened, not counted' : '',
    line.from === 'shed' ? 'from the shed' : '',
    short ? notBoughtYet(figures?.estimate ?? null, context.currency) : '',
  ].filter(Boolean);
  return { label: material?.name ?? line.name, small: notes.join(', '), ...(figures?.value != null && !(short && figures.value === 0) ? { value: formatMoney(figures.value, context.currency) } : {}) };
}

function sumOf(id: string, lines: readonly UsedLine[], context: ProjectionContext): number {
  return lines.reduce((sum, line) => sum + (context.figures.get(`${id}:${line.id}`)?.value ?? 0), 0);
}

function usedSlip(id: string, data: UsedData, context: ProjectionContext): SlipView {
  const wasted = data.lines.filter((line) => line.fate === 'wasted');
  const used = data.lines.filter((line) => line.fate === 'used');
  const [first, word] = used.length > 0 ? [used, 'Used'] : [wasted, 'Wasted'];
  const short = (lines: readonly UsedLine[]) => lines.some((line) => isShort(context.figures.get(`${id}:${line.id}`)));
  const money = (lines: readonly UsedLine[]) => formatMoneySoFar(sumOf(id, lines, context), context.currency, short(lines));
  const beside = used.length > 0 && wasted.length > 0 && context.costsShown;
  const note = [context.workWords ? `for ${context.workWords}` : '', ownDayWords(data.day, context)].filter(Boolean).join(', ');
  return {
    kind: 'used', word,
    ...(note ? { note } : {}),
    lines: data.lines.map((line) => lineView(id, line, context)),
    sum: context.costsShown ? { label: word, value: money(first) } : null,
    ...(beside ? { footnote: `${formatMoney(sumOf(id, wasted, context), context.currency)} wasted beside it${short(wasted) ? ', some not bought yet' : ''}` } : {}),
  };
}

export const used = pureBlock({
  type: 'used', version: 1, schema: usedData, stepsUp: {},
  read: (data: UsedData, kept, context) => ({ ...data, lines: data.lines.map((line) => readLine(line, kept?.lines.find((old) => old.id === line.id), context)) }),
  derive: deriveUsed,
  slip: usedSlip,
});
