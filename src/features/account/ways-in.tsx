import { Form } from 'react-router-dom';
import type { AccountView } from '#contracts/session.ts';
import { formatDay } from '#domain/format.ts';
import { DataTable } from '#src/components/data-table.tsx';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { useFormState } from '#src/lib/form-action.ts';
import { GithubButton } from './github-button.tsx';

export function GithubPanel({ account }: { account: AccountView }) {
  const form = useFormState('github');
  if (!account.github) {
    return (
      <>
        <p className="mb-4 text-control">Join your GitHub account and you can sign in with it as well.</p>
        <GithubButton next="/settings">Join GitHub</GithubButton>
      </>
    );
  }
  return (
    <Form method="post">
      <input type="hidden" name="form" value="github" />
      <ErrorSummary errors={form.errors} attempt={form.attempt} />
      <p className="mb-4 text-control">GitHub is joined: you can sign in with it.</p>
      <SubmitButton kind="quiet" pending={form.pending} pendingWord="Parting GitHub">Part GitHub</SubmitButton>
    </Form>
  );
}

export function SessionsPanel({ sessions }: { sessions: AccountView['sessions'] }) {
  const form = useFormState('sessions');
  return (
    <>
      <ErrorSummary errors={form.errors} attempt={form.attempt} />
      <DataTable
        caption="Where you are signed in" captionHidden
        columns={[{ key: 'since', label: 'Signed in on' }, { key: 'where', label: 'Where' }]}
        rows={sessions.map(({ since, current }, index) => ({ key: String(index), cells: [formatDay(since.slice(0, 10)), current ? 'This browser' : 'Another browser'] }))}
      />
      {sessions.length > 1 && (
        <Form method="post" className="mt-4">
          <input type="hidden" name="form" value="sessions" />
          <SubmitButton kind="quiet" pending={form.pending} pendingWord="Signing out everywhere else">Sign out everywhere else</SubmitButton>
        </Form>
      )}
    </>
  );
}
