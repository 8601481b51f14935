import { forOneOf } from '#domain/one-takes.ts';
import { exactFrom } from '#domain/quantity.ts';
import type { EntryDerivation } from '#src/blocks/pure.ts';
import { forEachOfEntries } from '#server/features/shelf/figures.service.ts';
import type { Em } from '#server/http/context.ts';

/** What one unit of work took: money in minor units, hands-on minutes; unsettled where some of the money is not bought yet. */
export interface Takes {
  readonly money: number;
  readonly minutes: number;
  readonly unsettled: boolean;
}

/**
 * What one unit of each entry's work took, over its priced rows; an entry of which nothing can be said is absent.
 * @param works.amount exact work done, `n/d`
 */
export async function takesOfEntries(em: Em, works: readonly { readonly entry: number; readonly amount: string }[]): Promise<Map<number, Takes>> {
  const sums = await forEachOfEntries(em, works.map(({ entry }) => entry));
  return new Map(works.flatMap(({ entry, amount }) => {
    const { money, minutes, unsettled } = sums.get(entry) ?? { money: 0, minutes: 0, unsettled: false };
    const one = forOneOf(exactFrom(amount), { money, minutes });
    return one ? [[entry, { ...one, unsettled }] as const] : [];
  }));
}

/** The same of a derivation whose lines were priced without being stored. */
export function takesOf(derived: EntryDerivation, amount: string, lines: ReadonlyMap<string, { readonly value: number; readonly short: string }>): Takes | null {
  const forEach = derived.uses.filter(({ kind, counts }) => kind === 'used' && counts === 'each').map(({ block, line }) => lines.get(`${block}:${line}`) ?? { value: 0, short: '0/1' });
  const one = forOneOf(exactFrom(amount), {
    money: forEach.reduce((sum, { value }) => sum + value, 0),
    minutes: derived.times.reduce((sum, { minutes, kind }) => (kind === 'each' ? sum + minutes : sum), 0),
  });
  return one && { ...one, unsettled: forEach.some(({ short }) => short !== '0/1') };
}
