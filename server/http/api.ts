import { Router, type RequestHandler } from 'express';
import { AppError } from '#contracts/errors.ts';
import { invoke, type EndpointTable, type MountedEndpoint } from './endpoint-table.ts';
import type { Parts } from './context.ts';
import { contextOf } from './request-context.ts';

function answer(table: EndpointTable, mounted: MountedEndpoint, parts: Parts): RequestHandler {
  const { method, path } = mounted.endpoint;
  return async (req, res) => {
    const reply = await invoke(table, method, path, { params: req.params, query: req.query, body: req.body }, await contextOf(req, parts));
    res.set('Cache-Control', 'no-store').json(reply);
  };
}

/** The JSON API: every endpoint of the table at its own address. */
export function apiRouter(table: EndpointTable, parts: Parts): Router {
  const router = Router();
  for (const mounted of table.values()) {
    const verb = mounted.endpoint.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
    router[verb](mounted.endpoint.path, ...mounted.before, answer(table, mounted, parts));
  }
  router.use('/api', (_req, _res, next) => next(new AppError('not-found', 'There is nothing at this address.')));
  return router;
}
