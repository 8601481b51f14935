import type { Basis, CostCategory, Counts, HazardTag, LineGoes, TimeKind } from '#contracts/words.ts';
import type { BlockData, BlockType, EntryDocument, ProseNode, TopNode } from '#src/blocks/pure.ts';
import type { DemoEntry } from './demo-build.ts';

// The words an entry of the demo is written in: each makes one part of the document that the desk would have made.

/** What the words of an entry refer to, as it stands in the database. */
export interface Bench {
  day(daysAgo: number): string;
  stage(title: string): number;
  material(key: string): { id: number; name: string };
  picture(file: string): { key: string; alt: string };
}
/** Makes one part of an entry; its lines take ids after the part's own. */
export type EntryPart = (id: string, bench: Bench) => TopNode;

type Paragraph = Extract<ProseNode, { type: 'paragraph' }>;
type Inline = NonNullable<Paragraph['content']>[number];
export type Words = string | Inline;

const inline = (words: readonly Words[]): Inline[] => words.map((word) => (typeof word === 'string' ? { type: 'text', text: word } : word));
const paragraph = (words: readonly Words[]) => ({ type: 'paragraph' as const, content: inline(words) });

export function bold(text: string): Words {
  return { type: 'text', text, marks: [{ type: 'bold' }] };
}
export function italic(text: string): Words {
  return { type: 'text', text, marks: [{ type: 'italic' }] };
}
export function link(text: string, href: string): Words {
  return { type: 'text', text, marks: [{ type: 'link', attrs: { href } }] };
}

export function p(...words: Words[]): EntryPart {
  return (id) => ({ ...paragraph(words), attrs: { id } });
}
export function h(text: string): EntryPart {
  return (id) => ({ type: 'heading', attrs: { id, level: 2 }, content: inline([text]) });
}

const listItems = (items: readonly (string | Words[])[]) => items.map((item) => ({ type: 'listItem' as const, content: [paragraph(Array.isArray(item) ? item : [item])] }));
export function bullets(...items: (string | Words[])[]): EntryPart {
  return (id) => ({ type: 'bulletList', attrs: { id }, content: listItems(items) });
}
export function steps(...items: (string | Words[])[]): EntryPart {
  return (id) => ({ type: 'orderedList', attrs: { id }, content: listItems(items) });
}
export function quote(...words: Words[]): EntryPart {
  return (id) => ({ type: 'blockquote', attrs: { id }, content: [paragraph(words)] });
}
/** The first row is the heading. */
export function table(...rows: string[][]): EntryPart {
  return (id) => ({
    type: 'table', attrs: { id },
    content: rows.map((cells, at) => ({ type: 'tableRow', content: cells.map((words) => ({ type: at === 0 ? 'tableHeader' : 'tableCell', content: [paragraph([words])] })) })),
  });
}

function block<T extends BlockType>(id: string, type: T, data: BlockData<T>): TopNode {
  // A type always comes with its own data, which the index type cannot say.
  return { type, attrs: { id, version: 1, data } } as unknown as TopNode;
}
const numbered = <L, M>(id: string, lines: readonly L[], make: (line: L, id: string) => M): M[] => lines.map((line, at) => make(line, `${id}-${at + 1}`));

/** Pictures with their captions, the first of them the cover where that is said. */
export function photos(captions: Readonly<Record<string, string>>, cover: 'cover' | 'plain' = 'plain'): EntryPart {
  return (id, bench) => block(id, 'photos', {
    photos: numbered(id, Object.entries(captions), ([file, caption], line) => {
      const { key, alt } = bench.picture(file);
      return { id: line, picture: key, caption, alt, cover: cover === 'cover' && line === `${id}-1` };
    }),
  });
}

export function caution(hazard: HazardTag): EntryPart {
  return (id) => block(id, 'caution', { hazard, title: '', words: '' });
}
export function ownCaution(title: string, words: string): EntryPart {
  return (id) => block(id, 'caution', { hazard: null, title, words });
}
export function worked(tried: string, happened: string, nextTime = ''): EntryPart {
  return (id) => block(id, 'finding', { verdict: 'worked', tried, happened, instead: nextTime });
}
export function wentWrong(tried: string, happened: string, instead: string): EntryPart {
  return (id) => block(id, 'finding', { verdict: 'wrong', tried, happened, instead });
}

/** A figure and a unit stand in two fields; anything else is typed into the first. */
function amountFields(typed: string): { amount: string; unit: string } {
  const [, amount, unit] = /^([\d./ ½¼¾]*[\d½¼¾]) (?!x )(\D.*)$/.exec(typed) ?? [];
  if (amount !== undefined && unit !== undefined) return { amount, unit };
  return { amount: typed, unit: /^[\d./ ]+$/.test(typed) ? 'piece' : '' };
}
function materialLine(key: string, typed: string, bench: Bench) {
  const { id: material, name } = bench.material(key);
  return { material, name, ...amountFields(typed), exact: null, read: '' };
}

