import { queryOptions } from '@tanstack/react-query';
import type { readBuildSettings, readMyBuilds, readStages } from '#contracts/builds.ts';
import { call } from '#src/lib/transport.ts';

export function myBuildsQuery() {
  return queryOptions({ queryKey: ['builds', 'mine', 'list'], queryFn: ({ client }) => call<typeof readMyBuilds>(client, 'GET', '/api/my/builds'), staleTime: 0 });
}
export function buildSettingsQuery(build: string) {
  return queryOptions({
    queryKey: ['build', build, 'settings'],
    queryFn: ({ client }) => call<typeof readBuildSettings>(client, 'GET', '/api/builds/:build/settings', { params: { build } }), staleTime: 0,
  });
}
export function stagesQuery(build: string) {
  return queryOptions({
    queryKey: ['build', build, 'stages'],
    queryFn: ({ client }) => call<typeof readStages>(client, 'GET', '/api/builds/:build/stages', { params: { build } }), staleTime: 0,
  });
}
