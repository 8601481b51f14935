import type { SqlEntityManager } from '@mikro-orm/sqlite';
import { Job } from '#server/entities/index.ts';

/** Writes down work for later, in the same flush as its cause: both are kept or neither is. */
export function queueJob(em: SqlEntityManager, kind: string, payload: Readonly<Record<string, unknown>> = {}, runAt: Date = new Date()): void {
  em.persist(em.create(Job, { kind, payload: { ...payload }, runAt }));
}
