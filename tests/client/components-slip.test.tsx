import { cleanup, render, screen, within } from '@testing-library/react';
import { renderToStaticMarkup } from 'react-dom/server';
import { afterEach, describe, expect, it } from 'vitest';
import { PlanBar, planBarShape } from '#src/components/plan-bar.tsx';
import { RunningTally } from '#src/components/running-tally.tsx';
import { Slip, type SlipContent } from '#src/components/slip.tsx';
import { SlipTable } from '#src/components/slip-table.tsx';
import { SumCheck } from '#src/components/sum-check.tsx';
import { TallyMargin } from '#src/components/tally-margin.tsx';

afterEach(cleanup);

const used: SlipContent = {
  kind: 'used', word: 'Used', note: 'for 17 ribs',
  lines: [{ label: 'Roves', small: '204 from a bag of 500', value: '£9.69' }, { label: 'Roves', small: '12 wasted' }],
  sum: { label: 'Used', value: '£9.69' }, footnote: '£0.57 wasted beside it',
};

describe('a slip', () => {
  it('is a named section whose lines pair a label with its figure', () => {
    render(<Slip {...used} />);
    const slip = within(screen.getByRole('region', { name: 'Used for 17 ribs' }));
    expect(slip.getAllByRole('term').map((term) => term.textContent)).toEqual(['Roves204 from a bag of 500', 'Roves12 wasted']);
    expect(slip.getAllByRole('definition').map((figure) => figure.textContent)).toEqual(['£9.69', '']);
    expect(slip.getByText('£0.57 wasted beside it')).toBeTruthy();
  });

  it('without lines or sum is words only', () => {
    const { container } = render(<Slip kind="wrong" word="Went wrong" lines={[]} text={[{ lead: 'Tried', words: 'A cold bend.' }]} sum={null} />);
    expect(container.querySelector('dl')).toBeNull();
    expect(container.textContent).toBe('Went wrongTried A cold bend.');
  });

  it('as a plain table says the same and wears no class', () => {
    const markup = renderToStaticMarkup(<SlipTable {...used} />);
    expect(markup).not.toContain('class=');
    for (const words of ['Used for 17 ribs', 'Roves', '204 from a bag of 500', '£9.69', '12 wasted', '£0.57 wasted beside it']) expect(markup).toContain(words);
  });
});

describe('the tally margin', () => {
  it('reads in the order of the page: words, their slips, the next words', () => {
    const part = (key: string, prose: string, slips: string[]) => ({ key, parts: [{ key, before: prose, slips, after: null }] });
    const { container } = render(<TallyMargin runs={[part('a', 'First words.', ['First slip.']), part('b', 'Second words.', [])]} />);
    expect(container.textContent).toBe('First words.First slip.Second words.');
  });

  it('keeps the order things were written in where one part stands alone', () => {
    const { container } = render(<TallyMargin runs={[{ key: 'a', parts: [{ key: 'a', before: 'Before.', slips: ['Slip.'], after: 'After.' }] }]} />);
    expect(container.textContent).toBe('Before.Slip.After.');
  });

  it('lets words run on within a run, and puts each slip after its own words on a phone', () => {
    const { container } = render(
      <TallyMargin runs={[{ key: 'a', parts: [{ key: 'a', before: 'One.', slips: ['First slip.'], after: 'More.' }, { key: 'b', before: 'Two.', slips: ['Second slip.'], after: null }] }]} />,
    );
    const ordered = [...container.querySelectorAll<HTMLElement>('[style]')].toSorted((a, b) => Number(a.style.order) - Number(b.style.order));
    expect(ordered.map((part) => part.textContent)).toEqual(['One.', 'First slip.', 'More.', 'Two.', 'Second slip.']);
  });
});

describe('figures', () => {
  it('of the running tally come with their words; empty groups leave no rule', () => {
    render(<RunningTally label="The day's tally" figure="£91.74" words="this day" groups={[[], [{ label: 'Work done', value: '17 steamed ribs' }]]} />);
    const tally = within(screen.getByRole('region', { name: "The day's tally" }));
    expect(tally.getByText('Work done').nextElementSibling?.textContent).toBe('17 steamed ribs');
    expect(tally.getAllByRole('term')).toHaveLength(1);
  });

  it('of the sum say whether they add up', () => {
    const parts = [{ figure: '£437.76', words: 'used' }, { figure: '£3.40', words: 'wasted' }];
    const { rerender } = render(<SumCheck whole={{ figure: '£441.16', words: 'spent' }} parts={parts} addsUp />);
    expect(screen.getByText('adds up')).toBeTruthy();
    rerender(<SumCheck whole={{ figure: '£441.16', words: 'spent' }} parts={parts} addsUp={false} />);
    expect(screen.getByText('does not add up')).toBeTruthy();
  });
});

describe('a plan bar', () => {
  it('keeps the mark in place until the plan is passed, then shows all that was used', () => {
    expect(planBarShape(10_000, 5000)).toEqual({ used: 36, mark: 72, isOver: false });
    expect(planBarShape(10_000, 10_000)).toEqual({ used: 72, mark: 72, isOver: false });
    expect(planBarShape(10_000, 20_000)).toEqual({ used: 100, mark: 50, isOver: true });
    expect(planBarShape(0, 0)).toEqual({ used: 0, mark: null, isOver: false });
    expect(planBarShape(0, 1)).toEqual({ used: 100, mark: null, isOver: true });
  });

  it('says by how much in words, only when it is over', () => {
    render(<PlanBar planned={14_000} used={15_150} label="£151.50 used of £140.00 planned" over="£11.50 over" />);
    expect(screen.getByRole('img', { name: '£151.50 used of £140.00 planned' })).toBeTruthy();
    expect(screen.getByText('£11.50 over')).toBeTruthy();
    cleanup();
    render(<PlanBar planned={14_000} used={14_000} label="all used" over="£0.00 over" />);
    expect(screen.queryByText('£0.00 over')).toBeNull();
  });
});
