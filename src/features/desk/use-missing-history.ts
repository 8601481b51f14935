import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import type { DeskView } from '#contracts/entries.ts';
import { deskQuery } from '#src/queries/entries.ts';
import type { DeskReckoning } from './desk-ledger.ts';
import type { SaveState } from './saver.ts';

/** Whether the entry draws on a material whose history was left out of the view for want of room. */
export function lacksHistory(view: DeskView, { shelf }: Pick<DeskReckoning, 'shelf'>): boolean {
  const has = (list: readonly { material: number; shelf: string }[], one: { material: number; shelf: string }) => list.some((row) => row.material === one.material && row.shelf === one.shelf);
  return shelf.some((row) => has(view.shelf, row) && !has(view.history, row));
}

/** Once such a material stands in the saved text, the server sends its history with the next reading. */
export function useMissingHistory(view: DeskView, reckoning: DeskReckoning, save: SaveState): void {
  const client = useQueryClient();
  const missing = save.onServer && lacksHistory(view, reckoning);
  const { build: { slug: build }, entry: { number } } = view;
  useEffect(() => {
    if (missing) void client.invalidateQueries({ queryKey: deskQuery({ build, number }).queryKey });
  }, [missing, client, build, number]);
}
