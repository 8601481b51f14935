import type { EntryDerivation, EntryDocument } from '#src/blocks/pure.ts';
import { isProse } from '#src/blocks/pure.ts';
import { deskBlockOf } from './block-node.tsx';

export interface DeskFault {
  /** Names the field it stands beside. */
  readonly path: string;
  readonly problem: string;
  /** Where and what: "Used, line 2: Say which unit". */
  readonly words: string;
}

function linesOf(data: object): { id: string }[] {
  return Object.values(data).flatMap((value: unknown) => (Array.isArray(value) ? (value as { id: string }[]) : []));
}

/** "Used, line 2" for a path under a block; nothing above the text. */
function placeOf(path: string, document: EntryDocument): string | null {
  const [block, line] = path.split('.');
  const node = document.content.find((one) => one.attrs.id === block);
  if (!node || isProse(node)) return null;
  const word = deskBlockOf(node.type)?.word ?? node.type;
  const alike = document.content.filter((one) => one.type === node.type);
  const which = alike.length > 1 ? `${word} ${alike.indexOf(node) + 1}` : word;
  const at = linesOf(node.attrs.data).findIndex(({ id }) => id === line);
  return at === -1 ? which : `${which}, line ${at + 1}`;
}

/** Faults in the order of the page: what stands above the text first, then block by block. */
export function deskFaults(faults: EntryDerivation['faults'], document: EntryDocument): DeskFault[] {
  const order = (path: string) => document.content.findIndex((node) => node.attrs.id === path.split('.')[0]);
  return Object.entries(faults)
    .map(([path, problem]) => {
      const place = placeOf(path, document);
      return { path, problem, words: place ? `${place}: ${problem}` : problem };
    })
    .toSorted((a, b) => order(a.path) - order(b.path));
}
