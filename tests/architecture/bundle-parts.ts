import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { isHeavyPackage } from './reader-weight.ts';
import { root } from './tree.ts';

interface Chunk {
  readonly file: string;
  readonly isEntry?: boolean;
  readonly imports?: readonly string[];
}

export type Manifest = Readonly<Record<string, Chunk>>;

const CLIENT = join(root, 'dist', 'client');

export function readManifest(): Manifest {
  return JSON.parse(readFileSync(join(CLIENT, '.vite', 'manifest.json'), 'utf8'));
}

/** The JavaScript files a page loads before anyone touches it: the way in, its page, and all they import. */
export function filesLoadedFor(page: string, manifest: Manifest): string[] {
  const queue = [...Object.keys(manifest).filter((key) => manifest[key]?.isEntry), page];
  const seen = new Set<string>();
  for (let key = queue.shift(); key !== undefined; key = queue.shift()) {
    const chunk = manifest[key];
    if (!chunk) throw new Error(`The manifest has no ${key}.`);
    if (seen.has(key)) continue;
    seen.add(key);
    queue.push(...(chunk.imports ?? []));
  }
  const files = [...seen].flatMap((key) => manifest[key]?.file ?? []);
  return [...new Set(files)].filter((file) => file.endsWith('.js'));
}

export function gzippedBytes(file: string): number {
  return gzipSync(readFileSync(join(CLIENT, file))).length;
}

/** The packages whose code is in a chunk, by the sources its map names. */
export function heavyPackagesIn(sources: readonly string[]): string[] {
  const inPackages = sources.flatMap((source) => /.*node_modules\/(.+)$/.exec(source)?.[1] ?? []);
  return inPackages.filter((name) => isHeavyPackage(name.replace('/dist/', '/').replace('/src/', '/')));
}

export function sourcesOf(file: string): string[] {
  const map: { sources: string[] } = JSON.parse(readFileSync(join(CLIENT, `${file}.map`), 'utf8'));
  return map.sources;
}
