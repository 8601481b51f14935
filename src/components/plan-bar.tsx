export interface PlanBarProps {
  /** Both in the same minor units. */
  planned: number;
  used: number;
  /** Said to a screen reader: "£102.44 used of £110.00 planned". */
  label: string;
  /** Money past the plan in words: "£11.50 over". Shown when it is. */
  over?: string;
}

/** Where the mark for the plan stands, in hundredths of the bar; the rest is room to run over. */
const markAt = 72;

export function planBarShape(planned: number, used: number): { used: number; mark: number | null; isOver: boolean } {
  const isOver = used > planned;
  if (planned <= 0) return { used: used > 0 ? 100 : 0, mark: null, isOver };
  const whole = Math.max((planned * 100) / markAt, used);
  return { used: (used / whole) * 100, mark: (planned / whole) * 100, isOver };
}

export function PlanBar({ planned, used, label, over }: PlanBarProps) {
  const shape = planBarShape(planned, used);
  return (
    <span className="plan-bar block">
      <svg viewBox="0 0 100 12" preserveAspectRatio="none" role="img" aria-label={label} className="block h-3 w-full">
        <rect x="0" y="3" width="100" height="6" className="fill-rule" />
        <rect x="0" y="3" width={shape.used} height="6" className={`bar-grows ${shape.isOver ? 'fill-lead' : 'fill-scribe'}`} />
        {shape.mark !== null && <path d={`M${shape.mark} 0v12`} className="stroke-ink" strokeWidth="2" vectorEffect="non-scaling-stroke" />}
      </svg>
      {shape.isOver && over && <span className="mt-0.5 block text-note font-semibold text-lead">{over}</span>}
    </span>
  );
}
