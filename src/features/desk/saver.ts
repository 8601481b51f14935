import { AppError } from '#contracts/errors.ts';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { sameText } from './same-text.ts';

/** A text somebody else saved meanwhile. */
export interface NewerText {
  version: number;
  document: EntryDocument;
}

export type SavePhase =
  | { is: 'still' }
  | { is: 'waiting' }
  | { is: 'saving' }
  /** The server could not be reached or could not do it; tried again by itself. */
  | { is: 'retrying' }
  | { is: 'signed-out' }
  | { is: 'newer'; newer: NewerText }
  | { is: 'refused'; problem: string };

export interface SaveState {
  readonly phase: SavePhase;
  /** Everything typed is kept in this browser. */
  readonly keptHere: boolean;
  /** Everything typed is on the server. */
  readonly onServer: boolean;
  /** When it last reached the server, or nothing yet. */
  readonly savedAt: Date | null;
  readonly version: number;
  /** The server's text of that version, where it is known. */
  readonly base: EntryDocument | null;
}

export interface SaverParts {
  readonly version: number;
  readonly base: EntryDocument | null;
  readonly savedAt: Date | null;
  readonly save: (version: number, document: EntryDocument) => Promise<{ version: number }>;
  /** Keeps a text in this browser; `onServer` once it has reached the server. */
  readonly keep: (record: { document: EntryDocument; version: number; base: EntryDocument | null; onServer: boolean }) => Promise<void>;
  /** False when somebody else is signed in by now: then nothing is sent in their name. */
  readonly isStillMe: () => Promise<boolean>;
  readonly now: () => Date;
}

export interface Saver {
  readonly state: () => SaveState;
  readonly subscribe: (listener: () => void) => () => void;
  readonly change: (document: EntryDocument) => void;
  /** Sends at once what has not been sent, and waits for the answer. */
  readonly flush: () => Promise<void>;
  readonly tryAgain: () => void;
  /** Says that the text the writer went on with stands on this newer one. */
  readonly settle: (newer: NewerText, document: EntryDocument) => void;
  readonly meetNewer: (newer: NewerText) => void;
  /** Waits for what is under way, and sends nothing until `release`. */
  readonly hold: () => Promise<number>;
  readonly release: () => void;
  /** Sends what is left, once. */
  readonly leave: () => void;
}

const pause = 1200;
const retries = [2000, 4000, 8000, 15_000, 30_000, 60_000];
const passing = new Set(['unreachable', 'broken', 'not-ready', 'too-many']);

/** Keeps every change in the browser at once, and on the server a moment after the last one. */
export function makeSaver(parts: SaverParts): Saver {
  let state: SaveState = { phase: { is: 'still' }, keptHere: true, onServer: true, savedAt: parts.savedAt, version: parts.version, base: parts.base };
  let unsent: EntryDocument | null = null;
  let sending: Promise<void> | null = null;
  let timer: ReturnType<typeof setTimeout> | undefined;
  let failures = 0;
  let held = false;
  let keeping: Promise<void> = Promise.resolve();
  const listeners = new Set<() => void>();

  const set = (part: Partial<SaveState>) => {
    state = { ...state, ...part };
    for (const listener of listeners) listener();
  };

  const keepNow = async (document: EntryDocument, onServer: boolean) => {
    // a newer text is on its way in already
    if (unsent !== null && unsent !== document) return;
    try {
      await parts.keep({ document, version: state.version, base: state.base, onServer });
      if (unsent === document || onServer) set({ keptHere: true });
    } catch (cause) {
      if (!(cause instanceof Error)) throw cause;
      // no room, or a browser that keeps nothing: the state says so, and leaving warns
      set({ keptHere: false });
    }
  };
  const keep = (document: EntryDocument, onServer: boolean) => {
    keeping = keeping.then(() => keepNow(document, onServer));
  };

  const schedule = (delay: number) => {
    clearTimeout(timer);
    if (held || state.phase.is === 'newer' || state.phase.is === 'signed-out') return;
    timer = setTimeout(() => void run(), delay);
  };

  const arrived = (document: EntryDocument, version: number) => {
    failures = 0;
    const done = unsent === document;
    if (done) unsent = null;
    set({ version, base: document, savedAt: parts.now(), onServer: done, phase: { is: done ? 'still' : 'waiting' } });
    keep(unsent ?? document, done);
    if (!done) schedule(pause);
  };

  const failed = (cause: unknown, document: EntryDocument) => {
    if (!(cause instanceof AppError)) throw cause;
    if (cause.code === 'newer-exists') {
      const newer = cause.newer as NewerText;
      // our own save whose answer was lost
      if (sameText(newer.document, document)) arrived(document, newer.version);
      else set({ phase: { is: 'newer', newer } });
    } else if (cause.code === 'sign-in-needed') set({ phase: { is: 'signed-out' } });
    else if (passing.has(cause.code)) {
      set({ phase: { is: 'retrying' } });
      schedule(retries[Math.min(failures, retries.length - 1)] ?? pause);
      failures += 1;
    } else set({ phase: { is: 'refused', problem: cause.message } });
  };

  async function send(document: EntryDocument): Promise<void> {
    set({ phase: { is: 'saving' } });
    try {
      const reply = await parts.save(state.version, document);
      arrived(document, reply.version);
    } catch (cause) {
      failed(cause, document);
    }
  }

  async function run(): Promise<void> {
    clearTimeout(timer);
    if (sending) await sending;
    if (unsent === null || held) return;
    sending = send(unsent);
    try {
      await sending;
    } finally {
      sending = null;
    }
  }

  const again = async () => {
    if (state.phase.is === 'signed-out' && !(await parts.isStillMe())) return;
    if (state.phase.is === 'newer') return;
    set({ phase: { is: unsent === null ? 'still' : 'waiting' } });
    await run();
  };

  return {
    state: () => state,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    change: (document) => {
      unsent = document;
      const quiet = state.phase.is === 'newer' || state.phase.is === 'signed-out' || state.phase.is === 'retrying' || state.phase.is === 'saving';
      set({ keptHere: false, onServer: false, ...(quiet ? {} : { phase: { is: 'waiting' } }) });
      keep(document, false);
      if (state.phase.is !== 'retrying') schedule(pause);
    },
    flush: async () => {
      await run();
      await keeping;
    },
    tryAgain: () => void again(),
    settle: ({ version, document: base }, document) => {
      unsent = document;
      failures = 0;
      set({ version, base, onServer: false, keptHere: false, phase: { is: 'waiting' } });
      keep(document, false);
      schedule(0);
    },
    meetNewer: (newer) => {
      clearTimeout(timer);
      set({ phase: { is: 'newer', newer } });
    },
    hold: async () => {
      held = true;
      clearTimeout(timer);
      if (sending) await sending;
      await keeping;
      return state.version;
    },
    release: () => {
      held = false;
      if (unsent !== null) schedule(pause);
    },
    leave: () => {
      if (unsent !== null && !held && state.phase.is !== 'newer' && state.phase.is !== 'signed-out') void run();
      clearTimeout(timer);
    },
  };
}
