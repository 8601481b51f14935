// Plain Node, no dependencies. Called by the pre* scripts: brings node_modules (and with --build also
// dist/, with --browser also Chromium) to the state that package-lock.json and the sources ask for.
import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync, readdirSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { findBrowser, findProgram } from './browser-path.mjs';
import { whileLocked } from './install-lock.mjs';

process.chdir(join(dirname(fileURLToPath(import.meta.url)), '..'));

const BUILD_INPUTS = [
  'src', 'server', 'content-fixtures', 'index.html', 'vite.config.ts', 'tsconfig.json',
  'package.json', 'package-lock.json', 'mikro-orm.config.ts', 'scripts/build.mjs',
];

function refuseOldNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  console.error(`Node.js 20.19 or newer is needed; this is ${process.version}.`);
  process.exit(1);
}

function run(command, args, options = {}) {
  const result = spawnSync(command, args, { stdio: 'inherit', ...options });
  if (result.error) console.error(result.error.message);
  if (result.status !== 0) process.exit(result.status ?? 1);
}

// npm writes node_modules/.package-lock.json as the last act of a good install, by `npm ci` and by a
// hand-made `npm i` alike: compare it with the lock file rather than keep a stamp of our own.
function isInstalled() {
  const stamp = 'node_modules/.package-lock.json';
  if (!existsSync(stamp)) return false;
  const have = JSON.parse(readFileSync(stamp, 'utf8')).packages;
  const want = JSON.parse(readFileSync('package-lock.json', 'utf8')).packages;
  return Object.entries(want).every(([path, { optional, version, integrity }]) =>
    path === '' || optional || (have[path]?.version === version && have[path]?.integrity === integrity));
}

function install() {
  console.log('Installing packages (npm ci) …');
  // --include=dev: under NODE_ENV=production npm would leave out vite, and with it the build.
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
  const npm = process.env.npm_execpath; // set inside npm start and npm test
  if (npm?.endsWith('npm-cli.js')) run(process.execPath, [npm, ...args]);
  else run('npm', args, { shell: process.platform === 'win32' });
}

// A folder's own time counts too: it changes when a file in it is deleted or renamed.
function newestChange(path) {
  const stat = statSync(path, { throwIfNoEntry: false });
  if (!stat) return 0;
  if (!stat.isDirectory()) return stat.mtimeMs;
  return Math.max(stat.mtimeMs, ...readdirSync(path).map((name) => newestChange(join(path, name))));
}

function isBuilt() {
  const stamp = statSync('dist/.built', { throwIfNoEntry: false });
  return stamp !== undefined && stamp.mtimeMs >= Math.max(...BUILD_INPUTS.map(newestChange));
}

// The words before a command that make it run as root: none for root, sudo where it asks no password.
function rootPrefix() {
  if (process.getuid?.() === 0) return [];
  const sudo = findProgram('sudo');
  if (sudo && spawnSync(sudo, ['-n', 'true'], { stdio: 'ignore' }).status === 0) return [sudo, '-n'];
  return null;
}

function installBrowser() {
  const prefix = findProgram('apt-get') && !process.env.CHROMIUM_PATH ? rootPrefix() : null;
  if (prefix) {
    console.log('Installing Chromium for the browser tests (apt-get) …');
    const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
    const apt = (...args) => {
      const [command, ...rest] = [...prefix, 'apt-get', '-qq', ...args];
      return spawnSync(command, rest, { stdio: 'inherit', env }).status === 0;
    };
    if (apt('update') && apt('install', '-y', '--no-install-recommends', 'chromium') && findBrowser()) return;
  }
  console.error(
    process.env.CHROMIUM_PATH
      ? `CHROMIUM_PATH is ${process.env.CHROMIUM_PATH}, which is not a program that can be run. Point it at a Chromium, or unset it.`
      : 'The browser tests need Chromium. Install it (on Debian: apt-get install chromium) or point CHROMIUM_PATH at one, then run this again.',
  );
  process.exit(1);
}

refuseOldNode();
if (!isInstalled()) whileLocked(() => { if (!isInstalled()) install(); });
if (process.argv.includes('--build') && !isBuilt()) {
  whileLocked(() => { if (!isBuilt()) run(process.execPath, ['scripts/build.mjs']); });
}
if (process.argv.includes('--browser') && !findBrowser()) {
  whileLocked(() => { if (!findBrowser()) installBrowser(); });
}
