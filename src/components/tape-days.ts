const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];
const dayMs = 86_400_000;

/** Days since 1 January 1970 of a plain date, YYYY-MM-DD. */
export function dayNumber(day: string): number {
  return Math.round(Date.parse(`${day}T00:00:00Z`) / dayMs);
}

export function dateParts(number: number): { year: number; month: number; date: number } {
  const at = new Date(number * dayMs);
  return { year: at.getUTCFullYear(), month: at.getUTCMonth(), date: at.getUTCDate() };
}

export function firstOfMonth(year: number, month: number): number {
  return Math.round(Date.UTC(year, month, 1) / dayMs);
}

/** 1 January 1970 was a Thursday, three days after a Monday. */
export function mondayOf(number: number): number {
  return number - ((((number + 3) % 7) + 7) % 7);
}

export function monthName(month: number): string {
  return months[month] ?? '';
}

/** 14 Nov 2026. */
export function writtenDay(number: number): string {
  const { year, month, date } = dateParts(number);
  return `${date} ${monthName(month)} ${year}`;
}

/** 14 Nov 2026, or 14 to 16 Nov 2026, or 30 Nov to 2 Dec 2026. */
export function writtenSpan(first: number, last: number): string {
  if (first === last) return writtenDay(first);
  const a = dateParts(first);
  const b = dateParts(last);
  const start = a.year !== b.year ? writtenDay(first) : a.month !== b.month ? `${a.date} ${monthName(a.month)}` : `${a.date}`;
  return `${start} to ${writtenDay(last)}`;
}
