import { archiveBuild, changeBuild, changeStages, readBuildSettings, readMyBuilds, readStages, startBuild } from '#contracts/builds.ts';
import { done } from '#contracts/fields.ts';
import { handle, type EndpointTable } from '#server/http/endpoint-table.ts';
import { changeSettings, readSettings, setArchived, startRestoration } from './builds.service.ts';
import { listMyBuilds } from './my-builds.service.ts';
import { listStages, replaceStages } from './stages.service.ts';

export function buildRoutes(table: EndpointTable): void {
  handle(table, startBuild, async ({ em, viewer, parts }, { body }) => ({ slug: (await startRestoration(em, viewer, body, parts.now().toISOString().slice(0, 10))).slug }));
  handle(table, readBuildSettings, async ({ em, viewer }, { params }) => readSettings(em, viewer, params.build));
  handle(table, changeBuild, async ({ em, viewer }, { params, body }) => {
    const { slug, version } = await changeSettings(em, viewer, params.build, body);
    return { slug, version };
  });
  handle(table, archiveBuild, async ({ em, viewer, parts }, { params, body }) => {
    await setArchived(em, viewer, params.build, body.archived, parts.now());
    return done;
  });
  handle(table, readStages, async ({ em, viewer }, { params }) => listStages(em, viewer, params.build));
  handle(table, changeStages, async ({ em, viewer }, { params, body }) => {
    await replaceStages(em, viewer, params.build, body.stages, body.version);
    return done;
  });
  handle(table, readMyBuilds, async ({ em, viewer }) => ({ builds: await listMyBuilds(em, viewer) }));
}
