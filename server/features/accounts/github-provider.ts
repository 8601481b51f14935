import type { Request, Response } from 'express';
import passport from 'passport';
import { Strategy } from 'passport-github2';
import { z } from 'zod';
import type { Config } from '#server/config.ts';
import type { GithubProfile } from './github.service.ts';

export interface GithubAddresses {
  readonly authorize: string;
  readonly token: string;
  readonly user: string;
  readonly emails: string;
}
export interface GithubApp {
  readonly clientId: string;
  readonly clientSecret: string;
  readonly addresses: GithubAddresses;
}

/** GitHub's own, as its documentation of OAuth apps and of the REST API gives them. */
export const realAddresses: GithubAddresses = {
  authorize: 'https://github.com/login/oauth/authorize',
  token: 'https://github.com/login/oauth/access_token',
  user: 'https://api.github.com/user',
  emails: 'https://api.github.com/user/emails',
};

export const callbackPath = '/sign-in/github/callback';
const userAgent = 'tallywright';
const answerWithinMs = 10_000;

const profileFields = z.object({ id: z.string().min(1), username: z.string().min(1), displayName: z.string().nullish() });
const emailsFields = z.array(z.object({ email: z.email(), primary: z.boolean(), verified: z.boolean() }));

async function confirmedAddress(addresses: GithubAddresses, token: string): Promise<string | null> {
  const answer = await fetch(addresses.emails, {
    headers: { authorization: `Bearer ${token}`, accept: 'application/vnd.github+json', 'user-agent': userAgent },
    signal: AbortSignal.timeout(answerWithinMs),
  });
  if (!answer.ok) throw new Error(`GitHub answered ${answer.status} for the e-mail addresses`);
  const known = emailsFields.parse(await answer.json());
  return known.find(({ primary, verified }) => primary && verified)?.email.toLowerCase() ?? null;
}

async function profileFrom(addresses: GithubAddresses, token: string, raw: unknown): Promise<GithubProfile> {
  const { id, username, displayName } = profileFields.parse(raw);
  return { githubId: id, login: username, name: displayName?.trim() || username, email: await confirmedAddress(addresses, token) };
}

/** How a request to the provider went: somebody came back, nobody did, or it has been answered with a redirect there. */
export type Passage = { readonly profile: GithubProfile } | { readonly error: unknown } | { readonly profile: null };

/** The exchange with GitHub by passport: state and a proof key kept in the session, checked on the way back. */
export function githubProvider({ clientId, clientSecret, addresses }: GithubApp, { publicUrl }: Config): (req: Request, res: Response) => Promise<Passage> {
  const strategy = new Strategy(
    {
      clientID: clientId, clientSecret, callbackURL: publicUrl + callbackPath, userAgent,
      authorizationURL: addresses.authorize, tokenURL: addresses.token, userProfileURL: addresses.user,
      // any word here has the state made, kept in the session and compared
      state: 'kept-in-the-session', pkce: true,
    },
    (token: string, _refresh: string, raw: unknown, verified: (error: unknown, profile?: GithubProfile) => void) => {
      profileFrom(addresses, token, raw).then((profile) => verified(null, profile), verified);
    },
  );
  const authenticator = new passport.Passport().use('github', strategy);
  return (req, res) => new Promise((resolve) => {
    res.once('finish', () => resolve({ profile: null }));
    const settle = (error: unknown, profile?: GithubProfile | false) => resolve(error ? { error } : { profile: profile || null });
    authenticator.authenticate('github', { session: false, scope: ['user:email'] }, settle)(req, res, (error: unknown) => resolve({ error }));
  });
}
