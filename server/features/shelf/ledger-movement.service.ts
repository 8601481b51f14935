import type { Movement as LedgerMovement } from '#domain/ledger/movement.ts';
import { exactFrom } from '#domain/quantity.ts';
import type { Movement } from '#server/entities/index.ts';

/** What the ledger reads of a stored movement. */
export type StoredMovement = Pick<Movement, 'key' | 'kind' | 'day' | 'sequence' | 'place' | 'amount' | 'cost' | 'of' | 'shortage'>;

/** A stored movement as the ledger replays it. */
export function ledgerMovement(row: StoredMovement, material: number): LedgerMovement {
  return {
    key: row.key, kind: row.kind, material: String(material), day: row.day, sequence: row.sequence, place: row.place, amount: exactFrom(row.amount),
    ...(row.cost == null ? {} : { cost: row.cost }), ...(row.of == null ? {} : { of: row.of }), ...(row.shortage == null ? {} : { shortage: row.shortage }),
  };
}
