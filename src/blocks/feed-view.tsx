import type { EntryPage, RowView, TallyView } from '#contracts/entry-view.ts';
import type { PictureView } from '#contracts/pictures.ts';
import { SlipTable } from '#src/components/slip-table.tsx';
import { dayFacts, oneFacts, tallyFigure, tallySaid } from './tally-words.ts';
import { ProseView } from './prose-view.tsx';

type BodyNode = RowView['body'][number];

function FeedPicture({ photo, publicUrl }: { photo: PictureView; publicUrl: string }) {
  return (
    <figure>
      {/* a picture not called lazy gets a preload link put before the whole entry */}
      <img src={`${publicUrl}${photo.src}`} alt={photo.alt} width={photo.width} height={photo.height} loading="lazy" />
      {photo.caption !== '' && <figcaption>{photo.caption}</figcaption>}
    </figure>
  );
}

function FeedBody({ node, publicUrl }: { node: BodyNode; publicUrl: string }) {
  if (node.type === 'photos') return <>{node.photos.map((photo) => <FeedPicture key={photo.key} photo={photo} publicUrl={publicUrl} />)}</>;
  if (node.type === 'caution') {
    return <p><strong>{node.title}.</strong> {node.words}{node.source ? <> <small>Source: {node.source}</small></> : null}</p>;
  }
  return <ProseView node={node} />;
}

export interface FeedEntryProps {
  page: Pick<EntryPage, 'lead' | 'rows'>;
  /** The build it is a day of, and when that was, in words. */
  build: { title: string; url: string };
  days: string;
  tally: TallyView;
  publicUrl: string;
}

/** An entry whole, for feeds and mail: no styles, blocks as plain tables, pictures at absolute addresses. */
export function FeedEntry({ page, build, days, tally, publicUrl }: FeedEntryProps) {
  return (
    <>
      <p><a href={build.url}>{build.title}</a>, {days}</p>
      {page.lead !== '' && <p><em>{page.lead}</em></p>}
      {page.rows.map((row, index) => (
        <div key={index}>
          {row.body.slice(0, row.at).map((node, at) => <FeedBody key={at} node={node} publicUrl={publicUrl} />)}
          {row.slips.map(({ id, slip }) => <SlipTable key={id} {...slip} />)}
          {row.body.slice(row.at).map((node, at) => <FeedBody key={at} node={node} publicUrl={publicUrl} />)}
        </div>
      ))}
      <FeedTally tally={tally} />
    </>
  );
}

/** The day's tally, without what changes as the build goes on: an item stays what it was. */
function FeedTally({ tally }: { tally: TallyView }) {
  return (
    <table>
      <caption>The day’s tally</caption>
      <tbody>
        {[{ label: tallyFigure(tally), value: tallySaid(tally) }, ...dayFacts(tally), ...oneFacts(tally)].map((fact) => (
          <tr key={fact.label}><th scope="row">{fact.label}</th><td>{fact.value}</td></tr>
        ))}
      </tbody>
    </table>
  );
}
