import type { RequestHandler } from 'express';
import { AppError } from '#contracts/errors.ts';

const here = 'http://local.invalid';

/**
 * Lets through only addresses that are read one way by everybody. `//x/settings` and `/\\x` name another host to whoever
 * reads an address as a browser does, and a path here to the router: limits, pages and feeds would not mean the same page.
 */
export const plainAddress: RequestHandler = (req, _res, next) => {
  const asked = req.originalUrl;
  const plain = URL.canParse(asked, here) && (!asked.startsWith('/') || new URL(asked, here).origin === here);
  next(plain ? undefined : new AppError('not-found', 'There is nothing at this address.'));
};
