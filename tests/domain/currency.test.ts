import { expect, test } from 'vitest';
import { currencyExponents, exponentOf, isCurrency } from '#domain/currency.ts';

// ISO 4217 list one, table A.1, current codes as published in February 2026.
const withExponent = {
  0: 'BIF CLP DJF GNF ISK JPY KMF KRW PYG RWF UGX UYI VND VUV XAF XOF XPF',
  3: 'BHD IQD JOD KWD LYD OMR TND',
  4: 'CLF UYW',
};

test.each(Object.entries(withExponent))('ISO 4217 gives %s decimals to its listed codes and no others', (exponent, codes) => {
  const ours = Object.keys(currencyExponents).filter((code) => currencyExponents[code] === Number(exponent));
  expect(ours.toSorted()).toEqual(codes.split(' ').toSorted());
});

test('ISO 4217 gives two decimals to 139 codes', () => {
  const two = Object.keys(currencyExponents).filter((code) => currencyExponents[code] === 2);
  expect(two).toHaveLength(139);
  expect(two).toEqual(expect.arrayContaining(['USD', 'EUR', 'GBP', 'AFN', 'ALL', 'HUF', 'LBP']));
});

test('codes without an exponent (ISO 4217: N.A.) are no ledger currencies', () => {
  for (const code of 'XAG XAU XBA XBB XBC XBD XDR XPD XPT XSU XTS XUA XXX'.split(' ')) expect(isCurrency(code)).toBe(false);
  for (const code of ['gbp', '', 'toString', 'HRK', 'BGN']) expect(isCurrency(code)).toBe(false);
  expect(() => exponentOf('XAU')).toThrow(RangeError);
  expect(() => exponentOf('constructor')).toThrow(RangeError);
});

test('the five currencies whose exponent the platform has otherwise keep that of ISO 4217', () => {
  // Measured on Node 20.20.2 (ICU 78.2, CLDR 48): the formatter gives 0 for all five.
  const published = { IQD: 3, AFN: 2, ALL: 2, HUF: 2, LBP: 2 };
  for (const [code, exponent] of Object.entries(published)) expect(exponentOf(code)).toBe(exponent);
});
