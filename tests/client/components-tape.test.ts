import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dayNumber, mondayOf, writtenSpan } from '#src/components/tape-days.ts';
import { foldAfterWeeks } from '#src/components/tape-scale.ts';
import { frameWidth, layoutTape, mostDayBars } from '#src/components/tape-layout.ts';
import type { TapeBar } from '#src/components/tape-slots.ts';
import { placeTargets, targetWidth } from '#src/components/tape-targets.ts';

const start = dayNumber('2026-03-02');

function dayOf(offset: number): string {
  return new Date((start + offset) * 86_400_000).toISOString().slice(0, 10);
}

function barsOn(offsets: readonly number[]): TapeBar[] {
  return offsets.map((offset) => ({ day: dayOf(offset), amount: 100 + offset, label: `Day ${offset}`, href: `/builds/curlew/${offset}` }));
}

function tapeOf(offsets: readonly number[]) {
  const bars = barsOn(offsets);
  return layoutTape({ from: dayOf(offsets[0] ?? 0), to: dayOf(offsets.at(-1) ?? 0), bars });
}

describe('the days of a tape', () => {
  it('begin their weeks on a Monday', () => {
    // 2 March 2026 and 29 December 1969 are Mondays (calendar).
    expect(mondayOf(dayNumber('2026-03-08'))).toBe(dayNumber('2026-03-02'));
    expect(mondayOf(dayNumber('1970-01-01'))).toBe(dayNumber('1969-12-29'));
  });

  it('are written out as elsewhere on the site', () => {
    expect(writtenSpan(dayNumber('2026-11-14'), dayNumber('2026-11-14'))).toBe('14 Nov 2026');
    expect(writtenSpan(dayNumber('2026-11-14'), dayNumber('2026-11-16'))).toBe('14 to 16 Nov 2026');
    expect(writtenSpan(dayNumber('2026-11-30'), dayNumber('2026-12-02'))).toBe('30 Nov to 2 Dec 2026');
    expect(writtenSpan(dayNumber('2026-12-31'), dayNumber('2027-01-01'))).toBe('31 Dec 2026 to 1 Jan 2027');
  });
});

