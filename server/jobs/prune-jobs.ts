import { Job } from '#server/entities/index.ts';
import type { JobHandlers } from './handler.ts';
import type { JobParts } from './runner.ts';

const dayMs = 86_400_000;
/** Long enough to look back at what a week did; common practice, no source. */
const keptForMs = 7 * dayMs;

/** Work that was done goes after a while. What was given up stays: somebody has to look at it. */
export function jobsPruning({ orm, now }: Pick<JobParts, 'orm' | 'now'>): JobHandlers {
  return {
    'prune-jobs': {
      everyMs: dayMs,
      run: async () => {
        await orm.em.fork().nativeDelete(Job, { doneAt: { $lt: new Date(now().getTime() - keptForMs) } });
      },
    },
  };
}
