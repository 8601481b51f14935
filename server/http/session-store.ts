import { createHash } from 'node:crypto';
import type { Knex } from '@mikro-orm/sqlite';
import session, { Store, type SessionData } from 'express-session';

declare module 'express-session' {
  interface SessionData {
    /** Who is signed in. */
    personId?: number;
    /** Where to go after a sign-in by provider. */
    next?: string;
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

/** express-session's store on the ORM's own connection, table `http_session`. */
export class DatabaseSessionStore extends Store {
  readonly #knex: Knex;
  readonly #lifetime: number;
  constructor(knex: Knex, lifetimeMs: number) {
    super();
    this.#knex = knex;
    this.#lifetime = lifetimeMs;
  }
  override get(sid: string, done: Done<SessionData | null>): void {
    const row = this.#knex('http_session').where('sid', storedId(sid)).andWhere('expires_at', '>', Date.now()).first('data');
    settle(row.then((found: { data: string } | undefined) => (found ? (JSON.parse(found.data) as SessionData) : null)), done);
  }
  override set(sid: string, data: SessionData, done?: Done<unknown>): void {
    const row = {
      sid: storedId(sid), data: JSON.stringify(data), person_id: data.personId ?? null,
      expires_at: Date.now() + this.#lifetime, created_at: Date.now(),
    };
    const { created_at: _, ...changed } = row;
    settle(this.#knex('http_session').insert(row).onConflict('sid').merge(changed), done);
  }
  override touch(sid: string, _data: SessionData, done?: () => void): void {
    settle(this.#knex('http_session').where('sid', storedId(sid)).update({ expires_at: Date.now() + this.#lifetime }), done);
  }
  override destroy(sid: string, done?: Done<unknown>): void {
    settle(this.#knex('http_session').where('sid', storedId(sid)).delete(), done);
  }
}

export { session };
