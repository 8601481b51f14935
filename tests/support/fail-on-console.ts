import { afterEach, beforeEach, vi } from 'vitest';

// React says what is wrong with a tree on the console only: a warning there fails the test that caused it.
const complaints: string[] = [];

function record(...words: unknown[]): void {
  complaints.push(words.map(String).join(' '));
}

beforeEach(() => {
  complaints.length = 0;
  vi.spyOn(console, 'error').mockImplementation(record);
  vi.spyOn(console, 'warn').mockImplementation(record);
});

afterEach(() => {
  if (complaints.length > 0) throw new Error(`The console was written to:\n${complaints.join('\n')}`);
});
