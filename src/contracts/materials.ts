import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { noBody, nothing } from './fields.ts';
import { hazardTags } from './words.ts';

export const dimensions = ['volume', 'mass', 'length', 'area', 'timber', 'count'] as const;
const exact = z.string().regex(/^\d+\/\d+$/).max(80);
export const packView = z.object({ name: z.string(), amount: exact });

export const materialView = z.object({
  id: z.number().int(), name: z.string(), dimension: z.enum(dimensions), unit: z.string(),
  packs: z.array(packView), ratio: z.object({ to: z.enum(dimensions), amount: exact, about: z.boolean() }).nullable(),
  hazards: z.array(z.enum(hazardTags)),
});
export type MaterialView = z.output<typeof materialView>;

export const readMyMaterials = endpoint({
  method: 'GET', path: '/api/my/materials', access: 'member', params: nothing,
  /** The owner of a build one is crew of; nothing for one's own. */
  query: z.object({ build: z.string().max(80).optional() }), body: noBody, reply: z.object({ materials: z.array(materialView) }),
});
/** Adds a material to the restorer's list (of the build's owner). Packs as typed: name "box", amount "500" or "2.5 l". */
export const addMaterial = endpoint({
  method: 'POST', path: '/api/my/materials', access: 'member', params: nothing, query: nothing,
  body: z.object({
    build: z.string().max(80).optional(),
    name: z.string().trim().min(1, 'Say what it is called.').max(120, '120 letters at most.'),
    dimension: z.enum(dimensions, 'Say how it is measured.'),
    unit: z.string().max(40),
    packs: z.array(z.object({ name: z.string().trim().min(1, 'Say what the pack is called.').max(40), amount: z.string().trim().min(1, 'Say what is in it.').max(40) })).max(12),
    hazards: z.array(z.enum(hazardTags)).max(16).optional(),
  }),
  reply: materialView,
});
