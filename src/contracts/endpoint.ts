import type { z } from 'zod';
import type { Access } from './words.ts';

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/** What crosses the wire at one address. Missing means leave alone; `null` means clear. */
export interface Endpoint<
  M extends Method = Method,
  P extends string = string,
  Params extends z.ZodType = z.ZodType,
  Query extends z.ZodType = z.ZodType,
  Body extends z.ZodType = z.ZodType,
  Reply extends z.ZodType = z.ZodType,
> {
  readonly method: M;
  readonly path: P;
  /** Who may call at all; what they may do to which build is asked by the service. */
  readonly access: Access;
  readonly params: Params;
  readonly query: Query;
  readonly body: Body;
  readonly reply: Reply;
}

/** States an endpoint once; the route, the page loader, the client's types and the described API all read it. */
export function endpoint<
  const M extends Method, const P extends string,
  Params extends z.ZodType, Query extends z.ZodType, Body extends z.ZodType, Reply extends z.ZodType,
>(spec: Endpoint<M, P, Params, Query, Body, Reply>): Endpoint<M, P, Params, Query, Body, Reply> {
  return spec;
}

type AnyEndpoint = Endpoint;
/** What a caller sends. */
export type InputOf<E extends AnyEndpoint> = {
  params: z.input<E['params']>;
  query: z.input<E['query']>;
  body: z.input<E['body']>;
};
/** What a route is given after parsing. */
export type ParsedOf<E extends AnyEndpoint> = {
  params: z.output<E['params']>;
  query: z.output<E['query']>;
  body: z.output<E['body']>;
};
export type ReplyOf<E extends AnyEndpoint> = z.output<E['reply']>;
