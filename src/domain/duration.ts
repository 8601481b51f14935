import Fraction from 'fraction.js';
import { decimalCommaProblem, numberAtStart, plainText } from './numbers-written.ts';
import { read, unread } from './reading.ts';
import type { Reading } from './reading.ts';
import { roundHalfEven } from './rounding.ts';

const example = 'Say hours or minutes: 7 h 30 or 45 min';
// More than a year of days and nights in one line is a slip of the finger.
const mostMinutes = 10_000 * 60;

function byClock(text: string): Fraction | null {
  const clock = /^(\d{1,4}):([0-5]\d)(?: ?(?:h|hrs?|hours?))?$/.exec(text);
  return clock ? new Fraction(Number(clock[1]) * 60 + Number(clock[2])) : null;
}

const hours = /^ ?(?:of )?(?:an? )?(?:h|hrs?|hours?)(?![a-z])(?: and| ?,)? ?/;
const minutes = /^ ?(?:of )?(?:an? )?(?:m|mins?|minutes?)$/;

function minutesAfter(text: string): Fraction | null {
  const part = numberAtStart(text);
  if (!part) return null;
  const bare = part.rest === '' && /^[0-5]?\d$/.test(text);
  return bare || minutes.test(part.rest) ? part.value : null;
}

// "an hour and a half": the fraction after the word is of an hour.
const shareOfHour: Readonly<Record<string, Fraction>> = {
  'a half': new Fraction(30), half: new Fraction(30), 'a quarter': new Fraction(15), 'three quarters': new Fraction(45),
};

function byUnits(text: string): Fraction | null {
  const first = numberAtStart(text);
  if (!first) return null;
  if (minutes.test(first.rest)) return first.value;
  const unit = hours.exec(first.rest);
  if (!unit) return null;
  const whole = first.value.mul(60);
  const rest = first.rest.slice(unit[0].length);
  if (rest === '') return whole;
  const more = shareOfHour[rest] ?? minutesAfter(rest);
  return more && whole.add(more);
}

/**
 * Reads hands-on time as people type it, in whole minutes: `7 h 30 min`, `7 h 30`, `7:30`, `7.5 h`,
 * `7 1/2 h`, `45 min`, `half an hour`, `an hour and a half`; what is no whole minute goes to the
 * nearest, half to even. A bare number is refused, as are a decimal comma, a minus and nought.
 */
export function readMinutes(text: string): Reading<number> {
  const typed = plainText(text);
  if (typed === '') return unread(example);
  if (typed.startsWith('-')) return unread('Time is more than nought: leave the minus out');
  const comma = decimalCommaProblem(typed);
  if (comma !== null) return unread(comma);
  const found = byClock(typed) ?? byUnits(typed);
  if (!found) return unread(example);
  if (found.gt(mostMinutes)) return unread('That is more time than one line can hold');
  const whole = roundHalfEven(found);
  return whole === 0 ? unread('Time is more than nought: write 5 min, or leave the line out') : read(whole);
}
