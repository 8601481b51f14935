import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Link, useParams, type LoaderFunctionArgs } from 'react-router-dom';
import { EntryView } from '#src/features/reading/entry-view.tsx';
import { Head } from '#src/lib/head.tsx';
import { previewQuery } from '#src/queries/reading.ts';

export function makeLoader(client: QueryClient) {
  return async ({ params }: LoaderFunctionArgs) => {
    await client.fetchQuery(previewQuery(params['build'] ?? '', Number(params['number'])));
    return null;
  };
}

/** What readers will see of a working copy. */
export function Component() {
  const { build = '', number = '' } = useParams();
  const { data } = useSuspenseQuery(previewQuery(build, Number(number)));
  return (
    <>
      <Head title={`What readers will see: ${data.title}`} />
      <EntryView page={data} notice={
        <p className="mb-5 border-l-[5px] border-zinc bg-zinc-wash px-4 py-2.5 text-control text-zinc-ink">
          This is what readers will see once the day is signed off. <Link to={`/builds/${build}/edit/${number}`} className="text-zinc-ink">Back to the desk</Link>
        </p>
      } />
    </>
  );
}
