import { Form } from 'react-router-dom';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { TextField } from '#src/components/text-field.tsx';
import { useFormState } from '#src/lib/form-action.ts';

export function SignInForm() {
  const form = useFormState();
  return (
    <Form method="post" noValidate>
      <ErrorSummary errors={form.errors} attempt={form.attempt} />
      <div className="grid gap-5">
        <TextField name="email" label="E-mail address" type="email" autoComplete="username" defaultValue={form.value('email')} error={form.error('email')} />
        <TextField name="password" label="Password" type="password" autoComplete="current-password" error={form.error('password')} />
        <div><SubmitButton pending={form.pending} pendingWord="Signing in">Sign in</SubmitButton></div>
      </div>
    </Form>
  );
}
