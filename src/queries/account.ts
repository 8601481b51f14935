import { queryOptions, type QueryClient } from '@tanstack/react-query';
import type { readAccount, readJoining } from '#contracts/session.ts';
import { call } from '#src/lib/transport.ts';
import { sessionQuery } from './session.ts';

/** The signed-in person's own account. */
export function accountQuery() {
  return queryOptions({
    queryKey: ['account', 'me', 'view'],
    queryFn: ({ client }) => call<typeof readAccount>(client, 'GET', '/api/account'),
  });
}

/** The sign-up with GitHub this browser is in the middle of. */
export function joiningQuery() {
  return queryOptions({
    queryKey: ['account', 'joining', 'view'],
    queryFn: ({ client }) => call<typeof readJoining>(client, 'GET', '/api/accounts/joining'),
  });
}

/** Who is signed in now, asked afresh: they may have signed in or out in another window. */
export async function viewerNow(client: QueryClient) {
  return (await client.fetchQuery({ ...sessionQuery(), staleTime: 0 })).viewer;
}

/** After a change to the account: its page and the bar show it. */
export async function accountChanged(client: QueryClient): Promise<void> {
  await Promise.all([
    client.invalidateQueries({ queryKey: accountQuery().queryKey, refetchType: 'all' }),
    client.invalidateQueries({ queryKey: sessionQuery().queryKey, refetchType: 'all' }),
  ]);
}
