import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { redirect, useParams, type LoaderFunctionArgs } from 'react-router-dom';
import { JustDone } from '#src/components/just-done.tsx';
import { EntryView } from '#src/features/reading/entry-view.tsx';
import { Head } from '#src/lib/head.tsx';
import { entryPageQuery } from '#src/queries/reading.ts';

export function makeLoader(client: QueryClient) {
  return async ({ params, request }: LoaderFunctionArgs) => {
    const reply = await client.ensureQueryData(entryPageQuery(params['build'] ?? '', params['entry'] ?? ''));
    if ('movedTo' in reply) throw redirect(reply.movedTo + new URL(request.url).search, 301);
    return null;
  };
}

export function Component() {
  const { build = '', entry = '' } = useParams();
  const { data } = useSuspenseQuery(entryPageQuery(build, entry));
  if ('movedTo' in data) return null;
  const address = `/builds/${data.build.slug}`;
  return (
    <>
      <Head title={`${data.title}, ${data.build.title}`} description={data.lead} {...(data.build.visibility === 'public' ? { path: `${address}/${data.slug}` } : {})} feeds={{ title: data.build.title, rss: `${address}/feed.xml`, json: `${address}/feed.json` }} />
      <EntryView page={data} notice={<JustDone />} />
    </>
  );
}
