import { readMoney } from '#domain/money.ts';

/** The sum of what can be read of typed amounts, minor units; what cannot be read says so beside its field. */
export function moneySum(texts: readonly string[], currency: string): number {
  return texts.reduce((sum, text) => {
    const reading = readMoney(text, currency);
    return reading.ok ? sum + reading.value.minor : sum;
  }, 0);
}
