import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { redirect, useSearchParams, type ActionFunctionArgs } from 'react-router-dom';
import { githubOutcomeOf, githubOutcomes } from '#contracts/github-outcomes.ts';
import type { AccountView, changeAccount, changePassword, endOtherSessions, partGithub } from '#contracts/session.ts';
import { PageColumns } from '#src/components/page-columns.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { Panel } from '#src/components/panel.tsx';
import { SectionHeading } from '#src/components/section-heading.tsx';
import { PasswordForm, ProfileForm } from '#src/features/account/account-forms.tsx';
import { Notice } from '#src/features/account/notice.tsx';
import { GithubPanel, SessionsPanel } from '#src/features/account/ways-in.tsx';
import { formAction, passwordOf, textOf } from '#src/lib/form-action.ts';
import { Head } from '#src/lib/head.tsx';
import { call } from '#src/lib/transport.ts';
import { accountChanged, accountQuery } from '#src/queries/account.ts';
import { sessionQuery } from '#src/queries/session.ts';

const doneWords = new Map([
  ['profile', 'Profile saved.'],
  ['password', 'Password changed. You are signed out everywhere else.'],
  ['github', 'GitHub parted. Sign in with your address and password from now on.'],
  ['sessions', 'Signed out everywhere else.'],
]);

export function makeLoader(client: QueryClient) {
  return async () => {
    await client.fetchQuery({ ...accountQuery(), staleTime: 0 });
    return null;
  };
}

/** One page, several forms: `form` says which was sent. */
async function send(client: QueryClient, form: FormData): Promise<void> {
  switch (textOf(form, 'form')) {
    case 'password':
      await call<typeof changePassword>(client, 'POST', '/api/account/password', { body: { current: passwordOf(form, 'current'), password: passwordOf(form, 'password') } });
      break;
    case 'github':
      await call<typeof partGithub>(client, 'DELETE', '/api/account/github');
      break;
    case 'sessions':
      await call<typeof endOtherSessions>(client, 'DELETE', '/api/account/sessions');
      break;
    default:
      await call<typeof changeAccount>(client, 'PATCH', '/api/account', { body: { name: textOf(form, 'name'), about: textOf(form, 'about') } });
  }
}

export function makeAction(client: QueryClient) {
  return ({ request }: ActionFunctionArgs) => formAction(request, async (form) => {
    await send(client, form);
    await accountChanged(client);
    return redirect(`/settings?done=${encodeURIComponent(textOf(form, 'form'))}`);
  });
}

/** What the page was come back to with, from one of its forms or from GitHub. */
function noticeOf(search: URLSearchParams, account: AccountView): { good: boolean; words: string } | null {
  const outcome = githubOutcomeOf(search.get('github'));
  if (outcome && (outcome !== 'joined' || account.github)) return githubOutcomes[outcome];
  const words = doneWords.get(search.get('done') ?? '');
  return words === undefined ? null : { good: true, words };
}

export function Component() {
  const { data: account } = useSuspenseQuery(accountQuery());
  const { data: { github } } = useSuspenseQuery(sessionQuery());
  const [search] = useSearchParams();
  const notice = noticeOf(search, account);
  return (
    <PageFrame head={<PageHead title="Settings" lettering="place" lede={<>{`You are @${account.handle} here, signed in as ${account.email}.`}</>} />}>
      <Head title="Settings" />
      {notice && <Notice key={search.toString()} good={notice.good}>{notice.words}</Notice>}
      <PageColumns asideWidth="wide" aside={<div className="grid gap-10"><WaysIn account={account} github={github} /></div>}>
        <div className="grid gap-10">
          <section><SectionHeading>Profile</SectionHeading><Panel><ProfileForm account={account} /></Panel></section>
          <section><SectionHeading>Password</SectionHeading><Panel><PasswordForm key={String(search.get('done'))} account={account} /></Panel></section>
        </div>
      </PageColumns>
    </PageFrame>
  );
}

/** How this account is got into, and from where. */
function WaysIn({ account, github }: { account: AccountView; github: boolean }) {
  return (
    <>
      <section><SectionHeading>Where you are signed in</SectionHeading><Panel><SessionsPanel sessions={account.sessions} /></Panel></section>
      {(github || account.github) && <section><SectionHeading>GitHub</SectionHeading><Panel><GithubPanel account={account} /></Panel></section>}
    </>
  );
}
