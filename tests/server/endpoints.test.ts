import { afterAll, beforeAll, expect, test } from 'vitest';
import type { Endpoint } from '#contracts/endpoint.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

const modules = import.meta.glob<Readonly<Record<string, unknown>>>('../../src/contracts/*.ts', { eager: true });

function isEndpoint(value: unknown): value is Endpoint {
  return typeof value === 'object' && value !== null && 'method' in value && 'path' in value && 'access' in value && 'reply' in value;
}

const stated = Object.values(modules).flatMap((module) => Object.values(module).filter(isEndpoint));
const keyOf = ({ method, path }: Endpoint) => `${method} ${path}`;

let site: TestServer;
beforeAll(async () => {
  site = await startTestServer();
});
afterAll(() => site.close());

test('every endpoint is stated once, at an address of its own', () => {
  const keys = stated.map(keyOf);
  expect(keys.filter((key, index) => keys.indexOf(key) !== index)).toEqual([]);
  expect(keys.length).toBeGreaterThan(10);
});

test('every endpoint that is stated is mounted, and no other', () => {
  expect([...site.table.keys()].toSorted()).toEqual(stated.map(keyOf).toSorted());
});

test.each(stated.filter(({ access }) => access !== 'anyone').map((endpoint) => [keyOf(endpoint), endpoint] as const))(
  '%s asks a visitor to sign in before it reads anything else',
  async (_key, endpoint) => {
    const path = endpoint.path.replace(/:\w+/g, '1');
    const visitor = site.visitor();
    const answer = endpoint.method === 'GET' ? await visitor.get(path) : await visitor.send(endpoint.method, path, {});
    expect([answer.status, answer.json()]).toEqual([401, expect.objectContaining({ code: 'sign-in-needed' })]);
  },
);

test('a member is not told of the tools of a role they do not have', async () => {
  const member = await site.as({ handle: 'wren' });
  const forRoles = stated.filter(({ access, method }) => (access === 'moderator' || access === 'administrator') && method === 'GET');
  for (const { path } of forRoles) expect((await member.get(path.replace(/:\w+/g, '1'))).status).toBe(404);
  expect((await member.get('/api/nothing-here')).status).toBe(404);
});
