import { Form } from 'react-router-dom';
import type { JoiningView } from '#contracts/session.ts';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { TextField } from '#src/components/text-field.tsx';
import { useFormState, type FormFault } from '#src/lib/form-fault.ts';
import { FormErrors } from './form-errors.tsx';

const handleHint = 'Part of your address here: letters, figures and hyphens. It stays as it is.';

function NameAndHandle({ fault, name = '', handle = '' }: { fault: FormFault | null; name?: string; handle?: string }) {
  return (
    <>
      <TextField name="name" label="Your name" hint="What readers see beside what you write." autoComplete="name" defaultValue={fault?.values['name'] ?? name} error={fault?.fields['name']} />
      <TextField name="handle" label="Handle" hint={handleHint} autoComplete="off" autoCapitalize="none" spellCheck={false} defaultValue={fault?.values['handle'] ?? handle} error={fault?.fields['handle']} />
    </>
  );
}

export function SignUpForm() {
  const { fault, pending } = useFormState();
  return (
    <Form method="post" noValidate>
      <FormErrors fault={fault} />
      <div className="grid gap-5">
        <NameAndHandle fault={fault} />
        <TextField name="email" label="E-mail address" hint="Never shown to anybody." type="email" autoComplete="email" defaultValue={fault?.values['email']} error={fault?.fields['email']} />
        <TextField name="password" label="Password" hint="Ten letters or more. Four or five plain words do well." type="password" autoComplete="new-password" error={fault?.fields['password']} />
        <div><SubmitButton pending={pending} pendingWord="Signing up">Sign up</SubmitButton></div>
      </div>
    </Form>
  );
}

/** The last step of a sign-up begun at GitHub: no password, the address comes confirmed. */
export function GithubSignUpForm({ joining }: { joining: NonNullable<JoiningView['joining']> }) {
  const { fault, pending } = useFormState('github');
  return (
    <Form method="post" noValidate>
      <input type="hidden" name="form" value="github" />
      <FormErrors fault={fault} />
      <div className="grid gap-5">
        <NameAndHandle fault={fault} name={joining.name} handle={joining.handle} />
        <p className="text-control">Your address here will be <b>{joining.email}</b>, as GitHub has confirmed it. It is never shown to anybody.</p>
        <div><SubmitButton pending={pending} pendingWord="Signing up">Sign up</SubmitButton></div>
      </div>
    </Form>
  );
}
