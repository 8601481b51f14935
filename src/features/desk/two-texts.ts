import { formatDay } from '#domain/format.ts';
import type { EntryContext } from '#src/blocks/derive-entry.ts';
import { isProse, plainWords, type EntryDocument, type TopNode } from '#src/blocks/pure.ts';
import { deskBlockOf } from './block-node.tsx';
import { comparable } from './same-text.ts';

export type Side = 'mine' | 'theirs';

/** One thing in which two texts differ: a fact above the text, or a paragraph or block of it. */
export interface Difference {
  readonly key: string;
  readonly label: string;
  /** Nothing where that text does not have it. */
  readonly mine: string | null;
  readonly theirs: string | null;
  /** Who changed it, where the text both stand on is known. */
  readonly changedBy: 'me' | 'them' | 'both' | null;
}

type HeadField = 'title' | 'lead' | 'day' | 'dayTo' | 'stage' | 'work';
const heads: readonly { field: HeadField; label: string }[] = [
  { field: 'title', label: 'Title' }, { field: 'lead', label: 'Lead' }, { field: 'day', label: 'Day of work' },
  { field: 'dayTo', label: 'Last day' }, { field: 'stage', label: 'Stage' }, { field: 'work', label: 'Work done' },
];

function headWords(document: EntryDocument, field: HeadField, stages: ReadonlyMap<number, string>): string | null {
  switch (field) {
    case 'title': return document.title;
    case 'lead': return document.lead;
    case 'day': return formatDay(document.day);
    case 'dayTo': return document.dayTo && formatDay(document.dayTo);
    case 'stage': return document.stage === null ? null : stages.get(document.stage) ?? 'Another stage';
    case 'work': return document.work && `${document.work.amount} ${document.work.kind}`;
  }
}

function nodeLabel(node: TopNode): string {
  if (!isProse(node)) return deskBlockOf(node.type)?.word ?? node.type;
  if (node.type === 'heading') return 'Heading';
  if (node.type === 'table') return 'Table';
  return node.type === 'paragraph' ? 'Paragraph' : 'List or quotation';
}

function nodeWords(node: TopNode | undefined, context: EntryContext): string | null {
  if (!node) return null;
  return isProse(node) ? plainWords(node) : deskBlockOf(node.type)?.words(node.attrs.data, context) ?? '';
}

/** The side to go on with unless the writer picks another: that of whoever changed it alone; else theirs where mine holds nothing, so that none of it is lost by not looking. */
export function usualSide({ mine, changedBy }: Difference): Side {
  if (changedBy === 'me' || changedBy === 'them') return changedBy === 'me' ? 'mine' : 'theirs';
  return (mine ?? '').trim() === '' ? 'theirs' : 'mine';
}

/** Why that side is picked, in words. */
export function usualWords(difference: Difference): string {
  const { changedBy } = difference;
  if (changedBy === 'them') return 'Only they changed this: theirs unless you pick yours.';
  if (changedBy === 'me') return 'Only you changed this: yours unless you pick theirs.';
  const both = changedBy === 'both' ? 'Both changed this' : 'The two differ';
  return usualSide(difference) === 'mine' ? `${both}: yours unless you pick theirs.` : `${both}, and yours has nothing here: theirs unless you pick yours.`;
}

/** Who made a piece another than it was. */
function changer<T>(mine: T, theirs: T, base: T): 'me' | 'them' | 'both' {
  const was = comparable(base ?? null);
  if (comparable(mine ?? null) === was) return 'them';
  return comparable(theirs ?? null) === was ? 'me' : 'both';
}

function byId(document: EntryDocument): Map<string, TopNode> {
  return new Map(document.content.map((node) => [node.attrs.id, node]));
}

/** Theirs in their order, with what only mine has put after what it follows in mine. */
function idsInOrder(mine: EntryDocument, theirs: EntryDocument): string[] {
  const order = mine.content.map((node) => node.attrs.id);
  theirs.content.forEach((node, index) => {
    if (order.includes(node.attrs.id)) return;
    const before = theirs.content[index - 1]?.attrs.id;
    order.splice(before === undefined ? 0 : order.indexOf(before) + 1, 0, node.attrs.id);
  });
  return order;
}

export interface TwoTexts {
  readonly mine: EntryDocument;
  readonly theirs: EntryDocument;
  /** The text both stand on, where it is known. */
  readonly base: EntryDocument | null;
}

export function differencesOf({ mine, theirs, base }: TwoTexts, context: EntryContext, stages: ReadonlyMap<number, string>): Difference[] {
  const facts = heads.filter(({ field }) => comparable(mine[field]) !== comparable(theirs[field])).map(({ field, label }) => ({
    key: field, label, mine: headWords(mine, field, stages), theirs: headWords(theirs, field, stages), changedBy: base && changer(mine[field], theirs[field], base[field]),
  }));
  const [own, other, before] = [byId(mine), byId(theirs), base && byId(base)];
  const pieces = idsInOrder(mine, theirs).flatMap((id): Difference[] => {
    const [a, b] = [own.get(id), other.get(id)];
    const node = a ?? b;
    if (!node || (a && b && comparable(a) === comparable(b))) return [];
    return [{ key: `node:${id}`, label: nodeLabel(node), mine: nodeWords(a, context), theirs: nodeWords(b, context), changedBy: before && changer(a, b, before.get(id)) }];
  });
  return [...facts, ...pieces];
}

/** One text of two, each difference taken from the side chosen; mine where none was. */
export function mergedText(mine: EntryDocument, theirs: EntryDocument, chosen: ReadonlyMap<string, Side>): EntryDocument {
  const sideOf = (key: string) => (chosen.get(key) === 'theirs' ? theirs : mine);
  const [own, other] = [byId(mine), byId(theirs)];
  const content = idsInOrder(mine, theirs).flatMap((id) => {
    const node = (sideOf(`node:${id}`) === theirs ? other : own).get(id);
    return node ? [node] : [];
  });
  return {
    title: sideOf('title').title, lead: sideOf('lead').lead, day: sideOf('day').day, dayTo: sideOf('dayTo').dayTo,
    stage: sideOf('stage').stage, work: sideOf('work').work, content,
  };
}
