import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { InputOf } from '#contracts/endpoint.ts';
import type { addMaterial, readMyMaterials } from '#contracts/materials.ts';
import { call, useCall } from '#src/lib/transport.ts';

export type NewMaterial = Omit<InputOf<typeof addMaterial>['body'], 'build'>;

/** The materials of the build's owner. */
export const materialsQuery = (build: string) => queryOptions({
  queryKey: ['materials', build, 'list'],
  queryFn: ({ client }) => call<typeof readMyMaterials>(client, 'GET', '/api/my/materials', { query: { build } }),
});

export function useAddMaterial(build: string) {
  const send = useCall();
  const client = useQueryClient();
  return useMutation({
    mutationFn: (material: NewMaterial) => send<typeof addMaterial>('POST', '/api/my/materials', { body: { ...material, build } }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['materials', build] }),
  });
}
