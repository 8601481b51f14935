import { createHash, randomBytes } from 'node:crypto';
import express, { Router, type Request, type RequestHandler } from 'express';
import type { Config } from '#server/config.ts';
import type { GithubApp } from './github-provider.ts';

// Stands in for GitHub while the site runs on one machine only: the real exchange, with people who are made up.

export const fakeMount = '/fake-github';
const codeLastsMs = 10 * 60_000;

/** One to sign up with, one GitHub has not confirmed, one whose address a demo person has already. */
export const fakePeople = [
  { id: 71_001, login: 'bram-ostler', name: 'Bram Ostler', email: 'bram@ostler.example', verified: true },
  { id: 71_002, login: 'tamsin-reel', name: 'Tamsin Reel', email: 'tamsin@reel.example', verified: false },
  { id: 71_003, login: 'Marlow-Finch', name: 'Marlow Finch', email: 'restorer@demo.example', verified: true },
] as const;
type FakePerson = (typeof fakePeople)[number];

export function fakeApp({ host, port, publicUrl }: Config): GithubApp {
  const visited = publicUrl + fakeMount;
  // the server asks itself where it listens, which is not always where browsers find it
  const asked = port === 0 ? visited : `http://${host.includes(':') ? `[${host}]` : host}:${port}${fakeMount}`;
  return {
    clientId: `fake-${randomBytes(8).toString('hex')}`, clientSecret: randomBytes(20).toString('hex'),
    addresses: { authorize: `${visited}/login/oauth/authorize`, token: `${asked}/login/oauth/access_token`, user: `${asked}/user`, emails: `${asked}/user/emails` },
  };
}

interface Grant {
  readonly person: FakePerson;
  readonly challenge: string;
  readonly callback: string;
  readonly until: number;
}

const textIn = (values: unknown, name: string): string => {
  const value = typeof values === 'object' && values !== null ? (values as Record<string, unknown>)[name] : undefined;
  return typeof value === 'string' ? value : '';
};
const escaped = (text: string) => text.replaceAll(/[&<>"]/g, (c) => `&#${c.charCodeAt(0)};`);

export function fakeGithub({ clientId, clientSecret }: GithubApp, callback: string): Router {
  const grants = new Map<string, Grant>();
  const tokens = new Map<string, FakePerson>();
  const router = Router();
  router.use(express.urlencoded({ extended: false }));

  const wrongApp = (values: unknown) => textIn(values, 'client_id') !== clientId || textIn(values, 'redirect_uri') !== callback;

  router.get('/login/oauth/authorize', (req, res) => {
    if (wrongApp(req.query)) res.status(404).type('text').send('No such application, or not its callback address.\n');
    else res.type('html').set('Cache-Control', 'no-store').send(choicePage(req.query));
  });

  router.post('/login/oauth/authorize', (req, res) => {
    const person = fakePeople.find(({ id }) => String(id) === textIn(req.body, 'person'));
    if (wrongApp(req.body)) {
      res.status(404).type('text').send('No such application, or not its callback address.\n');
      return;
    }
    const back = new URL(callback);
    if (person) {
      const code = randomBytes(10).toString('hex');
      grants.set(code, { person, challenge: textIn(req.body, 'code_challenge'), callback, until: Date.now() + codeLastsMs });
      back.searchParams.set('code', code);
    } else {
      back.searchParams.set('error', 'access_denied');
      back.searchParams.set('error_description', 'The user has denied your application access.');
    }
    back.searchParams.set('state', textIn(req.body, 'state'));
    res.redirect(302, back.href);
  });

  router.post('/login/oauth/access_token', (req, res) => {
    const code = textIn(req.body, 'code');
    const grant = grants.get(code);
    grants.delete(code);
    const proof = createHash('sha256').update(textIn(req.body, 'code_verifier')).digest('base64url');
    const right = !wrongApp(req.body) && textIn(req.body, 'client_secret') === clientSecret;
    // GitHub answers 200 with an error in the body
    if (!right) res.json({ error: 'incorrect_client_credentials', error_description: 'The client_id and/or client_secret passed are incorrect.' });
    else if (!grant || grant.until < Date.now() || grant.challenge !== proof) res.json({ error: 'bad_verification_code', error_description: 'The code passed is incorrect or expired.' });
    else {
      const token = `gho_${randomBytes(18).toString('hex')}`;
      tokens.set(token, grant.person);
      res.type('application/x-www-form-urlencoded').send(new URLSearchParams({ access_token: token, scope: 'user:email', token_type: 'bearer' }).toString());
    }
  });

  router.get('/user', forBearer(tokens, ({ id, login, name }) => ({ id, login, name, email: null, html_url: `https://github.example/${login}` })));
  router.get('/user/emails', forBearer(tokens, ({ email, login, verified }) => [
    { email: `${login}@users.noreply.example`, primary: false, verified: true, visibility: null },
    { email, primary: true, verified, visibility: 'private' },
  ]));
  return router;
}

function forBearer(tokens: ReadonlyMap<string, FakePerson>, answer: (person: FakePerson) => unknown): RequestHandler {
  return (req: Request, res) => {
    const person = tokens.get((req.get('authorization') ?? '').replace(/^(?:bearer|token) /i, ''));
    if (!req.get('user-agent')) res.status(403).json({ message: 'Request forbidden by administrative rules.' });
    else if (!person) res.status(401).json({ message: 'Bad credentials' });
    else res.json(answer(person));
  };
}

function choicePage(query: unknown): string {
  const kept = ['client_id', 'redirect_uri', 'state', 'code_challenge']
    .map((name) => `<input type="hidden" name="${name}" value="${escaped(textIn(query, name))}">`).join('');
  const people = fakePeople.map(({ id, name, email, verified }) =>
    `<p><button style="font:inherit;padding:10px 16px" name="person" value="${id}">${escaped(name)}, ${escaped(email)}${verified ? '' : ' (not confirmed)'}</button></p>`).join('');
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><meta name="color-scheme" content="light dark">
<link rel="icon" href="data:,"><title>A stand-in for GitHub</title></head><body style="font:18px/1.5 sans-serif;max-width:36rem;margin:3rem auto;padding:0 18px"><main>
<h1 style="font-size:1.6rem">A stand-in for GitHub</h1><p>This site runs on your own machine, so GitHub is not asked. Sign in as somebody made up:</p>
<form method="post" action="${fakeMount}/login/oauth/authorize">${kept}${people}<p><button style="font:inherit;padding:10px 16px" name="person" value="">Turn it down</button></p></form></main></body></html>`;
}
