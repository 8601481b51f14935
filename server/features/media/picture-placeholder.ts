import sharp from 'sharp';
import { rgbaToThumbHash, thumbHashToRGBA } from 'thumbhash';

/** The largest side the hash takes. */
const hashSide = 100;

/** A blurred likeness of 32 pixels as a data URI: the hash smooths it, WebP packs it. */
export async function placeholderOf(data: Buffer, raw: { width: number; height: number; channels: 3 }): Promise<string> {
  const small = await sharp(data, { raw }).resize(hashSide, hashSide, { fit: 'inside' }).ensureAlpha().raw().toBuffer({ resolveWithObject: true });
  const { w, h, rgba } = thumbHashToRGBA(rgbaToThumbHash(small.info.width, small.info.height, small.data));
  const packed = await sharp(Buffer.from(rgba), { raw: { width: w, height: h, channels: 4 } }).removeAlpha().webp({ quality: 40, effort: 6 }).toBuffer();
  return `data:image/webp;base64,${packed.toString('base64')}`;
}
