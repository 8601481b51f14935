import { Form } from 'react-router-dom';
import type { JoiningView } from '#contracts/session.ts';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { TextField } from '#src/components/text-field.tsx';
import { useFormState, type FormState } from '#src/lib/form-action.ts';

const handleHint = 'Part of your address here: letters, figures and hyphens. It stays as it is.';

function NameAndHandle({ form, name = '', handle = '' }: { form: FormState; name?: string; handle?: string }) {
  return (
    <>
      <TextField name="name" label="Your name" hint="What readers see beside what you write." autoComplete="name" defaultValue={form.value('name', name)} error={form.error('name')} />
      <TextField name="handle" label="Handle" hint={handleHint} autoComplete="off" autoCapitalize="none" spellCheck={false} defaultValue={form.value('handle', handle)} error={form.error('handle')} />
    </>
  );
}

export function SignUpForm() {
  const form = useFormState();
  return (
    <Form method="post" noValidate>
      <ErrorSummary errors={form.errors} attempt={form.attempt} />
      <div className="grid gap-5">
        <NameAndHandle form={form} />
        <TextField name="email" label="E-mail address" hint="Never shown to anybody." type="email" autoComplete="email" defaultValue={form.value('email')} error={form.error('email')} />
        <TextField name="password" label="Password" hint="Ten letters or more. Four or five plain words do well." type="password" autoComplete="new-password" error={form.error('password')} />
        <div><SubmitButton pending={form.pending} pendingWord="Signing up">Sign up</SubmitButton></div>
      </div>
    </Form>
  );
}

/** The last step of a sign-up begun at GitHub: no password, the address comes confirmed. */
export function GithubSignUpForm({ joining }: { joining: NonNullable<JoiningView['joining']> }) {
  const form = useFormState('github');
  return (
    <Form method="post" noValidate>
      <input type="hidden" name="form" value="github" />
      <ErrorSummary errors={form.errors} attempt={form.attempt} />
      <div className="grid gap-5">
        <NameAndHandle form={form} name={joining.name} handle={joining.handle} />
        <p className="text-control">Your address here will be <b>{joining.email}</b>, as GitHub has confirmed it. It is never shown to anybody.</p>
        <div><SubmitButton pending={form.pending} pendingWord="Signing up">Sign up</SubmitButton></div>
      </div>
    </Form>
  );
}
