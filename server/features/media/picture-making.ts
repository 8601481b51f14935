import { mkdir, rename, rm, writeFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import sharp from 'sharp';
import { checkPicture, decoding, type CheckedPicture } from './picture-reading.ts';
import type { MadePicture, PictureOrder } from './picture-messages.ts';
import { placeholderOf } from './picture-placeholder.ts';
import { widthSteps } from './picture-limits.ts';

// Runs in the picture process only. Every file is drawn afresh from pixels: nothing else of the upload survives.

const paper = '#ffffff';
/** Effort 2 takes a tenth of the time of the default 4 for about a tenth more bytes, and 1 a third of that for 0 to 3 % more (measured on our own plates). */
const avif = { quality: 50, effort: 1 } as const;
const webp = { quality: 78, effort: 2 } as const;
const jpeg = { quality: 80, mozjpeg: false } as const;
const originalJpeg = { quality: 88, mozjpeg: false } as const;

interface Pixels {
  readonly data: Buffer;
  readonly raw: { readonly width: number; readonly height: number; readonly channels: 3 };
}

/** A clean full-size original; decodes all of the upload, so that what is cut short is found out here. */
async function cleanOriginal(picture: CheckedPicture): Promise<{ data: Buffer; width: number; height: number }> {
  const { data, info } = await decoding(() =>
    picture.pipeline().flatten({ background: paper }).toColourspace('srgb').jpeg(originalJpeg).toBuffer({ resolveWithObject: true }));
  return { data, width: info.width, height: info.height };
}

/** The widest of the widths, decoded once for all of the smaller ones. */
async function widest(picture: CheckedPicture, width: number): Promise<Pixels> {
  const { data, info } = await decoding(() =>
    picture.pipeline().resize({ width, withoutEnlargement: true }).flatten({ background: paper }).toColourspace('srgb').raw({ depth: 'uchar' }).toBuffer({ resolveWithObject: true }));
  return { data, raw: { width: info.width, height: info.height, channels: 3 } };
}

export function widthsFor(width: number): number[] {
  const fitting = widthSteps.filter((step) => step <= width);
  return fitting.length > 0 ? fitting : [width];
}

/** One width in its three formats; the number of bytes written. */
async function writeWidth({ data, raw }: Pixels, width: number, folder: string): Promise<number> {
  const resized = await sharp(data, { raw }).resize({ width }).raw().toBuffer({ resolveWithObject: true });
  const again = () => sharp(resized.data, { raw: { width: resized.info.width, height: resized.info.height, channels: 3 } });
  const written = await Promise.all([
    again().avif(avif).toFile(join(folder, `${width}.avif`)),
    again().webp(webp).toFile(join(folder, `${width}.webp`)),
    again().jpeg(jpeg).toFile(join(folder, `${width}.jpg`)),
  ]);
  return written.reduce((sum, file) => sum + file.size, 0);
}

async function makeFiles(source: string, folder: string): Promise<MadePicture> {
  const picture = await checkPicture(source);
  const original = await cleanOriginal(picture);
  await writeFile(join(folder, 'original.jpg'), original.data);
  const widths = widthsFor(original.width);
  const pixels = await widest(picture, Math.max(...widths));
  // at once: the widest AVIF takes as long as all the others together
  const written = await Promise.all(widths.map((width) => writeWidth(pixels, width, folder)));
  return {
    width: original.width, height: original.height, widths,
    placeholder: await placeholderOf(pixels.data, pixels.raw),
    takenAt: picture.takenAt,
    bytes: written.reduce((sum, bytes) => sum + bytes, original.data.length),
  };
}

/** Makes all files of a picture aside and puts them in their place at once: a folder that is there is whole. */
export async function makePicture({ source, making, folder }: Omit<PictureOrder, 'id'>): Promise<MadePicture> {
  await mkdir(making, { recursive: true });
  try {
    const made = await makeFiles(source, making);
    await mkdir(dirname(folder), { recursive: true });
    await rename(making, folder);
    return made;
  } finally {
    await rm(making, { recursive: true, force: true });
  }
}
