import type { RequestHandler } from 'express';
import type { Parts } from './context.ts';
import { DatabaseSessionStore, session } from './session-store.ts';

const lifetimeMs = 30 * 86_400_000;

/** Sessions in the database. No cookie is set until somebody signs in. */
export function sessions(parts: Parts): RequestHandler {
  const secure = parts.config.publicUrl.startsWith('https:');
  return session({
    name: secure ? '__Host-tallywright' : 'tallywright',
    secret: parts.config.sessionSecret,
    store: new DatabaseSessionStore(parts.orm.em.getKnex(), lifetimeMs),
    resave: false,
    saveUninitialized: false,
    rolling: false,
    cookie: { httpOnly: true, sameSite: 'lax', secure: secure ? 'auto' : false, path: '/', maxAge: lifetimeMs },
  });
}
