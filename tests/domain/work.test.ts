import { expect, test } from 'vitest';
import { readAmountOfWork } from '#domain/work.ts';

test.each([
  ['17', '17/1'],
  ['3.2', '16/5'],
  ['4 1/2', '9/2'],
  ['4½', '9/2'],
])('%s of work', (text, value) => {
  expect(readAmountOfWork(text)).toEqual({ ok: true, value });
});

test.each([
  ['', 'Say how many, like 17 or 3.2'],
  ['1,5', 'Write 1.5 with a point'],
  ['-2', 'Work done is more than nought: leave the minus out'],
  ['0', 'Work done is more than nought'],
  ['17 ribs', '“17 ribs” is not an amount: write 17, 3.2 or 4 1/2'],
  ['1/0', '“1/0” is not an amount: write 17, 3.2 or 4 1/2'],
])('%j is answered beside its field', (text, problem) => {
  expect(readAmountOfWork(text)).toEqual({ ok: false, problem: `${problem}.` });
});
