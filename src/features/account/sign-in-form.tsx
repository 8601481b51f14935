import { Form } from 'react-router-dom';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { TextField } from '#src/components/text-field.tsx';
import { useFormState } from '#src/lib/form-fault.ts';
import { FormErrors } from './form-errors.tsx';

export function SignInForm() {
  const { fault, pending } = useFormState();
  return (
    <Form method="post" noValidate>
      <FormErrors fault={fault} />
      <div className="grid gap-5">
        <TextField name="email" label="E-mail address" type="email" autoComplete="username" defaultValue={fault?.values['email']} error={fault?.fields['email']} />
        <TextField name="password" label="Password" type="password" autoComplete="current-password" error={fault?.fields['password']} />
        <div><SubmitButton pending={pending} pendingWord="Signing in">Sign in</SubmitButton></div>
      </div>
    </Form>
  );
}
