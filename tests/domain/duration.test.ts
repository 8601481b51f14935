import { expect, test } from 'vitest';
import { readMinutes } from '#domain/duration.ts';

test.each([
  ['7 h 30 min', 450],
  ['7 h 30', 450],
  ['7h30', 450],
  ['7:30', 450],
  ['7.5 h', 450],
  ['7 1/2 h', 450],
  ['7½ hours', 450],
  ['45 min', 45],
  ['7h 5m', 425],
  ['1 hour, 20 minutes', 80],
  ['half an hour', 30],
  ['three quarters of an hour', 45],
  ['an hour and a half', 90],
  ['1 and a half hours', 90],
  // A third of an hour written short goes to the nearest minute.
  ['0.33 h', 20],
])('%s is %i minutes', (text, value) => {
  expect(readMinutes(text)).toEqual({ ok: true, value });
});

test.each([
  ['', 'Say hours or minutes: 7 h 30 or 45 min'],
  ['90', 'Say hours or minutes: 7 h 30 or 45 min'],
  ['7:75', 'Say hours or minutes: 7 h 30 or 45 min'],
  ['2 days', 'Say hours or minutes: 7 h 30 or 45 min'],
  ['all day', 'Say hours or minutes: 7 h 30 or 45 min'],
  ['1,5', 'Write 1.5 with a point'],
  ['1,5 h', 'Write 1.5 with a point'],
  ['-1 h', 'Time is more than nought: leave the minus out'],
  ['0 min', 'Time is more than nought: write 5 min, or leave the line out'],
  ['99999 h', 'That is more time than one line can hold'],
])('%j is answered beside its field', (text, problem) => {
  expect(readMinutes(text)).toEqual({ ok: false, problem: `${problem}.` });
});
