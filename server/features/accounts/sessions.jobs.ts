import { HttpSession } from '#server/entities/index.ts';
import type { Parts } from '#server/http/context.ts';
import type { JobHandlers } from '#server/jobs/handler.ts';

const dayMs = 86_400_000;

/** Sessions that have run out are of no use to anybody, and are dropped once a day. */
export function sessionJobs({ orm, now }: Parts): JobHandlers {
  return {
    'prune-sessions': {
      everyMs: dayMs,
      run: async () => {
        await orm.em.fork().nativeDelete(HttpSession, { expiresAt: { $lte: now() } });
      },
    },
  };
}
