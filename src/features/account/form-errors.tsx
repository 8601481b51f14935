import { ErrorSummary } from '#src/components/error-summary.tsx';
import type { FormFault } from '#src/lib/form-fault.ts';

/** The summary over a form: a line for each field, or the one thing that is wrong with none of them. */
export function FormErrors({ fault }: { fault: FormFault | null }) {
  if (!fault) return null;
  const beside = Object.entries(fault.fields).map(([name, message]) => ({ name, message }));
  return <ErrorSummary errors={beside.length > 0 ? beside : [{ message: fault.message }]} attempt={fault.attempt} />;
}
