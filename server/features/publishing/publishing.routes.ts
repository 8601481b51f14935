import { readBuild, readBuilds } from '#contracts/builds.ts';
import { previewEntry, readEntryPage } from '#contracts/entries.ts';
import { readHome } from '#contracts/home.ts';
import { handle, type EndpointTable } from '#server/http/endpoint-table.ts';
import { readBuildPage } from './build-page.service.ts';
import { listBuilds } from './builds-list.service.ts';
import { previewWorking, readEntryBySlug } from './entry-page.service.ts';
import { readFrontPage } from './home.service.ts';

/** What the world reads. */
export function publishingRoutes(table: EndpointTable): void {
  handle(table, readHome, async ({ em }) => readFrontPage(em));
  handle(table, readBuilds, async ({ em }, { query }) => listBuilds(em, query.kind, query.page));
  handle(table, readBuild, async ({ em, viewer }, { params, query }) => readBuildPage(em, viewer, params.build, query.page));
  handle(table, readEntryPage, async ({ em, viewer }, { params }) => readEntryBySlug(em, viewer, params.build, params.entry));
  handle(table, previewEntry, async ({ em, viewer }, { params }) => previewWorking(em, viewer, params.build, params.number));
}
