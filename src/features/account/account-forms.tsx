import { Form } from 'react-router-dom';
import type { AccountView } from '#contracts/session.ts';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { TextArea } from '#src/components/text-area.tsx';
import { TextField } from '#src/components/text-field.tsx';
import { useFormState } from '#src/lib/form-action.ts';

export function ProfileForm({ account }: { account: AccountView }) {
  const form = useFormState('profile');
  return (
    <Form method="post" noValidate>
      <input type="hidden" name="form" value="profile" />
      <ErrorSummary errors={form.errors} attempt={form.attempt} />
      <div className="grid gap-5">
        <TextField name="name" label="Your name" hint="What readers see beside what you write." autoComplete="name" defaultValue={form.value('name', account.name)} error={form.error('name')} />
        <TextArea name="about" label="About you" optional hint="What you restore, where you work, what you are good at." defaultValue={form.value('about', account.about)} error={form.error('about')} />
        <div><SubmitButton pending={form.pending} pendingWord="Saving the profile">Save the profile</SubmitButton></div>
      </div>
    </Form>
  );
}

export function PasswordForm({ account }: { account: AccountView }) {
  const form = useFormState('password');
  const word = account.password ? 'Change the password' : 'Set a password';
  return (
    <Form method="post" noValidate>
      <input type="hidden" name="form" value="password" />
      {/* tells a password keeper whose password this is */}
      <input type="text" name="username" autoComplete="username" defaultValue={account.email} hidden readOnly />
      <ErrorSummary errors={form.errors} attempt={form.attempt} />
      <div className="grid gap-5">
        {account.password && <TextField name="current" label="Current password" type="password" autoComplete="current-password" error={form.error('current')} />}
        <TextField name="password" label="New password" hint="Ten letters or more. Four or five plain words do well. You are signed out everywhere else." type="password" autoComplete="new-password" error={form.error('password')} />
        <div><SubmitButton pending={form.pending} pendingWord={account.password ? 'Changing the password' : 'Setting a password'}>{word}</SubmitButton></div>
      </div>
    </Form>
  );
}
