import Parser from 'rss-parser';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { changeBuild, readBuild, readBuilds, readBuildSettings, startBuild, type BuildPage } from '#contracts/builds.ts';
import { readDesk, readEntryPage, saveWorking, signOffEntry, startEntry } from '#contracts/entries.ts';
import type { EntryPage } from '#contracts/entry-view.ts';
import { readHome } from '#contracts/home.ts';
import { addMaterial } from '#contracts/materials.ts';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';
import type { TestClient } from '#tests/support/test-client.ts';
import { boughtBlock, costBlock, dayOf, timeBlock, usedBlock } from '#tests/support/workshop.ts';

let site: TestServer;
let owner: TestClient;
let visitor: TestClient;
let other: TestClient;

beforeAll(async () => {
  site = await startTestServer();
  owner = await site.as({ handle: 'owner' });
  other = await site.as({ handle: 'other' });
  visitor = site.visitor();
});
afterAll(() => site.close());

async function build(title: string, changes: Partial<{ visibility: 'public' | 'unlisted' | 'private'; costsShown: boolean; registration: string }> = {}): Promise<string> {
  return (await owner.ask(startBuild, { body: { kind: 'boat', title, currency: 'GBP', measures: 'imperial', ...changes } })).slug;
}

async function signOff(slug: string, document: EntryDocument, number?: number): Promise<{ number: number; href: string }> {
  const at = number ?? (await owner.ask(startEntry, { params: { build: slug }, body: { day: document.day } })).number;
  const { entry } = await owner.ask(readDesk, { params: { build: slug, number: at } });
  const { href } = await owner.ask(signOffEntry, { params: { build: slug, number: at }, body: { version: entry.version, document } });
  return { number: at, href };
}

/** A day that buys twenty lengths for 68.00, uses seventeen and wastes one, with an hour's work and a hire. */
async function costedDay(title: string): Promise<EntryDocument> {
  const oak = await owner.ask(addMaterial, { body: { name: `Oak for ${title}`, dimension: 'count', unit: 'piece', packs: [] } });
  return dayOf('2026-06-14', [
    boughtBlock([{ of: oak, amount: '20', unit: 'piece', money: '68.00' }]),
    usedBlock([{ of: oak, amount: '17', unit: 'piece' }, { of: oak, amount: '1', unit: 'piece', fate: 'wasted' }]),
    timeBlock([{ name: 'Wren', time: '1 h' }]),
    costBlock([{ label: 'Steamer', money: '12.34' }]),
  ], { title, lead: 'Steam day.', work: { amount: '17', unit: 'piece', kind: 'steamed rib' } });
}

async function pageAt(client: TestClient, href: string): Promise<EntryPage> {
  const [, , slug = '', entry = ''] = href.split('/');
  const page = await client.ask(readEntryPage, { params: { build: slug, entry } });
  if ('movedTo' in page) throw new Error(`${href} moved to ${page.movedTo}`);
  return page;
}

async function buildAt(client: TestClient, slug: string): Promise<BuildPage> {
  const page = await client.ask(readBuild, { params: { build: slug } });
  if ('movedTo' in page) throw new Error(`${slug} moved to ${page.movedTo}`);
  return page;
}

describe('a published day', () => {
  test('shows what it came to on its page, on the build and in both feeds', async () => {
    const slug = await build('Priced');
    const { href } = await signOff(slug, await costedDay('Ribs in'));
    const page = await pageAt(visitor, href);
    // 68.00 for twenty: seventeen 57.80, one 3.40, two left 6.80; the hire counts as used on its day
    expect(page.tally.money).toMatchObject({ used: 5780, wasted: 340, costs: 1234, day: 7354, bought: 6800, buildUsed: 7014, one: 340, unsettled: false });
    expect(page.tally.oneMinutes).toBe(4);
    const shown = await buildAt(visitor, slug);
    expect(shown.figures).toMatchObject({ spent: 8034, used: 7014, wasted: 340, left: 680, receipts: 1, materialsLeft: 1 });
    for (const feed of [`/builds/${slug}/feed.xml`, `/builds/${slug}/feed.json`, '/feed.xml', '/feed.json']) {
      const { text } = await visitor.get(feed);
      expect(text, feed).toContain('£57.80');
      expect(text, feed).toContain('£3.40');
      expect(text, feed).toContain('this day: £57.80 used, £3.40 wasted, £12.34 of costs');
      expect(text, feed).toContain('One steamed rib takes');
    }
  });

  test('sends readers nothing of the stored document', async () => {
    const slug = await build('Projected');
    const { href } = await signOff(slug, await costedDay('Projected day'));
    const text = JSON.stringify(await pageAt(visitor, href));
    for (const inner of ['"exact"', '"read"', '"material"', '"fate"', '"paperTotal"', '"basis"']) expect(text).not.toContain(inner);
  });
});

