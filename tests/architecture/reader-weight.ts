import { reachableFrom, type ModuleImport } from './module-graph.ts';

// What a reader's page must not carry: schema library, exact arithmetic, editor, form parts.
const HEAVY = [/^zod(\/|$)/, /^fraction\.js$/, /^@tiptap\//, /^prosemirror-/, /^react-aria/, /^react-stately/];
// Renders a stored document to elements without the editor behind it.
const LIGHT_EXCEPTIONS = [/^@tiptap\/static-renderer\/json\//];

const READER_PARTS = [
  /^src\/entry-client\.tsx$/,
  /^src\/(app|lib|queries|components)\//,
  /^src\/pages\/(home|builds|build|entry)(\.tsx$|\/)/,
  /^src\/blocks\/views\.ts$/,
];

export function isHeavyPackage(name: string): boolean {
  return HEAVY.some((pattern) => pattern.test(name)) && !LIGHT_EXCEPTIONS.some((pattern) => pattern.test(name));
}

/** Each heavy package that a reader's page loads at once, as the way of imports that leads to it. */
export function heavyReaderImports(graph: readonly ModuleImport[]): string[] {
  const paths = [...new Set(graph.map((edge) => edge.from))];
  const starts = paths.filter((path) => READER_PARTS.some((pattern) => pattern.test(path)));
  return [...reachableFrom(starts, graph)]
    .filter(([path]) => isHeavyPackage(path))
    .map(([, way]) => way.join(' → '));
}
