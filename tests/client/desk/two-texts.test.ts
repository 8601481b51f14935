import { describe, expect, test } from 'vitest';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { differencesOf, mergedText, usualSide, usualWords } from '#src/features/desk/two-texts.ts';
import { byId, documentOf, usedNode } from './desk-view.ts';

const paragraph = (id: string, text: string): EntryDocument['content'][number] => ({ type: 'paragraph', attrs: { id }, content: [{ type: 'text', text }] });
const context = { measures: 'us', currency: 'USD', materials: byId } as const;

const mine = documentOf({ title: 'Mine', stage: 5, content: [paragraph('para1', 'Same'), paragraph('para2', 'As I say'), usedNode('used1', [{ id: 'lineA', name: 'Resin', amount: '3', unit: 'US cup' }]), paragraph('para4', 'Only mine')] });
const theirs = documentOf({ title: 'Theirs', content: [paragraph('para1', 'Same'), paragraph('para3', 'Only theirs'), paragraph('para2', 'As they say'), usedNode('used1', [{ id: 'lineA', name: 'Resin', amount: '3', unit: 'US cup', exact: '709/1', read: 'x' }])] });

test('only what differs is shown, in words', () => {
  expect(differencesOf({ mine, theirs, base: null }, context, new Map([[5, 'Boards']]))).toEqual([
    { key: 'title', label: 'Title', mine: 'Mine', theirs: 'Theirs', changedBy: null },
    { key: 'stage', label: 'Stage', mine: 'Boards', theirs: null, changedBy: null },
    { key: 'node:para3', label: 'Paragraph', mine: null, theirs: 'Only theirs', changedBy: null },
    { key: 'node:para2', label: 'Paragraph', mine: 'As I say', theirs: 'As they say', changedBy: null },
    { key: 'node:para4', label: 'Paragraph', mine: 'Only mine', theirs: null, changedBy: null },
  ]);
});

test('each piece comes from the side picked, in its place', () => {
  const merged = mergedText(mine, theirs, new Map([['title', 'theirs'], ['node:para3', 'theirs'], ['node:para4', 'theirs']]));
  expect(merged.title).toBe('Theirs');
  expect(merged.stage).toBe(5);
  expect(merged.content.map((node) => node.attrs.id)).toEqual(['para1', 'para3', 'para2', 'used1']);
  expect(merged.content[2]).toEqual(paragraph('para2', 'As I say'));
});

describe('what is picked before the writer picks', () => {
  const base = documentOf({ title: 'Before', lead: 'Kept by both', content: [paragraph('para1', 'First'), paragraph('para2', 'Second'), paragraph('para3', 'Third')] });
  const usual = (before: EntryDocument | null, own: Partial<EntryDocument>, other: Partial<EntryDocument>) => differencesOf({ mine: { ...base, ...own }, theirs: { ...base, ...other }, base: before }, context, new Map()).map((one) => [one.key, usualSide(one), usualWords(one)]);

  test('a piece only one of them changed comes from that one', () => {
    expect(usual(base, { title: 'Mine' }, { content: [paragraph('para1', 'First'), paragraph('para2', 'Their second'), paragraph('para4', 'New')] })).toEqual([
      ['title', 'mine', 'Only you changed this: yours unless you pick theirs.'],
      ['node:para2', 'theirs', 'Only they changed this: theirs unless you pick yours.'],
      ['node:para4', 'theirs', 'Only they changed this: theirs unless you pick yours.'],
      ['node:para3', 'theirs', 'Only they changed this: theirs unless you pick yours.'],
    ]);
  });

  test('what the writer alone took out stays out', () => {
    expect(usual(base, { content: [] }, {}).map(([, side]) => side)).toEqual(['mine', 'mine', 'mine']);
  });

  test('where both changed it, or nobody knows what it was, the writer\'s own is picked unless it holds nothing', () => {
    expect(usual(base, { title: 'Mine', lead: '' }, { title: 'Theirs', lead: 'Another' })).toEqual([
      ['title', 'mine', 'Both changed this: yours unless you pick theirs.'],
      ['lead', 'theirs', 'Both changed this, and yours has nothing here: theirs unless you pick yours.'],
    ]);
    expect(usual(null, { title: 'Mine', lead: '' }, {})).toEqual([
      ['title', 'mine', 'The two differ: yours unless you pick theirs.'],
      ['lead', 'theirs', 'The two differ, and yours has nothing here: theirs unless you pick yours.'],
    ]);
  });
});
