import { open, readFile } from 'node:fs/promises';
import sharp, { type Metadata, type Sharp, type SharpOptions } from 'sharp';
import { decodeHeic } from './heic-decoding.ts';
import { RefusedPicture } from './picture-messages.ts';
import { maxPixels, maxSide, tooBigWords } from './picture-limits.ts';
import { timeTaken } from './time-taken.ts';

// Runs in the picture process only: it reads what strangers sent.

const headBytes = 32;
const startsWith = (head: Buffer, bytes: string, at = 0) => head.toString('latin1', at, at + bytes.length) === bytes;

type Kind = 'jpeg' | 'png' | 'webp' | 'gif' | 'heif';
/** What a file is by its first bytes; its name and the sender's word for it count for nothing. */
export function kindOf(head: Buffer): Kind | null {
  if (startsWith(head, '\xff\xd8\xff')) return 'jpeg';
  if (startsWith(head, '\x89PNG\r\n\x1a\n')) return 'png';
  if (startsWith(head, 'RIFF') && startsWith(head, 'WEBP', 8)) return 'webp';
  if (startsWith(head, 'GIF87a') || startsWith(head, 'GIF89a')) return 'gif';
  if (startsWith(head, 'ftyp', 4)) return 'heif';
  return null;
}

const wrongType = () => new RefusedPicture('wrong-type', 'That is not a picture we can read. JPEG, PNG, WebP, HEIC or GIF.');
const damaged = () => new RefusedPicture('bad-input', 'That picture is damaged or cut short. Send it again, or save a fresh copy first.');

async function headOf(path: string): Promise<Buffer> {
  const file = await open(path);
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(headBytes), 0, headBytes, 0);
    return buffer.subarray(0, bytesRead);
  } finally {
    await file.close();
  }
}

function requireSize(width: number, height: number): void {
  if (width > maxSide || height > maxSide || width * height > maxPixels) throw new RefusedPicture('too-large', tooBigWords(width, height));
}

/** A PNG says its size in its first bytes, whatever follows. */
function requirePngSize(head: Buffer): void {
  if (head.length >= 24) requireSize(head.readUInt32BE(16), head.readUInt32BE(20));
}

async function metadataOf(path: string): Promise<Metadata> {
  try {
    // no limit here: the size is wanted for the words; nothing is decoded yet
    return await sharp(path, { limitInputPixels: false }).metadata();
  } catch {
    throw damaged();
  }
}

/** A checked picture, not yet decoded. */
export interface CheckedPicture {
  /** A fresh pipeline from the start: upright, nothing decoded before it is asked for. */
  readonly pipeline: () => Sharp;
  readonly takenAt: string | null;
}

// libjpeg warns of harmless slips of some cameras; what is cut short or broken is still an error
const reading: SharpOptions = { limitInputPixels: maxPixels, failOn: 'error' };

async function heicPipeline(path: string, metadata: Metadata): Promise<() => Sharp> {
  try {
    const decoded = await decodeHeic(await readFile(path), metadata.icc, requireSize);
    // its frame is already turned by the format itself; a second turn by EXIF would be wrong
    return () => sharp(decoded, { limitInputPixels: maxPixels });
  } catch (error) {
    throw error instanceof RefusedPicture ? error : damaged();
  }
}

/**
 * Finds out what a file is and how large, from its head.
 * @throws RefusedPicture when it is no picture, too large or damaged
 */
export async function checkPicture(path: string): Promise<CheckedPicture> {
  const head = await headOf(path);
  const kind = kindOf(head);
  if (!kind) throw wrongType();
  if (kind === 'png') requirePngSize(head);
  const metadata = await metadataOf(path);
  if (metadata.format !== kind) throw wrongType();
  requireSize(metadata.width, metadata.height);
  const takenAt = await timeTaken(metadata.exif);
  if (kind === 'heif' && metadata.compression !== 'av1') return { pipeline: await heicPipeline(path, metadata), takenAt };
  return { pipeline: () => sharp(path, reading).autoOrient(), takenAt };
}

/** Runs a step that decodes; what it cannot decode is the sender's to mend. */
export async function decoding<T>(step: () => Promise<T>): Promise<T> {
  try {
    return await step();
  } catch {
    throw damaged();
  }
}
