import type { Reading } from './reading.ts';

export function readMinutes(text: string): Reading<number> {
  throw new Error(`readMinutes ${text}`);
}
