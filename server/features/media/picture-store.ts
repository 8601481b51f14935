import { mkdir, rename, rm } from 'node:fs/promises';
import { join } from 'node:path';
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