describe('costs kept to the crew', () => {
  test('are absent from pages, lists and feeds for everyone else, and there for the restorer', async () => {
    const slug = await build('Quiet', { costsShown: false });
    const { href } = await signOff(slug, await costedDay('Quiet day'));
    expect((await pageAt(owner, href)).tally.money?.used).toBe(5780);
    const answers = [
      JSON.stringify(await pageAt(visitor, href)), JSON.stringify(await buildAt(visitor, slug)), JSON.stringify(await buildAt(other, slug)),
      JSON.stringify((await visitor.ask(readHome)).fresh.filter((entry) => entry.build.slug === slug)),
      JSON.stringify((await visitor.ask(readBuilds)).builds.filter((card) => card.slug === slug)),
      (await visitor.get(`/builds/${slug}/feed.xml`)).text, (await visitor.get(`/builds/${slug}/feed.json`)).text,
    ];
    for (const text of answers) {
      // the words of the day are there, its money in no form is
      expect(text).not.toMatch(/£|5780|57\.80|7354|73\.54|"money"|"figures"|"plan"|"used":/);
    }
    expect(answers[0]).toContain('1 h');
  });
});

describe('who may see a build', () => {
  test('a private build answers 404 everywhere and is in no list', async () => {
    const slug = await build('Hidden away', { visibility: 'private' });
    const { href } = await signOff(slug, await costedDay('Hidden day'));
    const entry = href.split('/')[3] ?? '';
    for (const client of [visitor, other]) {
      expect((await client.call(readBuild, { params: { build: slug } })).status).toBe(404);
      expect((await client.call(readEntryPage, { params: { build: slug, entry } })).status).toBe(404);
      expect((await client.get(`/builds/${slug}/feed.xml`)).status).toBe(404);
      expect(JSON.stringify([await client.ask(readHome), await client.ask(readBuilds)])).not.toContain('Hidden');
      expect((await client.get('/feed.xml')).text).not.toContain('Hidden');
    }
    expect((await buildAt(owner, slug)).entries).toHaveLength(1);
  });

  test('an unlisted build is read by its address, which cannot be guessed, and is in no list', async () => {
    const slug = await build('Word of mouth', { visibility: 'unlisted' });
    expect(slug).toMatch(/^word-of-mouth-[a-z0-9]{10}$/);
    await signOff(slug, await costedDay('Told day'));
    expect((await buildAt(visitor, slug)).entries).toHaveLength(1);
    expect((await visitor.get(`/builds/${slug}/feed.xml`)).status).toBe(200);
    expect(JSON.stringify([await visitor.ask(readHome), await visitor.ask(readBuilds)])).not.toContain('Told day');
    expect((await visitor.get('/feed.json')).text).not.toContain('Told day');
  });

  test('a draft is for those who write it', async () => {
    const slug = await build('Half written');
    const { number } = await owner.ask(startEntry, { params: { build: slug }, body: { day: '2026-06-14' } });
    const { entry } = await owner.ask(readDesk, { params: { build: slug, number } });
    await owner.ask(saveWorking, { params: { build: slug, number }, body: { version: entry.version, document: dayOf('2026-06-14', [], { title: 'Secret so far' }) } });
    expect(JSON.stringify([await buildAt(visitor, slug), await visitor.ask(readHome)])).not.toContain('Secret so far');
    expect((await other.call(readDesk, { params: { build: slug, number } })).status).toBe(404);
  });

  test('private numbers are for the restorer until they are shown', async () => {
    const slug = await build('Numbered', { registration: 'ABC 123' });
    expect(JSON.stringify(await buildAt(visitor, slug))).not.toContain('ABC 123');
    expect((await buildAt(owner, slug)).identity).toContainEqual({ label: 'Registration', value: 'ABC 123' });
  });
});

