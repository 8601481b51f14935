import { exactFrom } from './quantity.ts';
import { pluralOf } from './pack.ts';
import type { Pack } from './pack.ts';
import { unitById, units, unitsFor, wordsByMeasures } from './units.ts';
import type { Dimension, Measures, Unit } from './units.ts';

/** What a word after a number stands for. */
export type Meaning =
  | { readonly as: 'unit'; readonly unit: Unit; readonly note?: string }
  | { readonly as: 'pack'; readonly packs: readonly Pack[] }
  | { readonly as: 'counted'; readonly word: string }
  | { readonly as: 'refused'; readonly problem: string };

export interface WordFound {
  readonly meaning: Meaning;
  /** the word as typed, in plain form */
  readonly word: string;
  readonly rest: string;
}

// What things come in or are counted by. Without a pack of that name they count as one piece.
const countedNames = [
  'bag', 'bar', 'batten', 'board', 'bolt', 'bottle', 'box', 'bucket', 'bundle', 'can', 'card', 'cartridge', 'coil', 'drum',
  'jar', 'kit', 'length', 'pack', 'packet', 'pair', 'panel', 'plank', 'pot', 'reel', 'roll', 'sachet', 'set', 'sheet',
  'strip', 'stick', 'tin', 'tub', 'tube',
];

interface Word<T> {
  readonly word: string;
  readonly stands: T;
}

const unitWords: readonly Word<Unit>[] = units.flatMap((unit) => unit.words.map((word) => ({ word, stands: unit })));
const bareWords: readonly Word<string>[] = Object.entries(wordsByMeasures).flatMap(([stem, words]) =>
  words.map((word) => ({ word, stands: stem })),
);
const countedWords: readonly Word<string>[] = countedNames.flatMap((name) => [
  { word: name, stands: name },
  { word: pluralOf(name), stands: name },
]);

function begins(text: string, word: string): boolean {
  if (!text.startsWith(word)) return false;
  const after = text.charAt(word.length);
  return !/[a-z]$/.test(word) || !/[a-z]/.test(after);
}

function longest<T>(text: string, words: readonly Word<T>[]): Word<T> | undefined {
  let best: Word<T> | undefined;
  for (const candidate of words) {
    if (candidate.word.length > (best?.word.length ?? 0) && begins(text, candidate.word)) best = candidate;
  }
  return best;
}

const measureNames: Readonly<Record<Measures, string>> = { us: 'US', imperial: 'imperial' };

function bareMeaning(stem: string, typed: string, measures: Measures): Meaning {
  const prefix = measures === 'us' ? 'us' : 'imp';
  const unit = units.find(({ id }) => id === `${prefix}-${stem}`);
  if (unit) return { as: 'unit', unit, note: `Read as ${unit.many}: this build measures in ${measureNames[measures]} units` };
  const american = unitById(`us-${stem}`);
  return { as: 'refused', problem: `A ${typed.replace(/s$/, '')} is a US measure: write ${american.many}, or ml` };
}

function packMeaning(text: string, packs: readonly Pack[]): WordFound | null {
  const words = packs.flatMap((pack) => {
    const name = pack.name.toLowerCase();
    return [{ word: name, stands: name }, { word: pluralOf(name), stands: name }];
  });
  const found = longest(text, words);
  if (!found) return null;
  const same = packs.filter(({ name }) => name.toLowerCase() === found.stands);
  const sizes = new Set(same.map(({ amount }) => exactFrom(amount).toFraction()));
  const meant = sizes.size === 1 ? same.slice(0, 1) : same;
  return { meaning: { as: 'pack', packs: meant }, word: found.word, rest: text.slice(found.word.length) };
}

function ofLonger(...found: (WordFound | null)[]): WordFound | null {
  return found.reduce((best, one) => (one && one.word.length > (best?.word.length ?? 0) ? one : best), null);
}

function meaningOf<T>(text: string, words: readonly Word<T>[], meaning: (stands: T, word: string) => Meaning): WordFound | null {
  const found = longest(text, words);
  return found ? { meaning: meaning(found.stands, found.word), word: found.word, rest: text.slice(found.word.length) } : null;
}

/**
 * What the word at the start of a text (in plain form) stands for: the material's own packs first,
 * then the longest of the unit's words, words that follow the build's measures, and counted things.
 * @returns null for a word that means nothing here
 */
export function wordAtStart(text: string, measures: Measures, packs: readonly Pack[]): WordFound | null {
  return (
    packMeaning(text, packs) ??
    ofLonger(
      meaningOf(text, unitWords, (unit) => ({ as: 'unit', unit })),
      meaningOf(text, bareWords, (stem, word) => bareMeaning(stem, word, measures)),
      meaningOf(text, countedWords, (word) => ({ as: 'counted', word })),
    )
  );
}

const usualMetric = new Set(['ml', 'l', 'g', 'kg', 'mm', 'm', 'm2', 'm3']);

/** What fits a material's field, for the words of a refusal: `ml, l, US gal or a tin`. */
export function wordsThatFit(dimension: Dimension, measures: Measures, packs: readonly Pack[]): string {
  const offered = unitsFor(dimension, measures);
  const metric = offered.slice(3).filter(({ id }) => usualMetric.has(id));
  const names = [...offered.slice(0, 3), ...metric].map(({ many }) => many);
  const own = [...new Set(packs.map(({ name }) => pluralOf(name)))];
  const all = [...names, ...own];
  const last = all.pop();
  return all.length === 0 ? `${last}` : `${all.join(', ')} or ${last}`;
}
