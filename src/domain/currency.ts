// ISO 4217, list one (current codes), minor-unit exponents of table A.1 as published in
// February 2026. The codes without an exponent (metals, testing, units of account) are no
// ledger currencies and are left out. The platform's formatter follows display practice
// instead (it gives 0 for IQD, AFN, ALL, HUF and LBP) and is never asked.
const codesByExponent = {
  0: 'BIF CLP DJF GNF ISK JPY KMF KRW PYG RWF UGX UYI VND VUV XAF XOF XPF',
  2:
    'AED AFN ALL AMD AOA ARS AUD AWG AZN BAM BBD BDT BMD BND BOB BOV BRL BSD BTN BWP BYN BZD ' +
    'CAD CDF CHE CHF CHW CNY COP COU CRC CUP CVE CZK DKK DOP DZD EGP ERN ETB EUR FJD FKP GBP ' +
    'GEL GHS GIP GMD GTQ GYD HKD HNL HTG HUF IDR ILS INR IRR JMD KES KGS KHR KPW KYD KZT LAK ' +
    'LBP LKR LRD LSL MAD MDL MGA MKD MMK MNT MOP MRU MUR MVR MWK MXN MXV MYR MZN NAD NGN NIO ' +
    'NOK NPR NZD PAB PEN PGK PHP PKR PLN QAR RON RSD RUB SAR SBD SCR SDG SEK SGD SHP SLE SOS ' +
    'SRD SSP STN SVC SYP SZL THB TJS TMT TOP TRY TTD TWD TZS UAH USD USN UYU UZS VED VES WST ' +
    'XAD XCD XCG YER ZAR ZMW ZWG',
  3: 'BHD IQD JOD KWD LYD OMR TND',
  4: 'CLF UYW',
} as const;

export type CurrencyExponent = keyof typeof codesByExponent;

function listed(exponent: CurrencyExponent): [string, CurrencyExponent][] {
  return codesByExponent[exponent].split(' ').map((code) => [code, exponent]);
}

/** Decimal places of the minor unit by ISO 4217 code (JPY 0, USD 2, KWD 3, CLF 4). */
export const currencyExponents: Readonly<Record<string, CurrencyExponent>> = Object.freeze(
  Object.fromEntries([...listed(0), ...listed(2), ...listed(3), ...listed(4)]),
);

/** Whether `code` is a current ISO 4217 code, in capitals, that money can be kept in. */
export function isCurrency(code: string): boolean {
  return Object.hasOwn(currencyExponents, code);
}

/**
 * Decimal places of the currency's minor unit: 0, 2, 3 or 4.
 * @throws RangeError for a code that is not a ledger currency.
 */
export function exponentOf(code: string): number {
  const exponent = isCurrency(code) ? currencyExponents[code] : undefined;
  if (exponent === undefined) throw new RangeError(`${code} is not a currency of ISO 4217`);
  return exponent;
}

/** What money of a currency is written with where it is not its code and a space: `£1,234.50`, `EC$8.00`. */
export const currencySigns: Readonly<Record<string, string>> = {
  GBP: '£', USD: '$', EUR: '€', JPY: '¥',
  AUD: 'A$', CAD: 'CA$', HKD: 'HK$', NZD: 'NZ$', SGD: 'S$', TWD: 'NT$', XCD: 'EC$',
};
