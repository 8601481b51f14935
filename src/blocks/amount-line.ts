import { z } from 'zod';
import { exactText } from '#domain/quantity.ts';
import { readQuantity } from '#domain/quantity-reading.ts';
import type { BlockContext, MaterialFacts } from './block.ts';
import { nodeId } from './prose.ts';

/** The part of a line that says how much of which material. What was typed is kept beside what it came to. */
export const amountLineShape = {
  id: nodeId,
  material: z.number().int().positive().nullable(),
  /** The name as typed or picked. */
  name: z.string().max(120),
  amount: z.string().max(60),
  unit: z.string().max(40),
  /** Exact `n/d` in the material's base unit, read from `read`; never read again while those words stand. */
  exact: z.string().max(80).regex(/^\d+\/\d+$/).nullable(),
  read: z.string().max(140),
};
export interface AmountLine {
  id: string;
  material: number | null;
  name: string;
  amount: string;
  unit: string;
  exact: string | null;
  read: string;
}

/** The whole text of an amount: what stands in the amount field, with the unit where the amount names none. */
export function typedAmount(line: Pick<AmountLine, 'amount' | 'unit'>): string {
  const amount = line.amount.trim();
  // "2 x 2.5" names no unit: a lone x is a sign, not a word
  return /[a-wyz]/i.test(amount) ? amount : `${amount} ${line.unit}`.trim();
}

function readingKey(line: AmountLine): string {
  return `${line.material ?? ''}|${typedAmount(line)}`;
}

/** Reads one line's amount, or keeps what an earlier save read from the same words. */
export function readLine<L extends AmountLine>(line: L, kept: L | undefined, context: BlockContext): L {
  const read = readingKey(line);
  if (kept?.exact && kept.read === read) return { ...line, exact: kept.exact, read };
  const reading = readAmount(line, context);
  return { ...line, exact: reading.ok ? reading.value.exact : null, read };
}

export type AmountReading =
  | { ok: true; value: { exact: string; shownBack: string; note?: string } }
  | { ok: false; problem: string };

/** What a line's typed amount comes to, or why it cannot be read. */
export function readAmount(line: AmountLine, context: BlockContext): AmountReading {
  const material = materialOf(line, context);
  if (!material) return { ok: false, problem: 'Pick a material first.' };
  const reading = readQuantity(typedAmount(line), { measures: context.measures, dimension: material.dimension, packs: material.packs, ratio: material.ratio });
  if (!reading.ok) return reading;
  const { quantity, shownBack, note } = reading.value;
  return { ok: true, value: { exact: exactText(quantity.amount), shownBack, ...(note ? { note } : {}) } };
}

export function materialOf(line: Pick<AmountLine, 'material'>, context: BlockContext): MaterialFacts | undefined {
  return line.material === null ? undefined : context.materials.get(line.material);
}

/** What bars a line from being signed off, as `path: problem`; nothing when it is whole. */
export function amountFaults(line: AmountLine, context: BlockContext): { path: string; problem: string }[] {
  if (!materialOf(line, context)) {
    return [{ path: `${line.id}.material`, problem: line.name.trim() === '' ? 'Say which material.' : `Add “${line.name.trim()}” to your materials, or pick one from the list.` }];
  }
  if (line.exact !== null && line.read === readingKey(line)) return [];
  const reading = readAmount(line, context);
  return [{ path: `${line.id}.amount`, problem: reading.ok ? 'Save this amount again.' : reading.problem }];
}
