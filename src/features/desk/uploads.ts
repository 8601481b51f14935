import { AppError } from '#contracts/errors.ts';
import type { DeskPicture } from '#contracts/pictures.ts';
import type { PictureUpload } from '#src/blocks/bench.ts';
import { newId } from './block-ids.ts';
import { speedometer, type Speedometer } from './speed.ts';

export interface Sending {
  readonly done: Promise<DeskPicture>;
  readonly stop: () => void;
}

export interface UploadParts {
  readonly send: (file: Blob, name: string, onProgress: (sent: number, whole: number) => void) => Sending;
  /** Puts a picture that has gone up into its block; `order` keeps pictures as they were picked. */
  readonly onReady: (upload: { id: string; block: string; order: number }, picture: DeskPicture) => void;
  readonly keepPicture: (picture: { id: string; block: string; name: string; file: Blob; order: number }) => Promise<void>;
  readonly forgetPicture: (id: string) => Promise<void>;
  readonly previewOf: (file: Blob) => string | null;
  readonly dropPreview: (address: string) => void;
}

interface Job extends PictureUpload {
  readonly file: Blob;
  readonly order: number;
}

export interface UploadsState {
  readonly uploads: readonly PictureUpload[];
  /** Of those going up now: bytes gone, bytes in all, and seconds left where that can be told. */
  readonly going: { readonly count: number; readonly sent: number; readonly size: number; readonly secondsLeft: number | null } | null;
}

const megabyte = 1_000_000;
/** The server's own limit: what is larger is not even sent. */
export const mostBytes = 40 * megabyte;
const atOnce = 2;

/** Why a file is not even sent, in words for beside it. */
export function refusalOf(file: { name: string; size: number; type: string }): string | null {
  if (file.size > mostBytes) return `“${file.name}” is ${Math.max(Math.round(file.size / megabyte), 41)} MB; 40 MB is the most. Save a smaller copy and pick that.`;
  if (file.size === 0) return `“${file.name}” is empty. Pick the photo again.`;
  if (file.type !== '' && !file.type.startsWith('image/')) return `“${file.name}” is not a photo. JPEG, PNG, WebP, HEIC and GIF can go up.`;
  return null;
}

/** Pictures on their way up: two at a time, in order, each stopped and tried again by itself. What is waiting outlives a reload. */
export function makeUploads(parts: UploadParts) {
  let jobs: readonly Job[] = [];
  let state: UploadsState = { uploads: [], going: null };
  let order = Date.now();
  const stops = new Map<string, () => void>();
  const listeners = new Set<() => void>();
  let speed: Speedometer = speedometer();

  const publish = () => {
    const active = jobs.filter((job) => job.state === 'going' || job.state === 'waiting' || job.state === 'checking');
    const sent = active.reduce((sum, job) => sum + job.sent, 0);
    const size = active.reduce((sum, job) => sum + job.size, 0);
    if (active.length === 0) speed = speedometer();
    state = { uploads: jobs, going: active.length === 0 ? null : { count: active.length, sent, size, secondsLeft: speed.secondsFor(size - sent) } };
    for (const listener of listeners) listener();
  };
  const change = (id: string, part: Partial<Job>) => {
    jobs = jobs.map((job) => (job.id === id ? { ...job, ...part } : job));
    publish();
  };
  const drop = (id: string) => {
    const job = jobs.find((one) => one.id === id);
    if (job?.preview) parts.dropPreview(job.preview);
    jobs = jobs.filter((one) => one.id !== id);
    publish();
    void parts.forgetPicture(id).catch(notKept);
  };

  const settled = (job: Job, reply: DeskPicture) => {
    if (reply.state === 'refused') change(job.id, { state: 'refused', problem: reply.problem ?? 'That photo could not be read. Save it again as a JPEG and pick that.' });
    else {
      parts.onReady(job, reply);
      drop(job.id);
    }
  };
  const broke = (id: string, cause: unknown) => {
    if (cause instanceof DOMException && cause.name === 'AbortError') change(id, { state: 'stopped', sent: 0 });
    else if (cause instanceof AppError && ['too-large', 'wrong-type', 'bad-input'].includes(cause.code)) change(id, { state: 'refused', problem: cause.fields?.['picture'] ?? cause.message });
    else if (cause instanceof AppError) change(id, { state: 'failed', problem: cause.message, sent: 0 });
    else change(id, { state: 'failed', problem: 'The server could not be reached. The photo is kept here.', sent: 0 });
  };

  const start = async (job: Job) => {
    let before = 0;
    const sending = parts.send(job.file, job.name, (sent, whole) => {
      const share = whole > 0 ? Math.round((sent / whole) * job.size) : sent;
      speed.moved(share - before);
      before = share;
      change(job.id, { sent: share, state: share >= job.size ? 'checking' : 'going' });
    });
    stops.set(job.id, sending.stop);
    try {
      settled(job, await sending.done);
    } catch (cause) {
      broke(job.id, cause);
    } finally {
      stops.delete(job.id);
      next();
    }
  };
  function next(): void {
    while (stops.size < atOnce) {
      const job = jobs.find((one) => one.state === 'waiting');
      if (!job) return;
      stops.set(job.id, () => undefined);
      change(job.id, { state: 'going', problem: null, sent: 0 });
      void start(job);
    }
  }

  const enter = (list: readonly Job[]) => {
    jobs = [...jobs, ...list];
    publish();
    next();
  };
  const jobOf = (id: string, block: string, name: string, file: Blob, place: number, problem: string | null): Job => ({
    id, block, name, file, order: place, size: file.size, sent: 0, state: problem === null ? 'waiting' : 'refused', problem, preview: problem === null ? parts.previewOf(file) : null,
  });

  return {
    state: () => state,
    subscribe: (listener: () => void) => {
      listeners.add(listener);
      return () => { listeners.delete(listener); };
    },
    add: (block: string, files: readonly File[]) => {
      const list = files.map((file) => jobOf(newId(), block, file.name, file, order++, refusalOf(file)));
      for (const job of list) if (job.state === 'waiting') void parts.keepPicture({ id: job.id, block, name: job.name, file: job.file, order: job.order }).catch(notKept);
      enter(list);
    },
    /** Takes up what was waiting when the page was last left. */
    resume: (kept: readonly { id: string; block: string; name: string; file: Blob; order: number }[]) => {
      enter(kept.filter(({ id }) => !jobs.some((job) => job.id === id)).map(({ id, block, name, file, order: place }) => jobOf(id, block, name, file, place, null)));
    },
    retry: (id: string) => {
      change(id, { state: 'waiting', problem: null, sent: 0 });
      next();
    },
    retryFailed: () => {
      for (const job of jobs) if (job.state === 'failed') change(job.id, { state: 'waiting', problem: null, sent: 0 });
      next();
    },
    stop: (id: string) => {
      const job = jobs.find((one) => one.id === id);
      if (job?.state === 'waiting') change(id, { state: 'stopped' });
      else stops.get(id)?.();
    },
    stopAll: () => {
      for (const job of jobs) if (job.state === 'waiting') change(job.id, { state: 'stopped' });
      for (const stop of stops.values()) stop();
    },
    dismiss: drop,
  };
}
export type Uploads = ReturnType<typeof makeUploads>;

/** A picture that this browser will not keep still goes up; it only would not outlive a reload. */
function notKept(cause: unknown): void {
  if (!(cause instanceof Error)) throw cause;
}
