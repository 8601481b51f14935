import type { QueryClient } from '@tanstack/react-query';
import { lazy, Suspense, useSyncExternalStore } from 'react';
import { type LoaderFunction, useParams } from 'react-router-dom';
import { Head } from '#src/lib/head.tsx';
import { Loading } from '#src/components/loading.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { deskQuery } from '#src/queries/entries.ts';

// Editor, schemas and exact arithmetic come only here, and never on the server.
const Desk = lazy(async () => ({ default: (await import('#src/features/desk/desk.tsx')).Desk }));

export function makeLoader(client: QueryClient): LoaderFunction {
  return async ({ params }) => {
    await client.fetchQuery(deskQuery({ build: params['build'] ?? '', number: Number(params['number']) }));
    return null;
  };
}

function DeskComing() {
  return (
    <PageFrame>
      <Loading label="Fetching the desk" shape="page" />
    </PageFrame>
  );
}

/** What stands here before scripts run, and all there is where they never do: nothing that looks as if it were still coming. */
function BeforeScripts({ build }: { build: string }) {
  return (
    <PageFrame>
      <noscript>
        <h1 className="lettering-place">The desk needs scripts</h1>
        <p className="mt-4 max-w-reading">The desk works out costs while you type, so it needs scripts. Turn them on for this site and load the page again; what was written before is kept.</p>
        <p className="mt-4"><a href={`/builds/${build}`}>Back to the build</a></p>
      </noscript>
      <div className="min-h-80" />
    </PageFrame>
  );
}

const never = () => () => undefined;

export function Component() {
  const { build = '', number = '' } = useParams();
  const inBrowser = useSyncExternalStore(never, () => true, () => false);
  return (
    <>
      <Head title="Write up a day" />
      {inBrowser ? (
        <Suspense fallback={<DeskComing />}>
          <Desk key={`${build}/${number}`} build={build} number={Number(number)} />
        </Suspense>
      ) : <BeforeScripts build={build} />}
    </>
  );
}
