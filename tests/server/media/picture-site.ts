import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { startBuild } from '#contracts/builds.ts';
import type { ProblemDetails } from '#contracts/errors.ts';
import { deskPicture, type DeskPicture } from '#contracts/pictures.ts';
import { Build, CrewMember, Entry, Person, Picture } from '#server/entities/index.ts';
import { setPublishedPictures } from '#server/features/media/pictures.service.ts';
import { startTestServer, type TestServer, type TestServerOptions } from '#tests/support/test-server.ts';
import type { TestClient } from '#tests/support/test-client.ts';

export type Sent =
  | { readonly ok: true; readonly status: number; readonly reply: DeskPicture }
  | { readonly ok: false; readonly status: number; readonly problem: ProblemDetails };

/** A site with a restorer, a build and its crew, for tests about pictures. */
export interface PictureSite {
  readonly server: TestServer;
  readonly build: string;
  readonly restorer: TestClient;
  readonly crew: TestClient;
  readonly stranger: TestClient;
  /** Sends a picture as the page does; the file's name and type are the sender's word only. */
  send(client: TestClient, file: Buffer, name?: string): Promise<Sent>;
  /** Sends one that must be taken. */
  taken(file: Buffer, name?: string): Promise<DeskPicture>;
  /** Sends one that must be refused. */
  refused(file: Buffer, name?: string): Promise<ProblemDetails>;
  /** The bytes of one file of a picture, as the restorer is sent them. */
  file(key: string, file: string): Promise<Buffer>;
  row(key: string): Promise<Picture>;
  /** Puts pictures on a published page of the build, as signing off does. */
  publish(keys: readonly string[]): Promise<Entry>;
  /** What is left in a folder of the data. */
  left(folder: string): Promise<string[]>;
}

let entries = 0;

async function publishedEntry(server: TestServer, slug: string, keys: readonly string[]): Promise<Entry> {
  return server.orm.em.fork().transactional(async (em) => {
    const build = await em.findOneOrFail(Build, { slug });
    entries += 1;
    const entry = em.create(Entry, {
      guid: crypto.randomUUID(), build, author: build.owner, sequence: entries, number: entries, slug: `day-${entries}`, day: '2026-11-14', firstPublishedAt: new Date(),
    });
    await em.flush();
    await setPublishedPictures(em, entry, keys.map((key, index) => ({ key, alt: 'A bench', cover: index === 0, block: 'b', line: String(index) })));
    return entry;
  });
}

async function withCrew(server: TestServer, slug: string, handle: string): Promise<void> {
  const em = server.orm.em.fork();
  em.create(CrewMember, { build: await em.findOneOrFail(Build, { slug }), person: await em.findOneOrFail(Person, { handle }) });
  await em.flush();
}

export async function startPictureSite(options: TestServerOptions = {}): Promise<PictureSite> {
  const server = await startTestServer(options);
  const [restorer, crew, stranger] = await Promise.all(['ada', 'ben', 'cora'].map((handle) => server.as({ handle }))) as [TestClient, TestClient, TestClient];
  const { slug: build } = await restorer.ask(startBuild, { body: { kind: 'boat', title: 'Clinker dinghy', currency: 'GBP', measures: 'imperial' } });
  await withCrew(server, build, 'ben');
  const send: PictureSite['send'] = async (client, file, name = 'bench.jpg') => {
    const form = new FormData();
    form.append('picture', new Blob([new Uint8Array(file)], { type: 'image/jpeg' }), name);
    const answer = await client.upload(`/api/builds/${build}/pictures`, form);
    const { status } = answer;
    return status < 400 ? { ok: true, status, reply: deskPicture.parse(answer.json()) } : { ok: false, status, problem: answer.json() as ProblemDetails };
  };
  return {
    server, build, restorer, crew, stranger, send,
    async taken(file, name) {
      const sent = await send(restorer, file, name);
      if (!sent.ok) throw new Error(`Refused: ${JSON.stringify(sent.problem)}`);
      return sent.reply;
    },
    async refused(file, name) {
      const sent = await send(restorer, file, name);
      if (sent.ok) throw new Error('It was expected to be refused and was taken.');
      return sent.problem;
    },
    async file(key, file) {
      const response = await fetch(`${server.url}/pictures/${key}/${file}`, { headers: { cookie: restorer.cookies.header() } });
      if (!response.ok) throw new Error(`${file} answered ${response.status}`);
      return Buffer.from(await response.arrayBuffer());
    },
    row: (key) => server.orm.em.fork().findOneOrFail(Picture, { key }),
    publish: (keys) => publishedEntry(server, build, keys),
    left: (folder) => readdir(join(server.parts.config.dataDir, folder)),
  };
}
