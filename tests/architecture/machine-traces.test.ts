import { expect, test } from 'vitest';
import { machineTraces } from './machine-traces.ts';
import { filesBelow, readText } from './tree.ts';

const BINARY = /\.(png|jpe?g|webp|avif|heic|woff2?|ico|sqlite)$/;
const slash = '/';
const colon = ':';

test.each([
  `"resolved"${colon} "https://example.org/a.tgz"`,
  ['registry', '= https://example.org'].join(' '),
  ['see https:', '', ['registry', 'npmjs', 'org'].join('.'), 'zod'].join(slash),
  `const data = '${slash}work/main/data';`,
  `DATA_DIR=${slash}tmp/demo npm start`,
  `copied from ..${slash}shared/design`,
])('a trace of a machine is found: %s', (text) => {
  expect(machineTraces(text)).not.toEqual([]);
});

test.each([
  `import x from '#server/features/tmp/x.ts'`,
  `fetch('/api/builds/one/work/two')`,
  `https://example.org/work/main`,
  `path: '/home'`,
])('an address or an import is no trace: %s', (text) => {
  expect(machineTraces(text)).toEqual([]);
});

test('no file names a package registry or a path of one machine', () => {
  const traces = filesBelow('.')
    .filter((path) => !BINARY.test(path))
    .flatMap((path) => machineTraces(readText(path)).map((trace) => `${path}: ${trace}`));
  expect(traces).toEqual([]);
});
