import { Link, useLocation } from 'react-router-dom';
import type { EntryPage, TallyView } from '#contracts/entry-view.ts';
import { formatDayLong } from '#domain/format.ts';
import { buildFact, dayFacts, oneFacts, readerRuns, tallyFigure, tallySaid } from '#src/blocks/views.ts';
import { Byline } from '#src/components/byline.tsx';
import { Chip } from '#src/components/chip.tsx';
import { DayLinks } from '#src/components/day-links.tsx';
import { Kicker } from '#src/components/kicker.tsx';
import { PageColumns } from '#src/components/page-columns.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { RunningTally } from '#src/components/running-tally.tsx';
import { TallyMargin } from '#src/components/tally-margin.tsx';
import { withSearch } from '#src/lib/address.ts';
import { BuildTape } from './build-tape.tsx';

/** "14 November 2026", or "12 to 14 November 2026". */
export function workDays(day: string, dayTo: string | null): string {
  if (dayTo === null || dayTo === day) return formatDayLong(day);
  const [from, to] = [formatDayLong(day), formatDayLong(dayTo)];
  return from.slice(from.indexOf(' ')) === to.slice(to.indexOf(' ')) ? `${from.slice(0, from.indexOf(' '))} to ${to}` : `${from} to ${to}`;
}

/** The day's tally: the last word on what it took. */
export function DayTally({ tally }: { tally: TallyView }) {
  return (
    <RunningTally
      label="The day's tally"
      figure={tallyFigure(tally)}
      words={tallySaid(tally)}
      groups={[dayFacts(tally), [...oneFacts(tally), ...buildFact(tally)]]}
    />
  );
}

function EntryHead({ page }: { page: EntryPage }) {
  const items = [`Entry ${page.number}`, workDays(page.day, page.dayTo), ...(page.stage ? [<Chip key="stage">{page.stage}</Chip>] : [])];
  const others = page.withNames.length > 0 ? `with ${page.withNames.join(' and ')}` : undefined;
  return (
    <PageHead
      kicker={<Kicker lead={{ label: page.build.title, to: `/builds/${page.build.slug}` }} items={items} />}
      title={page.title === '' ? 'No title yet' : page.title}
      lede={page.lead}
      aside={<Byline name={page.author.name} {...(others ? { note: others } : {})} />}
    />
  );
}

/** One entry as readers get it: words, slips in the tally margin, the day's tally, the days before and after. */
export function EntryView({ page, notice }: { page: EntryPage; notice?: React.ReactNode }) {
  const { pathname, search } = useLocation();
  const hours = new URLSearchParams(search).get('tape') === 'hours';
  return (
    <PageFrame
      head={<>{notice}<EntryHead page={page} /></>}
      hang={page.tape.days.length > 0 ? <BuildTape title={page.build.title} tape={page.tape} currency={page.build.currency} hours={hours} otherHref={pathname + withSearch(search, { tape: hours ? null : 'hours' })} current={page.number} /> : null}
    >
      <article aria-label={page.title}>
        <TallyMargin runs={readerRuns(page.rows, <DayTally key="tally" tally={page.tally} />)} />
      </article>
      <div className="mt-6 border-t border-rule pt-6">
        <PageColumns aside={<DayLinks before={page.before && { to: page.before.href, title: page.before.title }} after={page.after && { to: page.after.href, title: page.after.title }} />}>
          <p className="flex flex-wrap gap-x-5 gap-y-2 text-control">
            <Link to={`/builds/${page.build.slug}`}>All days of {page.build.title}</Link>
            {page.first && <Link to={page.first.href}>Read from the start</Link>}
            {page.may.write && <Link to={`/builds/${page.build.slug}/edit/${page.number}`}>Edit this day</Link>}
          </p>
          <EditedNote page={page} />
        </PageColumns>
      </div>
    </PageFrame>
  );
}

function EditedNote({ page }: { page: EntryPage }) {
  if (!page.publishedAt) return null;
  const edited = page.editedAt && page.editedAt.slice(0, 10) !== page.publishedAt.slice(0, 10) ? `, edited ${formatDayLong(page.editedAt.slice(0, 10))}` : '';
  return <p className="mt-3 text-note text-ink-soft">Signed off {formatDayLong(page.publishedAt.slice(0, 10))}{edited}.</p>;
}
