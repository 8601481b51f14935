import { queryOptions } from '@tanstack/react-query';
import type { readBuild, readBuilds } from '#contracts/builds.ts';
import type { previewEntry, readEntryPage } from '#contracts/entries.ts';
import type { readHome } from '#contracts/home.ts';
import type { BuildKind } from '#contracts/words.ts';
import { call } from '#src/lib/transport.ts';

export function homeQuery() {
  return queryOptions({ queryKey: ['home', 'site', 'page'], queryFn: ({ client }) => call<typeof readHome>(client, 'GET', '/api/home') });
}
export function buildsQuery(kind: BuildKind | undefined, page: number) {
  return queryOptions({
    queryKey: ['builds', kind ?? 'all', page],
    queryFn: ({ client }) => call<typeof readBuilds>(client, 'GET', '/api/builds', { query: { kind, page } }),
  });
}
export function buildQuery(build: string, page: number) {
  return queryOptions({
    queryKey: ['build', build, `page-${page}`],
    queryFn: ({ client }) => call<typeof readBuild>(client, 'GET', '/api/builds/:build', { params: { build }, query: { page } }),
  });
}
export function entryPageQuery(build: string, entry: string) {
  return queryOptions({
    queryKey: ['entry', `${build}/${entry}`, 'page'],
    queryFn: ({ client }) => call<typeof readEntryPage>(client, 'GET', '/api/builds/:build/pages/:entry', { params: { build, entry } }),
  });
}
export function previewQuery(build: string, number: number) {
  return queryOptions({
    queryKey: ['entry', `${build}/${number}`, 'preview'],
    queryFn: ({ client }) => call<typeof previewEntry>(client, 'GET', '/api/builds/:build/entries/:number/preview', { params: { build, number } }),
    staleTime: 0,
  });
}
