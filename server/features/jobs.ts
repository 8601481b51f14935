import type { Parts } from '#server/http/context.ts';
import type { JobHandlers } from '#server/jobs/handler.ts';
import { jobsPruning } from '#server/jobs/prune-jobs.ts';
import { sessionJobs } from './accounts/sessions.jobs.ts';
import { pictureJobs } from './media/pictures.jobs.ts';

/** Everything the queue can be asked to do. */
export function jobHandlers(parts: Parts): JobHandlers {
  return { ...jobsPruning(parts), ...sessionJobs(parts), ...pictureJobs(parts) };
}
