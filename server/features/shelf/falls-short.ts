import { AppError } from '#contracts/errors.ts';
import { formatDay } from '#domain/format.ts';
import type { Refusal } from '#domain/ledger/price.ts';
import { exactText } from '#domain/quantity.ts';
import { wordsForQuantity } from '#domain/quantity-words.ts';
import { Build, Material, type Movement, type Shelf } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';

async function measuresAround(em: Em, row: Movement, shelf: Shelf) {
  const id = row.build?.id ?? shelf.build?.id;
  const build = id === undefined ? null : await em.findOne(Build, { id });
  return build?.measures ?? 'imperial';
}

/** The outcome of a change that would leave a return or a sale with more than there is: which, when, and what is there. */
export async function fallsShort(em: Em, shelf: Shelf, row: Movement, refusal: Refusal): Promise<AppError> {
  const material = await em.findOneOrFail(Material, { id: row.material.id });
  const options = { measures: await measuresAround(em, row, shelf), packs: material.packs, unit: material.unit };
  const words = (amount: string) => wordsForQuantity(amount, material.dimension, options);
  const there = refusal.there.n === 0n ? 'none' : `only ${words(exactText(refusal.there))}`;
  const done = row.kind === 'sold' ? 'sold' : 'taken back to the shop';
  return new AppError(
    'falls-short',
    `${material.name}: ${words(row.amount)} was ${done} on ${formatDay(row.day)}, and with this change ${there} would be there that day. Mend that first, or leave enough on the ${shelf.person ? 'shed' : 'shelf'}.`,
  );
}
