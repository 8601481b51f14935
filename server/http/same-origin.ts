import type { RequestHandler } from 'express';
import { AppError } from '#contracts/errors.ts';
import type { Config } from '#server/config.ts';

const safe = new Set(['GET', 'HEAD', 'OPTIONS']);
const loopback = new Set(['127.0.0.1', 'localhost', '[::1]']);

/** Our public address, or, while the site runs on its own machine, another name of this machine by which the request came. */
function isOurs(origin: string, host: string, { publicUrl, local }: Config): boolean {
  if (origin === new URL(publicUrl).origin) return true;
  return local && origin === `http://${host}` && URL.canParse(origin) && loopback.has(new URL(origin).hostname);
}

/** Refuses writes that another site sent the browser with. Programs that are no browser send neither header and carry no cookie of ours by accident. */
export function sameOrigin(config: Config): RequestHandler {
  return (req, _res, next) => {
    if (safe.has(req.method)) {
      next();
      return;
    }
    const site = req.get('sec-fetch-site');
    const origin = req.get('origin');
    const ours = origin === undefined || isOurs(origin, req.get('host') ?? '', config);
    const refused = site === undefined ? !ours : site !== 'same-origin' && site !== 'none';
    next(refused || !ours ? new AppError('cross-site', 'This was sent from another site, so nothing was done.') : undefined);
  };
}
