import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, test } from 'vitest';
import { filesLoadedFor, gzippedBytes, heavyPackagesIn, readManifest, sourcesOf, type Manifest } from './bundle-parts.ts';
import { root } from './tree.ts';

// What a page may load, in bytes of gzipped JavaScript: the first is promised to readers of an entry,
// the others keep their neighbours from growing unseen.
const MOST_BYTES = [['entry', 130_000], ['home', 135_000], ['builds', 135_000], ['build', 135_000]] as const;

const small: Manifest = {
  'index.html': { file: 'assets/index.js', isEntry: true, imports: ['_react.js'] },
  '_react.js': { file: 'assets/react.js' },
  'src/pages/entry.tsx': { file: 'assets/entry.js', imports: ['_react.js', '_slip.js'] },
  '_slip.js': { file: 'assets/slip.js' },
  'src/pages/edit-entry.tsx': { file: 'assets/desk.js', imports: ['_slip.js'] },
};

test('a page loads the way in, itself and what they import, each once, and no other page', () => {
  expect(filesLoadedFor('src/pages/entry.tsx', small).toSorted()).toEqual(
    ['assets/entry.js', 'assets/index.js', 'assets/react.js', 'assets/slip.js'],
  );
});

test('a heavy package in a chunk is found by its sources', () => {
  const sources = ['../../node_modules/zod/v4/core.js', '../../node_modules/react/index.js', '../../src/domain/format.ts',
    '../../node_modules/@tiptap/static-renderer/dist/json/react/index.js', '../../node_modules/@tiptap/core/dist/index.js'];
  expect(heavyPackagesIn(sources)).toEqual(['zod/v4/core.js', '@tiptap/core/dist/index.js']);
});

describe('the built client', () => {
  let manifest: Manifest = {};
  beforeAll(() => {
    if (!existsSync(join(root, 'dist'))) throw new Error('There is no build: run npm run build first.');
    manifest = readManifest();
  });

  test.each(MOST_BYTES)('the %s page is light: no heavy package, at most %i bytes of JavaScript', (name, most) => {
    const pages = Object.keys(manifest).filter((key) => new RegExp(`^src/pages/${name}(\\.tsx$|/)`).test(key));
    expect(pages, `pages named ${name} with a chunk of their own`).not.toEqual([]);
    for (const page of pages) {
      const files = filesLoadedFor(page, manifest);
      expect(files.flatMap((file) => heavyPackagesIn(sourcesOf(file)))).toEqual([]);
      expect(files.reduce((sum, file) => sum + gzippedBytes(file), 0)).toBeLessThanOrEqual(most);
    }
  });
});
