import type { ModuleImport } from './module-graph.ts';

/** The area of the tree a module belongs to: the unit the arrows are drawn between. */
export function areaOf(path: string): string {
  const [top = '', second = '', third = ''] = path.split('/');
  if (top === 'src') {
    if (/^entry-(client|server)\.tsx$/.test(second)) return 'src/entry';
    return `src/${second}`;
  }
  if (top === 'server') {
    if (second === 'features') return /\.tsx?$/.test(third) ? 'server/features' : `server/features/${third}`;
    return `server/${second.replace(/\.tsx?$/, '')}`;
  }
  return top;
}

// The two lists of blocks that may be read outside a browser.
const LIGHT_BLOCK_LISTS = ['src/blocks/pure.ts', 'src/blocks/views.ts'];
// What a contract may hold of blocks: the stored document, never how it is shown or edited.
const DOCUMENT_OF_BLOCKS = /^src\/blocks\/(?!views|desk)[^/]+\.ts$/;
const DOMAIN_PACKAGES = ['fraction.js'];

// Each line: an area, and the areas it may import beside itself.
const CONTRACTS = ['src/contracts', 'src/domain'];
const LIB = ['src/lib', ...CONTRACTS];
const COMPONENTS = ['src/components', ...LIB];
const BLOCKS = ['src/blocks', ...COMPONENTS];
const FEATURES = ['src/features', 'src/queries', ...BLOCKS];
const PAGES = ['src/pages', ...FEATURES];
const SERVER_PARTS = ['server/http', 'server/jobs', 'server/email', 'server/entities', 'server/config', 'server/database'];
// What page rendering reads of the site: the way in, and the type of the transport it is handed.
const PAGE_RENDERING = ['src/entry-server.tsx', 'src/lib/transport.ts'];
const SERVER_READS = ['src/blocks', ...CONTRACTS];

const ARROWS: Readonly<Record<string, readonly string[]>> = {
  'src/entry': ['src/app', ...PAGES],
  'src/app': PAGES,
  'src/pages': FEATURES,
  'src/features': FEATURES.filter((area) => area !== 'src/features'),
  'src/blocks': COMPONENTS,
  'src/queries': LIB,
  'src/components': LIB,
  'src/lib': CONTRACTS,
  'src/contracts': ['src/domain', 'src/blocks'],
  'src/domain': [],
  'server/main': ['server/app', 'server/demo', 'server/features', 'server/features/*', 'server/seeders', 'server/migrations', ...SERVER_PARTS, ...SERVER_READS],
  'server/demo': ['server/features/*', 'server/seeders', ...SERVER_PARTS, ...SERVER_READS],
  'server/app': ['server/features', ...SERVER_PARTS, ...SERVER_READS],
  // The lists that put the features together.
  'server/features': ['server/features/*', ...SERVER_PARTS],
  'server/features/*': [...SERVER_PARTS, ...SERVER_READS],
  'server/seeders': ['server/features/*', 'content-fixtures', ...SERVER_PARTS, ...SERVER_READS],
  'server/http': ['server/entities', 'server/config', 'server/database', 'src/entry', 'src/lib', ...SERVER_READS],
  'server/jobs': ['server/entities', 'server/config', 'server/database'],
  'server/email': ['server/jobs', 'server/entities', 'server/config', ...SERVER_READS],
  'server/entities': SERVER_READS,
  'server/database': ['mikro-orm.config.ts', 'server/entities', 'server/migrations', 'server/config'],
  'server/config': [],
  'server/migrations': [],
};

function ruleName(area: string): string {
  return area.startsWith('server/features/') ? 'server/features/*' : area;
}

function featureOf(path: string): string | null {
  return /^src\/features\/([^/]+)\//.exec(path)?.[1] ?? null;
}

function blockOf(path: string): string | null {
  return /^src\/blocks\/([^/]+)\//.exec(path)?.[1] ?? null;
}

function insideProblem({ from, to }: ModuleImport): string | null {
  const [feature, other] = [featureOf(from), featureOf(to)];
  if (feature !== other && feature !== null) return `feature ${feature} imports ${other ?? 'a file beside the features'}`;
  const [block, otherBlock] = [blockOf(from), blockOf(to)];
  if (block !== null && otherBlock !== null && block !== otherBlock) return `block ${block} imports block ${otherBlock}`;
  return null;
}

function narrowProblem({ from, to, kind }: ModuleImport, fromArea: string, toArea: string): string | null {
  if (fromArea.startsWith('server/features/') && toArea.startsWith('server/features/') && !to.endsWith('.service.ts')) {
    return 'a feature uses another only through its .service.ts';
  }
  if (from.startsWith('server/') && toArea === 'src/blocks' && !LIGHT_BLOCK_LISTS.includes(to)) {
    return 'the server reads only the pure and views lists of blocks';
  }
  if (fromArea === 'src/contracts' && toArea === 'src/blocks' && !DOCUMENT_OF_BLOCKS.test(to)) {
    return 'a contract holds the stored document of blocks, not how it is shown or edited';
  }
  if (fromArea === 'server/http' && /^src\/(entry|lib)/.test(toArea) && !(PAGE_RENDERING.includes(to) && kind === 'type')) {
    return `page rendering reads only the types of ${PAGE_RENDERING.join(' and ')}`;
  }
  return null;
}

function packageProblem({ from, to }: ModuleImport): string | null {
  if (!from.startsWith('src/domain/') || DOMAIN_PACKAGES.includes(to)) return null;
  return `domain may import only ${DOMAIN_PACKAGES.join(', ')}`;
}

/** Says what is wrong with one import, or null. */
export function arrowProblem(edge: ModuleImport): string | null {
  if (!edge.inTree) return packageProblem(edge);
  const [fromArea, toArea] = [areaOf(edge.from), areaOf(edge.to)];
  if (fromArea === toArea) return insideProblem(edge);
  const rule = ruleName(fromArea);
  const allowed = ARROWS[rule];
  if (!allowed) return `${fromArea} has no place in the table of arrows`;
  const toRule = ruleName(toArea);
  const isSisterFeature = rule === 'server/features/*' && toRule === rule;
  if (!allowed.includes(toRule) && !isSisterFeature) return `${fromArea} may not import ${toArea}`;
  return narrowProblem(edge, fromArea, toArea);
}

// Two entities that know each other name each other in functions called later, as the ORM asks.
function isEntityPair(edge: ModuleImport): boolean {
  return areaOf(edge.from) === 'server/entities' && areaOf(edge.to) === 'server/entities';
}

/** The first ring of imports that run when the importer does, as its paths in order, or null. */
export function findCycle(graph: readonly ModuleImport[]): string[] | null {
  const targets = new Map<string, string[]>();
  for (const edge of graph) {
    if (!edge.inTree || edge.kind !== 'static' || isEntityPair(edge)) continue;
    targets.set(edge.from, [...(targets.get(edge.from) ?? []), edge.to]);
  }
  const done = new Set<string>();
  const visit = (path: string, way: readonly string[]): string[] | null => {
    if (way.includes(path)) return [...way.slice(way.indexOf(path)), path];
    if (done.has(path)) return null;
    for (const next of targets.get(path) ?? []) {
      const cycle = visit(next, [...way, path]);
      if (cycle) return cycle;
    }
    done.add(path);
    return null;
  };
  for (const path of targets.keys()) {
    const cycle = visit(path, []);
    if (cycle) return cycle;
  }
  return null;
}
