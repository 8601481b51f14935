import express, { type RequestHandler } from 'express';
import { once } from 'node:events';
import { request } from 'node:http';
import { expect, test } from 'vitest';
import { sameOrigin } from '#server/http/same-origin.ts';
import { startTestServer } from '#tests/support/test-server.ts';

// While the site runs on its own machine, a name of somebody else's that was made to lead here is not the site.
test('a page under a name that only leads to this machine may change nothing here; localhost may', async () => {
  const site = await startTestServer();
  const told: RequestHandler = (_req, res) => void res.status(204).end();
  const refused: express.ErrorRequestHandler = (error: { status: number }, _req, res, _next) => void res.status(error.status).end();
  const http = express().use(sameOrigin(site.parts.config), told, refused).listen(0, '127.0.0.1');
  await once(http, 'listening');
  const address = http.address();
  const port = typeof address === 'object' && address ? address.port : 0;
  const statusUnder = (name: string) => new Promise<number | undefined>((resolve, reject) => {
    const headers = { host: `${name}:${port}`, origin: `http://${name}:${port}`, 'sec-fetch-site': 'same-origin' };
    request({ host: '127.0.0.1', port, method: 'POST', path: '/', headers }, (answer) => {
      answer.resume();
      resolve(answer.statusCode);
    }).on('error', reject).end();
  });
  expect([await statusUnder('rebound.example'), await statusUnder('localhost'), await statusUnder('127.0.0.1')]).toEqual([403, 204, 204]);
  http.close();
  await site.close();
});
