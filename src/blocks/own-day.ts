import { plainDay } from '#contracts/fields.ts';
import { formatDay } from '#domain/format.ts';
import type { BlockContext, BlockFault } from './block.ts';

/** A block's own day within an entry of several; nothing means the last of them. */
export const ownDay = plainDay.nullable();

type Days = Pick<BlockContext, 'day' | 'dayTo'>;

/** The day a block stands on in the ledger. */
export function standsOn(day: string | null, { day: first, dayTo }: Days): string {
  return day ?? dayTo ?? first;
}

export function ownDayFaults(day: string | null, { day: first, dayTo }: Days): BlockFault[] {
  const last = dayTo ?? first;
  if (day === null || (day >= first && day <= last)) return [];
  const days = first === last ? `on ${formatDay(first)}` : `from ${formatDay(first)} to ${formatDay(last)}`;
  return [{ path: 'day', problem: `This entry is ${days}, and ${formatDay(day)} is outside it: pick another day here.` }];
}

/** The day in words for a block's slip, where it has one of its own among several. */
export function ownDayWords(day: string | null, { dayTo }: Days): string {
  return day === null || dayTo === null ? '' : formatDay(day);
}
