import { once } from 'node:events';
import { copyFile, mkdtemp, rm } from 'node:fs/promises';
import { createServer } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pino from 'pino';
import { inject } from 'vitest';
import { signUp } from '#contracts/session.ts';
import type { Role } from '#contracts/words.ts';
import { createApp } from '#server/app.ts';
import { readConfig } from '#server/config.ts';
import { openDatabase, type Orm } from '#server/database.ts';
import { Person } from '#server/entities/index.ts';
import type { Parts } from '#server/http/context.ts';
import type { EndpointTable } from '#server/http/endpoint-table.ts';
import { sourceShell } from './source-shell.ts';
import { TestClient } from './test-client.ts';

export interface TestServerOptions {
  /** `api` (the default) has no pages; `source` renders them from the tree as it is; `built` serves those of the last build. */
  readonly pages?: 'api' | 'source' | 'built';
  /** Whether requests are counted and held back; off unless that is what is tested. */
  readonly limits?: boolean;
  /** The clock the site goes by. */
  readonly now?: () => Date;
  /** Settings as the environment gives them, beside the ones a test server needs. */
  readonly env?: Readonly<Record<string, string>>;
}

export interface TestPerson {
  readonly handle: string;
  readonly role?: Role;
}

export interface TestServer {
  readonly url: string;
  readonly orm: Orm;
  readonly parts: Parts;
  readonly table: EndpointTable;
  /** A visitor who is not signed in. */
  visitor(): TestClient;
  /** The person of this handle, signed in; their account is made the first time. */
  as(person: TestPerson): Promise<TestClient>;
  close(): Promise<void>;
}

const QUIET = 'fatal';

async function signedUp(url: string, orm: Orm, { handle, role = 'member' }: TestPerson): Promise<TestClient> {
  const client = new TestClient(url);
  await client.ask(signUp, {
    body: { handle, name: handle, email: `${handle}@people.example`, password: `four brass cleats of ${handle}` },
  });
  if (role !== 'member') await orm.em.fork().nativeUpdate(Person, { handle }, { role });
  return client;
}

/** A whole site on a port of its own, over a copy of the migrated template, in a folder that goes with it. */
export async function startTestServer(options: TestServerOptions = {}): Promise<TestServer> {
  const dataDir = await mkdtemp(join(tmpdir(), 'test-server-'));
  const database = join(dataDir, 'tallywright.sqlite');
  await copyFile(inject('templateDatabase'), database);
  const orm = await openDatabase(database);
  const http = createServer().listen(0, '127.0.0.1');
  await once(http, 'listening');
  const address = http.address();
  if (address === null || typeof address === 'string') throw new Error('The test server has no port.');
  const url = `http://127.0.0.1:${address.port}`;
  const config = readConfig({ HOST: '127.0.0.1', PORT: String(address.port), PUBLIC_URL: url, DATA_DIR: dataDir, ...options.env });
  const parts: Parts = { config, orm, log: pino({ level: QUIET }), now: options.now ?? (() => new Date()), limits: options.limits ?? false };
  const site = await createApp({ parts, pages: options.pages === 'source' ? sourceShell : (options.pages ?? 'api'), http });
  http.on('request', site.app);
  const people = new Map<string, Promise<TestClient>>();
  return {
    url, orm, parts,
    table: site.table,
    visitor: () => new TestClient(url),
    as(person) {
      const known = people.get(person.handle) ?? signedUp(url, orm, person);
      people.set(person.handle, known);
      return known;
    },
    async close() {
      http.close();
      http.closeAllConnections();
      await site.close();
      await orm.close(true);
      await rm(dataDir, { recursive: true, force: true });
    },
  };
}
