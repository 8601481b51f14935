import { expect, test } from 'vitest';
import { impureUses } from './domain-purity.ts';
import { filesBelow, readText } from './tree.ts';

test.each([
  'export const now = () => Date.now();',
  'export const today = new Date();',
  'export const pick = () => Math.random();',
  'export const load = () => fetch("https://example.org");',
  'export const place = process.env["TZ"];',
  'export const words = new Intl.NumberFormat("en");',
])('a look outside the arguments is found: %s', (source) => {
  expect(impureUses('x.ts', source)).toHaveLength(1);
});

test('a date made from an argument, a comment and a message are none', () => {
  expect(impureUses('x.ts', `// not Date.now()\nexport const at = (ms: number) => new Date(ms);\nthrow new Error('fetch');`)).toEqual([]);
});

test('the domain has no clock, chance, network, page or process', () => {
  const uses = filesBelow('src/domain').flatMap((path) => impureUses(path, readText(path)).map((use) => `${path}: ${use}`));
  expect(uses).toEqual([]);
});
