import type { RequestHandler, Router } from 'express';
import type { Parts } from '#server/http/context.ts';
import type { EndpointTable } from '#server/http/endpoint-table.ts';
import { accountLimits, accountRoutes, accountsRouter } from './accounts/accounts.routes.ts';
import { buildRoutes } from './builds/builds.routes.ts';
import { entryRoutes } from './entries/entries.routes.ts';
import { pictureRoutes, picturesRouter } from './media/pictures.routes.ts';
import { publishingRoutes } from './publishing/publishing.routes.ts';
import { feedsRouter } from './publishing/feeds.routes.ts';
import { materialRoutes } from './shelf/materials.routes.ts';

/** Every feature, in one place. */
export function registerFeatures(table: EndpointTable, parts: Parts): void {
  accountRoutes(table);
  buildRoutes(table);
  materialRoutes(table);
  entryRoutes(table);
  pictureRoutes(table, parts);
  publishingRoutes(table);
}

/** Addresses that are no endpoints: provider sign-in, picture files, feeds. */
export function featureRouters(parts: Parts): Router[] {
  return [accountsRouter(parts), picturesRouter(parts), feedsRouter(parts)];
}

export function featureLimits(_parts: Parts): RequestHandler {
  return accountLimits();
}
