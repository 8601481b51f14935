import { cleanup, render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, expect, test } from 'vitest';
import { BenchProvider, type Bench } from '#src/blocks/bench.ts';
import { blankBought, blankBoughtLine, bought, type BoughtData } from '#src/blocks/bought/bought.ts';
import { boughtDesk } from '#src/blocks/bought/desk.tsx';
import { makeFiguresStore } from '#src/blocks/figures-store.ts';
import { deskLedger } from '#src/features/desk/desk-ledger.ts';
import { tallyWords } from '#src/features/desk/tally-words.ts';
import { boughtNode, byId, documentOf, materials, viewOf } from './desk-view.ts';

afterEach(cleanup);

const context = { measures: 'us', currency: 'USD', day: '2026-11-14', dayTo: null, stage: null, materials: byId } as const;
// 40.00 and 60.00; 10.00 of delivery by line value is 4.00 and 6.00
const receipt: BoughtData = {
  ...blankBought(), delivery: '10.00', paperTotal: '110.00',
  lines: [{ ...blankBoughtLine('lineA'), goes: 'straight', name: 'Rags', money: '40.00' }, { ...blankBoughtLine('lineB'), goes: 'straight', name: 'Tape', money: '60.00' }],
};

function Bare({ start }: { start: BoughtData }) {
  const [data, setData] = useState(start);
  const [store] = useState(() => makeFiguresStore({ lines: new Map(), leftWords: () => null, fault: () => undefined }));
  const bench: Bench = {
    context, buildTitle: 'Curlew', people: [], materials, figures: store, touch: () => undefined, say: () => undefined, tookOut: () => undefined,
    addMaterial: () => Promise.resolve({ ok: false, problem: 'no', fields: {} }), lastTime: () => Promise.resolve({ title: null, used: [], time: [] }),
  };
  return <BenchProvider value={bench}><boughtDesk.Desk id="bought1" data={data} onChange={setData} /></BenchProvider>;
}

test('while the delivery cannot be read no sum of the receipt stands, and it says why', async () => {
  const user = userEvent.setup();
  render(<Bare start={receipt} />);
  expect(document.body.textContent).toContain('The lines come to $110.00, as the paper says.');
  expect(document.body.textContent).toContain('$44.00 to the door');
  await user.clear(screen.getByLabelText('Delivery'));
  await user.type(screen.getByLabelText('Delivery'), 'ten');
  expect(document.body.textContent).toContain('No total while the delivery cannot be read.');
  expect(document.body.textContent).toContain('To the door—');
  expect(document.body.textContent).not.toMatch(/\$\d/);
});

test('the tally says no sum for it either', () => {
  const wordsOf = (delivery: string) => {
    const node = boughtNode('bought1', receipt.lines);
    const document = documentOf({ content: [{ ...node, attrs: { ...node.attrs, data: { ...receipt, delivery } } } as typeof node] });
    return tallyWords(deskLedger(viewOf()).reckon(document, byId), 'USD').groups.flat().find(({ label }) => label === 'Bought, to the door')?.value;
  };
  expect([wordsOf('10.00'), wordsOf('ten')]).toEqual(['$110.00', '—']);
});

test('a foreign receipt without its rate has no total yet', () => {
  render(<Bare start={{ ...receipt, currency: 'EUR', rate: '' }} />);
  expect(document.body.textContent).toContain('No total until the rate is there.');
});

test('readers are told in plain words what each line has its share of', () => {
  const footnoteOf = (part: Partial<BoughtData>) => bought.slip?.('bought1', { ...receipt, paperTotal: '', ...part }, { ...context, costsShown: true, figures: new Map(), workWords: null, names: new Map() })?.footnote;
  expect(footnoteOf({ tax: '2.00', discount: '5.00' })).toBe('Each line with its share of delivery, tax and discount');
  expect(footnoteOf({ tax: '2.00' })).toBe('Each line with its share of delivery and tax');
  expect(footnoteOf({})).toBe('Each line with its share of delivery');
});
