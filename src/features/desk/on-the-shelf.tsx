import type { DeskView } from '#contracts/entries.ts';
import { Slip, type SlipLine } from '#src/components/slip.tsx';
import { exactFrom } from '#domain/quantity.ts';
import { wordsForQuantity } from '#domain/quantity-words.ts';
import { shortTitle } from '#src/blocks/short-title.ts';
import type { MaterialFacts } from '#src/blocks/pure.ts';
import type { DeskReckoning, ShelfAfter } from './desk-ledger.ts';

const most = 8;

/** The shelf as it would stand: what this entry touches first, then what is used most. */
export function shelfRows(view: DeskView, reckoning: DeskReckoning, materials: readonly MaterialFacts[]): ShelfAfter[] {
  const touched = reckoning.shelf;
  const known = (row: ShelfAfter) => touched.some((one) => one.material === row.material && one.shelf === row.shelf);
  const place = new Map(materials.map(({ id }, index) => [id, index]));
  const rest = view.shelf
    .map(({ material, shelf, left, short }) => ({ material, shelf, left, short }))
    .filter((row) => !known(row) && row.shelf === 'shelf' && (!row.left.startsWith('0/') || !row.short.startsWith('0/')))
    .toSorted((a, b) => (place.get(a.material) ?? 0) - (place.get(b.material) ?? 0));
  return [...touched, ...rest.slice(0, Math.max(0, most - touched.length))];
}

function lineOf(row: ShelfAfter, material: MaterialFacts, view: DeskView): SlipLine {
  const words = (exact: string, unit?: string) => wordsForQuantity(exact, material.dimension, { measures: view.build.measures, packs: material.packs, ...(unit ? { unit } : {}) });
  const short = exactFrom(row.short).gt(0);
  const where = row.shelf === 'shed' ? 'in the shed' : '';
  if (short) return { label: material.name, value: `short ${words(row.short, material.unit)}`, small: ['not bought yet', where].filter(Boolean).join(', ') };
  const [value, packed] = [words(row.left, material.unit), words(row.left)];
  // a bare figure says no more than the value does
  const small = [packed !== value && /\p{L}/u.test(packed) ? packed : '', where].filter(Boolean).join(', ');
  return { label: material.name, value, ...(small ? { small } : {}) };
}

export function OnTheShelf({ view, reckoning, materials }: { view: DeskView; reckoning: DeskReckoning; materials: readonly MaterialFacts[] }) {
  const lines = shelfRows(view, reckoning, materials).flatMap((row) => {
    const material = materials.find(({ id }) => id === row.material);
    return material ? [lineOf(row, material, view)] : [];
  });
  if (lines.length === 0) return null;
  return <Slip kind="bought" word="On the shelf" note={shortTitle(view.build.title)} lines={lines} />;
}
