// Builds beside dist/ and swaps at the end, so that a half-made build is never served.
import { rename, rm, utimes, writeFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build as bundleServer } from 'esbuild';
import { build as bundleClient } from 'vite';

process.chdir(join(dirname(fileURLToPath(import.meta.url)), '..'));
process.env.NODE_ENV = 'production';
const startedAt = new Date();
const out = '.dist-next';
// A busy machine is no fault of the build.
const rolldownOptions = { checks: { bundlerTimings: false } };
await rm(out, { recursive: true, force: true });

console.log('Building the client …');
await bundleClient({
  logLevel: 'warn',
  build: {
    outDir: `${out}/client`,
    emptyOutDir: true,
    manifest: true,
    sourcemap: 'hidden', // made for us and for the weight test; readers are not told of it
    // The list of what each page needs would weigh more than a kilobyte on every reader's page, which reads without scripts.
    modulePreload: false,
    assetsInlineLimit: 0,
    chunkSizeWarningLimit: 800, // kB: the desk's editor; what readers load is weighed by a test
    rolldownOptions,
  },
});

console.log('Building the page renderer …');
await bundleClient({
  logLevel: 'warn',
  build: { outDir: `${out}/ssr`, emptyOutDir: true, ssr: 'src/entry-server.tsx', sourcemap: true, rolldownOptions },
});

console.log('Building the server …');
await bundleServer({
  entryPoints: {
    main: 'server/main.ts',
    // Pictures are made in a process of their own, started from this file.
    'picture-process': 'server/features/media/picture-process.ts',
  },
  outdir: `${out}/server`,
  bundle: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  packages: 'external', // native addons (sharp, sqlite3) must stay outside
  external: ['*/entry-server.tsx', '*/entry-server.js'], // imported at run time from ../ssr
  sourcemap: true,
  keepNames: true, // entity and migration class names are data for the ORM
  logLevel: 'warning',
});

// Dated from the start: a source changed while we built makes this build stale.
await writeFile(`${out}/.built`, '');
await utimes(`${out}/.built`, startedAt, startedAt);
await rm('dist', { recursive: true, force: true });
await rename(out, 'dist');
console.log(`Built in ${((Date.now() - startedAt.getTime()) / 1000).toFixed(1)} s.`);
