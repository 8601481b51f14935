import { expect, test } from 'vitest';
import { nameProblem } from './names.ts';
import { filesBelow } from './tree.ts';

test.each([
  'src/lib/utils.ts',
  'src/lib/date-utils.ts',
  'server/helpers/x.ts',
  'server/common/money.ts',
  'server/features/builds/buildService.ts',
  'src/components/Slip.tsx',
  'src/Pages/home.tsx',
  'server/migrations/initial.Table.ts',
])('a bad name is found: %s', (path) => {
  expect(nameProblem(path)).not.toBeNull();
});

test.each([
  'src/domain/currency.ts',
  'server/features/builds/build.service.ts',
  'server/features/accounts/common-passwords.ts',
  'server/migrations/Migration20261201063738_init.ts',
  '.oxlintrc.json',
  'README.md',
])('a good name passes: %s', (path) => {
  expect(nameProblem(path)).toBeNull();
});

test('every file is kebab-case and named for what it holds', () => {
  expect(filesBelow('.').map(nameProblem).filter((problem) => problem !== null)).toEqual([]);
});
