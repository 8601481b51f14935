import { raw } from '@mikro-orm/core';
import { AppError } from '#contracts/errors.ts';
import { Picture, type Build } from '#server/entities/index.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { maxBuildBytes, maxMakingMs, maxWaiting, megabyte } from './picture-limits.ts';

async function storedBytes(em: Em, build: Build): Promise<number> {
  const { bytes } = await em.createQueryBuilder(Picture).select(raw('sum(bytes) as bytes')).where({ build: build.id }).execute<{ bytes: number | null }>('get');
  return bytes ?? 0;
}

/** Whether there is room for one more picture of this person in this build. @throws AppError `too-many` or `falls-short` */
export async function requireRoom(em: Em, caller: Caller, build: Build, now: Date): Promise<void> {
  // a row older than this was left by a stop and waits for nothing
  const since = new Date(now.getTime() - maxWaiting * maxMakingMs);
  const waiting = await em.count(Picture, { uploader: caller.id, state: 'working', createdAt: { $gt: since } });
  if (waiting >= maxWaiting) throw new AppError('too-many', `${maxWaiting} of your pictures are being made already. Send this one when they are done.`);
  if (await storedBytes(em, build) > maxBuildBytes) {
    throw new AppError('falls-short', `The pictures of this build fill ${maxBuildBytes / megabyte / 1000} GB, which is the most. Pictures you take out of entries make room a week later.`);
  }
}
