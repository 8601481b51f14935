import type { WorkDone } from '#src/blocks/pure.ts';

/** Units of work: in the menu, and before the kind: "one m of seam". */
export const workUnitWords: Readonly<Record<WorkDone['unit'], { menu: string; one: string | null }>> = {
  piece: { menu: 'pieces', one: null }, m: { menu: 'm', one: 'm' }, m2: { menu: 'm²', one: 'm²' },
  ft: { menu: 'ft', one: 'ft' }, ft2: { menu: 'ft²', one: 'ft²' }, h: { menu: 'h', one: 'h' },
};

/** "steamed rib", "m of seam". */
export function oneOfWork(unit: string, kind: string): string {
  const words = unit in workUnitWords ? workUnitWords[unit as WorkDone['unit']].one : null;
  return words === null ? kind : `${words} of ${kind}`;
}
