import { mkdir, readdir, rename, rm, stat } from 'node:fs/promises';
import { basename, join } from 'node:path';
import { customAlphabet } from 'nanoid';

/** 24 of 36 letters are 124 bits; lower case only, so that keys stay apart on disks that fold case. */
export const newPictureKey = customAlphabet('0123456789abcdefghijklmnopqrstuvwxyz', 24);

export const quarantineFolder = (dataDir: string) => join(dataDir, 'quarantine');
export const picturesFolder = (dataDir: string) => join(dataDir, 'pictures');
/** Files not yet all there; beside the finished ones, so that a rename is enough. */
export const makingFolder = (dataDir: string) => join(picturesFolder(dataDir), 'making');
/** Path of a picture below the pictures folder; two letters spread the folders. */
export const placeOf = (key: string) => join(key.slice(0, 2), key);

/** Takes an upload out of reach of whoever sent it: what happens to the request no longer touches it. */
export async function takeOver(dataDir: string, upload: string, key: string): Promise<string> {
  const source = join(quarantineFolder(dataDir), `taken-${key}`);
  await rename(upload, source);
  return source;
}

export async function removePicture(dataDir: string, key: string): Promise<void> {
  await rm(join(picturesFolder(dataDir), placeOf(key)), { recursive: true, force: true });
}

export async function readyQuarantine(dataDir: string): Promise<string> {
  const folder = quarantineFolder(dataDir);
  await mkdir(folder, { recursive: true, mode: 0o700 });
  return folder;
}

/** What is there, or nothing: files come and go while their folder is read. */
async function ifThere<T>(asked: Promise<T>): Promise<T | null> {
  try {
    return await asked;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return null;
    throw error;
  }
}

const namesIn = async (folder: string) => (await ifThere(readdir(folder))) ?? [];

/** Paths of what stands in a folder since before a time. */
async function olderIn(folder: string, before: Date): Promise<string[]> {
  const paths = (await namesIn(folder)).map((name) => join(folder, name));
  const ages = await Promise.all(paths.map(async (path) => ({ path, at: (await ifThere(stat(path)))?.mtime })));
  return ages.filter(({ at }) => at && at < before).map(({ path }) => path);
}

/** Removes uploads and half-made pictures that a stop left behind. */
export async function clearLeftFiles(dataDir: string, before: Date): Promise<void> {
  for (const folder of [quarantineFolder(dataDir), makingFolder(dataDir)]) {
    for (const path of await olderIn(folder, before)) await rm(path, { recursive: true, force: true });
  }
}

/** The keys of all pictures kept since before a time, some at a time. */
export async function* keptKeys(dataDir: string, before: Date, batch: number): AsyncGenerator<string[]> {
  let keys: string[] = [];
  for (const name of await namesIn(picturesFolder(dataDir))) {
    // two letters; beside them stands what is being made
    if (name.length !== 2) continue;
    for (const path of await olderIn(join(picturesFolder(dataDir), name), before)) keys.push(basename(path));
    if (keys.length < batch) continue;
    yield keys;
    keys = [];
  }
  if (keys.length > 0) yield keys;
}
