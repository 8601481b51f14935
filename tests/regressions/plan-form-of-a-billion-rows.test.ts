import { expect, test } from 'vitest';
import { stageCount, stageInputs } from '#src/features/builds/stage-form.ts';

function formOf(fields: Record<string, string>): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.set(name, value);
  return form;
}

// A page's action reads its form before anybody is asked for, so whoever sends the form says how many rows are read.
test('a plan whose sender names any number of rows is read no further than a plan goes', () => {
  for (const count of ['1000000000', '1e9', 'Infinity', '-5', '2.5', 'many']) {
    expect(stageCount(formOf({ count })), count).toBeLessThanOrEqual(200);
    expect(stageInputs(formOf({ count, 'stages.0.title': 'Ribs' })).length, count).toBeLessThanOrEqual(1);
  }
});

test('more stages than a plan may have are sent on, so that it is said and none is lost unseen', () => {
  const titles = Object.fromEntries(Array.from({ length: 70 }, (_, index) => [`stages.${index}.title`, `Stage ${index + 1}`]));
  expect(stageInputs(formOf({ count: '70', ...titles }))).toHaveLength(70);
});
