import fc from 'fast-check';
import Fraction from 'fraction.js';
import { expect, test } from 'vitest';
import { whatOneTakes } from '#domain/one-takes.ts';
import type { UseForOne } from '#domain/one-takes.ts';

function use(material: string, amount: number, value: number, said: Partial<UseForOne> = {}): UseForOne {
  return { material, kind: 'used', counts: 'each', amount: new Fraction(amount), value, ...said };
}

const work = new Fraction(4);

test('only for-each lines count; the wasted share stands apart', () => {
  const one = whatOneTakes({
    work,
    uses: [
      use('resin', 1000, 800),
      use('resin', 200, 160, { kind: 'wasted' }),
      use('resin', 400, 320),
      use('tape', 1, 500, { counts: 'whole' }),
      use('gloves', 1, 900, { counts: 'opened' }),
    ],
    times: [{ minutes: 90, kind: 'each' }, { minutes: 30, kind: 'setup' }, { minutes: 600, kind: 'waiting' }],
  });
  expect(one).toEqual({
    materials: [{ material: 'resin', amount: new Fraction(350), money: 280, wastedShare: new Fraction(1, 7) }],
    money: 280,
    minutes: 22,
    wastedShare: new Fraction(1, 7),
  });
});

test('the sum is rounded once, half to even, not material by material', () => {
  const one = whatOneTakes({ work, uses: [use('a', 1, 2), use('b', 1, 2), use('c', 1, 2)], times: [] });
  expect(one?.materials.map(({ money }) => money)).toEqual([0, 0, 0]);
  expect(one?.money).toBe(2);
});

test('without work, or with nothing used, there is nothing to divide', () => {
  expect(whatOneTakes({ work: new Fraction(0), uses: [use('a', 1, 2)], times: [] })).toBeNull();
  expect(whatOneTakes({ work, uses: [use('a', 1, 5, { kind: 'wasted' })], times: [] })).toMatchObject({
    money: 0, wastedShare: null, materials: [{ amount: new Fraction(0), wastedShare: null }],
  });
});

// OpenStax, Principles of Accounting, volume 2.
test('unit costs as published', () => {
  const each = (total: number, units: number) => whatOneTakes({ work: new Fraction(units), uses: [use('x', 1, total)], times: [] })?.money;
  // Section 2.2: 1,560,000 of fixed cost over 500, 625 and 700 boats is 3,120, 2,496 and 2,229 (2,228.57) each.
  expect([500, 625, 700].map((boats) => each(156_000_000, boats))).toEqual([312_000, 249_600, 222_857]);
  // Section 4.4: rent of 1,000 over 500 units is 2.00, over 2,000 units 0.50.
  expect([each(100_000, 500), each(100_000, 2000)]).toEqual([200, 50]);
});

// OpenStax, volume 2, section 4.5: the job cost sheet of a sign. Vinyl 1 at 300, black ink 2 at 50,
// red and gold ink 1 at 60, grommets 12 at 10, wood 40 at 1.50: materials 700.
test('the materials of the published job cost sheet come to 700', () => {
  const sheet = [['vinyl', 1, 30000], ['black ink', 2, 5000], ['red ink', 1, 6000], ['gold ink', 1, 6000], ['grommets', 12, 1000], ['wood', 40, 150]] as const;
  const one = whatOneTakes({ work: new Fraction(1), uses: sheet.map(([name, amount, each]) => use(name, amount, amount * each)), times: [] });
  expect(one?.money).toBe(70_000);
  expect(one?.materials).toHaveLength(6);
});

test('what one takes, times the work done, is what was used', () => {
  const anyUse = fc.record({ material: fc.constantFrom('a', 'b', 'c'), n: fc.integer({ min: 1, max: 500 }), d: fc.integer({ min: 1, max: 16 }), value: fc.nat(10_000) });
  fc.assert(
    fc.property(fc.array(anyUse), fc.integer({ min: 1, max: 90 }), fc.integer({ min: 1, max: 9 }), (rows, n, d) => {
      const done = new Fraction(n, d);
      const uses = rows.map(({ material, value, ...row }) => ({ ...use(material, 1, value), amount: new Fraction(row.n, row.d) }));
      const one = whatOneTakes({ work: done, uses, times: [] });
      for (const { material, amount } of one?.materials ?? []) {
        const sum = uses.filter((row) => row.material === material).reduce((a, row) => a.add(row.amount), new Fraction(0));
        expect(amount.mul(done).equals(sum)).toBe(true);
      }
      const money = uses.reduce((sum, { value }) => sum + value, 0);
      expect(new Fraction(one?.money ?? -1).sub(new Fraction(money).div(done)).abs().lte(new Fraction(1, 2))).toBe(true);
    }),
  );
});
