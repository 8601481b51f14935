import { copyFile, rm } from 'node:fs/promises';
import { basename, join } from 'node:path';
import { AppError } from '#contracts/errors.ts';
import type { DeskPicture, PictureView } from '#contracts/pictures.ts';
import { Person, Picture, PublishedPicture, type Build, type Entry } from '#server/entities/index.ts';
import { mayWrite, requireCrewBuild, requireWritableBuild } from '#server/features/builds/build-access.service.ts';
import type { Caller, Em, Parts, Viewer } from '#server/http/context.ts';
import { pictureMaker } from './picture-maker.ts';
import { RefusedPicture, type MadePicture } from './picture-messages.ts';
import { makingFolder, newPictureKey, picturesFolder, placeOf, readyQuarantine, takeOver } from './picture-store.ts';

/** A file in quarantine, with the name its sender gave it. */
export interface Upload {
  readonly path: string;
  readonly name: string;
}

const longestName = 200;
const faultWords = 'Something went wrong here while this picture was made. Send it again.';

async function makeOf(parts: Parts, picture: Picture, source: string): Promise<MadePicture> {
  const { dataDir } = parts.config;
  return pictureMaker.make({ source, making: join(makingFolder(dataDir), picture.key), folder: join(picturesFolder(dataDir), placeOf(picture.key)) });
}

function settle(picture: Picture, made: MadePicture): void {
  const { takenAt, ...measured } = made;
  Object.assign(picture, { ...measured, takenAt: takenAt === null ? null : new Date(takenAt), state: 'ready' });
}

function refuse(picture: Picture, problem: string): void {
  picture.state = 'refused';
  picture.problem = problem;
}

/**
 * Takes one upload: a row, the making in the other process, the row again. Two flushes, since the making is slow.
 * @throws AppError with the field `picture` when it is refused
 */
export async function takePicture(parts: Parts, em: Em, build: Build, uploader: number, upload: Upload): Promise<Picture> {
  const key = newPictureKey();
  const source = await takeOver(parts.config.dataDir, upload.path, key);
  const picture = em.create(Picture, { key, build, uploader: em.getReference(Person, uploader), originalName: upload.name.slice(0, longestName), widths: [] });
  await em.persistAndFlush(picture);
  try {
    settle(picture, await makeOf(parts, picture, source));
  } catch (error) {
    refuse(picture, error instanceof RefusedPicture ? error.refusal.problem : faultWords);
    if (!(error instanceof RefusedPicture)) throw error;
    throw new AppError(error.refusal.code, error.refusal.problem, { picture: error.refusal.problem });
  } finally {
    await rm(source, { force: true });
    await em.flush();
  }
  return picture;
}

/** Takes a file of ours the way an upload goes; the file itself stays where it is. */
export async function addPictureFromFile(parts: Parts, em: Em, build: Build, person: Person, path: string): Promise<Picture> {
  const upload = { path: join(await readyQuarantine(parts.config.dataDir), newPictureKey()), name: basename(path) };
  await copyFile(path, upload.path);
  return takePicture(parts, em, build, person.id, upload);
}

/** Takes the upload of a request, if there is one. */
export async function addPictureToBuild(parts: Parts, em: Em, caller: Caller, slug: string, upload: Upload | null): Promise<Picture> {
  const build = await requireWritableBuild(em, caller, slug);
  if (!upload) throw new AppError('bad-input', 'Choose a picture.', { picture: 'Choose a picture.' });
  return takePicture(parts, em, build, caller.id, upload);
}

export async function pictureOfBuild(em: Em, caller: Caller, slug: string, key: string): Promise<Picture> {
  const build = await requireCrewBuild(em, caller, slug);
  const picture = await em.findOne(Picture, { key, build: build.id });
  if (!picture) throw new AppError('not-found', 'There is no such picture in this build.');
  return picture;
}

const addressOf = (picture: Picture, file: string) => `/pictures/${picture.key}/${file}`;

