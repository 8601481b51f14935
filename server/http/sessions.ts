import type { CookieOptions, RequestHandler } from 'express';
import type { Config } from '#server/config.ts';
import type { Parts } from './context.ts';
import { DatabaseSessionStore, session, type SessionLifetimes } from './session-store.ts';

const dayMs = 86_400_000;
const lifetimes: SessionLifetimes = { longestMs: 90 * dayMs, unusedMs: 30 * dayMs, passingMs: dayMs / 24 };

/** The cookie's name and how it is set; a browser keeps a `__Host-` one from every other address. */
export function sessionCookie({ publicUrl }: Config): { name: string; options: CookieOptions & { maxAge: number } } {
  const secure = publicUrl.startsWith('https:');
  return { name: secure ? '__Host-tallywright' : 'tallywright', options: { httpOnly: true, sameSite: 'lax', secure, path: '/', maxAge: lifetimes.longestMs } };
}

/** Sessions in the database. No cookie is set until somebody signs in, or goes to a provider to do so. */
export function sessions(parts: Parts): RequestHandler {
  const { name, options } = sessionCookie(parts.config);
  return session({
    name,
    secret: parts.config.sessionSecret,
    store: new DatabaseSessionStore(parts.orm.em.getKnex(), lifetimes),
    resave: false,
    saveUninitialized: false,
    rolling: false,
    cookie: { ...options, secure: options.secure ? 'auto' : false },
  });
}
