import { cleanup, render, screen, within } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { useEffect, useState } from 'react';
import { afterEach, describe, expect, test, vi } from 'vitest';
import { BenchProvider, type Bench } from '#src/blocks/bench.ts';
import { makeFiguresStore } from '#src/blocks/figures-store.ts';
import { usedDesk } from '#src/blocks/used/desk.tsx';
import type { UsedData } from '#src/blocks/used/used.ts';
import { deskLedger } from '#src/features/desk/desk-ledger.ts';
import { bought, brushes, byId, documentOf, gallon, materials, resin, viewOf } from './desk-view.ts';

afterEach(cleanup);

const history = [bought(resin.id, gallon, 5000), bought(brushes.id, '15/1', 1000)];

/** The Used block on a real ledger, without the editor around it. */
function Bare({ bench, start }: { bench: Partial<Bench>; start: UsedData }) {
  const [data, setData] = useState(start);
  const [touched, setTouched] = useState<string[]>([]);
  const reckoning = deskLedger(viewOf({ history })).reckon(documentOf({ content: [{ type: 'used', attrs: { id: 'used1', version: 1, data } }] }), byId);
  const figures = { lines: reckoning.lines, leftWords: () => null, fault: (path: string) => (touched.includes(path) ? reckoning.derived.faults[path] : undefined) };
  const [store] = useState(() => makeFiguresStore(figures));
  useEffect(() => store.publish(figures));
  const whole: Bench = {
    context: { measures: 'us', currency: 'USD', day: '2026-11-14', dayTo: null, stage: null, materials: byId }, buildTitle: 'Curlew, a dinghy', people: [], materials, figures: store,
    touch: (path) => setTouched((now) => [...now, path]),
    addMaterial: () => Promise.resolve({ ok: false, problem: 'no', fields: {} }), lastTime: () => Promise.resolve({ title: null, used: [], time: [] }),
    say: () => undefined, tookOut: () => undefined, ...bench,
  };
  return <BenchProvider value={whole}><usedDesk.Desk id="used1" data={data} onChange={setData} /></BenchProvider>;
}
const blank = usedDesk.blank();

describe('the Used block', () => {
  test('three letters and Enter, an amount and Enter: cost and what is left follow, and a new line waits', async () => {
    const user = userEvent.setup();
    render(<Bare bench={{}} start={blank} />);
    await user.type(screen.getByRole('combobox', { name: 'Material' }), 'res{Enter}');
    expect(document.activeElement).toBe(screen.getByRole('textbox', { name: 'Amount of Laminating resin' }));
    await user.keyboard('8 US cups{Enter}');
    const [first] = screen.getAllByRole('listitem');
    expect(first && within(first).getByText('$25.00')).toBeTruthy();
    expect(first && within(first).getByText('0.5 US gal left')).toBeTruthy();
    expect(screen.getAllByRole('combobox', { name: 'Material' })).toHaveLength(2);
    expect(document.activeElement).toBe(screen.getAllByRole('combobox', { name: 'Material' })[1]);
  });

  test('what cannot be read says so beside its field once it is left, and stays as typed', async () => {
    const user = userEvent.setup();
    render(<Bare bench={{}} start={blank} />);
    await user.type(screen.getByRole('combobox', { name: 'Material' }), 'lam br{Enter}');
    await user.keyboard('1,5');
    expect(screen.queryByText(/with a point/)).toBeNull();
    await user.tab();
    const field = screen.getByRole('textbox', { name: 'Amount of Laminating brushes' });
    expect(field).toHaveProperty('value', '1,5');
    expect(field.getAttribute('aria-invalid')).toBe('true');
    expect(document.getElementById(field.getAttribute('aria-describedby') ?? '')?.textContent).toMatch(/^Write 1\.5 with a point/);
  });

  test('an amount with a comma says what it was read as', async () => {
    const user = userEvent.setup();
    render(<Bare bench={{}} start={blank} />);
    await user.type(screen.getByRole('combobox', { name: 'Material' }), 'res{Enter}');
    await user.keyboard('1,500');
    expect(screen.getByText(/^read as 1,500 US gal/)).toBeTruthy();
    await user.clear(screen.getByRole('textbox', { name: 'Amount of Laminating resin' }));
    await user.keyboard('1500');
    expect(screen.queryByText(/read as/)).toBeNull();
  });

  test('a material that is not there yet is added in place', async () => {
    const user = userEvent.setup();
    const addMaterial = vi.fn<Bench['addMaterial']>(() => Promise.resolve({ ok: true, material: { ...brushes, id: 9, name: 'Mahogany plugs' } }));
    render(<Bare bench={{ addMaterial }} start={blank} />);
    await user.type(screen.getByRole('combobox', { name: 'Material' }), 'Mahogany plugs{Enter}');
    await user.type(screen.getByLabelText(/Comes in a/), 'bag');
    await user.type(screen.getByLabelText(/^of/), '100');
    await user.click(screen.getByRole('button', { name: 'Add the material' }));
    expect(addMaterial).toHaveBeenCalledWith({ name: 'Mahogany plugs', dimension: 'count', unit: 'piece', packs: [{ name: 'bag', amount: '100' }] });
    expect(screen.getByRole('combobox', { name: 'Material' })).toHaveProperty('value', 'Mahogany plugs');
  });

  test('same as last time says in the block that nothing was before', async () => {
    const user = userEvent.setup();
    const say = vi.fn<Bench['say']>();
    render(<Bare bench={{ say }} start={blank} />);
    await user.click(screen.getByRole('button', { name: 'Same as last time' }));
    expect(await screen.findByText('Nothing was written up as used before this day.')).toBeTruthy();
    expect(say).toHaveBeenCalledWith('Nothing was written up as used before this day.');
    expect(screen.getAllByRole('listitem')).toHaveLength(1);
  });

  test('same as last time fills the lines, and a line taken out can be put back', async () => {
    const user = userEvent.setup();
    let putBack: () => void = () => undefined;
    const tookOut = vi.fn<Bench['tookOut']>((_words, restore) => { putBack = restore; });
    const lastTime = () => Promise.resolve({ title: 'Before', time: [], used: [{ material: 2, name: brushes.name, amount: '8', unit: 'piece', fate: 'used' as const, counts: 'each' as const, from: 'shelf' as const }] });
    const { rerender } = render(<Bare bench={{ lastTime, tookOut }} start={{ day: null, lines: [] }} />);
    await user.click(screen.getByRole('button', { name: 'Same as last time' }));
    expect(await screen.findAllByText('$5.33')).toHaveLength(2);
    await user.click(screen.getByRole('button', { name: 'Take out Laminating brushes' }));
    expect(screen.queryByRole('listitem')).toBeNull();
    expect(tookOut.mock.calls[0]?.[0]).toBe('Laminating brushes taken out');
    putBack();
    rerender(<Bare bench={{ lastTime, tookOut }} start={{ day: null, lines: [] }} />);
    expect(await screen.findByRole('listitem')).toBeTruthy();
  });
});
