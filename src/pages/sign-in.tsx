import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Link, redirect, redirectDocument, useSearchParams, type ActionFunctionArgs, type LoaderFunctionArgs } from 'react-router-dom';
import { githubOutcomeOf, githubOutcomes } from '#contracts/github-outcomes.ts';
import { localPath, withNext } from '#contracts/local-path.ts';
import type { signIn } from '#contracts/session.ts';
import { PageColumns } from '#src/components/page-columns.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { Panel } from '#src/components/panel.tsx';
import { DemoAddresses } from '#src/features/account/demo-addresses.tsx';
import { GithubButton } from '#src/features/account/github-button.tsx';
import { Notice } from '#src/features/account/notice.tsx';
import { SignInForm } from '#src/features/account/sign-in-form.tsx';
import { formAction, passwordOf, textOf } from '#src/lib/form-action.ts';
import { Head } from '#src/lib/head.tsx';
import { call } from '#src/lib/transport.ts';
import { viewerNow } from '#src/queries/account.ts';
import { sessionQuery } from '#src/queries/session.ts';

const nextOf = (request: Request) => localPath(new URL(request.url).searchParams.get('next'));

export function makeLoader(client: QueryClient) {
  return async ({ request }: LoaderFunctionArgs) => ((await viewerNow(client)) ? redirect(nextOf(request)) : null);
}

export function makeAction(client: QueryClient) {
  return ({ request }: ActionFunctionArgs) => formAction(request, async (form) => {
    await call<typeof signIn>(client, 'POST', '/api/session', { body: { email: textOf(form, 'email'), password: passwordOf(form, 'password') } });
    // a whole new page: nothing read as somebody else, or as nobody, stays in memory
    return redirectDocument(nextOf(request));
  });
}

export function Component() {
  const { data: { demo, github } } = useSuspenseQuery(sessionQuery());
  const [search] = useSearchParams();
  const next = localPath(search.get('next'));
  const outcome = githubOutcomeOf(search.get('github'));
  return (
    <PageFrame head={<PageHead title="Sign in" lettering="place" lede={<>No account yet? <Link to={withNext('/sign-up', next)}>Sign up</Link>.</>} />}>
      <Head title="Sign in" />
      {outcome && outcome !== 'joined' && <Notice good={false}>{githubOutcomes[outcome].words}</Notice>}
      <PageColumns aside={demo && <DemoAddresses />}>
        <div className="max-w-[30rem]">
          <Panel><SignInForm /></Panel>
          {github && <p className="mt-5"><GithubButton next={next}>Sign in with GitHub</GithubButton></p>}
        </div>
      </PageColumns>
    </PageFrame>
  );
}
