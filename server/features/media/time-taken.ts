import exifr from 'exifr';

const exifPrefix = Buffer.from('Exif\0\0', 'latin1');
const written = /^(\d{4}):(\d\d):(\d\d) (\d\d):(\d\d):(\d\d)/;
const offsetWritten = /^[+-]\d\d:\d\d$/;

/** Reads "2026:11:14 10:11:12" with its offset; a camera that keeps no offset is taken at its word, as UTC. */
function isoTime(text: unknown, offset: unknown): string | null {
  const parts = typeof text === 'string' ? written.exec(text) : null;
  if (!parts) return null;
  const [, year, month, day, hour, minute, second] = parts;
  const zone = typeof offset === 'string' && offsetWritten.test(offset) ? offset : 'Z';
  const time = new Date(`${year}-${month}-${day}T${hour}:${minute}:${second}${zone}`);
  return Number.isNaN(time.getTime()) ? null : time.toISOString();
}

/** When the camera says the picture was taken, as an ISO time. */
export async function timeTaken(exif: Buffer | undefined): Promise<string | null> {
  if (!exif) return null;
  const tiff = exif.subarray(0, exifPrefix.length).equals(exifPrefix) ? exif.subarray(exifPrefix.length) : exif;
  try {
    const tags: unknown = await exifr.parse(tiff, { pick: ['DateTimeOriginal', 'OffsetTimeOriginal'], reviveValues: false });
    if (typeof tags !== 'object' || tags === null) return null;
    const { DateTimeOriginal: text, OffsetTimeOriginal: offset } = tags as { DateTimeOriginal?: unknown; OffsetTimeOriginal?: unknown };
    return isoTime(text, offset);
  } catch {
    // broken EXIF is common and no reason to refuse a good picture
    return null;
  }
}
