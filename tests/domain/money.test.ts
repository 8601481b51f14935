import { expect, test } from 'vitest';
import { currencyExponents } from '#domain/currency.ts';
import { formatMoney } from '#domain/format.ts';
import { addMoney, money, readMoney, subtractMoney } from '#domain/money.ts';
import type { Money } from '#domain/money.ts';

test('amounts of one currency add and subtract in minor units', () => {
  expect(addMoney(money(1999, 'GBP'), money(1, 'GBP'))).toEqual({ currency: 'GBP', minor: 2000 });
  expect(subtractMoney(money(100, 'JPY'), money(250, 'JPY')).minor).toBe(-150);
});

test('two currencies are never added, even where their types are not known', () => {
  const pounds: Money = money(100, 'GBP');
  const dollars: Money = money(100, 'USD');
  expect(() => addMoney(pounds, dollars)).toThrow(/GBP and USD/);
  expect(() => subtractMoney(pounds, dollars)).toThrow(RangeError);
});

test('money that cannot be is refused', () => {
  expect(() => money(0.5, 'GBP')).toThrow(RangeError);
  expect(() => money(1, 'XTS')).toThrow(RangeError);
  expect(() => addMoney(money(Number.MAX_SAFE_INTEGER, 'GBP'), money(1, 'GBP'))).toThrow(RangeError);
});

test.each([
  ['12.50', 'GBP', 1250],
  ['£12.50', 'GBP', 1250],
  [' £ 12.50 ', 'GBP', 1250],
  ['1,234.50', 'GBP', 123450],
  ['12.50 gbp', 'GBP', 1250],
  ['12.5', 'GBP', 1250],
  ['.50', 'GBP', 50],
  ['19.99', 'USD', 1999],
  ['4.35', 'USD', 435],
  ['$1', 'NZD', 100],
  ['NZ$1', 'NZD', 100],
  ['1250', 'JPY', 1250],
  ['1.234', 'KWD', 1234],
  ['0.1234', 'CLF', 1234],
  ['0', 'GBP', 0],
])('%s in %s is read as %i', (text, currency, minor) => {
  expect(readMoney(text, currency)).toEqual({ ok: true, value: { currency, minor } });
});

test.each([
  ['', 'GBP', 'Write an amount, like 12.50'],
  ['   ', 'GBP', 'Write an amount, like 12.50'],
  ['1,5', 'GBP', 'Write 1.5 with a point'],
  ['12,50', 'EUR', 'Write 12.50 with a point'],
  ['1.234,50', 'EUR', 'Commas only stand between thousands, like 1,234.50'],
  ['-3', 'GBP', 'An amount is never below nought: leave the minus out'],
  ['−3.00', 'GBP', 'An amount is never below nought: leave the minus out'],
  ['12.505', 'GBP', 'GBP has 2 decimals at most: write it like 12.50'],
  ['10.5', 'JPY', 'JPY has no decimals: write a whole number, like 1250'],
  ['$3', 'GBP', 'This amount is in GBP: write the figure alone, or with GBP'],
  ['3 EUR', 'GBP', 'This amount is in GBP: write the figure alone, or with GBP'],
  ['twelve', 'GBP', 'Write the amount as a figure, like 12.50'],
  ['1e3', 'GBP', 'Write the amount as a figure, like 12.50'],
  ['£', 'GBP', 'Write the amount as a figure, like 12.50'],
  ['99999999999999', 'GBP', 'That is more money than one line can hold'],
])('%s in %s is answered beside its field', (text, currency, problem) => {
  expect(readMoney(text, currency)).toEqual({ ok: false, problem: `${problem}.` });
});

test.each(Object.keys(currencyExponents))('money in %s reads back as it is shown', (code) => {
  for (const minor of [0, 7, 123_456, 1_234_567]) expect(readMoney(formatMoney(minor, code), code)).toEqual({ ok: true, value: { currency: code, minor } });
});

test('the dollar of the Eastern Caribbean is read with its own sign, with a bare one, and with no other', () => {
  expect(readMoney('EC$8.00', 'XCD')).toMatchObject({ ok: true, value: { minor: 800 } });
  expect(readMoney('$8.00', 'XCD')).toMatchObject({ ok: true, value: { minor: 800 } });
  expect(readMoney('EC$8.00', 'USD').ok).toBe(false);
});
