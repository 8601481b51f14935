import type { JSONContent } from '@tiptap/core';
import type { Node } from '@tiptap/pm/model';
import type { Transaction } from '@tiptap/pm/state';
import { deskBlockOf } from './block-node.tsx';
import { movedBlock } from './block-commands.ts';

export interface GoneBlock {
  readonly id: string;
  readonly index: number;
  readonly json: JSONContent;
  readonly word: string;
}

/** Blocks that a change took out of the text, by whatever way: a button, the keyboard, a selection typed over. An undo is no loss. */
export function blocksGone({ before, getMeta }: { before: Node; getMeta: (key: string) => unknown }, after: Node): GoneBlock[] {
  if (getMeta('history$') !== undefined || getMeta(movedBlock) === true) return [];
  const there = new Set<unknown>();
  after.forEach((node) => there.add(node.attrs['id']));
  const gone: GoneBlock[] = [];
  before.forEach((node, _offset, index) => {
    const block = deskBlockOf(node.type.name);
    const id: unknown = node.attrs['id'];
    if (block && typeof id === 'string' && !there.has(id)) gone.push({ id, index, json: node.toJSON() as JSONContent, word: block.word });
  });
  return gone;
}

export function goneIn(transaction: Transaction, after: Node): GoneBlock[] {
  return transaction.docChanged ? blocksGone({ before: transaction.before, getMeta: (key) => transaction.getMeta(key) as unknown }, after) : [];
}

export function goneWords(gone: readonly GoneBlock[]): string {
  const [first] = gone;
  return gone.length === 1 && first ? `${first.word} taken out` : `${gone.length} blocks taken out`;
}
