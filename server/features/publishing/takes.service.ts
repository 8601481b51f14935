import { whatOneTakes } from '#domain/one-takes.ts';
import { exactFrom } from '#domain/quantity.ts';
import type { EntryDerivation } from '#src/blocks/pure.ts';
import { Movement, TimeLine } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';

/**
 * What one unit of an entry's work took: money (minor units) and minutes.
 * @param amount exact work done, `n/d`
 */
export async function entryTakes(em: Em, entryId: number, amount: string): Promise<{ money: number; minutes: number } | null> {
  const uses = await em.find(Movement, { entry: entryId, kind: { $in: ['used', 'wasted'] } });
  const times = await em.find(TimeLine, { entry: entryId });
  const takes = whatOneTakes({
    work: exactFrom(amount),
    uses: uses.map((use) => ({ material: String(use.material.id), kind: use.kind === 'wasted' ? 'wasted' : 'used', counts: use.counts ?? 'each', amount: exactFrom(use.amount), value: use.value })),
    times: times.map(({ minutes, kind }) => ({ minutes, kind })),
  });
  return takes && { money: takes.money, minutes: takes.minutes };
}

/** The same of a derivation whose lines were priced without being stored. */
export function takesOf(derived: EntryDerivation, amount: string, lines: ReadonlyMap<string, { readonly value: number }>): { money: number; minutes: number } | null {
  const takes = whatOneTakes({
    work: exactFrom(amount),
    uses: derived.uses.map((use) => ({ material: String(use.material), kind: use.kind, counts: use.counts, amount: exactFrom(use.amount), value: lines.get(`${use.block}:${use.line}`)?.value ?? 0 })),
    times: derived.times.map(({ minutes, kind }) => ({ minutes, kind })),
  });
  return takes && { money: takes.money, minutes: takes.minutes };
}
