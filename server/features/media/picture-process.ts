import { setPriority } from 'node:os';
import sharp from 'sharp';
import { makePicture } from './picture-making.ts';
import { RefusedPicture, type PictureAnswer, type PictureOrder } from './picture-messages.ts';

// The process that pictures are made in. It is started by `picture-maker.ts`, takes one order at a time and ends with the site.

/** The site's own queries go first on a small machine. */
const behindTheSite = 5;
setPriority(behindTheSite);

sharp.cache(false);
sharp.concurrency(1);
// Only the readers of the kinds we take: no SVG, PDF or anything that reaches for other files.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({ operation: ['VipsForeignLoadJpeg', 'VipsForeignLoadPng', 'VipsForeignLoadWebp', 'VipsForeignLoadNsgif', 'VipsForeignLoadHeif'] });

async function answerTo(order: PictureOrder): Promise<PictureAnswer> {
  const { id, ...task } = order;
  const resident = () => process.memoryUsage.rss();
  try {
    return { id, kind: 'made', picture: await makePicture(task), resident: resident() };
  } catch (error) {
    if (error instanceof RefusedPicture) return { id, kind: 'refused', refusal: error.refusal, resident: resident() };
    return { id, kind: 'fault', fault: error instanceof Error ? (error.stack ?? error.message) : String(error), resident: resident() };
  }
}

process.on('message', (order: PictureOrder) => {
  void answerTo(order).then((answer) => process.send?.(answer));
});
// The site is gone. An ordinary exit would wait for the picture under way.
process.on('disconnect', () => process.kill(process.pid, 'SIGKILL'));
// An interrupt from the keyboard reaches the whole group; the site decides when this ends.
process.on('SIGINT', () => undefined);
