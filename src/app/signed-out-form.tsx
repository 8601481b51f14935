import { Form, useLocation } from 'react-router-dom';
import { Button } from '#src/components/button.tsx';

/** A form that came from nobody signed in: it waits here while one signs in beside it, and goes again as it was typed. */
export function SignedOutFormKept({ values }: { values: Readonly<Record<string, string>> }) {
  const { pathname, search } = useLocation();
  return (
    <Form method="post" action={pathname + search} className="mt-6">
      {Object.entries(values).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} />)}
      <p className="max-w-reading">
        <a href="/sign-in" target="_blank" rel="noopener" className="font-semibold">Sign in, in another window</a>. Then come back to this one and send it again. A password has to be typed once more.
      </p>
      <p className="mt-6"><Button type="submit">Send it again</Button></p>
    </Form>
  );
}
