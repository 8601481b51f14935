import { currencySigns, exponentOf } from './currency.ts';

const months = [
  'January', 'February', 'March', 'April', 'May', 'June',
  'July', 'August', 'September', 'October', 'November', 'December',
] as const;

const noBreakSpace = '\u00a0';
const minusSign = '\u2212';

function whole(value: number, what: string): number {
  if (!Number.isSafeInteger(value)) throw new RangeError(`${what} must be a whole number, not ${value}`);
  return value;
}

/** Digits with commas between thousands: `1,234,567`. */
export function grouped(digits: string): string {
  return digits.replace(/\B(?=(\d{3})+$)/g, ',');
}

/**
 * Money as readers see it: `£1,234.50`, `¥1,234`, `NZ$8.00`, `KWD 1.234`, `−£1.20`.
 * The same on server and browser: digits, never the platform's formatter.
 * @param minor integer minor units
 * @throws RangeError for an unknown currency or an amount that is not a safe integer.
 */
export function formatMoney(minor: number, currency: string): string {
  const exponent = exponentOf(currency);
  const digits = String(Math.abs(whole(minor, 'Money'))).padStart(exponent + 1, '0');
  const units = grouped(digits.slice(0, digits.length - exponent));
  const figure = exponent === 0 ? units : `${units}.${digits.slice(-exponent)}`;
  const sign = Object.hasOwn(currencySigns, currency) ? currencySigns[currency] : undefined;
  return `${minor < 0 ? minusSign : ''}${sign ?? currency + noBreakSpace}${figure}`;
}

/** Money that may have some of it still to come: `£3.00, some not bought yet`. */
export function formatMoneySoFar(minor: number, currency: string, unsettled = false): string {
  return unsettled ? `${formatMoney(minor, currency)}, some not bought yet` : formatMoney(minor, currency);
}

function hoursAndMinutes(minutes: number): { sign: string; hours: number; rest: number } {
  const total = Math.abs(whole(minutes, 'Time'));
  return { sign: minutes < 0 ? minusSign : '', hours: Math.floor(total / 60), rest: total % 60 };
}

/** Time in full: `7 h 30 min`, `14 h`, `40 min`, `0 min`. */
export function formatMinutes(minutes: number): string {
  const { sign, hours, rest } = hoursAndMinutes(minutes);
  if (hours === 0) return `${sign}${rest} min`;
  return rest === 0 ? `${sign}${hours} h` : `${sign}${hours} h ${rest} min`;
}

/** Time where there is little room: `7 h 30`, `7 h 05`, `14 h`, `40 min`. */
export function formatHours(minutes: number): string {
  const { sign, hours, rest } = hoursAndMinutes(minutes);
  if (hours === 0) return `${sign}${rest} min`;
  return rest === 0 ? `${sign}${hours} h` : `${sign}${hours} h ${String(rest).padStart(2, '0')}`;
}

function readDay(day: string): { year: number; month: (typeof months)[number]; date: number } {
  const parts = /^(\d{4})-(\d{2})-(\d{2})$/.exec(day);
  const month = months[Number(parts?.[2]) - 1];
  const date = Number(parts?.[3]);
  if (!parts || !month || date < 1 || date > 31) throw new RangeError(`${day} is not a day like 2026-11-14`);
  return { year: Number(parts[1]), month, date };
}

/** `2026-11-14` as `14 Nov 2026`. @throws RangeError for anything but a day. */
export function formatDay(day: string): string {
  const { year, month, date } = readDay(day);
  return `${date} ${month.slice(0, 3)} ${year}`;
}

/** `2026-11-14` as `14 Nov`. @throws RangeError for anything but a day. */
export function formatDayShort(day: string): string {
  const { month, date } = readDay(day);
  return `${date} ${month.slice(0, 3)}`;
}

/** `2026-11-14` as `14 November 2026`. @throws RangeError for anything but a day. */
export function formatDayLong(day: string): string {
  const { year, month, date } = readDay(day);
  return `${date} ${month} ${year}`;
}

/** A count with its word: `1 photo`, `6 photos`, `1,200 photos`. */
export function plural(count: number, one: string, many: string): string {
  const figure = grouped(String(Math.abs(whole(count, 'A count'))));
  return `${count < 0 ? minusSign : ''}${figure} ${count === 1 ? one : many}`;
}
