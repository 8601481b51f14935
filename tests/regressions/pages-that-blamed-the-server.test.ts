import { once } from 'node:events';
import { createServer, request } from 'node:http';
import express, { type Express, type RequestHandler } from 'express';
import { afterAll, beforeAll, expect, test, vi } from 'vitest';
import { changeBuild, readBuildSettings, startBuild } from '#contracts/builds.ts';
import { pageFault } from '#server/http/error-reply.ts';
import type { PageShell } from '#server/http/page-shell.ts';
import { pageHandler } from '#server/http/pages.ts';
import { sourceShell } from '#tests/support/source-shell.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

let site: TestServer;
beforeAll(async () => {
  site = await startTestServer({ pages: 'source' });
});
afterAll(() => site.close());

/** Sends a request line just as it is: `fetch` would mend it first. */
function raw(method: string, path: string): Promise<{ status: number; location: string | undefined }> {
  return new Promise((resolve, reject) => {
    const { hostname, port } = new URL(site.url);
    request({ hostname, port, method, path }, (answer) => {
      answer.resume().on('end', () => resolve({ status: answer.statusCode ?? 0, location: answer.headers.location }));
    }).on('error', reject).end();
  });
}

const withLog: RequestHandler = (req, _res, next) => {
  req.log = site.parts.log;
  next();
};

/** Asks an app of the test's own, once. */
async function asked(app: Express, path: string, signal?: AbortSignal): Promise<Response> {
  const server = createServer(app).listen(0, '127.0.0.1');
  await once(server, 'listening');
  const address = server.address();
  const port = typeof address === 'object' && address ? address.port : 0;
  try {
    return await fetch(`http://127.0.0.1:${port}${path}`, signal ? { signal } : {});
  } finally {
    server.close();
  }
}

test('an address that cannot be read is the asker’s fault and is not logged as ours', async () => {
  const logged = vi.spyOn(site.parts.log, 'error');
  for (const path of ['//[', '/builds/%E0%A4%A/feed.xml', '/builds/%E0%A4%A', '/%']) {
    const { status } = await raw('GET', path);
    expect([path, status >= 400 && status < 500]).toEqual([path, true]);
  }
  expect(logged).not.toHaveBeenCalled();
});

test('an address that names another site is no page here', async () => {
  for (const path of ['//builds', '//other.example/settings', '/\\other.example/settings']) expect(await raw('GET', path), path).toMatchObject({ status: 404 });
  expect(await raw('POST', '//sign-in')).toMatchObject({ status: 404 });
});

test('a file that is gone since the last build is not there, and is no fault of ours', async () => {
  // as the built site serves them
  const app = express().use(withLog).use('/assets', express.static('src', { fallthrough: false, index: false })).use(pageFault);
  expect((await asked(app, '/assets/page-old.js')).status).toBe(404);
});

test('a reader who leaves before the page is there is no fault', async () => {
  const logged = vi.spyOn(site.parts.log, 'error');
  let left = (): void => undefined;
  const leaving = new Promise<void>((resolve) => {
    left = resolve;
  });
  const stop = new AbortController();
  const slow: PageShell = {
    ...sourceShell,
    entry: async () => ({
      render: (page) => new Promise((_, reject) => {
        page.signal.addEventListener('abort', () => {
          reject(new Error('broken off'));
          setImmediate(left);
        });
        stop.abort();
      }),
    }),
  };
  const app = express().use(withLog, pageHandler(site.table, site.parts, slow), pageFault);
  await expect(asked(app, '/', stop.signal)).rejects.toThrow('aborted');
  await leaving;
  expect(logged).not.toHaveBeenCalled();
});

test('a form that is too large is told so', async () => {
  const answer = await site.visitor().submit('/write', { title: 'x'.repeat(600_000) });
  expect(answer.status).toBe(413);
});

test('asking for the head of a moved page answers as asking for the page does', async () => {
  const owner = await site.as({ handle: 'owner' });
  const { slug } = await owner.ask(startBuild, { body: { kind: 'boat', title: 'Old name', currency: 'GBP', measures: 'imperial' } });
  const { version } = await owner.ask(readBuildSettings, { params: { build: slug } });
  await owner.ask(changeBuild, { params: { build: slug }, body: { title: 'New name', version } });
  for (const method of ['GET', 'HEAD']) expect(await raw(method, `/builds/${slug}`), method).toEqual({ status: 301, location: '/builds/new-name' });
});
