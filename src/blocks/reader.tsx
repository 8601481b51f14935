import type { ReactNode } from 'react';
import type { RowView } from '#contracts/entry-view.ts';
import type { PictureView } from '#contracts/pictures.ts';
import { Caution } from '#src/components/caution.tsx';
import { PhotoGroup } from '#src/components/photo-group.tsx';
import type { PictureData } from '#src/components/picture.tsx';
import { Prose } from '#src/components/prose.tsx';
import { Slip } from '#src/components/slip.tsx';
import type { TallyPart, TallyRun } from '#src/components/tally-margin.tsx';
import { ProseView } from './prose-view.tsx';

type BodyNode = RowView['body'][number];

export function pictureData({ key, width, height, alt, placeholder, src, sources }: PictureView): PictureData {
  return { id: key, width, height, alt, placeholder, src, sources };
}

function bodyView(node: BodyNode, first: boolean): ReactNode {
  if (node.type === 'photos') return <PhotoGroup key={node.id} first={first} photos={node.photos.map((photo) => ({ picture: pictureData(photo), caption: photo.caption }))} />;
  if (node.type === 'caution') return <Caution key={node.id} title={node.title} {...(node.source ? { source: { label: node.source } } : {})}>{node.words}</Caution>;
  return null;
}

/** Runs of prose share one `Prose`; pictures and cautions stand between them. */
function bodyViews(body: readonly BodyNode[], firstPhotos: string | null): ReactNode[] {
  const views: ReactNode[] = [];
  let run: ReactNode[] = [];
  const close = () => {
    if (run.length > 0) views.push(<Prose key={`prose-${views.length}`}>{run}</Prose>);
    run = [];
  };
  for (const node of body) {
    if (node.type === 'photos' || node.type === 'caution') {
      close();
      views.push(bodyView(node, node.id === firstPhotos));
    } else run.push(<ProseView key={node.attrs.id} node={node} />);
  }
  close();
  return views;
}

const filled = (views: ReactNode[]): ReactNode => (views.length > 0 ? views : null);

/** A projected entry as runs of the tally margin: words and pictures, with the slips beside them. */
export function readerRuns(rows: readonly RowView[], tally: ReactNode): TallyRun[] {
  const firstPhotos = rows.flatMap((row) => row.body).find((node) => node.type === 'photos');
  const firstId = firstPhotos?.type === 'photos' ? firstPhotos.id : null;
  const slipsOf = (row: RowView) => row.slips.map(({ id, slip }) => <Slip key={id} {...slip} />);
  const parts = rows.map((row, index) => ({
    key: row.body[0] ? keyOf(row.body[0]) : row.slips[0]?.id ?? String(index),
    before: filled(bodyViews(row.body.slice(0, row.at), firstId)),
    after: filled(bodyViews(row.body.slice(row.at), firstId)),
    slips: [...(index === 0 ? [tally] : []), ...slipsOf(row).slice(0, row.slips.length - row.under)],
  }));
  const runs: { key: string; parts: TallyPart[]; under?: ReactNode[] }[] = [];
  rows.forEach(({ run }, index) => {
    const part = parts[index];
    if (!part) return;
    const open = runs[run];
    if (open) open.parts.push(part);
    else runs.push({ key: part.key, parts: [part] });
  });
  const last = runs.at(-1);
  const lastRow = rows.at(-1);
  if (last && lastRow && lastRow.under > 0) last.under = slipsOf(lastRow).slice(-lastRow.under);
  return runs.length > 0 ? runs : [{ key: 'tally', parts: [{ key: 'tally', before: null, slips: [tally], after: null }] }];
}

function keyOf(node: BodyNode): string {
  return node.type === 'photos' || node.type === 'caution' ? node.id : node.attrs.id;
}