describe('a tape', () => {
  it('of a young build goes by days and fills the frame', () => {
    const { unit, strips } = tapeOf([0, 1, 5]);
    expect(unit).toBe('day');
    expect(strips).toHaveLength(1);
    expect(strips[0]?.width).toBe(frameWidth);
    expect(strips[0]?.bars.map((bar) => bar.when)).toEqual(['2 Mar 2026', '3 Mar 2026', '7 Mar 2026']);
  });

  it('ticks every day, with weeks and months apart from plain days', () => {
    const { ticks } = tapeOf([0, 34]).strips[0] ?? { ticks: null };
    // 2 March to 5 April 2026: five Mondays, one first of a month (1 April), and the 29 days between.
    expect(ticks && [ticks.week.length, ticks.month.length, ticks.day.length]).toEqual([5, 1, 29]);
  });

  it('goes by weeks past 120 bars', () => {
    const few = Array.from({ length: mostDayBars }, (_, index) => index);
    expect(layoutTape({ from: dayOf(0), to: dayOf(119), bars: barsOn(few), unit: 'day' }).unit).toBe('day');
    expect(tapeOf([...few, mostDayBars]).unit).toBe('week');
  });

  it('by weeks adds up what each week cost and leads to its first day', () => {
    const layout = layoutTape({ from: dayOf(0), to: dayOf(20), bars: barsOn([0, 2, 9]), unit: 'week' });
    const bars = layout.strips[0]?.bars ?? [];
    expect(bars.map(({ amount, label, when, href }) => ({ amount, label, when, href }))).toEqual([
      { amount: 202, label: '2 entries', when: 'week of 2 Mar 2026', href: '/builds/curlew/0' },
      { amount: 109, label: 'Day 9', when: '11 Mar 2026', href: '/builds/curlew/9' },
    ]);
    expect(layout.tallest).toBe(202);
  });

  it('by weeks keeps the current day current, and leads to it', () => {
    const bars = barsOn([0, 2]).map((bar, index) => ({ ...bar, current: index === 1 }));
    const [bar] = layoutTape({ from: dayOf(0), to: dayOf(2), bars, unit: 'week' }).strips[0]?.bars ?? [];
    expect([bar?.current, bar?.href]).toEqual([true, '/builds/curlew/2']);
  });

  it('folds a gap of more than five weeks and says how long it was', () => {
    // Five idle weeks between a Monday and the Monday six weeks on: 41 whole days, so five whole weeks.
    expect(tapeOf([0, 42]).strips[0]?.folds).toEqual([]);
    const folds = tapeOf([0, 50]).strips[0]?.folds ?? [];
    expect(folds.map((fold) => fold.weeks)).toEqual([7]);
    expect(foldAfterWeeks).toBe(5);
  });

  it('past two years is one tape a year, all at one scale', () => {
    const { unit, strips } = tapeOf([0, 200, 400, 800]);
    expect(unit).toBe('week');
    expect(strips.map((strip) => strip.year)).toEqual([2026, 2027, 2028]);
    expect(strips.flatMap((strip) => strip.bars)).toHaveLength(4);
    expect(strips[0]?.bars[0]?.bar.end).toBeLessThan(strips[0]?.width ?? 0);
    expect(strips[1]?.folds.map((fold) => fold.weeks)).toContain(28);
  });

  it('gives a day of two entries one bar', () => {
    const bars = [...barsOn([3]), { ...barsOn([3])[0], day: dayOf(3), amount: 7, label: 'Second', href: '/builds/curlew/second' }];
    const laid = layoutTape({ from: dayOf(0), to: dayOf(5), bars }).strips[0]?.bars ?? [];
    expect(laid.map((bar) => [bar.label, bar.amount])).toEqual([['2 entries', 110]]);
  });

  it('stands with nothing on it', () => {
    const layout = layoutTape({ from: dayOf(0), to: dayOf(0), bars: [] });
    expect(layout.strips[0]?.bars).toEqual([]);
    expect(layout.tallest).toBe(0);
  });

  const history = fc.uniqueArray(fc.integer({ min: 0, max: 1500 }), { minLength: 1, maxLength: 160 }).map((days) => days.toSorted((a, b) => a - b));

  it('always gives each bar its own 24 px, in order, on the tape', () => {
    fc.assert(fc.property(history, (offsets) => {
      for (const strip of tapeOf(offsets).strips) {
        let taken = 0;
        for (const { bar, target } of strip.bars) {
          // Tenths of a pixel are rounded away when it is drawn.
          expect(target.end - target.start).toBeGreaterThanOrEqual(targetWidth - 0.15);
          expect(target.start).toBeLessThanOrEqual(bar.start + 0.15);
          expect(target.end).toBeGreaterThanOrEqual(bar.end - 0.15);
          expect(target.start).toBeGreaterThanOrEqual(taken - 0.15);
          taken = target.end;
        }
        expect(taken).toBeLessThanOrEqual(strip.width + 0.6);
      }
    }), { numRuns: 150 });
  });

  it('always shows every amount exactly once', () => {
    fc.assert(fc.property(history, (offsets) => {
      const shown = tapeOf(offsets).strips.flatMap((strip) => strip.bars).reduce((sum, bar) => sum + bar.amount, 0);
      expect(shown).toBe(barsOn(offsets).reduce((sum, bar) => sum + bar.amount, 0));
    }), { numRuns: 150 });
  });

  it('is never longer than it must be: days only while two frames hold them', () => {
    fc.assert(fc.property(history, (offsets) => {
      const { unit, strips } = tapeOf(offsets);
      const longest = unit === 'day' ? 2 * frameWidth : Infinity;
      expect(strips[0]?.width).toBeLessThanOrEqual(longest);
      expect(strips.every((strip) => strip.width >= frameWidth - 1)).toBe(true);
    }), { numRuns: 150 });
  });
});

describe('targets', () => {
  it('reach into free tape on either side of a thin bar', () => {
    expect(placeTargets([{ start: 100, end: 104 }], 300)).toEqual([{ start: 90, end: 114 }]);
  });

  it('part between neighbours without leaving their bars', () => {
    const [left, right] = placeTargets([{ start: 100, end: 104 }, { start: 106, end: 110 }], 300) ?? [];
    expect(left?.end).toBeLessThanOrEqual(106);
    expect(right?.start).toBeGreaterThanOrEqual(left?.end ?? Infinity);
  });

  it('are refused where three thin bars stand too close', () => {
    expect(placeTargets([{ start: 100, end: 104 }, { start: 106, end: 110 }, { start: 112, end: 116 }], 300)).toBeNull();
  });
});
