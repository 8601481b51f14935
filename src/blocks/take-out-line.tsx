/** Takes one line out of a block; the desk offers to put it back. */
export function TakeOutLine({ of, onTakeOut }: { of: string; onTakeOut: () => void }) {
  return (
    <button type="button" onClick={onTakeOut} aria-label={`Take out ${of}`} className="ml-auto min-h-7 px-1 text-small text-ink-soft hover:text-lead hover:underline max-wide:min-h-11">
      Take out
    </button>
  );
}
