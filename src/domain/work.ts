import { decimalCommaProblem, finenessProblem, numberAtStart, plainText } from './numbers-written.ts';
import { exactText } from './quantity.ts';
import { read, unread } from './reading.ts';
import type { Reading } from './reading.ts';

/**
 * Reads an amount of work as people write it: `17`, `3.2`, `4 1/2`, `4½`.
 * @returns the exact amount as `n/d`, above nought, in whatever unit stands beside the field; or words for beside it
 */
export function readAmountOfWork(text: string): Reading<string> {
  const typed = plainText(text);
  if (typed === '') return unread('Say how many, like 17 or 3.2');
  if (typed.startsWith('-')) return unread('Work done is more than nought: leave the minus out');
  const problem = decimalCommaProblem(typed) ?? finenessProblem(typed);
  if (problem !== null) return unread(problem);
  const found = numberAtStart(typed);
  if (!found || found.rest !== '') return unread(`“${text.trim()}” is not an amount: write 17, 3.2 or 4 1/2`);
  return found.value.n > 0n ? read(exactText(found.value)) : unread('Work done is more than nought');
}
