import { sumCheck } from '#domain/ledger/sum-check.ts';
import { priceShelf, type MaterialLedger } from '#domain/ledger/price.ts';
import { exactText } from '#domain/quantity.ts';
import { Build, Movement, Shelf } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { buildFigures, shedFigures } from './figures.service.ts';
import { ledgerMovement } from './ledger-movement.service.ts';

export interface LedgerReport {
  readonly shelves: number;
  readonly movements: number;
  /** One line for each figure that is not what it should be; none when the ledger holds. */
  readonly differences: readonly string[];
}

function movementDifferences(where: string, rows: readonly Movement[], ledgers: ReadonlyMap<string, MaterialLedger>): string[] {
  const replayed = new Map([...ledgers.values()].flatMap(({ movements }) => movements.map((movement) => [movement.key, movement] as const)));
  return rows.flatMap((row) => {
    const movement = replayed.get(row.key);
    if (!movement) return [`${where}, ${row.key}: not in the replay`];
    const short = exactText(movement.short);
    return [
      ...(row.value === movement.value ? [] : [`${where}, ${row.key}: value ${row.value} is stored, the replay gives ${movement.value}`]),
      ...(row.short === short ? [] : [`${where}, ${row.key}: short ${row.short} is stored, the replay gives ${short}`]),
    ];
  });
}

function refusalDifferences(where: string, ledgers: ReadonlyMap<string, MaterialLedger>): string[] {
  return [...ledgers.values()].flatMap(({ refusals }) => refusals.map(({ key, there }) => `${where}, ${key}: gives back or sells more than the ${exactText(there)} there is`));
}

async function shelfDifferences(em: Em, shelf: Shelf, rows: readonly Movement[]): Promise<string[]> {
  const where = shelf.build ? `shelf of build ${shelf.build.id}` : `shed of person ${shelf.person?.id ?? ''} in ${shelf.currency}`;
  const ledgers = priceShelf(rows.map((row) => ledgerMovement(row, row.material.id)), shelf.method);
  const figures = shelf.build ? await buildFigures(em, shelf.build) : await shedFigures(em, shelf);
  const { holds, difference } = sumCheck(figures);
  const left = [...ledgers.values()].reduce((sum, ledger) => sum + ledger.figures.left, 0);
  return [
    ...movementDifferences(where, rows, ledgers), ...refusalDifferences(where, ledgers),
    ...(holds ? [] : [`${where}: the sum does not hold, by ${difference}`]),
    ...(left === figures.left ? [] : [`${where}: ${figures.left} is left by its rows, ${left} by the replay`]),
  ];
}

/** Replays every shelf from nothing and reports every figure that differs, with the sum check of every build and shed. */
export async function verifyShelves(em: Em, only: { owner?: number } = {}): Promise<LedgerReport> {
  const differences: string[] = [];
  const mine = only.owner === undefined ? {} : { $or: [{ person: only.owner }, { build: { owner: only.owner } }] };
  const shelves = await em.find(Shelf, mine, { orderBy: { id: 'asc' } });
  const missing = await em.find(Build, { ...only, id: { $nin: shelves.flatMap(({ build }) => build?.id ?? []) } });
  differences.push(...missing.map(({ id }) => `build ${id} has no shelf`));
  let movements = 0;
  for (const shelf of shelves) {
    const rows = await em.find(Movement, { shelf: shelf.id }, { disableIdentityMap: true });
    movements += rows.length;
    differences.push(...await shelfDifferences(em, shelf, rows));
  }
  return { shelves: shelves.length, movements, differences };
}
