import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { discardWorking, readDesk, readLastTime, saveWorking, signOffEntry, startEntry, takeBackEntry } from '#contracts/entries.ts';
import type { InputOf } from '#contracts/endpoint.ts';
import { call, useCall } from '#src/lib/transport.ts';
import { previewQuery } from './reading.ts';

export interface EntryAt {
  build: string;
  number: number;
}

/** All the desk needs to show a cost while somebody types. Its figures go stale at once: others write too. */
export const deskQuery = ({ build, number }: EntryAt) => queryOptions({
  queryKey: ['entries', build, number, 'desk'],
  queryFn: ({ client }) => call<typeof readDesk>(client, 'GET', '/api/builds/:build/desk/:number', { params: { build, number } }),
  staleTime: 0,
  refetchOnMount: false,
  refetchOnReconnect: false,
});

/** Lines for "same as last time", of the same stage where there are any. */
export const lastTimeQuery = ({ build, number }: EntryAt, stage: number | null) => queryOptions({
  queryKey: ['entries', build, number, 'last-time', stage],
  queryFn: ({ client }) => call<typeof readLastTime>(client, 'GET', '/api/builds/:build/entries/:number/last-time', { params: { build, number }, query: stage === null ? {} : { stage } }),
});

/** Calls of one entry. They throw `AppError`; the desk decides what each outcome means for what was typed. */
export function useEntryCalls({ build, number }: EntryAt) {
  const send = useCall();
  const params = { build, number };
  return {
    saveWorking: (body: InputOf<typeof saveWorking>['body']) => send<typeof saveWorking>('PUT', '/api/builds/:build/entries/:number/working', { params, body }),
    signOff: (body: InputOf<typeof signOffEntry>['body']) => send<typeof signOffEntry>('POST', '/api/builds/:build/entries/:number/sign-off', { params, body }),
    takeBack: (version: number) => send<typeof takeBackEntry>('POST', '/api/builds/:build/entries/:number/take-back', { params, body: { version } }),
    discard: (version: number) => send<typeof discardWorking>('DELETE', '/api/builds/:build/entries/:number/working', { params, body: { version } }),
  };
}

/** After an entry was published, taken back or thrown away: the build, its pages and the lists of drafts are fetched again. */
export function useEntrySettled({ build, number }: EntryAt) {
  const client = useQueryClient();
  return async () => {
    const moved = ({ queryKey }: { queryKey: readonly unknown[] }) => queryKey[0] !== 'session' && queryKey[0] !== 'pictures';
    client.removeQueries({ type: 'inactive', predicate: moved });
    await client.invalidateQueries({ predicate: moved, refetchType: 'none' });
    client.removeQueries({ queryKey: previewQuery(build, number).queryKey });
  };
}

export function useStartEntry(build: string) {
  const send = useCall();
  return useMutation({ mutationFn: (body: InputOf<typeof startEntry>['body']) => send<typeof startEntry>('POST', '/api/builds/:build/entries', { params: { build }, body }) });
}
