import { expect, test } from 'vitest';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { differencesOf, mergedText } from '#src/features/desk/two-texts.ts';
import { byId, documentOf, usedNode } from './desk-view.ts';

const paragraph = (id: string, text: string): EntryDocument['content'][number] => ({ type: 'paragraph', attrs: { id }, content: [{ type: 'text', text }] });
const context = { measures: 'us', currency: 'USD', materials: byId } as const;

const mine = documentOf({ title: 'Mine', stage: 5, content: [paragraph('para1', 'Same'), paragraph('para2', 'As I say'), usedNode('used1', [{ id: 'lineA', name: 'Resin', amount: '3', unit: 'US cup' }]), paragraph('para4', 'Only mine')] });
const theirs = documentOf({ title: 'Theirs', content: [paragraph('para1', 'Same'), paragraph('para3', 'Only theirs'), paragraph('para2', 'As they say'), usedNode('used1', [{ id: 'lineA', name: 'Resin', amount: '3', unit: 'US cup', exact: '709/1', read: 'x' }])] });

test('only what differs is shown, in words', () => {
  expect(differencesOf(mine, theirs, context, new Map([[5, 'Boards']]))).toEqual([
    { key: 'title', label: 'Title', mine: 'Mine', theirs: 'Theirs' },
    { key: 'stage', label: 'Stage', mine: 'Boards', theirs: null },
    { key: 'node:para3', label: 'Paragraph', mine: null, theirs: 'Only theirs' },
    { key: 'node:para2', label: 'Paragraph', mine: 'As I say', theirs: 'As they say' },
    { key: 'node:para4', label: 'Paragraph', mine: 'Only mine', theirs: null },
  ]);
});

test('each piece comes from the side picked, in its place', () => {
  const merged = mergedText(mine, theirs, new Map([['title', 'theirs'], ['node:para3', 'theirs'], ['node:para4', 'theirs']]));
  expect(merged.title).toBe('Theirs');
  expect(merged.stage).toBe(5);
  expect(merged.content.map((node) => node.attrs.id)).toEqual(['para1', 'para3', 'para2', 'used1']);
  expect(merged.content[2]).toEqual(paragraph('para2', 'As I say'));
});
