import type { DerivedReceipt } from '../block.ts';

/** What a receipt brought the build itself, as its *spent* counts it: not what went to the shed, nor what is not ours. */
export function broughtToBuild({ notSorted, lines }: DerivedReceipt): number {
  return lines.reduce((sum, { goes, door }) => (goes === 'shelf' || goes === 'straight' ? sum + door : sum), notSorted);
}
