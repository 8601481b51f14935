import type { SqlEntityManager } from '@mikro-orm/sqlite';
import type { Logger } from 'pino';
import type { Orm } from '#server/database.ts';
import { claimJob, isQueued, keepClaim, settleDone, settleGivenUp, settleLater, type Claim } from './claims.ts';
import type { JobHandler, JobHandlers } from './handler.ts';
import { queueJob } from './queue.ts';

export interface JobParts {
  readonly orm: Orm;
  readonly log: Logger;
  readonly now: () => Date;
}

export interface JobPace {
  /** How often the queue is looked at. */
  readonly pollMs: number;
  /** Wait before the second attempt; doubled for each one after. */
  readonly retryMs: number;
  readonly longestRetryMs: number;
  readonly attempts: number;
  /** A holder that has said nothing for this long is taken for dead. */
  readonly staleMs: number;
}

// common practice, no source: eight attempts are spread over about an hour
const usualPace: JobPace = { pollMs: 1000, retryMs: 30_000, longestRetryMs: 3_600_000, attempts: 8, staleMs: 120_000 };

export interface JobRunner {
  /** Takes no more work and waits for what is being done. */
  stop(): Promise<void>;
  /** Comes back when nothing that is due is left. */
  idle(): Promise<void>;
}

/** Does the queued work one job at a time, for as long as the server runs. Knows no feature. */
export function startJobs(parts: JobParts, handlers: JobHandlers, pace: JobPace = usualPace): JobRunner {
  const stopping = new AbortController();
  const { signal } = stopping;
  let timer: NodeJS.Timeout | undefined;
  let round: Promise<void> | null = null;
  let recurringQueued = false;

  async function rounds(): Promise<void> {
    try {
      if (!recurringQueued) await queueRecurring(parts, handlers);
      recurringQueued = true;
      while (!signal.aborted && (await nextJob(parts, handlers, pace, signal)));
    } catch (error) {
      parts.log.error({ err: error }, 'the job queue could not be read');
    }
  }
  function work(): Promise<void> {
    clearTimeout(timer);
    round ??= rounds().finally(() => {
      round = null;
      if (!signal.aborted) timer = setTimeout(() => void work(), pace.pollMs).unref();
    });
    return round;
  }

  void work();
  return {
    async stop() {
      stopping.abort();
      clearTimeout(timer);
      await round;
    },
    async idle() {
      // what was queued while a round was ending is seen by the one after it
      await round;
      await work();
    },
  };
}

async function queueRecurring({ orm, now }: JobParts, handlers: JobHandlers): Promise<void> {
  await orm.em.fork().transactional(async (em) => {
    for (const [kind, { everyMs }] of Object.entries(handlers)) {
      if (everyMs !== undefined && !(await isQueued(em, kind))) queueJob(em, kind, {}, now());
    }
  });
}

async function nextJob(parts: JobParts, handlers: JobHandlers, pace: JobPace, signal: AbortSignal): Promise<boolean> {
  const now = parts.now();
  const claim = await claimJob(parts.orm.em.fork(), Object.keys(handlers), now, new Date(now.getTime() - pace.staleMs));
  const handler = claim && handlers[claim.kind];
  if (!claim || !handler) return false;
  const failure = await attempt(parts, handler, claim, pace, signal);
  await parts.orm.em.fork().transactional((em) => settle(em, parts, handler, claim, failure, pace, signal));
  return true;
}

/** Does the work; gives back why it failed, or nothing. */
async function attempt(parts: JobParts, handler: JobHandler, claim: Claim, pace: JobPace, signal: AbortSignal): Promise<string | null> {
  if (claim.attempt > pace.attempts) return 'The server stopped each time this was being done.';
  const heartbeat = setInterval(() => {
    keepClaim(parts.orm.em.fork(), claim, parts.now()).catch((error: unknown) => parts.log.warn({ err: error, job: claim.id }, 'a claim could not be kept'));
  }, pace.staleMs / 4);
  try {
    await handler.run(claim.payload, { id: claim.id, attempt: claim.attempt, signal });
    return null;
  } catch (error) {
    parts.log.error({ err: error, job: claim.id, kind: claim.kind, attempt: claim.attempt }, 'a job failed');
    return error instanceof Error ? error.message : String(error);
  } finally {
    clearInterval(heartbeat);
  }
}

async function settle(em: SqlEntityManager, parts: JobParts, handler: JobHandler, claim: Claim, failure: string | null, pace: JobPace, signal: AbortSignal): Promise<void> {
  const now = parts.now();
  if (failure !== null && claim.attempt < pace.attempts) {
    // what was cut short by the stop goes first after the start
    const wait = signal.aborted ? 0 : Math.min(pace.longestRetryMs, pace.retryMs * 2 ** (claim.attempt - 1));
    await settleLater(em, claim, new Date(now.getTime() + wait), failure);
    return;
  }
  const ours = failure === null ? await settleDone(em, claim, now) : await settleGivenUp(em, claim, now, failure);
  if (ours && handler.everyMs !== undefined) queueJob(em, claim.kind, {}, new Date(now.getTime() + handler.everyMs));
}
