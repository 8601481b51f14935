import { createHash } from 'node:crypto';
import type { Knex } from '@mikro-orm/sqlite';
import session, { Store, type SessionData } from 'express-session';
import type { Joining } from './context.ts';

declare module 'express-session' {
  interface SessionData {
    /** Who is signed in. */
    personId?: number;
    /** Where to go after a sign-in by provider. */
    next?: string;
    /** A sign-up by provider that is not finished. */
    joining?: Joining;
  }
}

/** A session id as it is stored: a copy of the database opens no session. */
export function storedId(sid: string): string {
  return createHash('sha256').update(sid).digest('base64url');
}

type Done<T> = (error: unknown, value?: T) => void;
function settle<T>(work: PromiseLike<T>, done: Done<T> | undefined): void {
  work.then((value) => done?.(null, value), (error: unknown) => done?.(error));
}

export interface SessionLifetimes {
  /** From signing in, however much it is used. */
  readonly longestMs: number;
  /** Since it was last used. */
  readonly unusedMs: number;
  /** Of a browser that is only on its way to a provider and back. */
  readonly passingMs: number;
}
/** Use is written down this coarsely, so that reading a page is not a write. */
const touchEveryMs = 3_600_000;

/** express-session's store on the ORM's own connection, table `http_session`. */
export class DatabaseSessionStore extends Store {
  readonly #knex: Knex;
  readonly #lifetimes: SessionLifetimes;
  constructor(knex: Knex, lifetimes: SessionLifetimes) {
    super();
    this.#knex = knex;
    this.#lifetimes = lifetimes;
  }
  override get(sid: string, done: Done<SessionData | null>): void {
    const row = this.#knex('http_session').where('sid', storedId(sid)).andWhere('expires_at', '>', Date.now()).first('data');
    settle(row.then((found: { data: string } | undefined) => (found ? (JSON.parse(found.data) as SessionData) : null)), done);
  }
  override set(sid: string, data: SessionData, done?: Done<unknown>): void {
    const now = Date.now();
    const { unusedMs, passingMs } = this.#lifetimes;
    const row = {
      sid: storedId(sid), data: JSON.stringify(data), person_id: data.personId ?? null,
      expires_at: now + (data.personId === undefined ? passingMs : unusedMs),
    };
    settle(this.#knex('http_session').insert({ ...row, created_at: now }).onConflict('sid').merge(row), done);
  }
  override touch(sid: string, data: SessionData, done?: () => void): void {
    if (data.personId === undefined) {
      done?.();
      return;
    }
    const { longestMs, unusedMs } = this.#lifetimes;
    const until = Date.now() + unusedMs;
    const row = this.#knex('http_session').where('sid', storedId(sid)).andWhere('expires_at', '<', until - touchEveryMs);
    settle(row.update({ expires_at: this.#knex.raw('min(?, created_at + ?)', [until, longestMs]) }), done);
  }
  override destroy(sid: string, done?: Done<unknown>): void {
    settle(this.#knex('http_session').where('sid', storedId(sid)).delete(), done);
  }
}

export { session };
