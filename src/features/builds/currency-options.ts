import { currencyExponents } from '#domain/currency.ts';

const usual = ['GBP', 'USD', 'EUR', 'CAD', 'AUD', 'NZD', 'SEK', 'NOK', 'DKK', 'CHF', 'JPY'];

/** Every currency of the ISO 4217 list, the usual ones first. */
export const currencyOptions = [...usual, ...Object.keys(currencyExponents).filter((code) => !usual.includes(code)).toSorted()].map((code) => ({ value: code, label: code }));
