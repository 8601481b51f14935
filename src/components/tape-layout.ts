import { dateParts, dayNumber, firstOfMonth, mondayOf, monthName } from './tape-days.ts';
import { cutIntoPieces, foldWidth, type Gap, longGaps, type Piece, type Scale, scaleOf } from './tape-scale.ts';
import { daySlots, type Slot, type TapeBar, weekSlots } from './tape-slots.ts';
import { type Extent, placeTargets, targetWidth } from './tape-targets.ts';

/** Width of the page's frame, CSS px: a tape is never drawn shorter. */
export const frameWidth = 1152;
/** Past this many bars a tape goes by weeks. */
export const mostDayBars = 120;
/** A tape by days may be this many frames long; after that it goes by weeks, so that a build is seen whole. */
const mostFrames = 2;
/** Past two years there is one tape a year. */
const mostDaysOnOneTape = 731;
/** A young build still gets a tape with room to write on. */
const fewestDays = 35;
/** Middling width of a letter of the month band, px. */
const letterWidth = 7.6;

export type TapeUnit = 'day' | 'week';

export interface LaidBar extends Slot {
  bar: Extent;
  target: Extent;
  /** Share of the tallest bar, 0 to 1. */
  share: number;
}

export interface Fold {
  x: number;
  width: number;
  weeks: number;
}

export interface Strip {
  /** The year, where there is a tape for each. */
  year: number | null;
  /** Years without work just before it, folded away. */
  idle: { from: number; to: number } | null;
  width: number;
  months: { x: number; label: string }[];
  ticks: { day: number[]; week: number[]; month: number[] };
  bars: LaidBar[];
  folds: Fold[];
  /** What to open on, px from the left: the current bar, else the last. */
  mark: number;
}

export interface TapeLayout {
  unit: TapeUnit;
  strips: Strip[];
  tallest: number;
}

export interface TapeInput {
  from: string;
  to: string;
  bars: readonly TapeBar[];
  unit?: TapeUnit | undefined;
}

export function layoutTape({ from, to, bars, unit }: TapeInput): TapeLayout {
  const days = daySlots(bars);
  const first = mondayOf(Math.min(dayNumber(from), ...days.map((slot) => slot.first)));
  const last = Math.max(dayNumber(to), first + fewestDays - 1, ...days.map((slot) => slot.last));
  const isLong = last - first >= mostDaysOnOneTape;
  if (unit === 'day' || (unit === undefined && days.length <= mostDayBars && !isLong)) {
    const strip = oneStrip(days, first, last);
    if (unit === 'day' || strip.width <= frameWidth * mostFrames) return withHeights('day', [strip]);
  }
  const weeks = weekSlots(days);
  return withHeights('week', isLong ? yearStrips(weeks, first, last) : [oneStrip(weeks, first, mondayOf(last) + 6)]);
}

function withHeights(unit: TapeUnit, strips: readonly Strip[]): TapeLayout {
  const tallest = Math.max(0, ...strips.flatMap((strip) => strip.bars.map((bar) => bar.amount)));
  const withShare = (bar: LaidBar) => ({ ...bar, share: tallest > 0 ? Math.max(0, bar.amount) / tallest : 0 });
  return { unit, tallest, strips: strips.map((strip) => ({ ...strip, bars: strip.bars.map(withShare) })) };
}

function oneStrip(slots: readonly Slot[], first: number, last: number): Strip {
  const pieces = cutIntoPieces(first, last, longGaps(slots, last));
  const folds = pieces.filter((piece) => piece.folded).length;
  const days = pieces.reduce((sum, piece) => sum + (piece.folded ? 0 : piece.last - piece.first + 1), 0);
  return drawToFit(slots, pieces, Math.max(1, (frameWidth - folds * foldWidth) / days));
}

/**
 * Every year of work at one scale from its first Monday, so that the months of one stand under those of the other.
 * Years without work are folded away, and those after the last are left out.
 */
function yearStrips(slots: readonly Slot[], first: number, last: number): Strip[] {
  const gaps = longGaps(slots, last);
  const perDay = Math.max(frameWidth / 371, targetWidth / 7);
  const worked = [...new Set(slots.map((slot) => tapeYear(slot.first)))];
  const years = worked.length > 0 ? worked : [tapeYear(last)];
  return years.map((year, index) => {
    const piece = { first: firstMonday(year), last: firstMonday(year + 1) - 1, folded: false, weeks: 0 };
    const own = slots.filter((slot) => slot.first >= piece.first && slot.first <= piece.last);
    const before = years[index - 1];
    const from = before === undefined ? tapeYear(first) : before + 1;
    return { ...drawToFit(own, [piece], perDay), year, idle: from < year ? { from, to: year - 1 } : null, folds: openFolds(gaps, piece, scaleOf([piece], perDay).at) };
  });
}

