import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { BuildCard } from '#contracts/builds.ts';
import { buildKinds, buildKindWords, type BuildKind } from '#contracts/words.ts';
import { formatDayShort, formatMoney, plural } from '#domain/format.ts';
import { pictureData } from '#src/blocks/views.ts';
import { BuildRow } from '#src/components/build-row.tsx';
import { ButtonLink } from '#src/components/button.tsx';
import { Chip } from '#src/components/chip.tsx';
import { Empty } from '#src/components/empty.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { Pager } from '#src/features/reading/pager.tsx';
import { standsText } from '#src/features/reading/stands-words.ts';
import { pageNumber, withSearch } from '#src/lib/address.ts';
import { Head } from '#src/lib/head.tsx';
import { buildsQuery } from '#src/queries/reading.ts';

function kindOf(search: URLSearchParams): BuildKind | undefined {
  return buildKinds.find((kind) => kind === search.get('kind'));
}

export function makeLoader(client: QueryClient) {
  return async ({ request }: LoaderFunctionArgs) => {
    const { searchParams } = new URL(request.url);
    await client.ensureQueryData(buildsQuery(kindOf(searchParams), pageNumber(searchParams)));
    return null;
  };
}

export function Component() {
  const [search] = useSearchParams();
  const kind = kindOf(search);
  const { data } = useSuspenseQuery(buildsQuery(kind, pageNumber(search)));
  const title = kind ? buildKindWords[kind].many : 'Builds';
  return (
    <PageFrame head={
      <PageHead title={title} lettering="place" lede={kind ? undefined : 'Everything being restored here, latest started first.'} actions={
        <>
          <ButtonLink kind={kind ? 'quiet' : 'scribe'} to="/builds" {...(kind ? {} : { 'aria-current': 'page' as const })}>All</ButtonLink>
          {data.kinds.map((row) => (
            <ButtonLink key={row.kind} kind={row.kind === kind ? 'scribe' : 'quiet'} to={`/builds?kind=${row.kind}`} {...(row.kind === kind ? { 'aria-current': 'page' as const } : {})}>
              {`${buildKindWords[row.kind].many} ${row.count}`}
            </ButtonLink>
          ))}
        </>
      } />
    }>
      <Head title={title} path={`/builds${withSearch('', { kind: kind ?? null })}`} description="Boats, caravans, motorcycles, machines and furniture being restored, with what each day took." />
      {data.builds.map((build) => <Row key={build.slug} build={build} />)}
      {data.builds.length === 0 && (
        <Empty title={kind ? `No ${buildKindWords[kind].many.toLowerCase()} yet` : 'No build has been started yet'} action={<ButtonLink to="/builds/new">Start a build</ButtonLink>}>
          Start one: say what it is, and write up the first day.
        </Empty>
      )}
      <Pager label="Builds" page={data.page} pages={data.pages} hrefOf={(page) => `/builds${withSearch(search.toString(), { page: page === 1 ? null : String(page) })}`} />
    </PageFrame>
  );
}

function Row({ build }: { build: BuildCard }) {
  const facts = [<Chip key="kind">{buildKindWords[build.kind].one}</Chip>, build.madeIn, standsText(build.stands, build.standsNote), build.owner.name].filter((fact) => fact !== '');
  return (
    <BuildRow
      to={`/builds/${build.slug}`}
      title={build.title}
      lead={build.lead}
      picture={build.picture ? pictureData(build.picture) : null}
      facts={facts}
      figures={[
        ...(build.used ? [`${formatMoney(build.used.minor, build.used.currency)} used${build.used.unsettled ? ', some not bought yet' : ''}`] : []),
        `${plural(build.days, 'day', 'days')} written up`,
        ...(build.lastDay ? [`last on ${formatDayShort(build.lastDay)}`] : []),
      ]}
    />
  );
}
