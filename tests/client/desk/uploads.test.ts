import { expect, test, vi } from 'vitest';
import { AppError } from '#contracts/errors.ts';
import type { DeskPicture } from '#contracts/pictures.ts';
import { makeUploads, refusalOf, type Sending, type UploadParts } from '#src/features/desk/uploads.ts';
import { speedometer } from '#src/features/desk/speed.ts';
import { placed } from '#src/features/desk/use-uploads.ts';

interface Sent { name: string; progress: (sent: number, whole: number) => void; settle: (picture: DeskPicture) => void; fail: (cause: unknown) => void }

function desk() {
  const sent: Sent[] = [];
  const ready: string[] = [];
  const kept = new Set<string>();
  const parts: UploadParts = {
    send: (_file, name, progress): Sending => {
      let fail: (cause: unknown) => void = () => undefined;
      const done = new Promise<DeskPicture>((resolve, reject) => {
        fail = reject;
        sent.push({ name, progress, settle: resolve, fail: reject });
      });
      return { done, stop: () => fail(new DOMException('Stopped', 'AbortError')) };
    },
    onReady: ({ order }, picture) => ready.push(`${order - first}:${picture.key}`),
    keepPicture: ({ id }) => { kept.add(id); return Promise.resolve(); },
    forgetPicture: (id) => { kept.delete(id); return Promise.resolve(); },
    previewOf: () => null,
    dropPreview: () => undefined,
  };
  vi.setSystemTime(first);
  return { uploads: makeUploads(parts), sent, ready, kept };
}
const first = new Date(2026, 10, 14).getTime();
const file = (name: string, size = 1000, type = 'image/jpeg') => Object.defineProperty(new File(['x'], name, { type }), 'size', { value: size });
const picture = (key: string): DeskPicture => ({ key, state: 'ready', problem: null, picture: null });
const soon = () => new Promise((resolve) => { setTimeout(resolve); });

test('two go up at a time, and each knows its place among those picked', async () => {
  const { uploads, sent, ready, kept } = desk();
  uploads.add('block', [file('a.jpg'), file('b.jpg'), file('c.jpg')]);
  expect(sent.map(({ name }) => name)).toEqual(['a.jpg', 'b.jpg']);
  expect(kept.size).toBe(3);
  sent[1]?.settle(picture('b'));
  await soon();
  expect(sent.map(({ name }) => name)).toEqual(['a.jpg', 'b.jpg', 'c.jpg']);
  sent[2]?.settle(picture('c'));
  sent[0]?.settle(picture('a'));
  await soon();
  expect(ready).toEqual(['1:b', '2:c', '0:a']);
  expect(uploads.state()).toEqual({ uploads: [], going: null });
  expect(kept.size).toBe(0);
});

test('pictures stand as they were picked, whichever was ready first', () => {
  const photo = (id: string) => ({ id, picture: `key-of-the-picture-${id}`, caption: '', alt: '', cover: false });
  const orders = new Map([['b', 1], ['c', 2], ['a', 0]]);
  const there = placed(placed(placed([photo('older')], photo('b'), 1, orders), photo('c'), 2, orders), photo('a'), 0, orders);
  expect(there.map(({ id }) => id)).toEqual(['older', 'a', 'b', 'c']);
});

test('a stopped or failed picture is kept and goes up when tried again; a refused one says why', async () => {
  const { uploads, sent } = desk();
  uploads.add('block', [file('a.jpg'), file('b.jpg')]);
  const [a = '', b = ''] = uploads.state().uploads.map(({ id }) => id);
  uploads.stop(a);
  sent[1]?.fail(new TypeError('network'));
  await soon();
  expect(uploads.state().uploads.map(({ state }) => state)).toEqual(['stopped', 'failed']);
  uploads.retry(a);
  uploads.retry(b);
  expect(sent).toHaveLength(4);
  sent[2]?.fail(new AppError('wrong-type', 'That is not a picture we can read.'));
  await soon();
  expect(uploads.state().uploads[0]).toMatchObject({ state: 'refused', problem: 'That is not a picture we can read.' });
});

test('a file that is too large, empty or no picture is not even sent', () => {
  const { uploads, sent, kept } = desk();
  uploads.add('block', [file('big.jpg', 60_000_000), file('film.mp4', 1000, 'video/mp4')]);
  expect(sent).toEqual([]);
  expect(kept.size).toBe(0);
  expect(uploads.state().uploads.map(({ problem }) => problem)).toEqual([
    '“big.jpg” is 60 MB; 40 MB is the most. Save a smaller copy and pick that.', '“film.mp4” is not a photo. JPEG, PNG, WebP, HEIC and GIF can go up.',
  ]);
  expect(refusalOf({ name: 'IMG_1.HEIC', size: 1000, type: '' })).toBeNull();
  expect(refusalOf({ name: 'edge.jpg', size: 40_000_000, type: 'image/jpeg' })).toBeNull();
  expect(refusalOf({ name: 'over.jpg', size: 40_000_001, type: 'image/jpeg' })).toContain('is 41 MB; 40 MB is the most');
});

test('time left follows the pace of the last seconds', () => {
  let now = 0;
  const speed = speedometer(() => now);
  expect(speed.secondsFor(1000)).toBeNull();
  speed.moved(1000);
  now = 2000;
  speed.moved(1000);
  expect(speed.secondsFor(3000)).toBe(3);
});
