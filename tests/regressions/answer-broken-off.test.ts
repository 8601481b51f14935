import { once } from 'node:events';
import { createServer, type Server } from 'node:http';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { AppError } from '#contracts/errors.ts';
import { fetchTransport } from '#src/lib/fetch-transport.ts';

let server: Server;
let root = '';
const real = globalThis.fetch;

beforeAll(async () => {
  server = createServer((req, res) => {
    if (req.url === '/broken-off') {
      res.writeHead(200, { 'content-type': 'application/json', 'content-length': '100' });
      res.write('{"ok":');
      setTimeout(() => res.destroy(), 20);
    } else {
      res.writeHead(200, { 'content-type': 'application/json' });
      res.end('{"ok":');
    }
  }).listen(0, '127.0.0.1');
  await once(server, 'listening');
  const address = server.address();
  root = typeof address === 'object' && address ? `http://127.0.0.1:${address.port}` : '';
  // pages ask by path; here there is no page to be relative to
  globalThis.fetch = (path, init) => real(new URL(path instanceof Request ? path.url : path, root), init);
});
afterAll(() => {
  globalThis.fetch = real;
  server.close();
});

// The desk tries again after an outcome, and stops for good at anything else.
test.each(['/broken-off', '/half'])('a connection lost while the answer comes (%s) is an outcome to try again after', async (path) => {
  const failure: unknown = await fetchTransport('GET', path, {}).catch((error: unknown) => error);
  expect(failure).toBeInstanceOf(AppError);
  expect(failure).toMatchObject({ code: 'unreachable' });
});
