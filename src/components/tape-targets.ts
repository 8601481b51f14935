/** Smallest target a finger can hit, CSS px (WCAG 2.2, 2.5.8). */
export const targetWidth = 24;
/** Less than anyone can see; keeps sums of fractions from failing a fit that is exact. */
const slack = 1e-6;

export interface Extent {
  start: number;
  end: number;
}

/**
 * Gives each bar a stretch of the tape to be pressed: its own bar inside it, at least 24 px wide, none over another.
 * Bars in order from left to right. Null when the tape is too short for that, and has to be drawn longer.
 */
export function placeTargets(bars: readonly Extent[], length: number): Extent[] | null {
  const latest = latestTargets(bars, length);
  if (!latest) return null;
  const placed: Extent[] = [];
  let taken = 0;
  for (const [index, bar] of bars.entries()) {
    const wanted = Math.min(bar.start, (bar.start + bar.end - targetWidth) / 2);
    const start = Math.min(Math.max(wanted, taken), latest[index]?.start ?? bar.start);
    const end = Math.max(bar.end, start + targetWidth);
    placed.push({ start, end });
    taken = end;
  }
  return placed;
}

/** Each target as far right as the ones after it allow; null when one would have to leave its bar or the tape. */
function latestTargets(bars: readonly Extent[], length: number): Extent[] | null {
  const found: Extent[] = [];
  let free = length;
  for (const bar of bars.toReversed()) {
    if (bar.end > free + slack) return null;
    const end = Math.min(free, Math.max(bar.end, bar.start + targetWidth));
    const start = Math.min(bar.start, end - targetWidth);
    if (start < -slack) return null;
    found.push({ start, end });
    free = start;
  }
  return found.toReversed();
}
