import { expect, test } from 'vitest';
import { blankBought, blankBoughtLine, readBought } from '#src/blocks/bought/bought.ts';

// Such a rate threw out of the receipt's sums: signing off answered "something went wrong", and a draft that held it took every desk of its build down.
test.each([['JPY', 'KWD', '1'], ['JPY', 'KWD', '99999999999999999999'], ['EUR', 'GBP', '99999999999999999999']])('%s into %s at %s is refused beside the rate', (currency, into, rate) => {
  const lines = Array.from({ length: 200 }, (_, at) => ({ ...blankBoughtLine(`line-${at}`), money: '9999999999' }));
  const context = { measures: 'us' as const, currency: into, day: '2026-01-01', dayTo: null, stage: null, materials: new Map<number, never>() };
  const { faults, door } = readBought({ ...blankBought(), currency, rate, lines, paperTotal: '1999999999800' }, context);
  expect(faults.filter(({ path }) => path === 'rate')).toEqual([{ path: 'rate', problem: `That comes to more ${into} than a receipt can hold: look at the rate again.` }]);
  expect(door.total).toBe(0);
});
