import { expect, test } from 'vitest';
import { changeBuild } from '#contracts/builds.ts';
import { buildInput } from '#src/features/builds/build-form.ts';

function sent(year: string): unknown {
  const form = new FormData();
  form.set('year', year);
  // as the browser sends it: JSON has no NaN, and writes it as null
  return JSON.parse(JSON.stringify({ ...buildInput(form), version: 1 }));
}

test('a year that is no number is refused beside its field, and takes no year away', () => {
  for (const year of ['about 1961', '1961?', '19 61', '1e3']) {
    const parsed = changeBuild.body.safeParse(sent(year));
    expect(parsed.success, year).toBe(false);
    expect(parsed.error?.issues[0], year).toMatchObject({ path: ['year'], message: 'Give a year, such as 1961.' });
  }
});

test('a year in figures is a year, and an empty field clears it', () => {
  expect(changeBuild.body.parse(sent('1961'))).toMatchObject({ year: 1961 });
  expect(changeBuild.body.parse(sent(' '))).toMatchObject({ year: null });
});
