import { AppError } from '#contracts/errors.ts';
import { Entry, Stage, type Build } from '#server/entities/index.ts';
import { requireCrewBuild, requireWritableBuild } from '#server/features/builds/build-access.service.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { standingDocument } from './stored-document.ts';

export interface OpenEntry {
  readonly build: Build;
  readonly entry: Entry;
}

async function entryOf(em: Em, build: Build, number: number): Promise<OpenEntry> {
  const entry = await em.findOne(Entry, { build: build.id, number }, { populate: ['build', 'stage'] });
  if (!entry) throw new AppError('not-found', 'There is no such entry in this build.');
  return { build, entry };
}

/** An entry this person may write in. */
export async function requireEntry(em: Em, caller: Caller, slug: string, number: number): Promise<OpenEntry> {
  return entryOf(em, await requireWritableBuild(em, caller, slug), number);
}

/** An entry whose working copy this person may see. */
export async function requireOpenEntry(em: Em, caller: Caller, slug: string, number: number): Promise<OpenEntry> {
  return entryOf(em, await requireCrewBuild(em, caller, slug), number);
}

/** @throws AppError `newer-exists`, with what stands there now, when somebody saved since `version` was read */
export function requireVersion(entry: Entry, version: number): void {
  if (entry.version === version) return;
  throw new AppError(
    'newer-exists', 'Somebody saved this entry since you opened it. Nothing is lost: both texts are here, keep what you want of each.',
    undefined, { version: entry.version, document: standingDocument(entry) },
  );
}

/** The stage of that id in this build. @throws AppError beside the field when there is none */
export async function requireStage(em: Em, build: Build, id: number | null): Promise<Stage | null> {
  if (id === null) return null;
  const stage = await em.findOne(Stage, { id, build: build.id });
  if (!stage) throw new AppError('bad-input', 'Some of this needs mending.', { stage: 'Pick a stage of this build.' });
  return stage;
}
