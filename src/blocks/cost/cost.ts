import { z } from 'zod';
import { formatMoney } from '#domain/format.ts';
import { readMoney } from '#domain/money.ts';
import type { SlipView } from '#contracts/slip.ts';
import { costCategories, costCategoryWords } from '#contracts/words.ts';
import { ownDay, ownDayFaults, ownDayWords, standsOn } from '../own-day.ts';
import { pureBlock, type BlockContext, type BlockDerivation, type ProjectionContext } from '../block.ts';
import { nodeId } from '../prose.ts';

export const costLine = z.object({ id: nodeId, label: z.string().max(160), category: z.enum(costCategories), money: z.string().max(40) });
export type CostLine = z.output<typeof costLine>;
/** Money that never goes on the shelf: hire, carriage, a service, a tool. In the build's currency. */
export const costData = z.object({ day: ownDay, lines: z.array(costLine).max(100) });
export type CostData = z.output<typeof costData>;

export function blankCostLine(id: string): CostLine {
  return { id, label: '', category: 'hire', money: '' };
}

function deriveCost(data: CostData, context: BlockContext): BlockDerivation {
  if (data.lines.length === 0) return { faults: [{ path: '', problem: 'Add a line, or take this block out.' }] };
  const read = data.lines.map((line) => ({ line, money: readMoney(line.money, context.currency) }));
  return {
    faults: [...ownDayFaults(data.day, context), ...read.flatMap(({ line, money }) => [
      ...(line.label.trim() === '' ? [{ path: `${line.id}.label`, problem: 'Say what it was for.' }] : []),
      ...(money.ok ? [] : [{ path: `${line.id}.money`, problem: money.problem }]),
    ])],
    costs: read.flatMap(({ line, money }) => money.ok ? [{ line: line.id, day: standsOn(data.day, context), category: line.category, label: line.label.trim(), money: money.value.minor }] : []),
  };
}

function costSlip(_id: string, data: CostData, context: ProjectionContext): SlipView {
  const costs = deriveCost(data, context).costs ?? [];
  const note = ownDayWords(data.day, context);
  return {
    kind: 'cost', word: 'Cost',
    ...(note ? { note } : {}),
    lines: data.lines.map((line) => {
      const cost = costs.find((derived) => derived.line === line.id);
      return { label: line.label, small: costCategoryWords[line.category].toLowerCase(), ...(context.costsShown && cost ? { value: formatMoney(cost.money, context.currency) } : {}) };
    }),
    sum: context.costsShown ? { label: 'Cost', value: formatMoney(costs.reduce((sum, cost) => sum + cost.money, 0), context.currency) } : null,
  };
}

export const cost = pureBlock({ type: 'cost', version: 1, schema: costData, stepsUp: {}, derive: deriveCost, slip: costSlip });
