import type { Request } from 'express';
import { Person } from '#server/entities/index.ts';
import type { Caller, Context, Parts, SessionHandle, Viewer } from './context.ts';
import { refusalOf } from './held-back.ts';
import { storedId } from './session-store.ts';
import { sessionCookie } from './sessions.ts';

function settled(run: (done: (error: unknown) => void) => void): Promise<void> {
  return new Promise((resolve, reject) => run((error) => (error ? reject(error instanceof Error ? error : new Error('The session could not be kept', { cause: error })) : resolve())));
}

function sessionHandle(req: Request, parts: Parts): SessionHandle {
  return {
    get stored() {
      return req.session?.personId === undefined ? null : storedId(req.sessionID);
    },
    async signIn(personId) {
      await settled((done) => req.session.regenerate(done));
      req.session.personId = personId;
      await settled((done) => req.session.save(done));
    },
    async signOut() {
      await settled((done) => req.session.destroy(done));
      const { name, options } = sessionCookie(parts.config);
      req.res?.clearCookie(name, options);
    },
    get joining() {
      return req.session?.joining ?? null;
    },
    async beginJoining(joining) {
      await settled((done) => req.session.regenerate(done));
      req.session.joining = joining;
      await settled((done) => req.session.save(done));
    },
  };
}

export function callerOf(person: Person, now: Date): Caller {
  return { id: person.id, handle: person.handle, name: person.name, role: person.role, suspended: person.suspendedUntil != null && person.suspendedUntil > now };
}

/** One entity manager, one viewer and one session a request. */
export async function contextOf(req: Request, parts: Parts): Promise<Context> {
  const em = parts.orm.em.fork();
  const personId = req.session?.personId;
  const person = personId === undefined ? null : await em.findOne(Person, { id: personId });
  const viewer: Viewer = person ? callerOf(person, parts.now()) : null;
  const file = req.file;
  return { em, viewer, session: sessionHandle(req, parts), parts, refusal: refusalOf(req), upload: file ? { path: file.path, name: file.originalname, bytes: file.size } : null };
}
