import fc from 'fast-check';
import Fraction from 'fraction.js';
import { describe, expect, test } from 'vitest';
import { compareMovements } from '#domain/ledger/movement.ts';
import type { Movement } from '#domain/ledger/movement.ts';
import { priceMaterial, priceShelf } from '#domain/ledger/price.ts';
import type { MaterialLedger, PricingMethod, ShelfFigures } from '#domain/ledger/price.ts';
import { sumCheck } from '#domain/ledger/sum-check.ts';
import { anyHistory, anyMethod, longHistory } from './random-history.ts';

const nought = new Fraction(0);
const out = ['used', 'wasted', 'returned', 'sold'] as const;

function sumOf(amounts: readonly Fraction[]): Fraction {
  return amounts.reduce((a, b) => a.add(b), nought);
}

function totals(shelf: ReadonlyMap<string, MaterialLedger>): ShelfFigures {
  const sums = { in: 0, used: 0, wasted: 0, returned: 0, sold: 0, left: 0 };
  for (const { figures } of shelf.values()) {
    for (const figure of ['in', ...out, 'left'] as const) sums[figure] += figures[figure];
  }
  return sums;
}

/** What a reader could compare: every figure of every movement, exactly, as text. */
function digits(ledger: MaterialLedger | undefined): string {
  return JSON.stringify(ledger, (_, value: unknown) => (value instanceof Fraction ? value.toFraction() : value));
}

function digitsOf(movements: readonly Movement[], method: PricingMethod): string[] {
  return [...priceShelf(movements, method)].toSorted(([a], [b]) => (a < b ? -1 : 1)).map(([, ledger]) => digits(ledger));
}

