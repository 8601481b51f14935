import { Link, useRouteError } from 'react-router-dom';
import { ButtonLink } from '#src/components/button.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { shownError } from './route-errors.ts';

const titles: Record<number, string> = { 403: 'Not yours to do', 404: 'Nothing at this address', 503: 'Out of reach' };

/** What went wrong, what to do. Stands inside the site's layout wherever that could be drawn. */
export function ErrorPage() {
  const { status, message } = shownError(useRouteError());
  return (
    <PageFrame>
      <title>{`${titles[status] ?? 'That did not work'} · Tallywright`}</title>
      <h1>{titles[status] ?? 'That did not work'}</h1>
      <p className="lede">{message}</p>
      <p className="mt-6 flex flex-wrap items-center gap-4">
        <ButtonLink kind="scribe" to="/">Back to the start</ButtonLink>
        <Link to="/builds">All builds</Link>
      </p>
    </PageFrame>
  );
}
