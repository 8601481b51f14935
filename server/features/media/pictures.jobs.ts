import { raw } from '@mikro-orm/core';
import { Picture } from '#server/entities/index.ts';
import type { Em, Parts } from '#server/http/context.ts';
import type { JobHandlers } from '#server/jobs/handler.ts';
import { forgetPictures } from './pictures.service.ts';
import { clearLeftFiles, keptKeys, removePicture } from './picture-store.ts';

const hourMs = 3_600_000;
const dayMs = 24 * hourMs;
/** A picture may wait this long for its entry: a week of evenings in the shed. */
const unusedForMs = 7 * dayMs;
/** No upload takes nearly this long, nor does waiting to be made: what is older was left by a stop. */
const leftAfterMs = 6 * hourMs;
/** Rows a query and a round of removals take at a time. */
const batch = 200;

/** Keys of pictures that no working copy, published document or build shows. A key is long enough to be looked for as text. */
async function unusedKeys(em: Em, before: Date): Promise<string[]> {
  const rows = await em.createQueryBuilder(Picture, 'p').select(['p.key']).where({ state: { $ne: 'working' }, createdAt: { $lt: before } })
    .andWhere(raw(`not exists (select 1 from entry e where e.build_id = p.build_id and (instr(e.working, p.key) > 0 or instr(e.published, p.key) > 0))`))
    .andWhere(raw('not exists (select 1 from published_picture s where s.picture_id = p.id)'))
    .andWhere(raw('not exists (select 1 from build b where b.before_picture_id = p.id or b.after_picture_id = p.id)'))
    .limit(batch).execute<{ key: string }[]>('all');
  return rows.map((row) => row.key);
}

/** Pictures whose making was cut short by a stop. */
async function abandonedKeys(em: Em, before: Date): Promise<string[]> {
  const rows = await em.find(Picture, { state: 'working', createdAt: { $lt: before } }, { fields: ['key'], limit: batch });
  return rows.map((row) => row.key);
}

async function forgetAll({ orm, config }: Parts, find: (em: Em) => Promise<string[]>, signal: AbortSignal): Promise<void> {
  while (!signal.aborted) {
    // looked for and forgotten in one transaction: an entry saved in between keeps its pictures
    const keys = await orm.em.fork().transactional(async (em) => {
      const found = await find(em);
      await forgetPictures(em, found);
      return found;
    });
    if (keys.length === 0) return;
    for (const key of keys) await removePicture(config.dataDir, key);
  }
}

/** Folders that no row tells of, such as those of a build that was removed. */
async function clearFoldersWithoutRow({ orm, config }: Parts, before: Date, signal: AbortSignal): Promise<void> {
  for await (const keys of keptKeys(config.dataDir, before, batch)) {
    if (signal.aborted) return;
    const rows = await orm.em.fork().find(Picture, { key: { $in: keys } }, { fields: ['key'] });
    const known = new Set(rows.map((row) => row.key));
    for (const key of keys) if (!known.has(key)) await removePicture(config.dataDir, key);
  }
}

/** Once a day: what uploads left behind, and pictures nobody used. */
export function pictureJobs(parts: Parts): JobHandlers {
  const ago = (ms: number) => new Date(parts.now().getTime() - ms);
  return {
    'clear-pictures': {
      everyMs: dayMs,
      run: async (_payload, { signal }) => {
        await clearLeftFiles(parts.config.dataDir, ago(leftAfterMs));
        await forgetAll(parts, (em) => abandonedKeys(em, ago(leftAfterMs)), signal);
        await forgetAll(parts, (em) => unusedKeys(em, ago(unusedForMs)), signal);
        await clearFoldersWithoutRow(parts, ago(dayMs), signal);
      },
    },
  };
}
