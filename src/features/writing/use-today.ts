import { useSyncExternalStore } from 'react';

function plainDay(date: Date): string {
  return `${date.getFullYear()}-${String(date.getMonth() + 1).padStart(2, '0')}-${String(date.getDate()).padStart(2, '0')}`;
}

const never = () => () => undefined;

/** Today where the writer is; on the server, and so at first, the day in UTC. */
export function useToday(): string {
  return useSyncExternalStore(never, () => plainDay(new Date()), () => new Date().toISOString().slice(0, 10));
}