describe('addresses are permanent', () => {
  test('a renamed build and a renamed entry redirect to where they are now', async () => {
    const slug = await build('First name');
    const day = await costedDay('First title');
    const { number } = await signOff(slug, day);
    await signOff(slug, { ...day, title: 'Second title' }, number);
    const settings = await owner.ask(readBuildSettings, { params: { build: slug } });
    const changed = await owner.ask(changeBuild, { params: { build: slug }, body: { title: 'Second name', version: settings.version } });
    expect(changed.slug).toBe('second-name');
    expect(await visitor.ask(readBuild, { params: { build: 'first-name' } })).toEqual({ movedTo: '/builds/second-name' });
    expect(await visitor.ask(readEntryPage, { params: { build: 'second-name', entry: 'first-title' } })).toEqual({ movedTo: '/builds/second-name/second-title' });
    const moved = await visitor.get('/builds/first-name/feed.xml');
    expect([moved.status, moved.headers.get('location')]).toEqual([301, '/builds/second-name/feed.xml']);
    expect(await build('First name')).not.toBe('first-name');
  });
});

describe('feeds', () => {
  test('stay well-formed with hostile titles and keep the guid through edits and renames', async () => {
    const slug = await build('Nasty ]]> & <b>feed</b>');
    const title = 'Tar ]]> & <script>alert(1)</script> \u202Bright to left';
    const day = { ...(await costedDay(title)), lead: 'Steam <b>day</b>.' };
    const { number } = await signOff(slug, day);
    const read = async () => new Parser().parseString((await visitor.get(`/builds/${slug}/feed.xml`)).text);
    const before = await read();
    expect(before.items[0]?.title).toBe(title);
    // a description is HTML to a feed reader: what the writer typed stands in it as letters
    const { text } = await visitor.get(`/builds/${slug}/feed.xml`);
    expect(text).toContain('<description><![CDATA[Steam &#60;b&#62;day&#60;/b&#62;.]]></description>');
    await signOff(slug, { ...day, title: 'Plain title' }, number);
    const after = await read();
    expect(after.items[0]?.title).toBe('Plain title');
    expect(after.items[0]?.guid).toBe(before.items[0]?.guid);
    expect(after.items[0]?.isoDate).toBe(before.items[0]?.isoDate);
  });

  // RSS 2.0 specification (RSS Advisory Board, 2.0.11): channel needs title, link, description; a guid that is no address says isPermaLink="false".
  // RSS Best Practices Profile: atom:link rel="self". JSON Feed 1.1: version, title, items with id and content.
  test('hold what their specifications ask for, with absolute addresses', async () => {
    const slug = await build('By the book');
    const { href } = await signOff(slug, await costedDay('By the book day'));
    const xml = (await visitor.get(`/builds/${slug}/feed.xml`)).text;
    expect(xml).toContain(`<atom:link href="${site.url}/builds/${slug}/feed.xml" rel="self" type="application/rss+xml"/>`);
    expect(xml).toMatch(/<guid isPermaLink="false">urn:uuid:[0-9a-f-]{36}<\/guid>/);
    expect(xml).toContain(`<link>${site.url}${href}</link>`);
    expect(xml).toContain('<content:encoded>');
    const json = (await visitor.get(`/builds/${slug}/feed.json`)).json() as { version: string; title: string; items: { id: string; url: string; content_html: string; date_published: string }[] };
    expect(json.version).toBe('https://jsonfeed.org/version/1.1');
    expect(json.items[0]).toMatchObject({ url: `${site.url}${href}` });
    expect(json.items[0]?.content_html).toContain('<table>');
    expect(xml).toContain(json.items[0]?.id);
  });

  test('answer 304 to a reader that has this version', async () => {
    const slug = await build('Twice asked');
    await signOff(slug, await costedDay('Twice asked day'));
    const first = await visitor.get(`/builds/${slug}/feed.xml`);
    // fetch would add no-cache of its own beside a condition, which asks for the whole answer
    const again = await visitor.get(`/builds/${slug}/feed.xml`, { 'if-none-match': first.headers.get('etag') ?? '', 'cache-control': 'max-age=0' });
    expect(again.status).toBe(304);
  });
});
