import { Router, type Request, type Response } from 'express';
import type { Parts } from '#server/http/context.ts';
import { movedBuild } from '#server/features/builds/build-access.service.ts';
import { jsonFeedOf, rssOf } from './feed-formats.ts';
import { buildFeed, siteFeed, type Feed } from './feed.service.ts';

const formats = {
  xml: { type: 'application/rss+xml; charset=utf-8', write: rssOf },
  json: { type: 'application/feed+json; charset=utf-8', write: jsonFeedOf },
} as const;

/** Answers a feed; express adds the ETag and the 304s. It has no date: figures change without the words. Other sites' readers may fetch it, so the resource policy is open. */
function sendFeed(res: Response, feed: Feed, format: keyof typeof formats, publicUrl: string): void {
  const { type, write } = formats[format];
  res.set({ 'Cache-Control': 'public, max-age=300', 'Cross-Origin-Resource-Policy': 'cross-origin', 'Access-Control-Allow-Origin': '*' });
  if (!feed.listed) res.set('X-Robots-Tag', 'noindex');
  res.set('Content-Type', type).send(Buffer.from(write(feed, publicUrl)));
}

/** RSS and JSON feeds, for everything and for a build. */
export function feedsRouter(parts: Parts): Router {
  const router = Router();
  for (const format of ['xml', 'json'] as const) {
    router.get(`/feed.${format}`, async (_req: Request, res: Response) => {
      sendFeed(res, await siteFeed(parts.orm.em.fork(), parts.config.publicUrl), format, parts.config.publicUrl);
    });
    router.get(`/builds/:build/feed.${format}`, async (req: Request<{ build: string }>, res: Response) => {
      const em = parts.orm.em.fork();
      const moved = await movedBuild(em, null, req.params.build);
      if (moved) {
        res.redirect(301, `/builds/${moved}/feed.${format}`);
        return;
      }
      sendFeed(res, await buildFeed(em, req.params.build, parts.config.publicUrl), format, parts.config.publicUrl);
    });
  }
  return router;
}
