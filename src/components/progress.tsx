export interface ProgressProps {
  /** "4 photos going up". */
  title: string;
  /** From 0 to 1. */
  share: number;
  /** Amount and what is left: "14.2 of 22.9 MB, 9 s left". */
  detail: string;
  onStop?: () => void;
}

export function Progress({ title, share, detail, onStop }: ProgressProps) {
  const percent = Math.round(Math.min(1, Math.max(0, share)) * 100);
  return (
    <div>
      <p className="text-small font-semibold">{title}</p>
      <svg
        viewBox="0 0 100 8"
        preserveAspectRatio="none"
        role="progressbar"
        aria-label={title}
        aria-valuenow={percent}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuetext={detail}
        className="mt-2 block h-2 w-full"
      >
        <rect width="100" height="8" className="fill-rule" />
        <rect width={percent} height="8" className="fill-verd" />
      </svg>
      <p className="num mt-1 text-small text-ink-soft">
        {detail}{' '}
        {onStop && (
          <button type="button" onClick={onStop} className="min-h-6 text-scribe underline">
            stop
          </button>
        )}
      </p>
    </div>
  );
}
