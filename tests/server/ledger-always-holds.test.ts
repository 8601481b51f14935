import fc from 'fast-check';
import { afterAll, beforeAll, expect, test } from 'vitest';
import type { MaterialView } from '#contracts/materials.ts';
import { verifyLedger } from '#server/features/entries/ledger-check.service.ts';
import type { Caller } from '#server/http/context.ts';
import { boughtBlock, costBlock, dayOf, usedBlock, Workshop, type BuyInput, type UseInput } from '#tests/support/workshop.ts';

let shop: Workshop;
beforeAll(async () => {
  shop = await Workshop.open();
});
afterAll(() => shop.close());

const runs = 12;
const materialCount = 3;
const which = fc.nat({ max: materialCount - 1 });
const place = fc.constantFrom('shelf' as const, 'shed' as const);
const useLine = fc.record({ at: which, amount: fc.integer({ min: 1, max: 9 }), fate: fc.constantFrom('used' as const, 'wasted' as const), from: place });
const buyLine = fc.record({
  at: which, amount: fc.integer({ min: 1, max: 12 }), pence: fc.nat({ max: 2000 }), onOrder: fc.boolean(),
  goes: fc.constantFrom('shelf' as const, 'shed' as const, 'straight' as const, 'not-mine' as const),
});
const day = fc.record({
  on: fc.integer({ min: 1, max: 9 }), delivery: fc.nat({ max: 300 }),
  uses: fc.array(useLine, { maxLength: 4 }), buys: fc.array(buyLine, { maxLength: 3 }), cost: fc.nat({ max: 900 }),
});
type Day = typeof day extends fc.Arbitrary<infer D> ? D : never;
const act = fc.oneof(
  { weight: 5, arbitrary: fc.record({ act: fc.constant('sign off' as const), day }) },
  { weight: 3, arbitrary: fc.record({ act: fc.constant('edit' as const), at: fc.nat({ max: 9 }), day }) },
  { weight: 2, arbitrary: fc.record({ act: fc.constant('take back' as const), at: fc.nat({ max: 9 }) }) },
  { weight: 1, arbitrary: fc.record({ act: fc.constant('keep a draft' as const), day }) },
);

const pounds = (pence: number) => (pence / 100).toFixed(2);

function documentOf(input: Day, materials: readonly MaterialView[]) {
  const of = (at: number) => materials[at] ?? { id: 0, name: '' };
  const uses: UseInput[] = input.uses.map(({ at, amount, ...line }) => ({ of: of(at), amount: `${amount}`, ...line }));
  const buys: BuyInput[] = input.buys.map(({ at, amount, pence, ...line }) => ({ of: of(at), amount: `${amount}`, money: pounds(pence), ...line }));
  return dayOf(`2026-05-0${input.on}`, [
    ...(uses.length > 0 ? [usedBlock(uses)] : []), ...(buys.length > 0 ? [boughtBlock(buys, { delivery: pounds(input.delivery) })] : []), costBlock([{ money: pounds(input.cost) }]),
  ]);
}

async function play(owner: Caller, build: string, materials: readonly MaterialView[], entries: number[], step: typeof act extends fc.Arbitrary<infer A> ? A : never) {
  if (step.act === 'sign off') return void entries.push(await shop.signOff(owner, build, documentOf(step.day, materials)));
  if (step.act === 'keep a draft') {
    const number = await shop.start(owner, build, '2026-05-01');
    return void await shop.save(owner, build, number, documentOf(step.day, materials));
  }
  const number = entries[step.at % Math.max(entries.length, 1)];
  if (number === undefined) return;
  if (step.act === 'edit') return void await shop.signOff(owner, build, documentOf(step.day, materials), number);
  if ((await shop.entry(build, number)).published) await shop.takeBack(owner, build, number);
}

test.each(['fifo', 'average'] as const)('whatever is signed off, edited and taken back, every stored figure is what a replay gives (%s)', async (method) => {
  let round = 0;
  await fc.assert(fc.asyncProperty(fc.array(act, { minLength: 2, maxLength: 8 }), async (steps) => {
    round += 1;
    const owner = await shop.person(`${method}-restorer-${round}`);
    const build = await shop.build(owner, { title: `${method} ${round}`, method });
    const materials = [];
    for (let at = 0; at < materialCount; at += 1) materials.push(await shop.material(owner, build, `Material ${at}`));
    const entries: number[] = [];
    for (const step of steps) {
      await play(owner, build, materials, entries, step);
      const report = await verifyLedger(shop.em(), { owner: owner.id });
      expect(report.differences).toEqual([]);
    }
  }), { numRuns: runs });
}, 120_000);

test('the check finds a figure that was changed behind its back, a row that went and one that stands in no document', async () => {
  const owner = await shop.person('careful');
  const build = await shop.build(owner, { title: 'Careful' });
  const oak = await shop.material(owner, build, 'Oak');
  const buy = await shop.signOff(owner, build, dayOf('2026-05-01', [boughtBlock([{ of: oak, amount: '3', money: '10.00' }])]));
  await shop.signOff(owner, build, dayOf('2026-05-02', [usedBlock([{ of: oak, amount: '1' }]), costBlock([{ money: '4.00' }])]));
  const differencesAfter = async (sql: string) => {
    const em = shop.em();
    await em.begin();
    await em.execute(sql);
    const { differences } = await verifyLedger(em, { owner: owner.id });
    await em.rollback();
    return differences.join('\n');
  };
  expect(await differencesAfter('select 1')).toBe('');
  expect(await differencesAfter(`update movement set value = value + 1 where material_id = ${oak.id} and kind = 'used'`)).toMatch(/value 334 is stored, the replay gives 333/);
  expect(await differencesAfter(`update movement set short = '1/1' where material_id = ${oak.id} and kind = 'used'`)).toMatch(/short 1\/1 is stored, the replay gives 0\/1/);
  expect(await differencesAfter(`delete from movement where material_id = ${oak.id} and kind = 'used'`)).toMatch(/movement .* is missing/);
  expect(await differencesAfter(`update entry set published = null where number = ${buy}`)).toMatch(/stands in no document/);
  expect(await differencesAfter(`update cost set money = 401 where entry_id in (select id from entry)`)).toMatch(/money 401 is stored, its document says 400/);
  expect(await differencesAfter(`update receipt_line set door = 999 where material_id = ${oak.id}`)).toMatch(/the sum does not hold, by -1/);
  expect(await differencesAfter('select 1')).toBe('');
});