/** The year on whose tape a day stands: the days before its first Monday are on the one before. */
function tapeYear(day: number): number {
  const { year } = dateParts(day);
  return day < firstMonday(year) ? year - 1 : year;
}

function firstMonday(year: number): number {
  return mondayOf(firstOfMonth(year, 0) + 6);
}

/** On a year's tape a long gap keeps its room, and is lettered where it stands. */
function openFolds(gaps: readonly Gap[], year: Piece, at: Scale['at']): Fold[] {
  return gaps.flatMap((gap) => {
    const x = at(Math.max(gap.first, year.first));
    const width = at(Math.min(gap.last, year.last) + 1) - x;
    return width >= foldWidth ? [{ x, width, weeks: gap.weeks }] : [];
  });
}

/** Draws at the given px a day, or longer where bars would otherwise be too close to press. */
function drawToFit(slots: readonly Slot[], pieces: readonly Piece[], least: number): Strip {
  // A day as wide as a target and its gap always has room.
  const most = Math.max(least, targetWidth + 2);
  for (let perDay = least; ; perDay = Math.min(perDay + 0.25, most)) {
    const scale = scaleOf(pieces, perDay);
    const bars = slots.map((slot) => barExtent(slot, scale));
    const targets = placeTargets(bars, scale.width);
    if (targets || perDay >= most) return drawnStrip(slots, bars, targets ?? bars, pieces, scale, perDay);
  }
}

/** A bar fills its day or week but for a sliver, at most 4 px, that parts it from the next. */
function barExtent(slot: Slot, scale: Scale): Extent {
  const start = scale.at(slot.first);
  const end = scale.at(slot.last + 1);
  const room = Math.min(4, (end - start) * 0.16);
  return { start: start + room / 2, end: end - room / 2 };
}

function drawnStrip(slots: readonly Slot[], bars: readonly Extent[], targets: readonly Extent[], pieces: readonly Piece[], scale: Scale, perDay: number): Strip {
  const laid = slots.flatMap((slot, index) => {
    const bar = bars[index];
    const target = targets[index];
    return bar && target ? [{ ...slot, bar: rounded(bar), target: rounded(target), share: 0 }] : [];
  });
  const opening = laid.find((bar) => bar.current) ?? laid.at(-1);
  return {
    year: null,
    idle: null,
    width: Math.round(scale.width),
    months: monthLabels(pieces, scale),
    ticks: ticksOf(pieces, scale, perDay),
    bars: laid,
    folds: pieces.filter((piece) => piece.folded).map((piece) => ({ x: round(scale.at(piece.first)), width: foldWidth, weeks: piece.weeks })),
    mark: opening ? (opening.bar.start + opening.bar.end) / 2 : 0,
  };
}

function ticksOf(pieces: readonly Piece[], scale: Scale, perDay: number): Strip['ticks'] {
  const ticks: Strip['ticks'] = { day: [], week: [], month: [] };
  for (const piece of pieces.filter(({ folded }) => !folded)) {
    for (let day = piece.first; day <= piece.last; day += 1) {
      const x = round(scale.at(day));
      if (dateParts(day).date === 1) ticks.month.push(x);
      else if (mondayOf(day) === day) ticks.week.push(x);
      // Closer than 3 px, day ticks run into a grey.
      else if (perDay >= 3) ticks.day.push(x);
    }
  }
  return ticks;
}

/** A month is lettered where it begins, or where the tape takes it up again; the year with the first and with January. */
function monthLabels(pieces: readonly Piece[], scale: Scale): Strip['months'] {
  const starts = pieces.filter(({ folded }) => !folded).flatMap((piece) => {
    const firsts = [piece.first];
    const { year, month } = dateParts(piece.first);
    for (let next = 1; firstOfMonth(year, month + next) <= piece.last; next += 1) firsts.push(firstOfMonth(year, month + next));
    return firsts;
  });
  const afterFold = new Set(pieces.filter((piece) => piece.folded).map((piece) => piece.last + 1));
  const labels = starts.map((day, index) => {
    const { year, month } = dateParts(day);
    return { x: round(scale.at(day) + (afterFold.has(day) ? 9 : 4)), label: index === 0 || month === 0 ? `${monthName(month)} ${year}` : monthName(month) };
  });
  const room = (index: number) => (labels[index + 1]?.x ?? scale.width) - (labels[index]?.x ?? 0);
  return labels.filter(({ label }, index) => room(index) >= label.length * letterWidth);
}

function rounded(extent: Extent): Extent {
  return { start: round(extent.start), end: round(extent.end) };
}

/** Tenths of a pixel are enough, and keep the page small. */
function round(value: number): number {
  return Math.round(value * 10) / 10;
}
