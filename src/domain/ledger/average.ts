import { drawFrom, leftIn, newLot } from './stock.ts';
import type { Lot, Stock } from './stock.ts';

/**
 * Moving average (IAS 2, paragraphs 25 and 27, struck at each receipt): what is there and what
 * comes in make one pool, which then gives up its value as one lot until the next inflow.
 */
export function averageStock(): Stock {
  let pool: Lot = newLot('', 0n, 0n);

  return {
    amount: () => leftIn(pool),
    value: () => pool.cost - pool.given,
    put(lot) {
      const value = pool.cost - pool.given + lot.cost - lot.given;
      pool = newLot('', value, leftIn(pool) + leftIn(lot));
    },
    take(wanted) {
      return wanted === 0n ? 0n : drawFrom(pool, wanted);
    },
  };
}
