import { drawFrom, leftIn } from './stock.ts';
import type { Lot, Stock } from './stock.ts';

/** First in, first out (IAS 2, paragraph 25): draws eat the oldest lot first. */
export function fifoStock(): Stock {
  const lots: Lot[] = [];
  const byOrigin = new Map<string, Lot>();
  let oldest = 0;
  let amount = 0n;
  let value = 0n;

  function eat(lot: Lot, wanted: bigint): { taken: bigint; worth: bigint } {
    const left = leftIn(lot);
    const taken = wanted < left ? wanted : left;
    return { taken, worth: drawFrom(lot, taken) };
  }

  function takeFromOldest(wanted: bigint): bigint {
    let owed = wanted;
    let worth = 0n;
    for (let lot = lots[oldest]; owed > 0n && lot; lot = lots[oldest]) {
      const draw = eat(lot, owed);
      owed -= draw.taken;
      worth += draw.worth;
      if (leftIn(lot) === 0n) oldest += 1;
    }
    return worth;
  }

  return {
    amount: () => amount,
    value: () => value,
    put(lot) {
      lots.push(lot);
      byOrigin.set(lot.origin, lot);
      amount += leftIn(lot);
      value += lot.cost - lot.given;
    },
    take(wanted, from) {
      const named = from === undefined ? undefined : byOrigin.get(from);
      const first = named ? eat(named, wanted) : { taken: 0n, worth: 0n };
      const worth = first.worth + takeFromOldest(wanted - first.taken);
      amount -= wanted;
      value -= worth;
      return worth;
    },
  };
}
