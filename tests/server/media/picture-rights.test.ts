import { get } from 'node:http';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import type { Visibility } from '#contracts/words.ts';
import { Build, Person, Picture, PublishedPicture } from '#server/entities/index.ts';
import { maxWaiting } from '#server/features/media/picture-limits.ts';
import { setPublishedPictures } from '#server/features/media/pictures.service.ts';
import type { TestClient } from '#tests/support/test-client.ts';
import { quadrants } from './picture-samples.ts';
import { startPictureSite, type PictureSite } from './picture-site.ts';

let site: PictureSite;
let visitor: TestClient;
let moderator: TestClient;
let sample: Buffer;
beforeAll(async () => {
  site = await startPictureSite();
  visitor = site.server.visitor();
  moderator = await site.server.as({ handle: 'mona', role: 'moderator' });
  sample = await quadrants(64, 48).jpeg().toBuffer();
});
afterAll(() => site.server.close());

async function setVisibility(visibility: Visibility): Promise<void> {
  await site.server.orm.em.fork().nativeUpdate(Build, { slug: site.build }, { visibility });
}
beforeEach(() => setVisibility('public'));

const lasting = 'public, max-age=31536000, immutable';
const crewOnly = 'private, no-store';

async function answers(key: string): Promise<Record<string, string | number>> {
  const people = { visitor, stranger: site.stranger, moderator, crew: site.crew, restorer: site.restorer };
  const asked = await Promise.all(Object.entries(people).map(async ([who, client]) => {
    const answer = await client.get(`/pictures/${key}/64.webp`);
    return [who, answer.status === 200 ? (answer.headers.get('cache-control') ?? '') : answer.status] as const;
  }));
  return Object.fromEntries(asked);
}
const forAll = { visitor: lasting, stranger: lasting, moderator: lasting, crew: lasting, restorer: lasting };
const forCrew = { visitor: 404, stranger: 404, moderator: 404, crew: crewOnly, restorer: crewOnly };

describe('who is sent the files', () => {
  test('a picture in no published document: crew only', async () => {
    expect(await answers((await site.taken(sample)).key)).toEqual(forCrew);
  });

  test('a published one follows its build: public, unlisted, private', async () => {
    const { key } = await site.taken(sample);
    await site.publish([key]);
    expect(await answers(key)).toEqual(forAll);
    await setVisibility('unlisted');
    expect(await answers(key)).toEqual(forAll);
    await setVisibility('private');
    expect(await answers(key)).toEqual(forCrew);
  });

  test('one taken out of its document at the next sign-off is crew only again', async () => {
    const [{ key: stays }, { key: goes }] = [await site.taken(sample), await site.taken(sample)];
    const entry = await site.publish([stays, goes]);
    await site.server.orm.em.fork().transactional(async (em) => {
      await setPublishedPictures(em, entry, [{ key: stays, alt: 'A bench', cover: false, block: 'b', line: '0' }]);
    });
    expect([await answers(stays), await answers(goes)]).toEqual([forAll, forCrew]);
  });

  test('the before and after of a build are public with it', async () => {
    const { key } = await site.taken(sample);
    const em = site.server.orm.em.fork();
    const build = await em.findOneOrFail(Build, { slug: site.build });
    build.beforePicture = await em.findOneOrFail(Picture, { key });
    await em.flush();
    expect(await answers(key)).toEqual(forAll);
  });

  test('a feed reader on another site may show what is public, and only that', async () => {
    const [{ key: open }, { key: closed }] = [await site.taken(sample), await site.taken(sample)];
    await site.publish([open]);
    const policy = async (key: string) => (await site.restorer.get(`/pictures/${key}/64.jpg`)).headers.get('cross-origin-resource-policy');
    expect([await policy(open), await policy(closed)]).toEqual(['cross-origin', 'same-origin']);
  });
});

/** `fetch` would ask every cache to be passed by as well. */
function askedAgain(path: string, tag: string): Promise<number | undefined> {
  return new Promise((resolve, reject) => {
    get(`${site.server.url}${path}`, { headers: { 'if-none-match': tag } }, (res) => resolve(res.resume().statusCode)).on('error', reject);
  });
}

