import Fraction from 'fraction.js';
import { exactFigure } from './figures.ts';
import { fineAsWritten, numberAtStart } from './numbers-written.ts';
import { packWords, pluralOf } from './pack.ts';
import type { Pack } from './pack.ts';
import { wordsForQuantity } from './quantity-words.ts';
import { exactFrom } from './quantity.ts';
import { read, unread } from './reading.ts';
import type { Reading } from './reading.ts';
import { wordAtStart, wordsThatFit } from './unit-words.ts';
import type { Meaning, WordFound } from './unit-words.ts';
import type { Dimension, Measures, Unit } from './units.ts';

/** What the words of a quantity may refer to. */
export interface TermContext {
  readonly measures: Measures;
  readonly dimension: Dimension;
  readonly packs: readonly Pack[];
}

/** An amount as typed, in the dimension it was typed in. */
export interface Terms {
  readonly dimension: Dimension;
  /** base units of `dimension`, exact */
  readonly amount: Fraction;
  /** the typed text, said properly: `3 US cups`, `2 tins of 2.5 l` */
  readonly words: string;
  /** said in metric or by the piece already, so that nothing need be shown beside it */
  readonly plain: boolean;
  readonly note?: string;
}

interface TermFound {
  readonly term: Terms;
  /** what was counted, multiplied out */
  readonly count: Fraction;
  /** base units in one of what was counted; the next term must be of a smaller one */
  readonly size: Fraction;
  readonly rest: string;
}

const example: Readonly<Record<Dimension, string>> = {
  volume: '350 ml, 2 l',
  mass: '350 g, 2 kg',
  length: '350 mm, 2 m',
  area: '2 m²',
  timber: '0.5 m³, 20 board feet',
  count: '17, 2 dozen',
  time: '45 min, 2 h',
};

/** What an amount of a dimension may look like, for the words of a refusal. */
export function exampleOf(dimension: Dimension): string {
  return example[dimension];
}

const plainUnits = new Set(['ml', 'l', 'g', 'kg', 'mm', 'm', 'm2', 'm3', 'piece', 'min', 'h']);

function unitTerm(count: Fraction, unit: Unit, note: string | undefined): Omit<TermFound, 'rest'> {
  const name = unit.id === 'piece' ? '' : ` ${count.gt(1) ? unit.many : unit.one}`;
  const words = `${exactFigure(count)}${name}`;
  const term = { dimension: unit.dimension, amount: count.mul(unit.factor), words, plain: plainUnits.has(unit.id) };
  return { term: note === undefined ? term : { ...term, note }, count, size: unit.factor };
}

function packTerm(count: Fraction, pack: Pack, { dimension, measures }: TermContext): Omit<TermFound, 'rest'> {
  const size = exactFrom(pack.amount);
  const words = packWords(count, pack, wordsForQuantity(pack.amount, dimension, { measures }));
  return { term: { dimension, amount: count.mul(size), words, plain: false }, count, size };
}

function countedTerm(count: Fraction, word: string): Omit<TermFound, 'rest'> {
  const words = `${exactFigure(count)} ${count.gt(1) ? pluralOf(word) : word}`;
  const note = `A ${word} counts as one: add it as a pack if it holds several`;
  return { term: { dimension: 'count', amount: count, words, plain: false, note }, count, size: new Fraction(1) };
}

function bareTerm(count: Fraction): Omit<TermFound, 'rest'> {
  return { term: { dimension: 'count', amount: count, words: exactFigure(count), plain: true }, count, size: new Fraction(1) };
}

function unknownPack(word: string, count: Fraction, { dimension }: TermContext): string {
  const [small] = example[dimension].split(', ');
  return `This material has no ${word}: write ${exactFigure(count)} x ${small}, or give the material a pack of that name`;
}

function twoSizes(packs: readonly Pack[], { dimension, measures }: TermContext): string {
  const sizes = packs.map(({ amount }) => wordsForQuantity(amount, dimension, { measures }));
  return `There is a ${packs[0]?.name} of ${sizes.join(' and of ')}: write the amount instead`;
}

function meant(count: Fraction, meaning: Meaning, context: TermContext): Reading<Omit<TermFound, 'rest'>> {
  switch (meaning.as) {
    case 'unit':
      return read(unitTerm(count, meaning.unit, meaning.note));
    case 'refused':
      return unread(meaning.problem);
    case 'counted':
      if (context.dimension === 'count') return read(countedTerm(count, meaning.word));
      return unread(unknownPack(meaning.word, count, context));
    case 'pack': {
      const [pack, other] = meaning.packs;
      if (pack && !other) return read(packTerm(count, pack, context));
      return unread(twoSizes(meaning.packs, context));
    }
  }
}

