import { useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useCallback } from 'react';
import type { Endpoint, InputOf, Method, ReplyOf } from '#contracts/endpoint.ts';

// One way to an endpoint for pages, forms and scripts: on the server it is invoked in place, in the browser it is fetched.

export interface CallInput {
  params?: unknown;
  query?: unknown;
  body?: unknown;
}
export type Transport = (method: Method, path: string, input: CallInput) => Promise<unknown>;

const transports = new WeakMap<QueryClient, Transport>();

/** Gives a query client its way to the endpoints; made once per request on the server, once per page in the browser. */
export function bindTransport(client: QueryClient, transport: Transport): void {
  transports.set(client, transport);
}

type Sent<E extends Endpoint> = { [K in keyof InputOf<E>]?: InputOf<E>[K] };

/**
 * Calls one endpoint. `E` is the contract, imported as a type only, so that no schema reaches a reader's page.
 * @throws AppError for outcomes the caller can act on
 */
export async function call<E extends Endpoint>(client: QueryClient, method: E['method'], path: E['path'], input: Sent<E> = {}): Promise<ReplyOf<E>> {
  const transport = transports.get(client);
  if (!transport) throw new Error('This query client has no transport');
  return (await transport(method, path, input)) as ReplyOf<E>;
}

/** `call` bound to the query client around. */
export function useCall() {
  const client = useQueryClient();
  return useCallback(<E extends Endpoint>(method: E['method'], path: E['path'], input: Sent<E> = {}) => call<E>(client, method, path, input), [client]);
}
