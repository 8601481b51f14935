import Fraction from 'fraction.js';
import { exactText } from './quantity.ts';
import { read, unread, type Reading } from './reading.ts';

/**
 * Reads an amount of work as people write it: `17`, `3.2`, `4 1/2`.
 * @returns the exact amount as `n/d`, above nought, in whatever unit stands beside the field; or words for beside it
 */
export function readAmountOfWork(text: string): Reading<string> {
  const typed = text.trim();
  if (typed === '') return unread('Say how many, such as 17 or 3.2.');
  if (/^\d+,\d+$/.test(typed)) return unread(`Write ${typed.replace(',', '.')} with a point.`);
  if (!/^(\d+(\.\d+)?|\d+\s+\d+\/[1-9]\d*|\d+\/[1-9]\d*)$/.test(typed)) return unread(`“${typed}” is not an amount. Write 17, 3.2 or 4 1/2.`);
  const amount = new Fraction(typed);
  return amount.compare(0) > 0 ? read(exactText(amount)) : unread('Work done is more than nought.');
}
