import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { arrowProblem, findCycle } from './arrows.ts';
import { importsOf, readModuleGraph, type ModuleImport } from './module-graph.ts';
import { heavyReaderImports } from './reader-weight.ts';
import { root } from './tree.ts';

const aliases = { '#domain/*': './src/domain/*', '#server/*': './server/*', '#src/*': './src/*', '#tests/*': './tests/*' };
const graph = readModuleGraph();

function edges(path: string, source: string): ModuleImport[] {
  return importsOf(path, source, aliases);
}

function problems(path: string, source: string): (string | null)[] {
  return edges(path, source).map(arrowProblem).filter((problem) => problem !== null);
}

test('imports are read with their kind: run at once, lazy, or type only', () => {
  const source = `
    import type { A } from './a.ts';
    import { type B } from '#domain/b.ts';
    export { c } from '../c.ts';
    export type { D } from './d.ts';
    import 'zod';
    const page = () => import('#src/pages/home.tsx');`;
  expect(edges('src/lib/x.ts', source).map(({ to, kind }) => [to, kind])).toEqual([
    ['src/lib/a.ts', 'type'],
    ['src/domain/b.ts', 'static'],
    ['zod', 'static'],
    ['src/c.ts', 'static'],
    ['src/lib/d.ts', 'type'],
    ['src/pages/home.tsx', 'lazy'],
  ]);
});

test.each([
  ['src/lib/fetch.ts', `import { x } from '#src/pages/home.tsx';`],
  ['src/app/app.tsx', `import type { Env } from '#server/config.ts';`],
  ['src/features/desk/desk.tsx', `import { x } from '../shelf/shelf.tsx';`],
  ['src/features/desk/desk.tsx', `const x = import('#src/features/plan/plan.tsx');`],
  ['src/domain/money.ts', `import { z } from 'zod';`],
  ['src/domain/money.ts', `import { readFileSync } from 'node:fs';`],
  ['src/blocks/used/view.tsx', `import { x } from '../time/view.tsx';`],
  ['src/contracts/entries.ts', `import { x } from '#src/blocks/views.ts';`],
  ['src/components/slip.tsx', `import { x } from '#src/queries/builds.ts';`],
  ['server/features/builds/build.service.ts', `import { x } from '../shelf/lot-lookup.ts';`],
  ['server/features/builds/build.service.ts', `import { x } from '#src/blocks/desk.ts';`],
  ['server/features/builds/build.service.ts', `import { x } from '#src/entry-server.tsx';`],
  ['server/http/page.ts', `import { x } from '#server/features/builds/build.service.ts';`],
  ['server/http/pages.ts', `import { render } from '#src/entry-server.tsx';`],
  ['server/http/pages.ts', `import type { x } from '#src/lib/format.ts';`],
  ['server/jobs/runner.ts', `import { x } from '#server/features/media/media.jobs.ts';`],
  ['server/entities/build.ts', `import { x } from '#server/http/session.ts';`],
  ['server/app.ts', `import { x } from '#tests/support/test-server.ts';`],
  ['server/leftovers/x.ts', `import { x } from '#domain/money.ts';`],
])('a wrong arrow is found: %s with %s', (path, source) => {
  expect(problems(path, source)).toHaveLength(1);
});

test.each([
  ['src/app/routes.tsx', `const page = () => import('#src/pages/home.tsx');`],
  ['src/domain/money.ts', `import Fraction from 'fraction.js';`],
  ['src/features/desk/desk.tsx', `import { x } from './tray.tsx'; import { y } from '#src/blocks/desk.ts';`],
  ['server/features/builds/build.service.ts', `import { x } from '../shelf/shelf.service.ts';`],
  ['server/features/index.ts', `import { x } from './builds/builds.routes.ts';`],
  ['server/http/page-rendering.ts', `import type { render } from '#src/entry-server.tsx';`],
])('a right arrow passes: %s with %s', (path, source) => {
  expect(problems(path, source)).toEqual([]);
});

test('every import of src and server follows the arrows', () => {
  const wrong = graph.flatMap((edge) => {
    const problem = arrowProblem(edge);
    return problem === null ? [] : [`${edge.from} → ${edge.to}: ${problem}`];
  });
  expect(wrong).toEqual([]);
  expect(graph.length).toBeGreaterThan(20);
});

test('every import of the tree names a file that is there, with its extension', () => {
  const missing = graph.filter((edge) => edge.inTree && !existsSync(join(root, edge.to)));
  expect(missing.map((edge) => `${edge.from} → ${edge.to}`)).toEqual([]);
});

test('a ring of imports is found, one closed by a type or a lazy import is none', () => {
  const ring = [...edges('src/lib/a.ts', `import { b } from './b.ts';`), ...edges('src/lib/b.ts', `import { a } from './a.ts';`)];
  expect(findCycle(ring)).toEqual(['src/lib/a.ts', 'src/lib/b.ts', 'src/lib/a.ts']);
  const open = [...edges('src/lib/a.ts', `import { b } from './b.ts';`), ...edges('src/lib/b.ts', `import type { A } from './a.ts';`)];
  expect(findCycle(open)).toBeNull();
});

test('no module imports itself round a ring', () => {
  expect(findCycle(graph)).toBeNull();
});

test('a heavy package is found behind a reader page, by the way it came', () => {
  const heavy = [
    ...edges('src/pages/entry.tsx', `import { x } from '#src/components/slip.tsx';`),
    ...edges('src/components/slip.tsx', `import { z } from 'zod';`),
  ];
  expect(heavyReaderImports(heavy)).toContainEqual(expect.stringContaining('zod'));
  const light = [
    ...edges('src/pages/entry.tsx', `import type { Z } from 'zod'; const desk = () => import('#src/pages/desk.tsx');`),
    ...edges('src/pages/desk.tsx', `import { Editor } from '@tiptap/core';`),
    ...edges('src/components/prose.tsx', `import { r } from '@tiptap/static-renderer/json/react';`),
  ];
  expect(heavyReaderImports(light)).toEqual([]);
});

test('a reader page loads no schema library, no exact arithmetic and no editor', () => {
  expect(heavyReaderImports(graph)).toEqual([]);
});
