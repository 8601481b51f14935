import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState, useSyncExternalStore } from 'react';
import type { DeskView } from '#contracts/entries.ts';
import { useEntryCalls } from '#src/queries/entries.ts';
import { sessionQuery } from '#src/queries/session.ts';
import type { DeskStart } from './desk-start.ts';
import type { KeptAt, KeptHere } from './kept-here.ts';
import { makeSaver } from './saver.ts';

/** The saver of one desk: made once, told when the connection or the person is back, asked once more on leaving. */
export function useSaver(view: DeskView, start: DeskStart, at: KeptAt, kept: KeptHere) {
  const client = useQueryClient();
  const calls = useEntryCalls(at);
  const [saver] = useState(() => makeSaver({
    version: start.version,
    base: start.base,
    savedAt: view.entry.savedAt === null ? null : new Date(view.entry.savedAt),
    save: (version, document) => calls.saveWorking({ version, document }),
    keep: kept.keep,
    isStillMe: async () => (await client.fetchQuery({ ...sessionQuery(), staleTime: 0 })).viewer?.handle === at.handle,
    now: () => new Date(),
  }));
  const state = useSyncExternalStore(saver.subscribe, saver.state);

  useEffect(() => {
    if (start.takenUp) saver.change(start.document);
    if (start.newer) saver.meetNewer(start.newer);
    return () => saver.leave();
  }, [saver, start]);

  useEffect(() => {
    const back = () => {
      const { is } = saver.state().phase;
      if (is === 'retrying' || is === 'signed-out') saver.tryAgain();
    };
    const hidden = () => {
      if (document.visibilityState === 'hidden') saver.leave();
      else back();
    };
    window.addEventListener('online', back);
    window.addEventListener('focus', back);
    document.addEventListener('visibilitychange', hidden);
    return () => {
      window.removeEventListener('online', back);
      window.removeEventListener('focus', back);
      document.removeEventListener('visibilitychange', hidden);
    };
  }, [saver]);

  useEffect(() => {
    // Only a text that is kept nowhere is lost by leaving.
    if (state.keptHere || state.onServer) return undefined;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [state.keptHere, state.onServer]);
  return { saver, state, calls };
}
