import { cleanup, render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, expect, test } from 'vitest';
import { BenchProvider, type Bench } from '#src/blocks/bench.ts';
import { makeFiguresStore } from '#src/blocks/figures-store.ts';
import { timeDesk } from '#src/blocks/time/desk.tsx';
import type { TimeData } from '#src/blocks/time/time.ts';

afterEach(cleanup);

/** The Time block in an entry of the days given. */
function TimeOn({ dayTo, start = null }: { dayTo: string | null; start?: string | null }) {
  const [data, setData] = useState<TimeData>({ ...timeDesk.blank(), day: start });
  const bench: Bench = {
    context: { measures: 'us', currency: 'USD', day: '2026-11-14', dayTo, stage: null, materials: new Map() }, buildTitle: 'Curlew', people: [], materials: [],
    figures: makeFiguresStore({ lines: new Map(), leftWords: () => null, fault: () => undefined }), touch: () => undefined,
    addMaterial: () => Promise.resolve({ ok: false, problem: 'no', fields: {} }), lastTime: () => Promise.resolve({ title: null, used: [], time: [] }), say: () => undefined, tookOut: () => undefined,
  };
  return <BenchProvider value={bench}><timeDesk.Desk id="time1" data={data} onChange={setData} /><output>{String(data.day)}</output></BenchProvider>;
}

test('in an entry of one day there is no day to pick', () => {
  render(<TimeOn dayTo={null} />);
  expect(screen.queryByLabelText('Day of Time')).toBeNull();
});

test('in an entry of several days a block may stand on any of them, and on the last unless said', async () => {
  const user = userEvent.setup();
  render(<TimeOn dayTo="2026-11-16" />);
  const select = screen.getByRole<HTMLSelectElement>('combobox', { name: 'Day of Time' });
  expect([...select.options].map(({ text }) => text)).toEqual(['On the last day', '14 Nov 2026', '15 Nov 2026', '16 Nov 2026']);
  await user.selectOptions(select, '15 Nov 2026');
  expect(screen.getByRole('status').textContent).toBe('2026-11-15');
  await user.selectOptions(select, 'On the last day');
  expect(screen.getByRole('status').textContent).toBe('null');
});

test('a day picked before the entry was made shorter is still there to be changed', () => {
  render(<TimeOn dayTo={null} start="2026-11-16" />);
  expect(screen.getByRole('combobox', { name: 'Day of Time' })).toHaveProperty('value', '2026-11-16');
});

test('a year mistyped in the last day lists no thousands of days', () => {
  render(<TimeOn dayTo="9026-11-16" />);
  expect(screen.queryByRole('combobox', { name: 'Day of Time' })).toBeNull();
  expect(screen.getByLabelText('Day of Time, if not the last')).toBeTruthy();
});
