export interface Tree {
  readonly scripts: readonly string[];
  readonly files: readonly string[];
  /** Folders made while working (dist, data, node_modules): named in documents, not in the tree. */
  readonly made: readonly string[];
}

const SOURCE_FILE = /\.(tsx?|mjs|json|html|css|md|svg|png)$/;
// npm's own commands, which need no script of ours.
const NPM_OWN = new Set(['ci', 'i', 'install', 'run', 'audit', 'outdated']);

function missingScripts(text: string, scripts: readonly string[]): string[] {
  return [...text.matchAll(/\bnpm (?:run )?([a-z][a-z0-9:-]*)/g)].flatMap(([command, name = '']) =>
    scripts.includes(name) || (NPM_OWN.has(name) && !command.startsWith('npm run')) ? [] : [command]);
}

function isThere(path: string, { files, made }: Tree): boolean {
  const name = path.replace(/^\.\//, '').replace(/\/$/, '');
  if (made.includes(name.split('/')[0] ?? '')) return true;
  return files.some((file) => file === name || file.startsWith(`${name}/`) || file.endsWith(`/${name}`));
}

function missingPaths(text: string, tree: Tree): string[] {
  const tops = new Set([...tree.files.map((file) => file.split('/')[0]), 'src', 'server', 'tests', 'scripts', 'content-fixtures']);
  const spans = [...text.matchAll(/`([^`\n]+)`/g)].map(([, span = '']) => span);
  const paths = spans.filter((span) =>
    /^[\w.][\w./-]*$/.test(span) && (SOURCE_FILE.test(span) || (span.includes('/') && tops.has(span.split('/')[0]))));
  const links = [...text.matchAll(/\]\((?!https?:|#|mailto:)([^)#\s]+)/g)].map(([, link = '']) => link);
  return [...paths, ...links].filter((path) => !isThere(path, tree));
}

/** Scripts and paths that a document names and the tree does not have. */
export function missingFrom(text: string, tree: Tree): string[] {
  return [...missingScripts(text, tree.scripts), ...missingPaths(text, tree)];
}
