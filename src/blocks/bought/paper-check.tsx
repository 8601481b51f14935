import { formatMoney } from '#domain/format.ts';
import type { readBought } from './bought.ts';

const fields: Readonly<Record<string, string>> = { discount: 'the discount', delivery: 'the delivery', tax: 'the tax', paperTotal: 'the total on the paper' };

/** Why no total stands: a figure of the receipt cannot be read, and the sums without it would be another receipt's. */
export function whyNoTotal([first]: readonly string[]): string | null {
  if (first === undefined) return null;
  if (first === 'rate') return 'No total until the rate is there.';
  return `No total while ${fields[first] ?? 'what a line came to'} cannot be read.`;
}

/** The lines against the paper: they agree, something is not sorted yet, or they come to too much. */
export function PaperCheck({ reading, into }: { reading: ReturnType<typeof readBought>; into: string }) {
  const { paperDifference, ownTotal, notSorted } = reading.door;
  const why = whyNoTotal(reading.unread);
  if (why) return <p className="mt-2 text-small font-semibold text-lead">{why}</p>;
  if (paperDifference === null) return null;
  const lines = `The lines come to ${formatMoney(ownTotal, reading.currency)}`;
  if (paperDifference === 0) return <p className="mt-2 text-small text-verd">{lines}, as the paper says.</p>;
  if (paperDifference > 0) {
    return <p className="mt-2 text-small text-ink-soft">{lines}; {formatMoney(paperDifference, reading.currency)} of the paper’s total has no line yet and stands as not sorted yet{reading.currency === into ? '' : ` (${formatMoney(notSorted, into)})`}.</p>;
  }
  return <p className="mt-2 text-small font-semibold text-lead">{lines}, {formatMoney(-paperDifference, reading.currency)} more than the paper says. Look over the lines, or the discount.</p>;
}
