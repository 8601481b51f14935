import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Link, redirect, redirectDocument, useSearchParams, type ActionFunctionArgs, type LoaderFunctionArgs } from 'react-router-dom';
import { localPath, withNext } from '#contracts/local-path.ts';
import type { signUp, signUpWithGithub } from '#contracts/session.ts';
import { PageColumns } from '#src/components/page-columns.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { Panel } from '#src/components/panel.tsx';
import { SectionHeading } from '#src/components/section-heading.tsx';
import { GithubButton } from '#src/features/account/github-button.tsx';
import { GithubSignUpForm, SignUpForm } from '#src/features/account/sign-up-form.tsx';
import { formAction, passwordOf, textOf } from '#src/lib/form-action.ts';
import { Head } from '#src/lib/head.tsx';
import { call } from '#src/lib/transport.ts';
import { joiningQuery, viewerNow } from '#src/queries/account.ts';
import { sessionQuery } from '#src/queries/session.ts';

const nextOf = (request: Request) => localPath(new URL(request.url).searchParams.get('next'));

export function makeLoader(client: QueryClient) {
  return async ({ request }: LoaderFunctionArgs) => {
    if (await viewerNow(client)) return redirect(nextOf(request));
    await client.fetchQuery({ ...joiningQuery(), staleTime: 0 });
    return null;
  };
}

export function makeAction(client: QueryClient) {
  return ({ request }: ActionFunctionArgs) => formAction(request, async (form) => {
    const who = { name: textOf(form, 'name'), handle: textOf(form, 'handle') };
    if (textOf(form, 'form') === 'github') await call<typeof signUpWithGithub>(client, 'POST', '/api/accounts/github', { body: who });
    else await call<typeof signUp>(client, 'POST', '/api/accounts', { body: { ...who, email: textOf(form, 'email'), password: passwordOf(form, 'password') } });
    return redirectDocument(nextOf(request));
  });
}

export function Component() {
  const { data: { github } } = useSuspenseQuery(sessionQuery());
  const { data: { joining } } = useSuspenseQuery(joiningQuery());
  const [search] = useSearchParams();
  const next = localPath(search.get('next'));
  const finishing = search.get('with') === 'email' ? null : joining;
  const lede = finishing
    ? <>GitHub knows you; choose how you are called here. Or <Link to={withNext('/sign-up?with=email', next)}>sign up with an e-mail address</Link>.</>
    : <>Reading needs no account. Have one already? <Link to={withNext('/sign-in', next)}>Sign in</Link>.</>;
  return (
    <PageFrame head={<PageHead title={finishing ? 'Finish signing up' : 'Sign up'} lettering="place" lede={lede} />}>
      <Head title={finishing ? 'Finish signing up' : 'Sign up'} />
      <PageColumns asideWidth="wide" aside={<WhatForSection />}>
        <Panel>{finishing ? <GithubSignUpForm joining={finishing} /> : <SignUpForm />}</Panel>
        {github && !finishing && <p className="mt-5"><GithubButton next={next}>Sign up with GitHub</GithubButton></p>}
      </PageColumns>
    </PageFrame>
  );
}

const uses = [
  ['Keep a build', 'Write up each day with pictures, what it took and how long. The tally is kept for you.'],
  ['Know what it cost', 'Buy by the tin and the box, use by the cup and the piece: every line is priced from what you paid.'],
  ['Show as much as you like', 'A build is public, by its address only, or for you and your crew; costs can stay with the crew.'],
] as const;

/** What an account is for. */
function WhatForSection() {
  return (
    <section>
      <SectionHeading>What an account is for</SectionHeading>
      <ul>{uses.map(([title, words]) => <li key={title} className="border-b border-rule py-3"><b className="lettering-row block">{title}</b><span className="text-control text-ink-soft">{words}</span></li>)}</ul>
    </section>
  );
}
