import { queryOptions } from '@tanstack/react-query';
import type { readSession } from '#contracts/session.ts';
import { call } from '#src/lib/transport.ts';

/** Who is looking. */
export function sessionQuery() {
  return queryOptions({
    queryKey: ['session', 'me', 'view'],
    queryFn: ({ client }) => call<typeof readSession>(client, 'GET', '/api/session'),
    staleTime: 5 * 60_000,
  });
}
