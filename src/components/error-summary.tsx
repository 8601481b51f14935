import { useEffect, useRef } from 'react';
import { fieldId } from './field.tsx';

export interface FormError {
  /** The field's name; left out when the fault is in no one field. */
  name?: string;
  message: string;
}

export interface ErrorSummaryProps {
  errors: readonly FormError[];
  /** Anything new each time the form comes back, so that the focus is taken again. */
  attempt?: number | string;
}

/** What is wrong, above the form: takes the focus when it comes, and each line leads to its field. */
export function ErrorSummary({ errors, attempt }: ErrorSummaryProps) {
  return errors.length > 0 ? <SummaryBox key={attempt} errors={errors} /> : null;
}

function SummaryBox({ errors }: { errors: readonly FormError[] }) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => box.current?.focus(), []);
  const title = errors.length === 1 ? 'One thing needs mending' : `${errors.length} things need mending`;
  return (
    <div ref={box} role="alert" tabIndex={-1} aria-labelledby="error-summary-title" className="mb-6 border border-l-[5px] border-lead bg-card px-4 py-3 text-control [--focus:var(--color-lead)]">
      <h2 id="error-summary-title" className="font-bold text-lead">
        {title}
      </h2>
      <ul className="mt-1.5 space-y-1">
        {errors.map((error) => (
          <li key={`${error.name ?? ''} ${error.message}`}>{error.name ? <a href={`#${fieldId(error.name)}`}>{error.message}</a> : error.message}</li>
        ))}
      </ul>
    </div>
  );
}
