import express, { Router, type Request, type RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit, type Options } from 'express-rate-limit';
import { AppError } from '#contracts/errors.ts';
import { holdBack } from '#server/http/held-back.ts';

const minuteMs = 60_000;

// How often: from one place, for one address from one place, for one address from anywhere. Common practice, no source.
const signInFrom = { limit: 30, windowMs: 10 * minuteMs };
const signInFor = { limit: 10, windowMs: 10 * minuteMs };
const signInAnywhere = { limit: 100, windowMs: 60 * minuteMs };
const signUpFrom = { limit: 20, windowMs: 60 * minuteMs };
const passwordOf = { limit: 10, windowMs: 10 * minuteMs };
const githubFrom = { limit: 60, windowMs: 10 * minuteMs };

const placeOf = (req: Request) => ipKeyGenerator(req.ip ?? '');

function addressIn(req: Request): string {
  const body: unknown = req.body;
  const email = typeof body === 'object' && body !== null && 'email' in body ? body.email : '';
  return typeof email === 'string' ? email.trim().toLowerCase() : '';
}

/** Past the limit a page gets its form back as it was typed; anything else gets the problem. */
function limiter(identifier: string, options: Partial<Options>): RequestHandler {
  return rateLimit({
    standardHeaders: 'draft-8', legacyHeaders: false, keyGenerator: placeOf, identifier, ...options,
    handler: (req, _res, next, { windowMs }) => {
      const wait = windowMs === 60 * minuteMs ? 'an hour' : `${windowMs / minuteMs} minutes`;
      const reason = new AppError('too-many', `Too many tries. Wait ${wait} and try again.`);
      const page = req.method === 'POST' && !req.path.startsWith('/api/');
      if (page) holdBack(req, reason);
      next(page ? undefined : reason);
    },
  });
}

/** The path as the pages' router will read it: dots resolved, letters decoded, either case, no slash at the end. */
function pathOf(req: Request): string {
  const { pathname } = new URL(req.originalUrl, 'http://local.invalid');
  const trimmed = pathname.replace(/(?<=.)\/+$/, '').toLowerCase();
  try {
    return decodeURIComponent(trimmed);
  } catch (error) {
    // a stray percent sign: the router takes such a path as it stands
    if (error instanceof URIError) return trimmed;
    throw error;
  }
}

/** The tries one place and one address have at signing in and up, by the API and by the pages alike. Right answers are not counted. */
export function accountLimits(): RequestHandler {
  const wrongOnes = { skipSuccessfulRequests: true };
  // what these addresses are sent is small, and the address in it is part of what is counted
  const read = [express.json({ limit: '16kb' }), express.urlencoded({ extended: false, limit: '64kb' })];
  const signIns = Router().use(
    limiter('sign-in-from', { ...signInFrom, ...wrongOnes }), ...read,
    limiter('sign-in-for', { ...signInFor, ...wrongOnes, keyGenerator: (req) => `${placeOf(req)} ${addressIn(req)}` }),
    limiter('sign-in-anywhere', { ...signInAnywhere, ...wrongOnes, keyGenerator: addressIn }),
  );
  const signUps = limiter('sign-up-from', signUpFrom);
  const passwords = limiter('password-of', {
    ...passwordOf, ...wrongOnes,
    keyGenerator: (req) => (req.session.personId === undefined ? placeOf(req) : `person ${req.session.personId}`),
  });
  const github = limiter('github-from', githubFrom);
  const limited = new Map<string, RequestHandler>([
    ['POST /api/session', signIns], ['POST /sign-in', signIns],
    ['POST /api/accounts', signUps], ['POST /api/accounts/github', signUps], ['POST /sign-up', signUps],
    ['POST /api/account/password', passwords], ['POST /settings', passwords],
    ['GET /sign-in/github', github], ['GET /sign-in/github/callback', github],
  ]);
  return (req, res, next) => {
    const limit = limited.get(`${req.method} ${pathOf(req)}`);
    if (limit) limit(req, res, next);
    else next();
  };
}
