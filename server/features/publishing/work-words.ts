import { exactFigure } from '#domain/figures.ts';
import { exactFrom } from '#domain/quantity.ts';

const unitWords: Readonly<Record<string, string>> = { m: 'm', m2: 'm²', ft: 'ft', ft2: 'ft²', h: 'h' };

/** "steamed rib", "m² of laminate": one unit of it, after "one" or "an". */
export function oneOfWork({ unit, kind }: { unit: string; kind: string }): string {
  const words = unitWords[unit];
  return words ? `${words} of ${kind}` : kind;
}

/** "17 steamed ribs", "3.2 m² of laminate"; `amount` is exact `n/d`. */
export function workWords(work: { amount: string; unit: string; kind: string }, plurals: ReadonlyMap<string, string>): string {
  const amount = exactFrom(work.amount);
  const figure = exactFigure(amount);
  if (unitWords[work.unit]) return `${figure} ${oneOfWork(work)}`;
  return `${figure} ${amount.equals(1) ? work.kind : plurals.get(work.kind) ?? work.kind}`;
}
