import { addMaterial, readMyMaterials } from '#contracts/materials.ts';
import { handle, type EndpointTable } from '#server/http/endpoint-table.ts';
import { addToMaterials, listMaterials } from './materials.service.ts';

export function materialRoutes(table: EndpointTable): void {
  handle(table, readMyMaterials, async ({ em, viewer }, { query }) => ({ materials: await listMaterials(em, viewer, query.build) }));
  handle(table, addMaterial, ({ em, viewer }, { body: { build, ...input } }) => addToMaterials(em, viewer, build, input));
}
