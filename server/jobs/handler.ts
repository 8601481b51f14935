/** What a handler is told of its job beside the payload. */
export interface JobRun {
  readonly id: number;
  /** 1 the first time. */
  readonly attempt: number;
  /** Aborted when the server stops: long work ends early, and is done again after the start. */
  readonly signal: AbortSignal;
}

export interface JobHandler {
  /** Does the work. A thrown error means: again later. May be called twice for one job after a crash. */
  readonly run: (payload: Readonly<Record<string, unknown>>, job: JobRun) => Promise<void>;
  /** For work that comes round by itself: how long after one round the next is due. */
  readonly everyMs?: number;
}

/** By kind of job. */
export type JobHandlers = Readonly<Record<string, JobHandler>>;
