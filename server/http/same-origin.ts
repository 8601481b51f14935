import type { RequestHandler } from 'express';
import { AppError } from '#contracts/errors.ts';
import type { Config } from '#server/config.ts';

const safe = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Refuses writes that another site sent the browser with. Programs that are no browser send neither header and carry no cookie of ours by accident. */
export function sameOrigin(config: Config): RequestHandler {
  return (req, _res, next) => {
    if (safe.has(req.method)) {
      next();
      return;
    }
    const site = req.get('sec-fetch-site');
    const origin = req.get('origin');
    const ours = origin === undefined || origin === new URL(config.publicUrl).origin || (config.local && origin === `http://${req.get('host') ?? ''}`);
    const refused = site === undefined ? !ours : site !== 'same-origin' && site !== 'none';
    next(refused || !ours ? new AppError('cross-site', 'This was sent from another site, so nothing was done.') : undefined);
  };
}
