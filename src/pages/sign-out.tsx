import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Form, redirectDocument, useNavigation } from 'react-router-dom';
import type { signOut } from '#contracts/session.ts';
import { ButtonLink } from '#src/components/button.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { Head } from '#src/lib/head.tsx';
import { call } from '#src/lib/transport.ts';
import { sessionQuery } from '#src/queries/session.ts';

export function makeAction(client: QueryClient) {
  return async () => {
    await call<typeof signOut>(client, 'DELETE', '/api/session');
    return redirectDocument('/');
  };
}

/** A link must not sign anybody out, so coming here shows the button. */
export function Component() {
  const { data: { viewer } } = useSuspenseQuery(sessionQuery());
  const pending = useNavigation().formMethod === 'POST';
  const lede = viewer ? `You are signed in as ${viewer.name}. Unsent words of an entry stay in this browser.` : 'You are not signed in.';
  return (
    <PageFrame head={<PageHead title="Sign out" lettering="place" lede={lede} />}>
      <Head title="Sign out" />
      {viewer
        ? <Form method="post"><SubmitButton pending={pending} pendingWord="Signing out">Sign out</SubmitButton></Form>
        : <ButtonLink to="/sign-in">Sign in</ButtonLink>}
    </PageFrame>
  );
}
