import { readFile } from 'node:fs/promises';
import type { PageShell } from '#server/http/page-shell.ts';

/** Pages from the tree as it is, through the test runner's own module loader: no build has to be there. */
export const sourceShell: PageShell = {
  template: () => readFile('index.html', 'utf8'),
  entry: () => import('#src/entry-server.tsx'),
  preloads: () => '', explain: () => undefined,
  close: () => Promise.resolve(),
};
