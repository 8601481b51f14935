import { posix } from 'node:path';
import { parseSync } from 'vite';
import { filesBelow, foldersIn, readText } from './tree.ts';

/** `static` runs when the importer does, `lazy` is an `import()`, `type` is gone once compiled. */
export type ImportKind = 'static' | 'lazy' | 'type';

export interface ModuleImport {
  readonly from: string;
  /** A path of the tree, or the name of a package or Node module as written. */
  readonly to: string;
  readonly inTree: boolean;
  readonly kind: ImportKind;
}

interface Span {
  readonly start: number;
  readonly end: number;
}

type ImportsMap = Readonly<Record<string, string>>;

function resolveImport(from: string, asked: string, aliases: ImportsMap): { to: string; inTree: boolean } {
  const specifier = asked.replace(/\?.*$/, '');
  if (specifier.startsWith('.')) return { to: posix.normalize(posix.join(posix.dirname(from), specifier)), inTree: true };
  for (const [pattern, target] of Object.entries(aliases)) {
    const prefix = pattern.replace('*', '');
    if (!specifier.startsWith(prefix)) continue;
    return { to: posix.normalize(target.replace('*', specifier.slice(prefix.length))), inTree: true };
  }
  return { to: specifier, inTree: false };
}

// With verbatimModuleSyntax `import { type A } from` still loads the module; only `import type` does not.
function kindOf(source: string, statement: Span): ImportKind {
  return /^(import|export)\s+type\b/.test(source.slice(statement.start, statement.end)) ? 'type' : 'static';
}

/** What one module imports, re-exports and loads lazily, read by the parser that builds it. */
export function importsOf(path: string, source: string, aliases: ImportsMap): ModuleImport[] {
  const { module } = parseSync(path, source);
  const found: { specifier: string; kind: ImportKind }[] = [];
  for (const statement of module.staticImports) {
    found.push({ specifier: statement.moduleRequest.value, kind: kindOf(source, statement) });
  }
  for (const statement of module.staticExports) {
    const request = statement.entries.find((entry) => entry.moduleRequest)?.moduleRequest;
    if (request) found.push({ specifier: request.value, kind: kindOf(source, statement) });
  }
  for (const { moduleRequest } of module.dynamicImports) {
    const literal = /^(['"`])([^'"`$]+)\1$/.exec(source.slice(moduleRequest.start, moduleRequest.end));
    if (literal?.[2] !== undefined) found.push({ specifier: literal[2], kind: 'lazy' });
  }
  return found.map(({ specifier, kind }) => ({ from: path, kind, ...resolveImport(path, specifier, aliases) }));
}

export function importAliases(): ImportsMap {
  const manifest: { imports: ImportsMap } = JSON.parse(readText('package.json'));
  return manifest.imports;
}

/** Every import of every module below `src` and `server`. */
export function readModuleGraph(): ModuleImport[] {
  const aliases = importAliases();
  return foldersIn('.')
    .filter((folder) => folder === 'src' || folder === 'server')
    .flatMap(filesBelow)
    .filter((path) => /\.tsx?$/.test(path) && !path.endsWith('.d.ts'))
    .flatMap((path) => importsOf(path, readText(path), aliases));
}

/** Every path reachable from `starts` by imports that run when the importer does, with the way there. */
export function reachableFrom(starts: readonly string[], graph: readonly ModuleImport[]): Map<string, string[]> {
  const ways = new Map<string, string[]>(starts.map((start) => [start, [start]]));
  const queue = [...starts];
  for (let path = queue.shift(); path !== undefined; path = queue.shift()) {
    const way = ways.get(path) ?? [];
    for (const edge of graph) {
      if (edge.from !== path || edge.kind !== 'static' || ways.has(edge.to)) continue;
      ways.set(edge.to, [...way, edge.to]);
      if (edge.inTree) queue.push(edge.to);
    }
  }
  return ways;
}
