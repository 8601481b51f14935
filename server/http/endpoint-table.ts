import type { RequestHandler } from 'express';
import type { z } from 'zod';
import type { Endpoint, Method, ParsedOf } from '#contracts/endpoint.ts';
import { AppError, type FieldProblems } from '#contracts/errors.ts';
import type { Access, Role } from '#contracts/words.ts';
import type { Caller, Context } from './context.ts';
import { unshowableIn } from './unshowable.ts';
import './zod-words.ts';

type ReplyInput<E extends Endpoint> = z.input<E['reply']>;
type MemberContext = Context & { readonly viewer: Caller };
/** Endpoints above `anyone` always have a viewer. */
export type ContextOf<E extends Endpoint> = E['access'] extends 'anyone' ? Context : MemberContext;
export type Run<E extends Endpoint> = (context: ContextOf<E>, input: ParsedOf<E>) => Promise<ReplyInput<E>>;

export interface MountedEndpoint {
  readonly endpoint: Endpoint;
  readonly run: (context: Context, input: { params: unknown; query: unknown; body: unknown }) => Promise<unknown>;
  readonly before: readonly RequestHandler[];
}
/** Every endpoint of the site, by `METHOD /path`. Pages, forms and the API all go through it. */
export type EndpointTable = Map<string, MountedEndpoint>;

/** Mounts an endpoint: access, parse, one service call, the reply cut to its schema. */
export function handle<E extends Endpoint>(table: EndpointTable, endpoint: E, run: Run<E>, before: readonly RequestHandler[] = []): void {
  const key = `${endpoint.method} ${endpoint.path}`;
  if (table.has(key)) throw new Error(`${key} is mounted twice`);
  // what `invoke` hands over was parsed by this very endpoint's schemas
  table.set(key, { endpoint, run: run as unknown as MountedEndpoint['run'], before });
}

const rank: Readonly<Record<Access, number>> = { anyone: 0, member: 1, moderator: 2, administrator: 3 };
const rankOf: Readonly<Record<Role, number>> = { member: 1, moderator: 2, administrator: 3 };

function requireAccess(endpoint: Endpoint, context: Context): void {
  const needed = rank[endpoint.access];
  if (needed === 0) return;
  if (!context.viewer) throw new AppError('sign-in-needed', 'Sign in first.');
  // the tools of a role are not hinted at to those without it
  if (rankOf[context.viewer.role] < needed) throw new AppError('not-found', 'There is nothing at this address.');
  if (context.viewer.suspended && endpoint.method !== 'GET') throw new AppError('suspended', 'This account is suspended: you can read, and take your data away.');
}

/** Field problems of a failed parse, keyed by the path of each field. */
export function fieldProblems(error: z.ZodError): FieldProblems {
  const fields: Record<string, string> = {};
  for (const issue of error.issues) fields[issue.path.map(String).join('.') || 'form'] ??= issue.message;
  return fields;
}

function parsed(schema: z.ZodType, value: unknown, missing: 'bad-input' | 'not-found'): unknown {
  const unshowable = unshowableIn(value);
  if (unshowable !== null && missing === 'bad-input') {
    const words = 'This holds a character that cannot be shown, often from pasting. Type it again without it.';
    throw new AppError('bad-input', words, { [unshowable === '' ? 'form' : unshowable]: words });
  }
  const result = schema.safeParse(value ?? {});
  if (result.success) return result.data;
  if (missing === 'not-found') throw new AppError('not-found', 'There is nothing at this address.');
  const fields = fieldProblems(result.error);
  // one problem is said itself, for whoever shows no fields
  const [words = 'Some of this needs mending.', ...more] = Object.values(fields);
  throw new AppError('bad-input', more.length > 0 ? 'Some of this needs mending.' : words, fields);
}

/**
 * Calls one endpoint in place, with the same access, parsing and cut as over the wire.
 * @throws AppError for outcomes the caller can act on
 */
export async function invoke(table: EndpointTable, method: Method, path: string, input: { params?: unknown; query?: unknown; body?: unknown }, context: Context): Promise<unknown> {
  const mounted = table.get(`${method} ${path}`);
  if (!mounted) throw new Error(`No endpoint ${method} ${path}`);
  const { endpoint, run } = mounted;
  requireAccess(endpoint, context);
  if (context.refusal && endpoint.method !== 'GET') throw context.refusal;
  const reply = await run(context, {
    params: parsed(endpoint.params, input.params, 'not-found'),
    query: parsed(endpoint.query, input.query, 'bad-input'),
    body: endpoint.method === 'GET' ? undefined : parsed(endpoint.body, input.body, 'bad-input'),
  });
  return endpoint.reply.parse(reply);
}