interface Use {
  readonly material: string;
  readonly amount: string;
  readonly counts: Counts;
  readonly fate: 'used' | 'wasted';
  readonly from: 'shelf' | 'shed';
}
export function use(material: string, amount: string, counts: Counts = 'each'): Use {
  return { material, amount, counts, fate: 'used', from: 'shelf' };
}
export function waste(material: string, amount: string, counts: Counts = 'each'): Use {
  return { ...use(material, amount, counts), fate: 'wasted' };
}
export function fromShed(line: Use): Use {
  return { ...line, from: 'shed' };
}
export function used(...lines: Use[]): EntryPart {
  return (id, bench) => block(id, 'used', {
    day: null, lines: numbered(id, lines, ({ material, amount, counts, fate, from }, line) => ({ id: line, ...materialLine(material, amount, bench), counts, fate, from })),
  });
}

interface Purchase {
  readonly material: string | null;
  readonly name: string;
  readonly amount: string;
  readonly money: string;
  readonly goes: LineGoes;
  readonly category: CostCategory;
  readonly onOrder: boolean;
}
const purchase = { material: null, name: '', amount: '', category: 'consumable', onOrder: false } as const;
export function toShelf(material: string, amount: string, money: string): Purchase {
  return { ...purchase, material, amount, money, goes: 'shelf' };
}
export function toShed(material: string, amount: string, money: string): Purchase {
  return { ...purchase, material, amount, money, goes: 'shed' };
}
export function onOrder(line: Purchase): Purchase {
  return { ...line, onOrder: true };
}
export function straight(name: string, money: string, category: CostCategory): Purchase {
  return { ...purchase, name, money, goes: 'straight', category };
}
export function notMine(name: string, money: string): Purchase {
  return { ...purchase, name, money, goes: 'not-mine' };
}

interface Paper {
  readonly supplier: string;
  readonly daysAgo?: number;
  readonly currency?: string;
  readonly rate?: string;
  readonly basis?: Basis;
  readonly discount?: string;
  readonly delivery?: string;
  readonly tax?: string;
  readonly paperTotal?: string;
}
export function bought({ supplier, daysAgo, currency = '', rate = '', basis = 'paper', discount = '', delivery = '', tax = '', paperTotal = '' }: Paper, ...lines: Purchase[]): EntryPart {
  return (id, bench) => block(id, 'bought', {
    supplier, day: daysAgo === undefined ? null : bench.day(daysAgo), currency: currency === '' ? null : currency, rate, basis, discount, delivery, tax, paperTotal,
    lines: numbered(id, lines, ({ material, name, amount, ...line }, lineId) => ({
      id: lineId, ...(material === null ? { material, name, amount, unit: '', exact: null, read: '' } : materialLine(material, amount, bench)), ...line, arrivedOn: null,
    })),
  });
}

/** Label, category, money. */
export function cost(...lines: [label: string, category: CostCategory, money: string][]): EntryPart {
  return (id) => block(id, 'cost', { day: null, lines: numbered(id, lines, ([label, category, money], line) => ({ id: line, label, category, money })) });
}

interface Spell {
  readonly handle: string | null;
  readonly name: string;
  readonly time: string;
  readonly what: string;
  readonly kind: TimeKind;
}
const members: Readonly<Record<string, string>> = { marlow: 'Marlow Finch', ines: 'Ines Tarn' };
/** Time of a member by handle, or of somebody by just a name. */
export function took(who: string, long: string, what: string, kind: TimeKind = 'each'): Spell {
  const name = members[who];
  return { handle: name === undefined ? null : who, name: name ?? who, time: long, what, kind };
}
export function waited(long: string, what: string): Spell {
  return { handle: null, name: '', time: long, what, kind: 'waiting' };
}
export function time(...lines: Spell[]): EntryPart {
  return (id) => block(id, 'time', { day: null, lines: numbered(id, lines, (spell, line) => ({ id: line, ...spell })) });
}

/** The document of an entry, as the desk would hand it in. */
export function documentOf({ key, daysAgo, daysAgoTo, stage, title, lead, work, content }: DemoEntry, bench: Bench): EntryDocument {
  return {
    title, lead, day: bench.day(daysAgo), dayTo: daysAgoTo === undefined ? null : bench.day(daysAgoTo), stage: bench.stage(stage), work: work ?? null,
    content: content.map((part, at) => part(`${key}-${at + 1}`, bench)),
  };
}
