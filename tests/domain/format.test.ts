import { expect, test } from 'vitest';
import { formatDay, formatDayLong, formatDayShort, formatHours, formatMinutes, formatMoney, plural } from '#domain/format.ts';

test.each([
  // 1234 minor units by ISO 4217 exponent.
  [1234, 'JPY', '¥1,234'],
  [1234, 'USD', '$12.34'],
  [1234, 'KWD', 'KWD\u00a01.234'],
  [1234, 'CLF', 'CLF\u00a00.1234'],
  [123450, 'GBP', '£1,234.50'],
  [123456789, 'EUR', '€1,234,567.89'],
  [800, 'NZD', 'NZ$8.00'],
  [5, 'GBP', '£0.05'],
  [0, 'GBP', '£0.00'],
  [0, 'JPY', '¥0'],
  [-120, 'GBP', '−£1.20'],
  [-1, 'KWD', '−KWD\u00a00.001'],
])('%i minor units of %s read %s', (minor, currency, words) => {
  expect(formatMoney(minor, currency)).toBe(words);
});

test('money that is no whole number of minor units, or of no currency, is not shown', () => {
  expect(() => formatMoney(1.5, 'GBP')).toThrow(RangeError);
  expect(() => formatMoney(Number.NaN, 'GBP')).toThrow(RangeError);
  expect(() => formatMoney(1, 'XAU')).toThrow(RangeError);
});

test.each([
  [450, '7 h 30 min', '7 h 30'],
  [425, '7 h 5 min', '7 h 05'],
  [840, '14 h', '14 h'],
  [40, '40 min', '40 min'],
  [0, '0 min', '0 min'],
  [-90, '−1 h 30 min', '−1 h 30'],
])('%i minutes read %s', (minutes, full, short) => {
  expect(formatMinutes(minutes)).toBe(full);
  expect(formatHours(minutes)).toBe(short);
});

test('days are read without a clock or a time zone', () => {
  expect(formatDay('2026-11-14')).toBe('14 Nov 2026');
  expect(formatDayShort('2026-03-05')).toBe('5 Mar');
  expect(formatDayLong('2026-05-31')).toBe('31 May 2026');
  expect(() => formatDay('2026-13-01')).toThrow(RangeError);
  expect(() => formatDay('2026-1-1')).toThrow(RangeError);
  expect(() => formatDay('2026-01-32')).toThrow(RangeError);
});

test('a count takes the word of its number', () => {
  expect([plural(1, 'photo', 'photos'), plural(6, 'photo', 'photos'), plural(0, 'photo', 'photos')]).toEqual([
    '1 photo', '6 photos', '0 photos',
  ]);
  expect(plural(1200, 'build', 'builds')).toBe('1,200 builds');
});
