import type { SqlEntityManager } from '@mikro-orm/sqlite';
import type { Logger } from 'pino';
import type { AppError } from '#contracts/errors.ts';
import type { Role } from '#contracts/words.ts';
import type { Config } from '#server/config.ts';
import type { Orm } from '#server/database.ts';

export type Em = SqlEntityManager;

/** Who is asking. */
export interface Caller {
  readonly id: number;
  readonly handle: string;
  readonly name: string;
  readonly role: Role;
  readonly suspended: boolean;
}
export type Viewer = Caller | null;

/** Somebody a provider vouches for who has no account here yet. */
export interface Joining {
  readonly githubId: string;
  readonly email: string;
  readonly name: string;
  readonly handle: string;
}

/** The signed-in browser behind a request, for the few endpoints that change it. */
export interface SessionHandle {
  /** Signs a person in under a new session id. */
  signIn(personId: number): Promise<void>;
  signOut(): Promise<void>;
  /** Id of the stored session, hashed as it is stored; nothing when signed out. */
  readonly stored: string | null;
  /** The sign-up by provider that this browser is in the middle of. */
  readonly joining: Joining | null;
  /** Keeps one, under a new session id. */
  beginJoining(joining: Joining): Promise<void>;
}

/** What the application is made of; built once in `main.ts` or by a test. */
export interface Parts {
  readonly config: Config;
  readonly orm: Orm;
  readonly log: Logger;
  readonly now: () => Date;
  /** Set to false in tests that send many requests from one address. */
  readonly limits: boolean;
}

/** One request, as every endpoint sees it. */
export interface Context {
  readonly em: Em;
  readonly viewer: Viewer;
  readonly session: SessionHandle;
  readonly parts: Parts;
  /** Why this request may change nothing, when it was held back; pages say it beside what was typed. */
  readonly refusal: AppError | null;
  /** The uploaded file, already in quarantine, for endpoints that take one. */
  readonly upload: { readonly path: string; readonly name: string; readonly bytes: number } | null;
}
