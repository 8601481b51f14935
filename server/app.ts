import type { Server } from 'node:http';
import express, { type Express } from 'express';
import helmet from 'helmet';
import { pinoHttp } from 'pino-http';
import { AppError } from '#contracts/errors.ts';
import { apiRouter } from './http/api.ts';
import type { Parts } from './http/context.ts';
import type { EndpointTable } from './http/endpoint-table.ts';
import { pageFault } from './http/error-reply.ts';
import { builtShell, viteShell, type PageShell } from './http/page-shell.ts';
import { pageHandler } from './http/pages.ts';
import { plainAddress } from './http/plain-address.ts';
import { sameOrigin } from './http/same-origin.ts';
import { sessions } from './http/sessions.ts';
import { registerFeatures, featureRouters, featureLimits } from './features/index.ts';

export interface AppOptions {
  readonly parts: Parts;
  /** `api`: no pages, for tests of services; `dev`: pages by Vite on the given server; or a shell of the caller's own. */
  readonly pages: 'built' | 'dev' | 'api' | PageShell;
  readonly http?: Server;
  /** Whether the demo is in and the site may be sent readers. */
  readonly ready?: () => boolean;
}

export interface App {
  readonly app: Express;
  readonly table: EndpointTable;
  close(): Promise<void>;
}

function security(parts: Parts, dev: boolean) {
  const secure = parts.config.publicUrl.startsWith('https:');
  return helmet({
    contentSecurityPolicy: dev ? false : {
      directives: {
        'default-src': ["'none'"], 'script-src': ["'self'"], 'style-src': ["'self'"], 'style-src-attr': ["'unsafe-inline'"],
        'img-src': ["'self'", 'data:', 'blob:'], 'font-src': ["'self'"], 'connect-src': ["'self'"], 'manifest-src': ["'self'"],
        'form-action': ["'self'"], 'base-uri': ["'none'"], 'frame-ancestors': ["'none'"], 'object-src': ["'none'"],
        'upgrade-insecure-requests': secure ? [] : null,
      },
    },
    strictTransportSecurity: secure ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    referrerPolicy: { policy: 'strict-origin-when-cross-origin' },
    crossOriginOpenerPolicy: { policy: 'same-origin' },
    crossOriginResourcePolicy: { policy: 'same-origin' },
  });
}

/** Builds the Express app from its parts. Listens to nothing and starts nothing. */
export async function createApp({ parts, pages, http, ready }: AppOptions): Promise<App> {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', parts.config.trustProxy);
  app.set('query parser', 'simple');
  app.get('/healthz', (_req, res) => void res.type('text').send('ok\n'));
  app.get('/readyz', (_req, res) => void res.status(ready?.() === false ? 503 : 200).type('text').send(ready?.() === false ? 'not yet\n' : 'ready\n'));
  app.use(pinoHttp({ logger: parts.log, autoLogging: false, quietReqLogger: true }));
  app.use(security(parts, pages === 'dev'));
  app.use(plainAddress);

  let shell: PageShell | null = typeof pages === 'object' ? pages : null;
  if (pages === 'built') shell = await builtShell(app);
  if (pages === 'dev' && http) shell = await viteShell(app, http);

  app.use(sameOrigin(parts.config));
  app.use(sessions(parts));
  if (parts.limits) app.use(featureLimits(parts));
  app.use('/api', express.json({ limit: '2mb' }));
  app.use(express.urlencoded({ extended: false, limit: '512kb' }));

  const table: EndpointTable = new Map();
  registerFeatures(table, parts);
  for (const router of featureRouters(parts)) app.use(router);
  app.use(apiRouter(table, parts));
  if (shell) {
    const page = pageHandler(table, parts, shell);
    app.get('/{*path}', page);
    app.post('/{*path}', page);
  }
  app.use((_req, _res, next) => next(new AppError('not-found', 'There is nothing at this address.')));
  app.use(pageFault);
  return { app, table, close: async () => shell?.close() };
}
