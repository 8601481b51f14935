import { crc32, deflateSync } from 'node:zlib';
import heic from 'heic-decode';
import sharp from 'sharp';

function pngChunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const chunk = Buffer.alloc(body.length + 8);
  chunk.writeUInt32BE(data.length, 0);
  body.copy(chunk, 4);
  chunk.writeUInt32BE(crc32(body), body.length + 4);
  return chunk;
}

/** Bytes of a PNG up to the end of its header chunk, after which a colour profile stands. */
const afterHeader = 33;

/** A phone's HEIC is in a colour space wider than the screen's: its profile goes along, or the colours come out dull. */
function withProfile(png: Buffer, icc: Buffer | undefined): Buffer {
  if (!icc) return png;
  const profile = pngChunk('iCCP', Buffer.concat([Buffer.from('p\0\0', 'latin1'), deflateSync(icc)]));
  return Buffer.concat([png.subarray(0, afterHeader), profile, png.subarray(afterHeader)]);
}

// The package's typings leave out the size told before decoding, and the release of its memory.
interface HeicPicture {
  readonly width: number;
  readonly height: number;
  decode(): Promise<{ width: number; height: number; data: Uint8ClampedArray }>;
}
type HeicPictures = HeicPicture[] & { dispose(): void };

/**
 * Decodes the first picture of a HEIC file to an unpacked PNG, upright, in its own colour space.
 * @param check called with its size before anything is decoded
 */
export async function decodeHeic(file: Buffer, icc: Buffer | undefined, check: (width: number, height: number) => void): Promise<Buffer> {
  const images = (await heic.all({ buffer: file })) as unknown as HeicPictures;
  try {
    const [first] = images;
    if (!first) throw new Error('The file holds no picture.');
    check(first.width, first.height);
    const { width, height, data } = await first.decode();
    const frame = sharp(Buffer.from(data.buffer, data.byteOffset, data.byteLength), { raw: { width, height, channels: 4 } });
    return withProfile(await frame.removeAlpha().png({ compressionLevel: 0 }).toBuffer(), icc);
  } finally {
    images.dispose();
  }
}