function times(count: Fraction, inner: TermFound, joined: string): Reading<TermFound> {
  const { term, rest } = inner;
  const counted = count.mul(inner.count);
  if (!fineAsWritten(counted)) return unread('That is finer than one line can hold: write a rounder figure');
  const amount = count.mul(term.amount);
  return read({ term: { ...term, amount, words: `${exactFigure(count)} ${joined} ${term.words}`, plain: false }, count: counted, size: amount, rest });
}

/** `2 tins of 2.5 l`: the word only counts, the amount of each follows. */
function ofEach(count: Fraction, { meaning, word, rest }: WordFound, context: TermContext): Reading<TermFound> | null {
  const each = /^ of (?=[\d.])/.exec(rest);
  if (!each || meaning.as === 'unit' || meaning.as === 'refused') return null;
  const inner = oneTerm(rest.slice(each[0].length), context);
  return inner.ok ? times(count, inner.value, `${word} of`) : inner;
}

function noUnit(typed: string, context: TermContext): string {
  const { dimension, measures, packs } = context;
  if (typed === '') return `Say which unit: ${example[dimension]}`;
  if (/^\d/.test(typed)) return 'Two figures stand side by side: put a unit or an x between them';
  const word = /^[^\d\s,]+/.exec(typed)?.[0] ?? typed;
  return `“${word}” is not a unit known here: write ${wordsThatFit(dimension, measures, packs)}`;
}

function oneTerm(text: string, context: TermContext): Reading<TermFound> {
  const number = numberAtStart(text);
  if (!number) return unread(`Start with a figure, like ${example[context.dimension]}`);
  const multiplied = /^ ?(?:x|\*|off|of) ?(?=[\d.])/.exec(number.rest);
  if (multiplied) {
    const inner = oneTerm(number.rest.slice(multiplied[0].length), context);
    return inner.ok ? times(number.value, inner.value, '×') : inner;
  }
  const typed = number.rest.replace(/^ ?(?:of )?(?:an? )?(?:the )?/, '');
  const word = wordAtStart(typed, context.measures, context.packs);
  if (word) {
    const each = ofEach(number.value, word, context);
    if (each) return each;
    const found = meant(number.value, word.meaning, context);
    return found.ok ? read({ ...found.value, rest: word.rest }) : found;
  }
  const ends = typed === '' || /^(?:x|,|and )/.test(typed);
  if (ends && context.dimension === 'count') return read({ ...bareTerm(number.value), rest: number.rest });
  return unread(noUnit(typed, context));
}

function joinedTerms(before: TermFound, next: TermFound): Reading<TermFound> {
  if (before.term.dimension !== next.term.dimension) {
    return unread(`${before.term.words} and ${next.term.words} cannot be added: write one of them`);
  }
  if (next.size.gte(before.size)) return unread(`Write the larger unit first, or one amount: ${before.term.words}`);
  const note = before.term.note ?? next.term.note;
  const inPacks = before.term.words.includes(' of ');
  const term: Terms = {
    dimension: before.term.dimension,
    amount: before.term.amount.add(next.term.amount),
    words: `${before.term.words}${inPacks ? ' and' : ''} ${next.term.words}`,
    plain: false,
    ...(note === undefined ? {} : { note }),
  };
  return read({ term, count: next.count, size: next.size, rest: next.rest });
}

/**
 * Reads the whole of a text in plain form: one amount (`350 ml`, `2 x 2.5 l`, `2 boxes of 500`,
 * `2.5 l x 2`) or several of falling units (`3 ft 6 in`, `1 lb 4 oz`).
 */
export function readTerms(text: string, context: TermContext): Reading<Terms> {
  let so = oneTerm(text, context);
  while (so.ok && so.value.rest.trim() !== '') {
    const again = /^ ?x ?(\d+)$/.exec(so.value.rest);
    if (again) {
      const all = times(new Fraction(BigInt(again[1] ?? 1)), { ...so.value, rest: '' }, '×');
      return all.ok ? read(all.value.term) : all;
    }
    const more = so.value.rest.replace(/^ ?(?:,|and |\+)? ?/, '');
    if (!numberAtStart(more)) return unread(`Write the amount alone, like ${so.value.term.words}`);
    const next = oneTerm(more, context);
    if (!next.ok) return next;
    so = joinedTerms(so.value, next.value);
  }
  return so.ok ? read(so.value.term) : so;
}