describe('how the files are sent', () => {
  test('by type, with a tag for asking again and in ranges', async () => {
    const { key } = await site.taken(sample);
    await site.publish([key]);
    for (const [file, type] of [['64.avif', 'image/avif'], ['64.webp', 'image/webp'], ['64.jpg', 'image/jpeg']]) {
      expect((await visitor.get(`/pictures/${key}/${file}`)).headers.get('content-type')).toBe(type);
    }
    const first = await visitor.get(`/pictures/${key}/64.jpg`);
    expect(await askedAgain(`/pictures/${key}/64.jpg`, first.headers.get('etag') ?? '')).toBe(304);
    const part = await visitor.get(`/pictures/${key}/64.jpg`, { range: 'bytes=0-9' });
    expect([part.status, part.headers.get('content-length')]).toEqual([206, '10']);
    expect((await visitor.get(`/pictures/${key}/64.jpg`, { range: 'bytes=999999-' })).status).toBe(416);
    expect(first.headers.get('set-cookie')).toBeNull();
  });

  test('nothing but the files of a picture can be had', async () => {
    const { key } = await site.taken(sample);
    await site.publish([key]);
    const astray = [
      `${key}/65.jpg`, `${key}/64.png`, `${key}/64.jpg.html`, `${key}/.hidden`, `${key}/..%2f..%2f..%2fsession-secret`, `${key}/%2e%2e%2f64.jpg`, `${key}/64.jpg%00`,
      `..%2f${key}/64.jpg`, `${key.toUpperCase()}/64.jpg`, `making/64.jpg`, `${'0'.repeat(24)}/64.jpg`, `%2e%2e/session-secret`, `${key}/`,
    ];
    for (const path of astray) {
      const { status, headers } = await site.restorer.get(`/pictures/${path}`);
      expect({ path, status, kept: /max-age/.test(headers.get('cache-control') ?? '') }).toEqual({ path, status: 404, kept: false });
    }
  });
});

describe('who may send', () => {
  async function problem(client: TestClient): Promise<string> {
    const sent = await site.send(client, sample);
    return sent.ok ? 'taken' : sent.problem.code;
  }
  const rows = () => site.server.orm.em.fork().count(Picture);

  test('the restorer and the crew; nobody else, and nothing of theirs is read', async () => {
    expect([await problem(site.restorer), await problem(site.crew)]).toEqual(['taken', 'taken']);
    const before = await rows();
    expect([await problem(visitor), await problem(site.stranger), await problem(moderator)]).toEqual(['sign-in-needed', 'not-allowed', 'not-allowed']);
    await setVisibility('private');
    expect(await problem(site.stranger)).toBe('not-found');
    expect([await rows(), await site.left('quarantine')]).toEqual([before, []]);
  });

  test('not a suspended person', async () => {
    const em = site.server.orm.em.fork();
    await em.nativeUpdate(Person, { handle: 'ben' }, { suspendedUntil: new Date(Date.now() + 60_000) });
    expect(await problem(site.crew)).toBe('suspended');
    await em.nativeUpdate(Person, { handle: 'ben' }, { suspendedUntil: null });
  });

  test('not while forty of one person are being made, nor in a build that is full', async () => {
    const em = site.server.orm.em.fork();
    const [build, uploader] = [await em.findOneOrFail(Build, { slug: site.build }), await em.findOneOrFail(Person, { handle: 'ada' })];
    const waiting = Array.from({ length: maxWaiting }, (_, index) => em.create(Picture, { key: `waiting-${index}`, build, uploader, originalName: 'a', widths: [] }));
    await em.flush();
    expect([await problem(site.restorer), await problem(site.crew)]).toEqual(['too-many', 'taken']);
    for (const picture of waiting) em.remove(picture);
    em.create(Picture, { key: 'a-great-many', build, uploader, originalName: 'a', widths: [], state: 'ready', bytes: 9 * 1024 ** 3 });
    await em.flush();
    expect(await problem(site.restorer)).toBe('falls-short');
    await em.nativeDelete(Picture, { key: 'a-great-many' });
  });
});

test('a day cannot be signed off with a picture of another build or one that is gone', async () => {
  const { key } = await site.taken(sample);
  const entry = await site.publish([key]);
  const shown = { key: 'b'.repeat(24), alt: '', cover: false, block: 'photos-1', line: 'line-2' };
  const signOff = site.server.orm.em.fork().transactional((em) => setPublishedPictures(em, entry, [shown]));
  await expect(signOff).rejects.toMatchObject({ code: 'bad-input', fields: { 'photos-1.line-2.picture': 'This photo is not there any more. Add it again, or take it out.' } });
  expect(await site.server.orm.em.fork().count(PublishedPicture, { entry: entry.id })).toBe(1);
});
