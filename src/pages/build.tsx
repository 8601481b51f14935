import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { redirect, useLocation, useParams, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { BuildPage, EntryCard } from '#contracts/builds.ts';
import { buildKindWords } from '#contracts/words.ts';
import { formatDayLong, formatDayShort, formatHours, formatMoney, plural } from '#domain/format.ts';
import { pictureData } from '#src/blocks/views.ts';
import { ButtonLink } from '#src/components/button.tsx';
import { Chip } from '#src/components/chip.tsx';
import { Empty } from '#src/components/empty.tsx';
import { EntryRow } from '#src/components/entry-row.tsx';
import { Figure } from '#src/components/figure.tsx';
import { JustDone } from '#src/components/just-done.tsx';
import { Kicker } from '#src/components/kicker.tsx';
import { PageColumns } from '#src/components/page-columns.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { SectionHeading } from '#src/components/section-heading.tsx';
import { BuildFigures } from '#src/features/reading/build-figures.tsx';
import { BuildPlan } from '#src/features/reading/build-plan.tsx';
import { BuildTape } from '#src/features/reading/build-tape.tsx';
import { Pager } from '#src/features/reading/pager.tsx';
import { standsText } from '#src/features/reading/stands-words.ts';
import { Head } from '#src/lib/head.tsx';
import { pageNumber, withSearch } from '#src/lib/address.ts';
import { buildQuery } from '#src/queries/reading.ts';

export function makeLoader(client: QueryClient) {
  return async ({ params, request }: LoaderFunctionArgs) => {
    const url = new URL(request.url);
    const reply = await client.ensureQueryData(buildQuery(params['build'] ?? '', pageNumber(url.searchParams)));
    if ('movedTo' in reply) throw redirect(reply.movedTo + url.search, 301);
    return null;
  };
}

export function Component() {
  const { build: slug = '' } = useParams();
  const [search] = useSearchParams();
  const { data } = useSuspenseQuery(buildQuery(slug, pageNumber(search)));
  return 'movedTo' in data ? null : <BuildView build={data} />;
}

function BuildView({ build }: { build: BuildPage }) {
  const { pathname, search } = useLocation();
  const hours = new URLSearchParams(search).get('tape') === 'hours';
  const address = `/builds/${build.slug}`;
  return (
    <PageFrame
      head={<><JustDone /><BuildHead build={build} /></>}
      hang={build.tape.days.length > 0 ? <BuildTape title={build.title} tape={build.tape} currency={build.currency} hours={hours} otherHref={pathname + withSearch(search, { tape: hours ? null : 'hours' })} size="tall" /> : null}
    >
      <Head title={build.title} description={build.lead} {...(build.visibility === 'public' ? { path: address } : {})} feeds={{ title: build.title, rss: `${address}/feed.xml`, json: `${address}/feed.json` }} />
      {build.figures && <section aria-label="The figures" className="mb-10"><BuildFigures figures={build.figures} currency={build.currency} days={build.days} minutes={build.minutes} /></section>}
      <PageColumns asideWidth="wide" aside={<><SectionHeading>Plan and tally</SectionHeading><BuildPlan build={build} /><BuildNumbers build={build} /></>}>
        <SectionHeading id="days">Day by day</SectionHeading>
        {build.entries.map((entry) => <DayRow key={entry.number} entry={entry} />)}
        {build.entries.length === 0 && <NoDays build={build} />}
        <Pager label="Days" page={build.page} pages={build.pages} hrefOf={(page) => `${pathname}${withSearch(search, { page: page === 1 ? null : String(page) })}#days`} />
      </PageColumns>
    </PageFrame>
  );
}

function BuildHead({ build }: { build: BuildPage }) {
  const first = build.tape.days[0];
  const facts = [
    <Chip key="kind">{buildKindWords[build.kind].one}</Chip>, build.madeIn, `Started ${formatDayLong(build.startedOn).replace(/^\d+ /, '')}`,
    standsText(build.stands, build.standsNote), `${plural(build.days, 'day', 'days')} written up`,
    build.visibility === 'public' ? '' : build.visibility === 'unlisted' ? 'Unlisted' : 'Private',
    build.archived ? 'Put away' : '',
  ].filter((fact) => fact !== '');
  return (
    <PageHead
      kicker={<Kicker items={facts} />}
      title={build.title}
      lede={build.lead}
      actions={
        <>
          {build.may.write && <ButtonLink to={`/write?build=${build.slug}`}>Write up a day</ButtonLink>}
          {first && <ButtonLink kind="quiet" to={first.href}>Read from the start</ButtonLink>}
          {build.may.settle && <ButtonLink kind="quiet" to={`/builds/${build.slug}/plan`}>Plan the stages</ButtonLink>}
          {build.may.settle && <ButtonLink kind="quiet" to={`/builds/${build.slug}/settings`}>Settings</ButtonLink>}
        </>
      }
      asideWidth="wide"
      {...(build.before && build.after ? { aside: <BeforeAfter before={build.before} after={build.after} /> } : {})}
    />
  );
}

function BeforeAfter({ before, after }: { before: NonNullable<BuildPage['before']>; after: NonNullable<BuildPage['after']> }) {
  return (
    <div className="grid grid-cols-2 gap-1.5">
      {[before, after].map((picture) => <Figure key={picture.key} picture={pictureData(picture)} sizes="(min-width: 864px) 207px, 50vw" crop="square" caption={picture.caption} />)}
    </div>
  );
}

function DayRow({ entry }: { entry: EntryCard }) {
  return (
    <EntryRow
      to={entry.href}
      title={entry.title}
      picture={entry.picture ? pictureData(entry.picture) : null}
      kicker={{ items: [formatDayShort(entry.dayTo ?? entry.day), ...(entry.stage ? [entry.stage] : [])] }}
      small={[entry.photos > 0 ? plural(entry.photos, 'photo', 'photos') : entry.lead, ...(entry.unsettled ? ['some not bought yet'] : [])].join(', ')}
      money={entry.money === undefined ? null : formatMoney(entry.money, entry.currency)}
      hours={entry.minutes > 0 ? formatHours(entry.minutes) : null}
    />
  );
}

function NoDays({ build }: { build: BuildPage }) {
  return (
    <Empty title="No day is written up yet" action={build.may.write ? <ButtonLink to={`/write?build=${build.slug}`}>Write up a day</ButtonLink> : null}>
      {build.may.write ? 'Write up the first day: what you did, what it took, and a picture or two. It need not be long.' : 'The restorer has started this build and not signed off a day yet.'}
    </Empty>
  );
}

function BuildNumbers({ build }: { build: BuildPage }) {
  if (build.identity.length === 0) return null;
  return (
    <section className="mt-10">
      <SectionHeading>What it is</SectionHeading>
      <dl className="num text-control">
        {build.identity.map((row) => (
          <div key={row.label} className="flex justify-between gap-4 border-b border-rule px-3 py-[11px]"><dt className="text-ink-soft">{row.label}</dt><dd>{row.value}</dd></div>
        ))}
      </dl>
    </section>
  );
}
