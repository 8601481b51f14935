import { Router, type Request, type RequestHandler, type Response } from 'express';
import type { GithubOutcome } from '#contracts/github-outcomes.ts';
import { localPath, withNext } from '#contracts/local-path.ts';
import type { Parts } from '#server/http/context.ts';
import { contextOf } from '#server/http/request-context.ts';
import { fakeApp, fakeGithub, fakeMount } from './fake-provider.ts';
import { callbackPath, githubProvider, realAddresses, type GithubApp, type Passage } from './github-provider.ts';
import { arriveFromGithub, joinGithub, type GithubProfile } from './github.service.ts';

type Ask = (req: Request, res: Response) => Promise<Passage>;

/** Signing in by GitHub: off to the provider and back. By a stand-in for it while the site runs on its own machine only. */
export function accountsRouter(parts: Parts): Router {
  const { config } = parts;
  const router = Router();
  if (config.github === null && !config.local) return router;
  const app: GithubApp = config.github ? { ...config.github, addresses: realAddresses } : fakeApp(config);
  if (config.github === null) router.use(fakeMount, fakeGithub(app, config.publicUrl + callbackPath));
  let made: Ask | undefined;
  // made at first use: with port 0 the public address is known only once the server listens
  const ask: Ask = (req, res) => (made ??= githubProvider(app, config))(req, res);
  router.get('/sign-in/github', setOff(ask));
  router.get(callbackPath, comeBack(ask, parts));
  return router;
}

function setOff(ask: Ask): RequestHandler {
  return async (req, res) => {
    const next = localPath(req.query['next']);
    res.set('Cache-Control', 'no-store');
    // only our own pages begin this: another site's link leads to the page with the button on it
    const begun = req.get('sec-fetch-site') !== 'cross-site' && !('code' in req.query) && !('error' in req.query);
    if (!begun) {
      res.redirect(303, withNext('/sign-in', next));
      return;
    }
    req.session.next = next;
    const passage = await ask(req, res);
    if ('error' in passage) throw passage.error;
  };
}

function comeBack(ask: Ask, parts: Parts): RequestHandler {
  return async (req, res) => {
    const next = localPath(req.session.next);
    const result = await profileOf(req, res, ask);
    const context = await contextOf(req, parts);
    const done = (path: string) => res.set('Cache-Control', 'no-store').redirect(303, path);
    const failed = (outcome: GithubOutcome) => done(withNext(`/${context.viewer ? 'settings' : 'sign-in'}?github=${outcome}`, next));

    if (typeof result === 'string') failed(result);
    else if (context.viewer) done(`/settings?github=${await joinGithub(context.em, context.viewer, result)}`);
    else {
      const arrival = await arriveFromGithub(context.em, result);
      if ('outcome' in arrival) failed(arrival.outcome);
      else if ('joining' in arrival) {
        await context.session.beginJoining(arrival.joining);
        done(withNext('/sign-up', next));
      } else {
        await context.session.signIn(arrival.person.id);
        done(next);
      }
    }
  };
}

async function profileOf(req: Request, res: Response, ask: Ask): Promise<GithubProfile | GithubOutcome> {
  if (req.query['error'] === 'access_denied') return 'refused';
  if (!('code' in req.query) || !('state' in req.query)) return 'lost';
  const passage = await ask(req, res);
  if ('error' in passage) {
    req.log.warn({ err: passage.error }, 'sign-in by GitHub failed');
    return 'failed';
  }
  return passage.profile ?? 'lost';
}
