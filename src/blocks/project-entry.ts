import type { RowView } from '#contracts/entry-view.ts';
import type { PictureView } from '#contracts/pictures.ts';
import type { HazardTag } from '#contracts/words.ts';
import type { ProjectionContext, PureBlock } from './block.ts';
import { cautionFor } from './caution/caution-list.ts';
import type { CautionData } from './caution/caution.ts';
import { withRuns } from './margin-runs.ts';
import { isProse, type EntryDocument, type TopNode } from './entry-document.ts';
import { pureBlocks } from './pure-list.ts';

export interface EntryProjection {
  rows: RowView[];
}

type BodyNode = RowView['body'][number];
type CutRow = Omit<RowView, 'run' | 'under'>;
type SlipNode = RowView['slips'][number];

function cautionView(id: string, data: CautionData): BodyNode {
  const listed = data.hazard ? cautionFor(data.hazard) : null;
  const words = [data.words.trim(), data.words.trim() === '' ? listed?.words ?? '' : ''].filter(Boolean).join(' ');
  // the list's source stands behind the list's words only
  return { type: 'caution', id, title: data.title.trim() || listed?.title || 'Beware', words, source: data.words.trim() === '' ? listed?.source ?? null : null };
}

function bodyOf(node: TopNode, pictures: ReadonlyMap<string, PictureView>): BodyNode | null {
  if (isProse(node)) return node;
  if (node.type === 'caution') return cautionView(node.attrs.id, node.attrs.data);
  if (node.type !== 'photos') return null;
  const photos = node.attrs.data.photos.flatMap((photo) => {
    const picture = pictures.get(photo.picture);
    return picture ? [{ ...picture, alt: photo.alt, caption: photo.caption }] : [];
  });
  return { type: 'photos', id: node.attrs.id, photos };
}

function slipOf(node: TopNode, context: ProjectionContext): SlipNode | null {
  if (isProse(node)) return null;
  const block = pureBlocks[node.type] as unknown as PureBlock;
  const slip = block.slip?.(node.attrs.id, node.attrs.data, context);
  return slip ? { type: node.type, id: node.attrs.id, slip } : null;
}

/** Hazards of the materials used that no caution in the text speaks of yet. */
function unspokenHazards(document: EntryDocument, context: ProjectionContext): HazardTag[] {
  const spoken = new Set(document.content.flatMap((node) => (node.type === 'caution' && node.attrs.data.hazard ? [node.attrs.data.hazard] : [])));
  const touched = document.content.flatMap((node) => (node.type === 'used' ? node.attrs.data.lines.flatMap((line) => context.materials.get(line.material ?? 0)?.hazards ?? []) : []));
  return [...new Set(touched)].filter((hazard) => !spoken.has(hazard));
}

/**
 * What readers get of a document, never the document itself: rows of text with the slips that belong beside them.
 * A slip belongs to the words before it (and to the heading over those), so a row starts there and runs on to the next words with slips.
 */
export function projectEntry(document: EntryDocument, context: ProjectionContext, pictures: ReadonlyMap<string, PictureView>): EntryProjection {
  const rows: CutRow[] = [];
  let row: CutRow = { body: [], at: 0, slips: [] };
  let slipBefore = false;
  for (const node of document.content) {
    const slip = slipOf(node, context);
    const body = bodyOf(node, pictures);
    if (slip) {
      if (!slipBefore) {
        row = splitAtAnchor(rows, row);
        row.at = row.body.length;
      }
      row.slips.push(slip);
    } else if (body) row.body.push(body);
    if (slip || body) slipBefore = slip !== null;
  }
  for (const hazard of unspokenHazards(document, context)) row.body.push(cautionView(`hazard-${hazard}`, { hazard, title: '', words: '' }));
  return { rows: withRuns([...rows, row].filter((one) => one.body.length > 0 || one.slips.length > 0)) };
}

/** Closes the row before the words a new slip belongs to, and opens one that starts with them. */
function splitAtAnchor(rows: CutRow[], row: CutRow): CutRow {
  const anchor = row.body.at(-2)?.type === 'heading' ? row.body.length - 2 : row.body.length - 1;
  if (anchor <= 0 && row.slips.length === 0) return row;
  const moved = row.body.splice(Math.max(anchor, 0));
  rows.push(row);
  return { body: moved, at: 0, slips: [] };
}
