import { mkdir, utimes, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { Build, Entry, Picture } from '#server/entities/index.ts';
import { pictureJobs } from '#server/features/media/pictures.jobs.ts';
import { placeOf } from '#server/features/media/picture-store.ts';
import { quadrants } from './picture-samples.ts';
import { startPictureSite, type PictureSite } from './picture-site.ts';

const dayMs = 86_400_000;
let now = new Date();
let site: PictureSite;
let sample: Buffer;
beforeAll(async () => {
  site = await startPictureSite({ now: () => now });
  sample = await quadrants(64, 48).jpeg().toBuffer();
});
afterAll(() => site.server.close());

async function clear(at: Date): Promise<void> {
  now = at;
  const job = pictureJobs(site.server.parts)['clear-pictures'];
  await job?.run({}, { id: 1, attempt: 1, signal: new AbortController().signal });
}
const later = (days: number) => new Date(Date.now() + days * dayMs);
const keys = async () => (await site.server.orm.em.fork().find(Picture, {}, { orderBy: { id: 'asc' } })).map((row) => row.key);

async function aged(path: string, at: Date): Promise<void> {
  await mkdir(join(path, '..'), { recursive: true });
  await writeFile(path, 'left behind');
  await utimes(path, at, at);
}

test('a picture that no document shows is forgotten after a week, with its files; all others stay', async () => {
  const [unused, published, working, before] = [await site.taken(sample), await site.taken(sample), await site.taken(sample), await site.taken(sample)];
  await site.publish([published.key]);
  const em = site.server.orm.em.fork();
  const build = await em.findOneOrFail(Build, { slug: site.build });
  build.beforePicture = await em.findOneOrFail(Picture, { key: before.key });
  em.create(Entry, {
    guid: crypto.randomUUID(), build, author: build.owner, sequence: 90, number: 90, day: '2026-11-15',
    working: { title: '', day: '2026-11-15', dayTo: null, stage: null, work: null, body: [{ type: 'photos', attrs: { id: 'photos01', version: 1, data: { photos: [{ id: 'photo001', picture: working.key, caption: '', alt: '', cover: false }] } } }] } as unknown as NonNullable<Entry['working']>,
  });
  await em.flush();

  await clear(later(6.9));
  expect(await keys()).toHaveLength(4);
  await clear(later(7.1));
  expect(await keys()).toEqual([published.key, working.key, before.key]);
  expect(await site.left(join('pictures', unused.key.slice(0, 2))).catch(() => [])).not.toContain(unused.key);
  for (const { key } of [published, working, before]) expect((await site.file(key, '64.jpg')).length).toBeGreaterThan(100);
});

test('what a stop left behind goes: uploads, half-made pictures, rows still working, folders without a row', async () => {
  const data = site.server.parts.config.dataDir;
  const old = new Date(Date.now() - 2 * dayMs);
  const [stray, fresh] = ['z'.repeat(24), 'y'.repeat(24)];
  await aged(join(data, 'quarantine', 'taken-old'), old);
  await aged(join(data, 'quarantine', 'fresh'), new Date());
  await aged(join(data, 'pictures', 'making', 'old'), old);
  for (const [key, at] of [[stray, old], [fresh, new Date()]] as const) {
    const folder = join(data, 'pictures', placeOf(key));
    await mkdir(folder, { recursive: true });
    await utimes(folder, at, at);
  }
  const em = site.server.orm.em.fork();
  const build = await em.findOneOrFail(Build, { slug: site.build });
  em.create(Picture, { key: 'abandoned', build, uploader: build.owner, originalName: 'a', widths: [], createdAt: old });
  em.create(Picture, { key: 'being-made', build, uploader: build.owner, originalName: 'a', widths: [] });
  await em.flush();

  await clear(new Date());
  expect(await site.left('quarantine')).toEqual(['fresh']);
  expect(await site.left('pictures/making')).toEqual([]);
  expect(await site.left('pictures/zz')).toEqual([]);
  expect(await site.left('pictures/yy')).toEqual([fresh]);
  expect(await keys()).toContain('being-made');
  expect(await keys()).not.toContain('abandoned');
});

test('it comes round once a day, and an empty site has nothing to clear', async () => {
  expect(pictureJobs(site.server.parts)['clear-pictures']?.everyMs).toBe(dayMs);
  const empty = await startPictureSite();
  await pictureJobs(empty.server.parts)['clear-pictures']?.run({}, { id: 1, attempt: 1, signal: new AbortController().signal });
  await empty.server.close();
});
