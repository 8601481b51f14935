import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import type { EntryCard } from '#contracts/builds.ts';
import type { HomeView } from '#contracts/home.ts';
import { buildKindWords } from '#contracts/words.ts';
import { formatDayShort, formatHours, formatMinutes, formatMoney } from '#domain/format.ts';
import { pictureData } from '#src/blocks/views.ts';
import { DataTable } from '#src/components/data-table.tsx';
import { Empty } from '#src/components/empty.tsx';
import { EntryRow } from '#src/components/entry-row.tsx';
import { OpeningEntry } from '#src/components/opening-entry.tsx';
import { PageColumns } from '#src/components/page-columns.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { SectionHeading } from '#src/components/section-heading.tsx';
import { Slip } from '#src/components/slip.tsx';
import { ButtonLink } from '#src/components/button.tsx';
import { Head } from '#src/lib/head.tsx';
import { homeQuery } from '#src/queries/reading.ts';

export function makeLoader(client: QueryClient) {
  return async () => {
    await client.ensureQueryData(homeQuery());
    return null;
  };
}

function Welcome() {
  return (
    <p className="mb-4 text-control text-ink-soft">
      Restorers write up the work here, and every tin, nail and hour is counted. <Link to="/builds/new">Start a build</Link>
    </p>
  );
}

function FreshRow({ entry }: { entry: EntryCard }) {
  return (
    <EntryRow
      to={entry.href}
      title={entry.title}
      picture={entry.picture ? pictureData(entry.picture) : null}
      kicker={{ lead: { label: entry.build.title, to: `/builds/${entry.build.slug}` }, items: [formatDayShort(entry.dayTo ?? entry.day)] }}
      small={entry.unsettled ? <>{entry.lead} <span className="text-lead">Some of it is not bought yet.</span></> : entry.lead}
      money={entry.money === undefined ? null : formatMoney(entry.money, entry.currency)}
      hours={entry.minutes > 0 ? formatHours(entry.minutes) : null}
    />
  );
}

/** What is being restored now. */
export function Component() {
  const { data: home } = useSuspenseQuery(homeQuery());
  const opening = home.opening;
  return (
    <PageFrame head={
      <>
        <Head title="Tallywright" description="Write up the work. Know what it cost. Build logs of boats, caravans, machines and furniture, with every tin, nail and hour counted." path="/" feeds={{ title: 'Everything fresh', rss: '/feed.xml', json: '/feed.json' }} />
        <Welcome />
        {opening ? (
          <OpeningEntry
            to={opening.entry.href}
            kicker={{ lead: { label: opening.entry.build.title, to: `/builds/${opening.entry.build.slug}` }, items: [formatDayShort(opening.entry.dayTo ?? opening.entry.day)] }}
            title={opening.entry.title}
            lede={opening.entry.lead}
            picture={opening.entry.picture ? pictureData(opening.entry.picture) : null}
            slip={opening.slip ? <Slip {...opening.slip} /> : null}
          />
        ) : <h1 className="lettering-page">Write up the work. Know what it cost.</h1>}
      </>
    }>
      <PageColumns aside={<HomeAside home={home} />}>
        <SectionHeading id="fresh">Fresh from the bench</SectionHeading>
        {home.fresh.length > 0 ? home.fresh.map((entry) => <FreshRow key={entry.href} entry={entry} />) : (
          <Empty title="Nothing more has been written up yet" action={<ButtonLink to="/builds/new">Start a build</ButtonLink>}>
            Start a build, write up a day with what it took, and it stands here for others to read.
          </Empty>
        )}
      </PageColumns>
    </PageFrame>
  );
}

function HomeAside({ home }: { home: HomeView }) {
  return (
    <>
      {home.takes.length > 0 && (
        <section aria-labelledby="takes" className="mb-10">
          <SectionHeading id="takes">What one takes</SectionHeading>
          <DataTable
            caption="What one unit of work took, on the latest days that say so"
            captionHidden
            columns={[{ key: 'work', label: 'Kind of work' }, { key: 'money', label: 'Money', numeric: true }, { key: 'hands', label: 'Hands on', numeric: true }]}
            rows={home.takes.map((take) => ({
              key: take.href,
              cells: [
                <><Link to={take.href}>{take.one}</Link><span className="block text-note text-ink-soft">{take.unsettled ? `${take.build}, some not bought yet` : take.build}</span></>,
                take.money === null || take.money === 0 ? '' : formatMoney(take.money, take.currency),
                take.minutes === null ? '' : formatMinutes(take.minutes),
              ],
            }))}
          />
        </section>
      )}
      {home.kinds.length > 0 && (
        <section aria-labelledby="kinds">
          <SectionHeading id="kinds">Builds by kind</SectionHeading>
          <ul>
            {home.kinds.map(({ kind, count }) => (
              <li key={kind} className="num flex justify-between gap-4 border-b border-rule px-3 py-[11px] text-control">
                <Link to={`/builds?kind=${kind}`}>{buildKindWords[kind].many}</Link>
                <span>{count}</span>
              </li>
            ))}
          </ul>
        </section>
      )}
    </>
  );
}
