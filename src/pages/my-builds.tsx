import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { buildKindWords } from '#contracts/words.ts';
import { formatDay, plural } from '#domain/format.ts';
import { pictureData } from '#src/blocks/views.ts';
import { BuildRow } from '#src/components/build-row.tsx';
import { ButtonLink } from '#src/components/button.tsx';
import { Chip } from '#src/components/chip.tsx';
import { Empty } from '#src/components/empty.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { Head } from '#src/lib/head.tsx';
import { myBuildsQuery } from '#src/queries/builds.ts';

export function makeLoader(client: QueryClient) {
  return async () => {
    await client.fetchQuery(myBuildsQuery());
    return null;
  };
}

/** The builds one may write in, and what was left unfinished on each. */
export function Component() {
  const { data: { builds } } = useSuspenseQuery(myBuildsQuery());
  return (
    <PageFrame head={<PageHead title="My builds" lettering="place" actions={<><ButtonLink kind="scribe" to="/builds/new">Start a build</ButtonLink>{builds.length > 0 && <ButtonLink kind="quiet" to="/write">Write up a day</ButtonLink>}</>} />}>
      <Head title="My builds" />
      {builds.map((build) => (
        <div key={build.slug}>
          <BuildRow
            to={`/builds/${build.slug}`}
            title={build.title}
            picture={build.picture ? pictureData(build.picture) : null}
            facts={[<Chip key="kind">{buildKindWords[build.kind].one}</Chip>, build.mine ? 'Yours' : 'You are in the crew', ...(build.visibility === 'public' ? [] : [build.visibility === 'unlisted' ? 'Unlisted' : 'Private']), ...(build.archived ? ['Put away'] : [])]}
            figures={[plural(build.days, 'day', 'days')]}
          />
          {build.drafts.length > 0 && (
            <ul className="mb-6 border-b border-rule py-3 text-control">
              {build.drafts.map((draft) => (
                <li key={draft.number} className="flex flex-wrap gap-x-3 py-1">
                  <Link to={`/builds/${build.slug}/edit/${draft.number}`}>{draft.title === '' ? 'A day without a title yet' : draft.title}</Link>
                  <span className="text-ink-soft">{formatDay(draft.day)}, not signed off</span>
                </li>
              ))}
            </ul>
          )}
        </div>
      ))}
      {builds.length === 0 && <Empty title="You have not started a build yet" action={<ButtonLink to="/builds/new">Start a build</ButtonLink>}>Any member becomes a restorer by starting one.</Empty>}
    </PageFrame>
  );
}
