import type { WorkDone } from '#src/blocks/pure.ts';

/** Units of work: in the menu, and before the kind: "one metre of seam". */
export const workUnitWords: Readonly<Record<WorkDone['unit'], { menu: string; one: string | null }>> = {
  piece: { menu: 'pieces', one: null }, m: { menu: 'm', one: 'metre' }, m2: { menu: 'm²', one: 'square metre' },
  ft: { menu: 'ft', one: 'foot' }, ft2: { menu: 'ft²', one: 'square foot' }, h: { menu: 'h', one: 'hour' },
};

/** "steamed rib", "metre of seam". */
export function oneOfWork(unit: string, kind: string): string {
  const words = unit in workUnitWords ? workUnitWords[unit as WorkDone['unit']].one : null;
  return words === null ? kind : `${words} of ${kind}`;
}
