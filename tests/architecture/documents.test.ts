import { expect, test } from 'vitest';
import { missingFrom, type Tree } from './documents.ts';
import { filesBelow, readText } from './tree.ts';

const small: Tree = { scripts: ['start', 'check:long'], files: ['README.md', 'src/domain/money.ts'], made: ['dist'] };

test.each([
  ['Run `npm run nothing`.', 'npm run nothing'],
  ['Run `npm test`.', 'npm test'],
  ['It is in `src/domain/ledger.ts`.', 'src/domain/ledger.ts'],
  ['It is in `server/app.ts`.', 'server/app.ts'],
  ['See `gone.ts`.', 'gone.ts'],
  ['![home](pictures/home.png)', 'pictures/home.png'],
])('what a document names and the tree lacks is found: %s', (text, missing) => {
  expect(missingFrom(text, small)).toEqual([missing]);
});

test('what is there passes: scripts, files, folders, things made, addresses', () => {
  const text = '`npm start`, `npm run check:long`, `npm ci`, `src/domain/`, `money.ts`, `dist/client`, `/builds/:build`, `image/jpeg`, [x](https://example.org)';
  expect(missingFrom(text, small)).toEqual([]);
});

const documents = filesBelow('.').filter((path) => path.endsWith('.md'));

test.each(documents)('%s names only what is there', (path) => {
  const manifest: { scripts: Record<string, string> } = JSON.parse(readText('package.json'));
  const tree: Tree = {
    scripts: Object.keys(manifest.scripts),
    files: filesBelow('.'),
    made: ['dist', 'data', 'node_modules', 'test-results'],
  };
  expect(missingFrom(readText(path), tree)).toEqual([]);
});
