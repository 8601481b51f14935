import { exactFigure } from '#domain/figures.ts';
import { exactFrom } from '#domain/quantity.ts';
import { isMeasured, oneOfWork } from '#domain/work-words.ts';

/** "17 steamed ribs", "3.2 m² of laminate"; `amount` is exact `n/d`. */
export function workWords(work: { amount: string; unit: string; kind: string }, plurals: ReadonlyMap<string, string>): string {
  const amount = exactFrom(work.amount);
  const figure = exactFigure(amount);
  if (isMeasured(work.unit)) return `${figure} ${oneOfWork(work)}`;
  return `${figure} ${amount.equals(1) ? work.kind : plurals.get(work.kind) ?? work.kind}`;
}
