import { z } from 'zod';
import { pureBlock, type BlockDerivation } from '../block.ts';
import { nodeId } from '../prose.ts';

export const photo = z.object({
  id: nodeId,
  /** Key of an uploaded picture of this build. */
  picture: z.string().regex(/^[A-Za-z0-9_-]{16,40}$/),
  caption: z.string().max(400),
  alt: z.string().max(400),
  cover: z.boolean(),
});
export type Photo = z.output<typeof photo>;
/** One or more pictures with captions and words for people who cannot see them. */
export const photosData = z.object({ photos: z.array(photo).max(40) });
export type PhotosData = z.output<typeof photosData>;

function derivePhotos(data: PhotosData): BlockDerivation {
  const silent = data.photos.filter((one) => one.alt.trim() === '').length;
  return {
    faults: data.photos.length === 0 ? [{ path: '', problem: 'Add a photo, or take this block out.' }] : [],
    pictures: data.photos.map((one) => ({ line: one.id, key: one.picture, alt: one.alt.trim(), caption: one.caption.trim(), cover: one.cover })),
    remarks: silent === 0 ? [] : [silent === 1 ? 'A photo has no words for people who cannot see it.' : `${silent} photos have no words for people who cannot see them.`],
  };
}

export const photos = pureBlock({ type: 'photos', version: 1, schema: photosData, stepsUp: {}, derive: derivePhotos });
