import type { EntryDocument, TopNode } from '#src/blocks/pure.ts';
import type { Build } from '#server/entities/index.ts';
import { materialsSeen, sees } from '#server/features/shelf/build-materials.service.ts';
import type { Caller, Em } from '#server/http/context.ts';

/** A document as somebody sent it, without the materials they may not see: a line that names one by its number keeps its words and is to be picked again. */
export async function seenDocument(em: Em, caller: Caller, build: Build, document: EntryDocument): Promise<EntryDocument> {
  const seen = await materialsSeen(em, caller, build);
  if (seen === null) return document;
  const seenLine = <L extends { readonly material: number | null }>(line: L): L => (line.material === null || sees(seen, line.material) ? line : { ...line, material: null });
  const content = document.content.map((node): TopNode => {
    if (node.type === 'used') return { ...node, attrs: { ...node.attrs, data: { ...node.attrs.data, lines: node.attrs.data.lines.map(seenLine) } } };
    if (node.type === 'bought') return { ...node, attrs: { ...node.attrs, data: { ...node.attrs.data, lines: node.attrs.data.lines.map(seenLine) } } };
    return node;
  });
  return { ...document, content };
}
