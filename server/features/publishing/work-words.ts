import { exactFrom } from '#domain/quantity.ts';

const unitWords: Readonly<Record<string, string>> = { m: 'm', m2: 'm²', ft: 'ft', ft2: 'ft²', h: 'h' };

/** "17 steamed ribs", "3.2 m² of laminate"; `amount` is exact `n/d`. */
export function workWords(work: { amount: string; unit: string; kind: string }, plurals: ReadonlyMap<string, string>): string {
  const amount = exactFrom(work.amount);
  const figure = String(Number(amount.valueOf().toFixed(3)));
  const unit = unitWords[work.unit];
  if (unit) return `${figure} ${unit} of ${work.kind}`;
  return `${figure} ${amount.equals(1) ? work.kind : plurals.get(work.kind) ?? work.kind}`;
}
