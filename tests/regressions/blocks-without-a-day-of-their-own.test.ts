import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { deriveEntry, entryDocument, isProse, projectEntry, type TopNode } from '#src/blocks/pure.ts';
import { Cost, Movement, TimeLine } from '#server/entities/index.ts';
import { verifyLedger } from '#server/features/entries/ledger-check.service.ts';
import type { Caller } from '#server/http/context.ts';
import { boughtBlock, costBlock, dayOf, freshId, timeBlock, usedBlock, Workshop } from '#tests/support/workshop.ts';

// In an entry of several days everything stood on the last of them: what was used early was priced after what came later.

let shop: Workshop;
let owner: Caller;
beforeAll(async () => {
  shop = await Workshop.open();
  owner = await shop.person('wren');
});
afterAll(() => shop.close());

test('first in first out: what was used early in a long entry takes the early lot', async () => {
  const build = await shop.build(owner);
  const nails = await shop.material(owner, build, 'Nails');
  await shop.signOff(owner, build, dayOf('2026-03-01', [boughtBlock([{ of: nails, amount: '10', money: '10.00' }]), boughtBlock([{ of: nails, amount: '10', money: '20.00' }])]));
  const early = [usedBlock([{ of: nails, amount: '10' }], freshId(), '2026-03-10'), costBlock([{ money: '5.00' }], '2026-03-11'), timeBlock([{ time: '2 h' }], freshId(), '2026-03-12')];
  const late = [usedBlock([{ of: nails, amount: '1' }]), costBlock([{ money: '6.00' }]), timeBlock([{ time: '3 h' }])];
  const long = await shop.signOff(owner, build, dayOf('2026-03-10', [...early, ...late], { dayTo: '2026-03-20' }));
  await shop.signOff(owner, build, dayOf('2026-03-15', [usedBlock([{ of: nails, amount: '5' }])]));
  const { id } = await shop.entry(build, long);
  const em = shop.em();
  const rows = await em.find(Movement, { entry: id }, { orderBy: { place: 'asc' } });
  expect(rows.map(({ day, value }) => [day, value])).toEqual([['2026-03-10', 1000], ['2026-03-20', 200]]);
  expect((await em.find(Cost, { entry: id }, { orderBy: { id: 'asc' } })).map(({ day }) => day)).toEqual(['2026-03-11', '2026-03-20']);
  expect((await em.find(TimeLine, { entry: id }, { orderBy: { id: 'asc' } })).map(({ day }) => day)).toEqual(['2026-03-12', '2026-03-20']);
  expect((await verifyLedger(shop.em())).differences).toEqual([]);
});

const around = { measures: 'imperial', currency: 'GBP', materials: new Map() } as const;
const blocks: readonly [string, (day: string) => TopNode][] = [
  ['Used', (day) => usedBlock([{ of: { id: 1, name: 'Nails' } }], freshId(), day)],
  ['Cost', (day) => costBlock([{ money: '1.00' }], day)],
  ['Time', (day) => timeBlock([{ time: '1 h' }], freshId(), day)],
];

describe.each(blocks)('%s', (_, block) => {
  const faultOf = (day: string, facts: Parameters<typeof dayOf>[2]) => {
    const node = block(day);
    if (isProse(node)) throw new Error('a block is no prose');
    return deriveEntry(dayOf('2026-03-10', [node], facts), around).faults[`${node.attrs.id}.day`];
  };

  test('a day outside the entry’s is a fault beside it', () => {
    expect(faultOf('2026-03-09', { dayTo: '2026-03-20' })).toMatch(/from 10 Mar 2026 to 20 Mar 2026, and 9 Mar 2026 is outside/);
    expect(faultOf('2026-03-21', { dayTo: '2026-03-20' })).toMatch(/outside/);
    expect(faultOf('2026-03-11', {})).toMatch(/on 10 Mar 2026/);
    expect(faultOf('2026-03-10', { dayTo: '2026-03-20' })).toBeUndefined();
    expect(faultOf('2026-03-20', { dayTo: '2026-03-20' })).toBeUndefined();
    expect(faultOf('2026-03-10', {})).toBeUndefined();
  });

  test('its slip says the day', () => {
    const context = { ...around, day: '2026-03-10', dayTo: '2026-03-20', stage: null, costsShown: true, figures: new Map(), workWords: null, names: new Map() };
    const { rows } = projectEntry(dayOf('2026-03-10', [block('2026-03-11')], { dayTo: '2026-03-20' }), context, new Map());
    expect(rows.flatMap(({ slips }) => slips)[0]?.slip.note).toBe('11 Mar 2026');
  });

  test('a day outside the years of work is refused at saving', () => {
    expect(entryDocument.safeParse(dayOf('2026-03-10', [block('0026-03-11')])).success).toBe(false);
  });
});
