import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { startBuild } from '#contracts/builds.ts';
import { readDesk, saveWorking, signOffEntry, startEntry } from '#contracts/entries.ts';
import { addMaterial } from '#contracts/materials.ts';
import { signIn, signUp } from '#contracts/session.ts';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { openDatabase } from '#server/database.ts';
import { Entry } from '#server/entities/index.ts';
import { verifyLedger } from '#server/features/entries/ledger-check.service.ts';
import { freePort } from './free-port.ts';
import { TestClient } from './test-client.ts';
import { boughtBlock, dayOf, usedBlock } from './workshop.ts';

const publicUrl = 'http://log.example';
const email = 'writer@people.example';
const password = 'four brass cleats in a row';

/** A client that comes by the site's public address, as through a proxy. */
class PublicClient extends TestClient {
  override fetch(path: string, init: RequestInit = {}) {
    const headers = new Headers(init.headers);
    headers.set('origin', publicUrl);
    return super.fetch(path, { ...init, headers });
  }
}

async function listening(url: string, server: ChildProcess): Promise<void> {
  for (;;) {
    if (server.exitCode !== null) throw new Error(`The site stopped with code ${server.exitCode}`);
    const answer = await fetch(`${url}/healthz`).catch((error: unknown) => {
      if (error instanceof TypeError) return null;
      throw error;
    });
    if (answer?.ok) return;
    await wait(30);
  }
}

/** The built site in a folder of its own, to be killed and started again. Its address is public, so that no demo goes in. */
export class KilledSite {
  readonly #folder: string;
  readonly #port: number;
  #server: ChildProcess | null = null;
  readonly client: TestClient;

  private constructor(folder: string, port: number) {
    this.#folder = folder;
    this.#port = port;
    this.client = new PublicClient(`http://127.0.0.1:${port}`);
  }

  static async open(): Promise<KilledSite> {
    return new KilledSite(await mkdtemp(join(tmpdir(), 'killed-site-')), await freePort());
  }

  async start(): Promise<void> {
    this.#server = spawn(process.execPath, ['scripts/start.mjs'], {
      env: { ...process.env, PORT: String(this.#port), HOST: '127.0.0.1', PUBLIC_URL: publicUrl, DATA_DIR: this.#folder, SESSION_SECRET: 'a secret of more than thirty-two letters' }, stdio: 'ignore',
    });
    await listening(this.client.url, this.#server);
  }

  async kill(signal: 'SIGKILL' | 'SIGTERM' = 'SIGKILL'): Promise<void> {
    const server = this.#server;
    // one killed by a signal has no exit code
    if (!server || server.exitCode !== null || server.signalCode !== null) return;
    const gone = once(server, 'exit');
    server.kill(signal);
    await gone;
  }

  /** The database as it was left, read while nothing runs. */
  async left(): Promise<{ titles: ReadonlyMap<number, string>; signedOff: ReadonlySet<number>; differences: readonly string[] }> {
    const orm = await openDatabase(join(this.#folder, 'tallywright.sqlite'));
    try {
      const entries = await orm.em.fork().find(Entry, {});
      const { differences } = await verifyLedger(orm.em.fork());
      return {
        titles: new Map(entries.map((entry) => [entry.number, (entry.working ?? entry.published)?.title ?? ''])),
        signedOff: new Set(entries.filter((entry) => entry.published != null).map((entry) => entry.number)), differences,
      };
    } finally {
      await orm.close(true);
    }
  }

  async close(): Promise<void> {
    await this.kill('SIGTERM');
    await rm(this.#folder, { recursive: true, force: true });
  }
}

export interface Acknowledged {
  /** The last title the site said it had saved, by entry. */
  readonly saved: Map<number, string>;
  readonly signedOff: Set<number>;
}

/** Signs up once; afterwards signs in again, since the cookie jar is as old as the last start. */
export async function writerOf(site: KilledSite, first: boolean): Promise<void> {
  if (first) await site.client.ask(signUp, { body: { name: 'Writer', handle: 'writer', email, password } });
  else await site.client.ask(signIn, { body: { email, password } });
}

export async function shelfToDrawOn(site: KilledSite): Promise<{ build: string; document: (title: string, day: string) => EntryDocument }> {
  const { slug } = await site.client.ask(startBuild, { body: { kind: 'boat', title: 'Killed boat', currency: 'GBP', measures: 'imperial' } });
  const nails = await site.client.ask(addMaterial, { body: { name: 'Copper nails', dimension: 'count', unit: 'piece', packs: [] } });
  const document = (title: string, day: string) => dayOf(day, [boughtBlock([{ of: nails, amount: '7', unit: 'piece', money: '10.00' }]), usedBlock([{ of: nails, amount: '3', unit: 'piece' }])], { title });
  return { build: slug, document };
}

/** Writes up one day over and over until the site goes away (each writer its own day: a blank draft of a day is taken up again); what it acknowledged is told to `known` before the next write. */
export async function writeUntilGone(site: KilledSite, shelf: { build: string; document: (title: string, day: string) => EntryDocument }, known: Acknowledged, day: string): Promise<void> {
  const { client } = site;
  const { build } = shelf;
  try {
    for (let turn = 0; ; turn += 1) {
      const { number } = await client.ask(startEntry, { params: { build }, body: { day } });
      const { entry } = await client.ask(readDesk, { params: { build, number } });
      const title = `Day ${number}, turn ${turn}`;
      const saved = await client.ask(saveWorking, { params: { build, number }, body: { version: entry.version, document: shelf.document(title, day) } });
      known.saved.set(number, title);
      await client.ask(signOffEntry, { params: { build, number }, body: { version: saved.version, document: saved.document } });
      known.signedOff.add(number);
    }
  } catch (error) {
    // the connection broke: that is what this waits for
    if (!(error instanceof TypeError)) throw error;
  }
}
