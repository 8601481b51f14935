import { useLocation } from 'react-router-dom';
import { Button } from '#src/components/button.tsx';
import type { FormState } from '#src/lib/form-action.ts';

interface VersionFieldProps {
  form: FormState;
  /** Of what was read for this form. */
  version: string;
}

/** The version a form was opened with. It stays until the writer has seen that there is a newer one and says whose to keep. */
export function VersionField({ form, version }: VersionFieldProps) {
  const { pathname } = useLocation();
  return (
    <>
      <input type="hidden" name="version" value={form.value('version', version)} />
      {form.newer !== undefined && (
        <p className="mb-6 flex flex-wrap items-center gap-4">
          <a href={pathname} target="_blank" rel="noopener">See it as it is now, in another window</a>
          <Button type="submit" kind="lead" name="over" value={form.newer}>Keep mine instead</Button>
        </p>
      )}
    </>
  );
}
