/** Four strokes and the one across: the tally. */
export function Mark({ size = 26 }: { size?: number }) {
  return (
    <svg viewBox="0 0 26 26" width={size} height={size} fill="none" aria-hidden="true" focusable="false">
      <path d="M4 2v22M10 2v22M16 2v22M22 2v22" stroke="currentColor" strokeWidth="2.6" />
      <path d="M0 20.5 26 5.5" className="stroke-zinc" strokeWidth="3" />
    </svg>
  );
}
