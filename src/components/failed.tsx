import { Button } from './button.tsx';

export interface FailedProps {
  /** What happened. */
  title: string;
  /** What was kept, and what to do. */
  kept?: string;
  onRetry?: () => void;
  /** Where there are no scripts, trying again is the same address again. */
  retryHref?: string;
  /** What to quote when asking for help. */
  requestId?: string;
}

export function Failed({ title, kept, onRetry, retryHref, requestId }: FailedProps) {
  return (
    <div role="alert" className="border border-l-[5px] border-lead bg-card px-5 py-4">
      <p className="lettering-row">{title}</p>
      {kept && <p className="mt-1.5 max-w-reading text-control">{kept}</p>}
      <div className="mt-4 flex flex-wrap items-center gap-x-4 gap-y-2">
        {onRetry && (
          <Button kind="quiet" onClick={onRetry}>
            Try again
          </Button>
        )}
        {!onRetry && retryHref && (
          <a href={retryHref} className="font-semibold">
            Try again
          </a>
        )}
        {requestId && <span className="text-note text-ink-soft">Reference {requestId}</span>}
      </div>
    </div>
  );
}
