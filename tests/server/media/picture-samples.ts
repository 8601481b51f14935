import { readFile } from 'node:fs/promises';
import { crc32, deflateSync } from 'node:zlib';
import sharp, { type Sharp } from 'sharp';

/** Colours of the sample's quarters, as they lie: above left and right, below left and right. */
export const quarters = { aboveLeft: [220, 30, 30], aboveRight: [30, 200, 40], belowLeft: [40, 50, 210], belowRight: [240, 240, 240] } as const;

/** A picture of four quarters, by which its turning and its colours show. */
export function quadrants(width = 120, height = 80): Sharp {
  const data = Buffer.alloc(width * height * 3);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const above = y < height / 2;
      const left = x < width / 2;
      data.set(above ? (left ? quarters.aboveLeft : quarters.aboveRight) : left ? quarters.belowLeft : quarters.belowRight, (y * width + x) * 3);
    }
  }
  return sharp(data, { raw: { width, height, channels: 3 } });
}

/** As a phone writes it: lying on its side, with where and when. */
export function fromPhone(): Promise<Buffer> {
  return quadrants().withExif({
    IFD0: { Orientation: '6', Make: 'Bench', Copyright: 'somebody private' },
    IFD2: { DateTimeOriginal: '2026:11:14 10:11:12', OffsetTimeOriginal: '+01:00', UserComment: 'in my garage' },
    IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '51/1 30/1 0/1', GPSLongitudeRef: 'W', GPSLongitude: '0/1 7/1 0/1' },
  }).withMetadata({ orientation: 6 }).withXmp('<x:xmpmeta xmlns:x="adobe:ns:meta/"><secret>shed key under the pot</secret></x:xmpmeta>').jpeg({ quality: 95 }).toBuffer();
}

/** Noise, which packs badly: a photograph's weight. */
export function noisy(width: number, height: number): Sharp {
  return sharp({ create: { width, height, channels: 3, background: '#886644', noise: { type: 'gaussian', mean: 128, sigma: 40 } } });
}

/** HEIC of the quarters in Display P3 with EXIF and GPS; `turned` also carries the format's own quarter turn to the left. */
export const heicSample = (name: 'quadrants' | 'quadrants-turned') => readFile(new URL(`./${name}.heic`, import.meta.url));

function pngChunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const chunk = Buffer.alloc(body.length + 8);
  chunk.writeUInt32BE(data.length, 0);
  body.copy(chunk, 4);
  chunk.writeUInt32BE(crc32(body), body.length + 4);
  return chunk;
}

/** A whole, valid black and white PNG of any size: 30,000 by 30,000 unpack to 112 MB from 110 kB. */
export function blankPng(width: number, height: number): Buffer {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header[8] = 1; // one bit a pixel, grey
  const rows = Buffer.alloc((Math.ceil(width / 8) + 1) * height);
  const signature = Buffer.from('\x89PNG\r\n\x1a\n', 'latin1');
  return Buffer.concat([signature, pngChunk('IHDR', header), pngChunk('IDAT', deflateSync(rows)), pngChunk('IEND', Buffer.alloc(0))]);
}

/** The head of a JPEG as large as asked for, with nothing behind it. */
export async function jpegClaiming(width: number, height: number): Promise<Buffer> {
  const jpeg = await quadrants().jpeg().toBuffer();
  const frame = jpeg.indexOf(Buffer.from([0xff, 0xc0]));
  jpeg.writeUInt16BE(height, frame + 5);
  jpeg.writeUInt16BE(width, frame + 7);
  return jpeg;
}

/** What of a text stands in the bytes of a file, so that nothing of it may come out again. */
export function holds(file: Buffer, text: string): boolean {
  return file.includes(Buffer.from(text, 'latin1'));
}

/** Mean colour of a small square around a point given in parts of the whole. */
export async function colourAt(file: Buffer, x: number, y: number): Promise<number[]> {
  const { data, info } = await sharp(file).removeAlpha().raw().toBuffer({ resolveWithObject: true });
  const at = (Math.round(y * (info.height - 1)) * info.width + Math.round(x * (info.width - 1))) * info.channels;
  return [...data.subarray(at, at + 3)];
}
