import { mondayOf } from './tape-days.ts';
import type { Slot } from './tape-slots.ts';

/** Weeks without work after which the tape folds. */
export const foldAfterWeeks = 5;
/** Room for "laid up 12 weeks", CSS px. */
export const foldWidth = 116;

/** A stretch of days drawn to scale, or one folded away. Day numbers, both included. */
export interface Piece {
  first: number;
  last: number;
  folded: boolean;
  /** Whole weeks laid up; 0 where there was work. */
  weeks: number;
}

export interface Gap {
  first: number;
  last: number;
  weeks: number;
}

/** Long stretches without work between entries, and from the last to the end of the tape, from Monday to Sunday. */
export function longGaps(slots: readonly Slot[], end: number): Gap[] {
  const gaps: Gap[] = [];
  let worked: number | null = null;
  for (const next of [...slots, { first: end + 1, last: end + 1 }]) {
    if (worked !== null) {
      const weeks = Math.floor((next.first - worked - 1) / 7);
      const first = mondayOf(worked + 7);
      const last = mondayOf(next.first) - 1;
      if (weeks > foldAfterWeeks && last > first) gaps.push({ first, last, weeks });
    }
    worked = Math.max(worked ?? next.last, next.last);
  }
  return gaps;
}

export function cutIntoPieces(first: number, last: number, gaps: readonly Gap[]): Piece[] {
  const pieces: Piece[] = [];
  let start = first;
  for (const gap of gaps) {
    if (gap.first > start) pieces.push({ first: start, last: gap.first - 1, folded: false, weeks: 0 });
    pieces.push({ ...gap, folded: true });
    start = gap.last + 1;
  }
  if (start <= last) pieces.push({ first: start, last, folded: false, weeks: 0 });
  return pieces;
}

export interface Scale {
  width: number;
  /** Where a day begins, px from the left; inside a fold, in proportion. */
  at: (day: number) => number;
}

export function scaleOf(pieces: readonly Piece[], perDay: number): Scale {
  let width = 0;
  const laid = pieces.map((piece) => {
    const days = piece.last - piece.first + 1;
    const own = piece.folded ? foldWidth : days * perDay;
    const x = width;
    width += own;
    return { piece, x, perDay: own / days };
  });
  const at = (day: number) => {
    const found = laid.find(({ piece }) => day <= piece.last);
    return found ? found.x + (day - found.piece.first) * found.perDay : width;
  };
  return { width, at };
}
