import type Fraction from 'fraction.js';
import { shownFigure } from './figures.ts';
import { exactFrom } from './quantity.ts';
import type { Dimension } from './units.ts';

export interface Pack {
  /** box, tin, roll: in the singular */
  readonly name: string;
  /** n/d base units of the material's dimension */
  readonly amount: string;
}

/** The plural of a pack's name: boxes, tins, batteries. */
export function pluralOf(name: string): string {
  if (/(?:s|x|z|ch|sh)$/.test(name)) return `${name}es`;
  if (/[^aeiou]y$/.test(name)) return `${name.slice(0, -1)}ies`;
  return `${name}s`;
}

function one(name: string): string {
  return `${/^[aeiou]/i.test(name) ? 'an' : 'a'} ${name}`;
}

const shareWords: Readonly<Record<string, { alone: string; after: string }>> = {
  '1/2': { alone: 'half', after: 'a half' },
  '1/3': { alone: 'a third of', after: 'a third' },
  '2/3': { alone: 'two thirds of', after: 'two thirds' },
  '1/4': { alone: 'a quarter of', after: 'a quarter' },
  '3/4': { alone: 'three quarters of', after: 'three quarters' },
};

function shareOf(packs: Fraction): { whole: bigint; share: { alone: string; after: string } | undefined } {
  return { whole: packs.n / packs.d, share: shareWords[`${packs.n % packs.d}/${packs.d}`] };
}

/** So many of a pack, in words: `2 tins of 2.5 l`, `half a tin`, `2 and a half tins of 2.5 l`, `0.4 of a tin`. */
export function packWords(packs: Fraction, { name }: Pack, size: string): string {
  const { whole, share } = shareOf(packs);
  if (share && whole === 0n) return `${share.alone} ${one(name)}`;
  if (!share && packs.lt(1)) return `${shownFigure(packs)} of ${one(name)}`;
  const figure = share ? `${whole} and ${share.after}` : shownFigure(packs);
  // a length, a sheet, a pair: one piece needs no size
  const of = size === '1' ? '' : ` of ${size}`;
  return `${figure} ${packs.equals(1) ? name : pluralOf(name)}${of}`;
}

function comesOutNeat(packs: Fraction, dimension: Dimension): boolean {
  return packs.d === 1n || (dimension !== 'count' && shareOf(packs).share !== undefined);
}

/** Whole packs before packs and a share, and those before a share of one. */
function rank(packs: Fraction): number {
  if (packs.d === 1n) return 0;
  return packs.gt(1) ? 1 : 2;
}

/**
 * An amount in the words of one of its material's packs, whole ones before shares and the larger
 * pack before the smaller.
 * @returns null where no pack comes out neat
 */
export function wordsInPacks(
  amount: Fraction,
  dimension: Dimension,
  packs: readonly Pack[],
  sizeWords: (size: Fraction) => string,
): string | null {
  const neat = packs
    .map((pack) => ({ pack, size: exactFrom(pack.amount) }))
    .map(({ pack, size }) => ({ pack, size, count: amount.div(size) }))
    .filter(({ size, count }) => !(dimension === 'count' && size.equals(1)) && comesOutNeat(count, dimension))
    .toSorted((a, b) => rank(a.count) - rank(b.count) || b.size.compare(a.size));
  const best = neat[0];
  return best ? packWords(best.count, best.pack, sizeWords(best.size)) : null;
}
