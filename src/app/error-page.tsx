import { useRouteError } from 'react-router-dom';
import { ButtonLink } from '#src/components/button.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { shownError } from './route-errors.ts';
import { SignedOutFormKept } from './signed-out-form.tsx';

const titles: Record<number, string> = { 401: 'You are signed out', 403: 'Not yours to do', 404: 'Nothing at this address', 503: 'Out of reach' };

/** What went wrong, what to do. Stands inside the site's layout wherever that could be drawn. */
export function ErrorPage() {
  const { status, message, values } = shownError(useRouteError());
  return (
    <PageFrame head={
      <PageHead
        title={titles[status] ?? 'That did not work'}
        lede={status === 404 ? 'It may have moved, been taken back, or be for somebody else’s eyes.' : message}
        actions={<><ButtonLink kind="scribe" to="/">Back to the start</ButtonLink><ButtonLink kind="quiet" to="/builds">All builds</ButtonLink></>}
      />
    }>
      <title>{`${titles[status] ?? 'That did not work'} · Tallywright`}</title>
      {values && <SignedOutFormKept values={values} />}
    </PageFrame>
  );
}
