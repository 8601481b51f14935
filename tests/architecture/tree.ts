import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, sep } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');

function ignoredNames(): ReadonlySet<string> {
  const lines = readFileSync(join(root, '.gitignore'), 'utf8').split('\n');
  return new Set(['.git', ...lines.map((line) => line.trim().replace(/^\/|\/$/g, '')).filter((line) => line !== '')]);
}

/** Every file of the project below `folder`, as paths from the root with `/`, without what git ignores. */
export function filesBelow(folder: string): string[] {
  const ignored = ignoredNames();
  const walk = (path: string): string[] =>
    readdirSync(path, { withFileTypes: true }).flatMap((item) => {
      if (ignored.has(item.name) || /\.log$|^\.deps-lock/.test(item.name)) return [];
      const full = join(path, item.name);
      if (item.isDirectory()) return walk(full);
      return [relative(root, full).split(sep).join('/')];
    });
  return walk(join(root, folder)).toSorted();
}

export function foldersIn(folder: string): string[] {
  return readdirSync(join(root, folder), { withFileTypes: true })
    .filter((item) => item.isDirectory())
    .map((item) => item.name);
}

export function readText(path: string): string {
  return readFileSync(join(root, path), 'utf8');
}
