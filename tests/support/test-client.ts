import type { Endpoint, InputOf, ReplyOf } from '#contracts/endpoint.ts';
import type { ProblemDetails } from '#contracts/errors.ts';
import { CookieJar } from './cookie-jar.ts';

/** An answer of the site, its body read once. */
export interface Answer {
  readonly status: number;
  readonly headers: Headers;
  readonly text: string;
  json(): unknown;
}

/** What an endpoint said: its reply, read by its own schema, or the problem. */
export type Outcome<E extends Endpoint> =
  | { readonly ok: true; readonly status: number; readonly reply: ReplyOf<E> }
  | { readonly ok: false; readonly status: number; readonly problem: ProblemDetails };

type Input<E extends Endpoint> = Partial<InputOf<E>>;

// What a test sends is read by the route itself: a test may send what no schema allows.
function addressOf(endpoint: Endpoint, input: { params?: unknown; query?: unknown }): string {
  const params = new Map(Object.entries(input.params ?? {}));
  const path = endpoint.path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(String(params.get(name))));
  const query = Object.entries(input.query ?? {}).filter(([, value]) => value !== undefined);
  const search = new URLSearchParams(query.map(([name, value]) => [name, String(value)])).toString();
  return search === '' ? path : `${path}?${search}`;
}

/** One visitor talking to the site over HTTP as its own pages do: cookies kept, same origin, redirects not followed. */
export class TestClient {
  readonly url: string;
  readonly cookies = new CookieJar();

  constructor(url: string) {
    this.url = url;
  }

  async fetch(path: string, init: RequestInit = {}): Promise<Answer> {
    const headers = new Headers(init.headers);
    if (!headers.has('origin')) headers.set('origin', this.url);
    if (!headers.has('sec-fetch-site')) headers.set('sec-fetch-site', 'same-origin');
    const cookies = this.cookies.header();
    if (cookies !== '') headers.set('cookie', cookies);
    const response = await fetch(new URL(path, this.url), { redirect: 'manual', ...init, headers });
    this.cookies.keep(response.headers);
    const text = await response.text();
    return { status: response.status, headers: response.headers, text, json: () => JSON.parse(text) };
  }

  get(path: string, headers: Record<string, string> = {}): Promise<Answer> {
    return this.fetch(path, { headers });
  }

  send(method: string, path: string, body: unknown): Promise<Answer> {
    return this.fetch(path, { method, headers: { 'content-type': 'application/json' }, body: JSON.stringify(body) });
  }

  /** Posts a plain form, as a page without scripts does. */
  submit(path: string, fields: Record<string, string>): Promise<Answer> {
    return this.fetch(path, { method: 'POST', body: new URLSearchParams(fields) });
  }

  upload(path: string, form: FormData): Promise<Answer> {
    return this.fetch(path, { method: 'POST', body: form });
  }

  /** Calls an endpoint and tells the outcome; a reply that does not fit its contract fails the test. */
  async call<E extends Endpoint>(endpoint: E, input: Input<E> = {}): Promise<Outcome<E>> {
    const path = addressOf(endpoint, input);
    const answer = endpoint.method === 'GET' ? await this.get(path) : await this.send(endpoint.method, path, input.body ?? {});
    if (answer.status >= 400) return { ok: false, status: answer.status, problem: answer.json() as ProblemDetails };
    return { ok: true, status: answer.status, reply: endpoint.reply.parse(answer.json()) as ReplyOf<E> };
  }

  /** Calls an endpoint that must answer; gives back its reply. */
  async ask<E extends Endpoint>(endpoint: E, input: Input<E> = {}): Promise<ReplyOf<E>> {
    const outcome = await this.call(endpoint, input);
    if (!outcome.ok) throw new Error(`${endpoint.method} ${endpoint.path} answered ${outcome.status}: ${JSON.stringify(outcome.problem)}`);
    return outcome.reply;
  }

  /** Calls an endpoint that must refuse; gives back the problem. */
  async refused<E extends Endpoint>(endpoint: E, input: Input<E> = {}): Promise<ProblemDetails> {
    const outcome = await this.call(endpoint, input);
    if (outcome.ok) throw new Error(`${endpoint.method} ${endpoint.path} was expected to refuse and answered ${outcome.status}.`);
    return outcome.problem;
  }
}
