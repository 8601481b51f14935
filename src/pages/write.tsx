import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { redirect, useSearchParams, type ActionFunctionArgs, type LoaderFunctionArgs } from 'react-router-dom';
import type { MyBuilds } from '#contracts/builds.ts';
import type { startEntry } from '#contracts/entries.ts';
import { ButtonLink } from '#src/components/button.tsx';
import { Empty } from '#src/components/empty.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { DraftsLeft } from '#src/features/writing/drafts-left.tsx';
import { PickBuild } from '#src/features/writing/pick-build.tsx';
import { StartDay } from '#src/features/writing/start-day.tsx';
import { formAction, textOf } from '#src/lib/form-action.ts';
import { Head } from '#src/lib/head.tsx';
import { call } from '#src/lib/transport.ts';
import { myBuildsQuery, stagesQuery } from '#src/queries/builds.ts';

type MyBuild = MyBuilds['builds'][number];

function open(builds: readonly MyBuild[]): MyBuild[] {
  return builds.filter(({ archived }) => !archived);
}

/** The build asked for, or the only one there is. */
function picked(builds: readonly MyBuild[], asked: string | null): MyBuild | undefined {
  const choices = open(builds);
  return choices.find(({ slug }) => slug === asked) ?? (choices.length === 1 ? choices[0] : undefined);
}

export function makeLoader(client: QueryClient) {
  return async ({ request }: LoaderFunctionArgs) => {
    const { builds } = await client.fetchQuery(myBuildsQuery());
    const build = picked(builds, new URL(request.url).searchParams.get('build'));
    if (build) await client.fetchQuery(stagesQuery(build.slug));
    return null;
  };
}

export function makeAction(client: QueryClient) {
  return async ({ request }: ActionFunctionArgs) => formAction(request, async (form) => {
    const [build, day, otherDay, stage] = ['build', 'day', 'otherDay', 'stage'].map((name) => textOf(form, name));
    const { number } = await call<typeof startEntry>(client, 'POST', '/api/builds/:build/entries', {
      params: { build: build ?? '' },
      body: { day: (day === 'other' ? otherDay : day) ?? '', stage: stage ? Number(stage) : null },
    });
    await client.invalidateQueries({ queryKey: myBuildsQuery().queryKey });
    return redirect(`/builds/${build}/edit/${number}`);
  });
}

/** Write up a day: which build, which day, which stage; then the desk. */
export function Component() {
  const { data: { builds } } = useSuspenseQuery(myBuildsQuery());
  const [search] = useSearchParams();
  const choices = open(builds);
  const build = picked(builds, search.get('build'));
  return (
    <PageFrame head={<PageHead title="Write up a day" lettering="place" />}>
      <Head title="Write up a day" />
      <div className="grid gap-10">
        {choices.length === 0 && (
          <Empty title="There is no build to write up yet" action={<ButtonLink to="/builds/new">Start a build</ButtonLink>}>
            A day of work belongs to a build. Start one, then write up its first day.
          </Empty>
        )}
        {build && <StartDay build={build} others={choices.length > 1} />}
        {!build && choices.length > 0 && <PickBuild builds={choices} />}
        <DraftsLeft builds={build ? [build] : choices} />
      </div>
    </PageFrame>
  );
}