describe.each([
  ['up to 60 movements', anyHistory, 300],
  ['200 movements', longHistory, 25],
])('over random histories of %s', (_, histories, numRuns) => {
  const over = (check: (movements: Movement[], method: PricingMethod) => void) => () =>
    fc.assert(fc.property(histories, anyMethod, check), { numRuns });

  test('in = used + wasted + returned + sold + left, for each material and in sum', over((movements, method) => {
    const shelf = priceShelf(movements, method);
    for (const { figures } of [...shelf.values(), { figures: totals(shelf) }]) {
      expect(figures.used + figures.wasted + figures.returned + figures.sold + figures.left).toBe(figures.in);
    }
    const paid = movements.reduce((sum, { kind, cost }) => (kind === 'bought' ? sum + (cost ?? 0) : sum), 0);
    const { in: spent, ...rests } = totals(shelf);
    expect(spent).toBe(paid);
    expect(sumCheck({ spent, movedIn: 0, movedOut: 0, onOrder: 0, notSorted: 0, ...rests }).holds).toBe(true);
  }));

  test('in amounts: in, with what was found, and not bought yet = out + left', over((movements, method) => {
    for (const ledger of priceShelf(movements, method).values()) {
      const refused = new Set(ledger.refusals.map(({ key }) => key));
      const own = movements.filter(({ material, key }) => material === ledger.material && !refused.has(key));
      const of = (...kinds: Movement['kind'][]) => sumOf(own.filter(({ kind }) => kinds.includes(kind)).map(({ amount }) => amount));
      const found = ledger.movements.map((row) => row.found?.amount ?? nought);
      const surplus = sumOf(found.filter((amount) => amount.gt(0)));
      const shortage = sumOf(found.filter((amount) => amount.lt(0))).neg();
      const came = of('bought', 'given').add(surplus).add(ledger.notBoughtYet);
      expect(came.equals(of(...out).add(shortage).add(ledger.left))).toBe(true);
      expect(sumOf(ledger.movements.map(({ short }) => short)).equals(ledger.notBoughtYet)).toBe(true);
    }
  }));

  test('the figures are the sums of the movements they count', over((movements, method) => {
    for (const ledger of priceShelf(movements, method).values()) {
      const shortageOf = new Map(movements.map(({ key, shortage }) => [key, shortage ?? 'used']));
      for (const figure of out) {
        const own = ledger.movements.filter(({ key, kind }) => (kind === 'counted' ? shortageOf.get(key) : kind) === figure);
        expect(own.reduce((sum, { value }) => sum + value, 0)).toBe(ledger.figures[figure]);
      }
    }
  }));

  test('nothing is below nought, and an empty shelf is worth nothing', over((movements, method) => {
    for (const ledger of priceShelf(movements, method).values()) {
      for (const { value, short, left } of ledger.movements) {
        expect(value).toBeGreaterThanOrEqual(0);
        expect(short.gte(0) && left.gte(0)).toBe(true);
      }
      expect(ledger.figures.left).toBeGreaterThanOrEqual(0);
      if (ledger.left.equals(0)) expect(ledger.figures.left).toBe(0);
    }
  }));

  test('amounts are the same by either method', () => {
    fc.assert(
      fc.property(histories, (movements) => {
        const amounts = (method: PricingMethod) =>
          [...priceShelf(movements, method).values()].flatMap((ledger) =>
            ledger.movements.map(({ key, short, left }) => `${key} ${short.toFraction()} ${left.toFraction()}`));
        expect(amounts('fifo')).toEqual(amounts('average'));
      }),
      { numRuns },
    );
  });

  test('typing the same movements in another order changes nothing', () => {
    fc.assert(
      fc.property(histories, anyMethod, fc.infiniteStream(fc.nat()), (movements, method, picks) => {
        const order = new Map(movements.map(({ key }) => [key, picks.next().value ?? 0]));
        const retyped = movements.toSorted((a, b) => (order.get(a.key) ?? 0) - (order.get(b.key) ?? 0));
        expect(digitsOf(retyped, method)).toEqual(digitsOf(movements, method));
      }),
      { numRuns },
    );
  });

  test('no figure changes when a material it has nothing to do with does', over((movements, method) => {
    const before = priceShelf(movements, method);
    const others = movements.filter(({ material }) => material !== 'A');
    const after = priceShelf([...others, ...others.map((one) => ({ ...one, key: `again ${one.key}`, material: 'A', cost: 1 }))], method);
    for (const material of ['B', 'C']) expect(digits(after.get(material))).toBe(digits(before.get(material)));
  }));

  test('splitting a used or wasted line into two neighbours changes no total', () => {
    fc.assert(
      fc.property(histories, anyMethod, fc.nat(), fc.integer({ min: 1, max: 6 }), (movements, method, pick, part) => {
        const lines = movements.filter(({ kind }) => kind === 'used' || kind === 'wasted');
        const line = lines[pick % Math.max(1, lines.length)];
        fc.pre(line !== undefined);
        const first = { ...line, amount: line.amount.mul(part).div(7) };
        const second = { ...line, key: `${line.key} second`, place: line.place + 0.5, amount: line.amount.sub(first.amount) };
        const split = movements.flatMap((one) => (one === line ? [first, second] : [one]));
        const [before, after] = [priceMaterial(line.material, movements, method), priceMaterial(line.material, split, method)];
        expect(after.figures).toEqual(before.figures);
        expect([after.left, after.notBoughtYet]).toEqual([before.left, before.notBoughtYet]);
        const row = (ledger: MaterialLedger, key: string) => ledger.movements.find((one) => one.key === key);
        const both = (row(after, first.key)?.value ?? NaN) + (row(after, second.key)?.value ?? NaN);
        expect(both).toBe(row(before, line.key)?.value);
      }),
      { numRuns },
    );
  });

  test('an edit of the past changes nothing before it but what was still short', () => {
    fc.assert(
      fc.property(histories, anyMethod, fc.nat(), fc.integer({ min: 1, max: 90 }), (movements, method, pick, halves) => {
        const line = movements[pick % movements.length];
        fc.pre(line !== undefined);
        const edited = movements.map((one) => (one === line ? { ...one, amount: new Fraction(halves, 2) } : one));
        const earlier = movements.filter((one) => one.material === line.material && compareMovements(one, line) < 0);
        const then = priceMaterial(line.material, earlier, method);
        const now = new Map(priceMaterial(line.material, edited, method).movements.map((row) => [row.key, row]));
        for (const row of then.movements) {
          const same = now.get(row.key);
          expect(same?.left.equals(row.left)).toBe(true);
          if (row.short.equals(0)) expect(same?.value).toBe(row.value);
          else expect(same?.value).toBeGreaterThanOrEqual(row.value);
        }
        const others = (list: readonly Movement[]) => digitsOf(list.filter(({ material }) => material !== line.material), method);
        expect(others(edited)).toEqual(others(movements));
      }),
      { numRuns },
    );
  });
});

test('where no two of one day go one way, the numbers of their sources change nothing', () => {
  const oneEachWay = anyHistory.map((movements) => {
    const taken = new Set<string>();
    return movements.filter(({ material, day, kind }) => {
      const way = `${material} ${day} ${kind === 'bought' || kind === 'given' ? 'in' : kind === 'counted' ? 'count' : 'out'}`;
      return taken.has(way) ? false : taken.add(way) !== undefined;
    });
  });
  fc.assert(
    fc.property(oneEachWay, anyMethod, (movements, method) => {
      const renumbered = movements.map((one, at) => ({ ...one, sequence: 1000 - at, place: -one.place }));
      expect(digitsOf(renumbered, method)).toEqual(digitsOf(movements, method));
    }),
  );
});
