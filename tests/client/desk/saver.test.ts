import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { AppError } from '#contracts/errors.ts';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { makeSaver, type SaverParts } from '#src/features/desk/saver.ts';
import { keptWords } from '#src/features/desk/what-is-kept.ts';
import { documentOf, usedNode } from './desk-view.ts';

interface Kept { document: EntryDocument; version: number; base: EntryDocument | null; onServer: boolean }

// A server that holds one text and its version, and a browser that keeps the last text given.
function bench(part: Partial<SaverParts> = {}) {
  const server = { version: 3, document: documentOf() };
  const kept: Kept[] = [];
  const save = vi.fn(async (version: number, document: EntryDocument) => {
    await Promise.resolve();
    if (version !== server.version) throw new AppError('newer-exists', 'There is a newer text.', undefined, { version: server.version, document: server.document });
    server.version += 1;
    server.document = document;
    return { version: server.version };
  });
  const saver = makeSaver({
    version: 3, base: documentOf(), savedAt: null, save, isStillMe: () => Promise.resolve(true), now: () => new Date(2026, 10, 14, 12, 4),
    keep: (record) => { kept.push(record); return Promise.resolve(); }, ...part,
  });
  return { server, kept, save, saver };
}

const titled = (title: string) => documentOf({ title });

beforeEach(() => { vi.useFakeTimers(); });
afterEach(() => { vi.useRealTimers(); });

describe('keeping what is typed', () => {
  test('every change is kept here at once, and reaches the server a moment after the last', async () => {
    const { saver, kept, save, server } = bench();
    saver.change(titled('a'));
    saver.change(titled('ab'));
    await vi.advanceTimersByTimeAsync(100);
    expect(kept.at(-1)).toEqual({ document: titled('ab'), version: 3, base: documentOf(), onServer: false });
    expect(save).not.toHaveBeenCalled();
    await vi.advanceTimersByTimeAsync(1200);
    expect(save).toHaveBeenCalledTimes(1);
    expect(server.document.title).toBe('ab');
    expect(kept.at(-1)).toEqual({ document: titled('ab'), version: 4, base: titled('ab'), onServer: true });
    expect(keptWords(saver.state())).toBe('Kept here and on the server, 12:04');
  });

  test('what is typed while a save is under way goes with the next, on the version that came back', async () => {
    let answer: (reply: { version: number }) => void = () => undefined;
    const save = vi.fn<SaverParts['save']>(() => new Promise((resolve) => { answer = resolve; }));
    const { saver, kept } = bench({ save });
    saver.change(titled('a'));
    await vi.advanceTimersByTimeAsync(1200);
    saver.change(titled('b'));
    answer({ version: 4 });
    await vi.advanceTimersByTimeAsync(0);
    expect(saver.state().onServer).toBe(false);
    expect(kept.at(-1)).toEqual({ document: titled('b'), version: 4, base: titled('a'), onServer: false });
    await vi.advanceTimersByTimeAsync(1200);
    expect(save).toHaveBeenLastCalledWith(4, titled('b'));
  });

  test('a server that cannot be reached is tried again by itself, further and further apart', async () => {
    const down = vi.fn<SaverParts['save']>(() => Promise.reject(new AppError('unreachable', 'No answer.')));
    const { saver } = bench({ save: down });
    saver.change(titled('a'));
    await vi.advanceTimersByTimeAsync(1200);
    expect(keptWords(saver.state())).toBe('Kept here; the server could not be reached, trying again');
    await vi.advanceTimersByTimeAsync(2000);
    expect(down).toHaveBeenCalledTimes(2);
    await vi.advanceTimersByTimeAsync(3999);
    expect(down).toHaveBeenCalledTimes(2);
    down.mockImplementation(() => Promise.resolve({ version: 4 }));
    await vi.advanceTimersByTimeAsync(1);
    expect(saver.state()).toMatchObject({ onServer: true, version: 4 });
  });

  test('a newer text stops the saving and is handed over; settling goes on from its version', async () => {
    const { saver, server, save } = bench();
    server.version = 9;
    server.document = titled('theirs');
    saver.change(titled('mine'));
    await vi.advanceTimersByTimeAsync(1200);
    expect(saver.state().phase).toEqual({ is: 'newer', newer: { version: 9, document: titled('theirs') } });
    saver.change(titled('mine, and more'));
    await vi.advanceTimersByTimeAsync(60_000);
    expect(save).toHaveBeenCalledTimes(1);
    expect(saver.state()).toMatchObject({ keptHere: true, onServer: false });
    saver.settle({ version: 9, document: titled('theirs') }, titled('both'));
    await vi.advanceTimersByTimeAsync(0);
    expect(server.document.title).toBe('both');
  });

  test('an own save whose answer was lost is no newer text, whatever the server read from the amounts', async () => {
    const { saver, server } = bench();
    const line = { id: 'lineA', material: 1, name: 'Resin', amount: '2', unit: 'l' };
    server.version = 4;
    server.document = documentOf({ content: [usedNode('used1', [{ ...line, exact: '2000/1', read: '1|2 l' }])] });
    saver.change(documentOf({ content: [usedNode('used1', [line])] }));
    await vi.advanceTimersByTimeAsync(1200);
    expect(saver.state()).toMatchObject({ phase: { is: 'still' }, version: 4, onServer: true });
  });

  test('signed out, nothing more is sent until the same person is back', async () => {
    let me = false;
    const save = vi.fn<SaverParts['save']>(() => Promise.reject(new AppError('sign-in-needed', 'Sign in first.')));
    const { saver } = bench({ save, isStillMe: () => Promise.resolve(me) });
    saver.change(titled('a'));
    await vi.advanceTimersByTimeAsync(1200);
    expect(saver.state().phase.is).toBe('signed-out');
    save.mockResolvedValue({ version: 4 });
    saver.tryAgain();
    await vi.advanceTimersByTimeAsync(0);
    expect(save).toHaveBeenCalledTimes(1);
    me = true;
    saver.tryAgain();
    await vi.advanceTimersByTimeAsync(0);
    expect(saver.state()).toMatchObject({ onServer: true });
  });

  test('a browser that keeps nothing says so', async () => {
    const { saver } = bench({ keep: () => Promise.reject(new Error('no room')) });
    saver.change(titled('a'));
    await vi.advanceTimersByTimeAsync(0);
    expect(saver.state().keptHere).toBe(false);
    expect(keptWords(saver.state())).toBe('Keeping it');
  });

  test('held for signing off, nothing is sent beside it', async () => {
    const { saver, save } = bench();
    saver.change(titled('a'));
    expect(await saver.hold()).toBe(3);
    await vi.advanceTimersByTimeAsync(60_000);
    expect(save).not.toHaveBeenCalled();
    saver.release();
    await vi.advanceTimersByTimeAsync(1200);
    expect(save).toHaveBeenCalledTimes(1);
  });
});
