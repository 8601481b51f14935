import { describe, expect, test } from 'vitest';
import { exactFrom } from '#domain/quantity.ts';
import { deskLedger } from '#src/features/desk/desk-ledger.ts';
import { boughtNode, bought, brushes, byId, documentOf, gallon, oil, resin, usedNode, viewOf } from './desk-view.ts';

const line = (id: string, material: number, amount: string, unit: string) => ({ id, material, name: 'as picked', amount, unit });

describe('figures while somebody types', () => {
  // Common practice, no source: resin by the US gallon at 50.00, a US cup a board on eight boards; brushes 10.00 for fifteen, one a board.
  test('eight boards used 25.00 of resin and 5.33 of brushes; half a gallon and seven brushes are left', () => {
    const view = viewOf({ history: [bought(resin.id, gallon, 5000), bought(brushes.id, '15/1', 1000)] });
    const reckoning = deskLedger(view).reckon(documentOf({
      work: { amount: '8', unit: 'piece', kind: 'board' },
      content: [usedNode('used1', [line('lineA', resin.id, '8', 'US cup'), line('lineB', brushes.id, '8', 'piece')])],
    }), byId);
    expect(reckoning.lines.get('used1:lineA')?.value).toBe(2500);
    expect(reckoning.lines.get('used1:lineB')?.value).toBe(533);
    expect(reckoning.figures.day).toBe(3033);
    const left = new Map(reckoning.shelf.map((row) => [row.material, row.left]));
    expect(exactFrom(left.get(resin.id) ?? '').equals(exactFrom(gallon).div(2))).toBe(true);
    expect(left.get(brushes.id)).toBe('7/1');
    // 30.33 over eight boards, half to even once: 3.79125
    expect(reckoning.one).toEqual({ kind: 'board', unit: 'piece', money: 379, minutes: 0, unsettled: false });
  });

  test('what is bought in the entry itself comes in before it is used, at its cost to the door', () => {
    const reckoning = deskLedger(viewOf()).reckon(documentOf({
      content: [
        usedNode('used1', [line('lineA', oil.id, '1', 'l')]),
        boughtNode('bought1', [{ id: 'lineB', material: oil.id, name: oil.name, amount: '2', unit: 'tin', money: '50.00' }]),
      ],
    }), byId);
    expect(reckoning.lines.get('used1:lineA')).toEqual({ value: 1000, short: '0/1', estimate: null, left: '4000/1' });
    expect(reckoning.figures).toMatchObject({ used: 1000, bought: 5000, linesShort: 0 });
  });

  test('delivery is shared by what the lines came to, and the shelf gets the cost to the door', () => {
    const node = boughtNode('bought1', [
      { id: 'lineA', material: oil.id, name: oil.name, amount: '1', unit: 'tin', money: '10' },
      { id: 'lineB', material: brushes.id, name: brushes.name, amount: '1', unit: 'box', money: '30' },
    ]);
    if (node.type !== 'bought') throw new Error('not a receipt');
    node.attrs.data.delivery = '4';
    const reckoning = deskLedger(viewOf()).reckon(documentOf({ content: [node] }), byId);
    expect(reckoning.lines.get('bought1:lineA')?.value).toBe(1100);
    expect(reckoning.lines.get('bought1:lineB')?.value).toBe(3300);
  });

  test('on order brings nothing in, so a use of it is short', () => {
    const reckoning = deskLedger(viewOf()).reckon(documentOf({
      content: [
        boughtNode('bought1', [{ id: 'lineA', material: oil.id, name: oil.name, amount: '1', unit: 'tin', money: '10', onOrder: true }]),
        usedNode('used1', [line('lineB', oil.id, '500', 'ml')]),
      ],
    }), byId);
    expect(reckoning.lines.get('used1:lineB')).toEqual({ value: 0, short: '500/1', estimate: null, left: '0/1' });
    expect(reckoning.figures.linesShort).toBe(1);
  });

  test('a line from the shed is priced on the shed, by the shed’s own method', () => {
    const shed = bought(brushes.id, '10/1', 1000, '2026-10-01', 'shed', 1);
    shed.rows.push({ key: 'receipt2:a', kind: 'bought', day: '2026-10-02', sequence: 2, place: 0, amount: '10/1', cost: 2000, of: null, shortage: null });
    const document = documentOf({ content: [usedNode('used1', [{ ...line('lineA', brushes.id, '5', 'piece'), from: 'shed' }])] });
    const history = [shed, bought(brushes.id, '10/1', 9000)];
    expect(deskLedger(viewOf({ history })).reckon(document, byId).lines.get('used1:lineA')?.value).toBe(500);
    expect(deskLedger(viewOf({ history, shedMethod: 'average' })).reckon(document, byId).lines.get('used1:lineA')?.value).toBe(750);
  });

  // ledger.md's worked history: a draft uses what a published entry uses after it.
  test('drafts lie over the published ledger: first in first out gives 10.00 then 20.00', () => {
    const history = bought(brushes.id, '10/1', 1000, '2026-11-01', 'shelf', 1);
    history.rows.push(
      { key: 'receipt2:a', kind: 'bought', day: '2026-11-02', sequence: 2, place: 0, amount: '10/1', cost: 2000, of: null, shortage: null },
      { key: '9:u:l', kind: 'used', day: '2026-11-20', sequence: 25, place: 0, amount: '10/1', cost: null, of: null, shortage: null },
    );
    const reckoning = deskLedger(viewOf({ history: [history] })).reckon(documentOf({ content: [usedNode('used1', [line('lineA', brushes.id, '10', 'piece')])] }), byId);
    expect(reckoning.lines.get('used1:lineA')?.value).toBe(1000);
    expect(reckoning.shelf).toEqual([{ material: brushes.id, shelf: 'shelf', left: '0/1', short: '0/1' }]);
  });

  test('a keystroke replays only the material it touches', () => {
    const ledger = deskLedger(viewOf({ history: [bought(resin.id, gallon, 5000), bought(brushes.id, '15/1', 1000)] }));
    const content = (cups: string) => [usedNode('used1', [line('lineA', resin.id, cups, 'US cup'), line('lineB', brushes.id, '8', 'piece')])];
    ledger.reckon(documentOf({ content: content('8') }), byId);
    expect(ledger.replayed()).toBe(4);
    ledger.reckon(documentOf({ content: content('8'), title: 'Another title' }), byId);
    expect(ledger.replayed()).toBe(4);
    ledger.reckon(documentOf({ content: content('9') }), byId);
    expect(ledger.replayed()).toBe(6);
  });

  test('a stage counts this entry in, with its costs, and says where it would finish', () => {
    const stage = { id: 5, title: 'Boards', done: false, planned: 11_000, plannedWork: '24', workUnit: 'piece', workKind: 'board', used: 1000, wasted: 0, usedForEach: 1000, workDone: '4/1' };
    const view = viewOf({ stages: [stage], history: [bought(brushes.id, '15/1', 1500)] });
    const reckoning = deskLedger(view).reckon(documentOf({
      stage: 5, work: { amount: '8', unit: 'piece', kind: 'Board' },
      content: [
        usedNode('used1', [line('lineA', brushes.id, '8', 'piece')]),
        { type: 'cost', attrs: { id: 'cost1', version: 1, data: { day: null, lines: [{ id: 'lineC', label: 'Hire of a planer', category: 'hire', money: '20' }] } } },
      ],
    }), byId);
    // 10.00 + 8.00 + 20.00 so far; 12 boards to go at (10.00 + 8.00) ÷ 12 = 1.50 each
    expect(reckoning.stage).toMatchObject({ soFar: 3800, finishAt: 5600, workDone: '12/1' });
  });
});
