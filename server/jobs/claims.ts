import type { SqlEntityManager } from '@mikro-orm/sqlite';
import { Job } from '#server/entities/index.ts';

/** A job this runner holds. The attempt is the proof of holding: whoever takes it over counts one up. */
export interface Claim {
  readonly id: number;
  readonly kind: string;
  readonly payload: Record<string, unknown>;
  readonly attempt: number;
}

const open = { doneAt: null, givenUpAt: null };

/** Takes the job that has been due longest; one whose holder has not been heard of since `staleBefore` counts as free. */
export async function claimJob(em: SqlEntityManager, kinds: readonly string[], now: Date, staleBefore: Date): Promise<Claim | null> {
  const free = { ...open, kind: { $in: [...kinds] }, runAt: { $lte: now }, $or: [{ claimedAt: null }, { claimedAt: { $lt: staleBefore } }] };
  for (;;) {
    const due = await em.findOne(Job, free, { orderBy: { runAt: 'asc', id: 'asc' }, disableIdentityMap: true });
    if (!due) return null;
    const attempt = due.attempts + 1;
    // the row is taken only if nobody else has taken it since it was read
    const taken = await em.nativeUpdate(Job, { id: due.id, attempts: due.attempts, ...open }, { attempts: attempt, claimedAt: now });
    if (taken === 1) return { id: due.id, kind: due.kind, payload: due.payload, attempt };
  }
}

const held = ({ id, attempt }: Claim) => ({ id, attempts: attempt, ...open });

/** Says that the holder is still there. */
export async function keepClaim(em: SqlEntityManager, claim: Claim, now: Date): Promise<void> {
  await em.nativeUpdate(Job, held(claim), { claimedAt: now });
}

/** These three answer whether the job was still ours to settle. */
export async function settleDone(em: SqlEntityManager, claim: Claim, now: Date): Promise<boolean> {
  return (await em.nativeUpdate(Job, held(claim), { doneAt: now, claimedAt: null, failure: null })) === 1;
}
export async function settleLater(em: SqlEntityManager, claim: Claim, runAt: Date, failure: string): Promise<boolean> {
  return (await em.nativeUpdate(Job, held(claim), { runAt, claimedAt: null, failure })) === 1;
}
export async function settleGivenUp(em: SqlEntityManager, claim: Claim, now: Date, failure: string): Promise<boolean> {
  return (await em.nativeUpdate(Job, held(claim), { givenUpAt: now, claimedAt: null, failure })) === 1;
}

/** Whether a job of this kind waits or is being done. */
export async function isQueued(em: SqlEntityManager, kind: string): Promise<boolean> {
  return (await em.count(Job, { kind, ...open })) > 0;
}