/** A picture as pages need it. */
export function pictureView(picture: Picture, { alt, caption }: { alt: string; caption: string }): PictureView {
  const { key, width, height, placeholder, widths } = picture;
  const srcset = (suffix: string) => widths.map((step) => `${addressOf(picture, `${step}.${suffix}`)} ${step}w`).join(', ');
  return {
    key, width, height, alt, caption, placeholder,
    src: addressOf(picture, `${widths.at(-1) ?? 0}.jpg`),
    sources: [{ type: 'image/avif', srcset: srcset('avif') }, { type: 'image/webp', srcset: srcset('webp') }],
  };
}

export function deskPictureOf(picture: Picture): DeskPicture {
  const { key, state, problem } = picture;
  return { key, state: state ?? 'working', problem: problem ?? null, picture: state === 'ready' ? pictureView(picture, { alt: '', caption: '' }) : null };
}

/** The pictures of a build by key, as far as they are ready; words for them stand in the entry. */
export async function pictureViews(em: Em, build: number, keys: readonly string[]): Promise<Map<string, PictureView>> {
  if (keys.length === 0) return new Map();
  const pictures = await em.find(Picture, { build, key: { $in: [...new Set(keys)] }, state: 'ready' });
  return new Map(pictures.map((picture) => [picture.key, pictureView(picture, { alt: '', caption: '' })]));
}

/** A picture as an entry's document shows it; `block` and `line` say where. */
export interface ShownHere {
  readonly key: string;
  readonly alt: string;
  readonly cover: boolean;
  readonly block: string;
  readonly line: string;
}

/**
 * What an entry's published document shows from now on, for the rights to its files. Called inside the sign-off's transaction.
 * @throws AppError when a picture is not one of this build or not ready
 */
export async function setPublishedPictures(em: Em, entry: Entry, shown: readonly ShownHere[]): Promise<void> {
  const pictures = await em.find(Picture, { build: entry.build.id, key: { $in: shown.map((one) => one.key) }, state: 'ready' });
  const byKey = new Map(pictures.map((picture) => [picture.key, picture]));
  const lost = shown.filter((one) => !byKey.has(one.key));
  if (lost.length > 0) {
    throw new AppError('bad-input', 'A photo is not there any more.', Object.fromEntries(lost.map((one) => [`${one.block}.${one.line}.picture`, 'This photo is not there any more. Add it again, or take it out.'])));
  }
  await em.nativeDelete(PublishedPicture, { entry: entry.id });
  const first = shown.filter((one, index) => shown.findIndex((other) => other.key === one.key) === index);
  for (const [position, { key, alt, cover }] of first.entries()) {
    const picture = byKey.get(key);
    if (picture) em.persist(em.create(PublishedPicture, { entry, picture, position, cover, alt }));
  }
}

/** Whether a published page shows this picture: in an entry, or as its build's before or after. */
async function isShown(em: Em, picture: Picture, build: Build): Promise<boolean> {
  if (build.beforePicture?.id === picture.id || build.afterPicture?.id === picture.id) return true;
  return (await em.count(PublishedPicture, { picture: picture.id })) > 0;
}

/** Who may be sent the files of a picture, as far as this viewer is concerned. */
export async function mayServePicture(em: Em, viewer: Viewer, key: string): Promise<'everyone' | 'crew' | 'nobody'> {
  const picture = await em.findOne(Picture, { key, state: 'ready' }, { populate: ['build'] });
  if (!picture) return 'nobody';
  const { build } = picture;
  if (build.visibility !== 'private' && (await isShown(em, picture, build))) return 'everyone';
  return (await mayWrite(em, viewer, build)) ? 'crew' : 'nobody';
}

/** Forgets the rows of pictures; their files go after the transaction, or with the next clearing. */
export async function forgetPictures(em: Em, keys: readonly string[]): Promise<void> {
  if (keys.length > 0) await em.nativeDelete(Picture, { key: { $in: [...keys] } });
}
