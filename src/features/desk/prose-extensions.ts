import { Extension, type Extensions } from '@tiptap/core';
import { Blockquote } from '@tiptap/extension-blockquote';
import { ListItem } from '@tiptap/extension-list';
import { Table, TableCell, TableHeader, TableRow } from '@tiptap/extension-table';
import { StarterKit } from '@tiptap/starter-kit';
import { proseTypes } from '#src/blocks/prose.ts';

const safeAddress = /^(https?:\/\/|mailto:)\S+$/i;

export function isSafeAddress(address: string): boolean {
  return safeAddress.test(address);
}

/** Prose nodes carry the id they are stored under; inside a list or a table it means nothing. */
const ProseIds = Extension.create({
  name: 'proseIds',
  addGlobalAttributes() {
    return [{
      types: [...proseTypes],
      attributes: {
        id: {
          default: null,
          keepOnSplit: false,
          parseHTML: (element) => element.getAttribute('data-id'),
          renderHTML: ({ id }) => (typeof id === 'string' ? { 'data-id': id } : {}),
        },
      },
    }];
  },
});

/** Our own prose and nothing more: what is stored is what the schema of the blocks accepts. */
export const proseExtensions: Extensions = [
  StarterKit.configure({
    heading: { levels: [2, 3] },
    codeBlock: false, horizontalRule: false, underline: false,
    blockquote: false, listItem: false,
    link: {
      openOnClick: false, autolink: true, linkOnPaste: true, defaultProtocol: 'https', protocols: ['http', 'https', 'mailto'],
      isAllowedUri: (address) => isSafeAddress(address), HTMLAttributes: { target: null, rel: null },
    },
    dropcursor: { class: 'desk-drop', width: 3, color: false },
  }),
  ListItem.extend({ content: 'paragraph (paragraph | bulletList | orderedList)*' }),
  Blockquote.extend({ content: 'paragraph+' }),
  Table.configure({ resizable: false }),
  TableRow,
  TableCell.extend({ content: 'paragraph+' }),
  TableHeader.extend({ content: 'paragraph+' }),
  ProseIds,
];
