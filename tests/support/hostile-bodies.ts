import fc from 'fast-check';
import { expect } from 'vitest';
import type { EndpointTable } from '#server/http/endpoint-table.ts';
import type { TestClient } from './test-client.ts';

const nasty = [
  '', ' ', '\u0000', '1,5', '-1', '1e309', 'NaN', '../../etc/passwd', "'; drop table person; --", '<script>alert(1)</script>', '{{7*7}}', '%00', '\uD800', '\u202Eabc',
  'a'.repeat(5000), '2026-02-30', '9999-12-31', '1/0', '0/0', '-1/2', '__proto__', 'constructor', 'javascript:alert(1)', 'http://[', '999999999999999999999', '½', '1 1/0 gal',
];
const leaf = fc.oneof(fc.constantFrom(...nasty), fc.string(), fc.integer(), fc.double(), fc.boolean(), fc.constant(null));
const names = [
  'title', 'lead', 'kind', 'currency', 'measures', 'method', 'visibility', 'costsShown', 'version', 'document', 'content', 'type', 'attrs', 'id', 'data', 'lines', 'day', 'dayTo',
  'stage', 'work', 'amount', 'unit', 'stages', 'email', 'password', 'handle', 'name', 'current', 'about', 'archived', 'packs', 'dimension', 'hazards', 'build', 'next', 'text', 'marks', '__proto__',
];
const { tree } = fc.letrec<{ tree: unknown }>((tie) => ({
  tree: fc.oneof({ depthSize: 'small' }, leaf, fc.array(tie('tree'), { maxLength: 4 }), fc.dictionary(fc.constantFrom(...names), tie('tree'), { maxKeys: 6 })),
}));

/** An EntryDocument gone wrong: right enough to get past the first checks. */
const documents = fc.record({
  version: fc.oneof(fc.constant(1), fc.integer(), leaf),
  document: fc.record({
    title: fc.oneof(fc.string(), leaf), lead: fc.string(), day: fc.oneof(fc.constant('2026-06-14'), leaf), dayTo: fc.oneof(fc.constant(null), leaf), stage: fc.oneof(fc.constant(null), fc.integer()), work: tree,
    content: fc.array(fc.record({
      type: fc.constantFrom('paragraph', 'heading', 'used', 'bought', 'cost', 'time', 'photos', 'finding', 'caution', 'table', 'nothing'),
      attrs: fc.record({ id: fc.oneof(fc.constant('abcd1234'), leaf), version: fc.constantFrom(1, 2, 0), data: tree }), content: tree,
    }), { maxLength: 4 }),
  }),
});
const bodies = fc.oneof(tree, documents, fc.dictionary(fc.constantFrom(...names), tree));
const parts = fc.oneof(fc.constantFrom('1', 'boat', 'none', '0', '-1', '1e9', '%2e%2e', "'", 'a'.repeat(300), '\u202E'), fc.string({ minLength: 1, maxLength: 20 }));

export interface Sent {
  readonly key: string;
  readonly status: number;
}

/**
 * Sends `runs` random and hostile requests over every endpoint of the site as each of the clients given.
 * Every answer must be one the caller can act on: nothing broken, nothing hanging, nothing of a stack or a query in it.
 */
export async function sendHostileBodies(table: EndpointTable, clients: readonly TestClient[], runs: number, seed: number): Promise<Sent[]> {
  const sent: Sent[] = [];
  const endpoints = [...table.values()].map(({ endpoint }) => endpoint).filter(({ path }) => !path.endsWith('/pictures'));
  const inputs = fc.sample(fc.record({ at: fc.nat(), who: fc.nat(), body: bodies, part: parts, real: fc.boolean() }), { numRuns: runs, seed });
  for (const { at, who, body, part, real } of inputs) {
    const endpoint = endpoints[at % endpoints.length];
    const client = clients[who % clients.length];
    if (!endpoint || !client) continue;
    const path = endpoint.path.replace(/:(\w+)/g, (_, name: string) => (real ? { build: 'hostile-boat', number: '1', entry: 'day', key: 'x' }[name] ?? '1' : encodeURIComponent(part.toWellFormed())));
    // signing out would leave the rest of the run to a visitor
    if (endpoint.method === 'DELETE' && endpoint.path === '/api/session') continue;
    const answer = endpoint.method === 'GET' ? await client.get(`${path}?page=${encodeURIComponent(part.toWellFormed())}`) : await client.send(endpoint.method, path, body);
    const key = `${endpoint.method} ${endpoint.path}`;
    expect(answer.status, `${key} ${path} ${JSON.stringify(body)} said ${answer.text}`).toBeLessThan(500);
    expect(answer.text).not.toMatch(/at .*\.(ts|js):\d+|SQLITE_|node_modules/);
    sent.push({ key, status: answer.status });
  }
  return sent;
}
