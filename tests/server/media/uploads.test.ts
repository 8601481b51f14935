import exifr from 'exifr';
import sharp from 'sharp';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { readPicture } from '#contracts/pictures.ts';
import { colourAt, fromPhone, heicSample, holds, noisy, quadrants, quarters } from './picture-samples.ts';
import { startPictureSite, type PictureSite } from './picture-site.ts';

let site: PictureSite;
beforeAll(async () => {
  site = await startPictureSite();
});
afterAll(() => site.server.close());

/** Lossy formats and chroma at half size shift a flat colour by a few steps; a wrong profile shifts it by eighteen. */
const close = 8;
async function expectColour(file: Buffer, x: number, y: number, colour: readonly number[]): Promise<void> {
  const found = await colourAt(file, x, y);
  for (const [channel, value] of colour.entries()) expect(Math.abs((found[channel] ?? -99) - value), `${found.join(' ')} for ${colour.join(' ')}`).toBeLessThanOrEqual(close);
}

async function everyFile(key: string, widths: readonly number[]): Promise<Map<string, Buffer>> {
  const names = ['original.jpg', ...widths.flatMap((width) => ['avif', 'webp', 'jpg'].map((kind) => `${width}.${kind}`))];
  return new Map(await Promise.all(names.map(async (name) => [name, await site.file(key, name)] as const)));
}

test('a phone photograph comes out upright, with the time taken kept aside and nothing else of its metadata', async () => {
  const sent = await fromPhone();
  expect(await exifr.gps(sent)).toEqual({ latitude: 51.5, longitude: expect.closeTo(-0.1167, 3) });
  expect(holds(sent, 'shed key under the pot')).toBe(true);

  const { key, state, picture } = await site.taken(sent);
  expect({ state, width: picture?.width, height: picture?.height }).toEqual({ state: 'ready', width: 80, height: 120 });
  const row = await site.row(key);
  expect(row.takenAt?.toISOString()).toBe('2026-11-14T09:11:12.000Z');

  const files = await everyFile(key, [80]);
  expect(files.size).toBe(4);
  expect([...files.values()].reduce((sum, file) => sum + file.length, 0)).toBe(row.bytes);
  for (const [name, file] of files) {
    const { exif, xmp, icc, iptc, comments, orientation, width, height } = await sharp(file).metadata();
    expect({ name, exif, xmp, icc, iptc, comments, orientation, width, height }).toEqual({ name, width: 80, height: 120 });
    if (!name.endsWith('webp')) expect(await exifr.gps(file).catch(() => undefined)).toBeUndefined();
    for (const secret of ['Exif', 'shed key', 'somebody private', 'in my garage', 'xmpmeta', '2026:11:14']) expect(holds(file, secret), `${secret} in ${name}`).toBe(false);
    // turned a quarter to the right: what lay below left is above left
    await expectColour(file, 0.2, 0.2, quarters.belowLeft);
    await expectColour(file, 0.8, 0.2, quarters.aboveLeft);
  }
});

test('three widths in three formats, the view naming each, never wider than what was sent', async () => {
  const { key, picture } = await site.taken(await quadrants(2000, 1500).jpeg().toBuffer(), 'Größe – Ängel.JPG');
  expect(picture?.src).toBe(`/pictures/${key}/1600.jpg`);
  expect(picture?.sources.map((source) => source.type)).toEqual(['image/avif', 'image/webp']);
  expect(picture?.sources[0]?.srcset).toBe(`/pictures/${key}/480.avif 480w, /pictures/${key}/960.avif 960w, /pictures/${key}/1600.avif 1600w`);
  for (const [name, file] of await everyFile(key, [480, 960, 1600])) {
    const { width, format } = await sharp(file).metadata();
    const expected = name === 'original.jpg' ? 2000 : Number.parseInt(name, 10);
    expect({ name, width }).toEqual({ name, width: expected });
    expect(format).toBe(name.endsWith('avif') ? 'heif' : name.endsWith('webp') ? 'webp' : 'jpeg');
  }
  expect((await site.row(key)).originalName).toBe('Größe – Ängel.JPG');
  expect(picture?.placeholder).toMatch(/^data:image\/webp;base64,/);
  expect(picture?.placeholder.length).toBeLessThan(600);
  const middling = await site.taken(await quadrants(1000, 300).png().toBuffer());
  expect((await site.row(middling.key)).widths).toEqual([480, 960]);
});

test('every kind that is taken comes out in its right colours', async () => {
  const transparent = sharp({ create: { width: 60, height: 60, channels: 4, background: { r: 0, g: 0, b: 0, alpha: 0 } } });
  const wide = quadrants().withIccProfile('p3').jpeg({ quality: 95 });
  const kinds = { png: quadrants().png(), webp: quadrants().webp({ lossless: true }), avif: quadrants().avif({ quality: 90 }), gif: quadrants().gif(), wide, grey: quadrants().greyscale().jpeg(), cmyk: quadrants().toColourspace('cmyk').jpeg({ quality: 95 }) };
  for (const [kind, image] of Object.entries(kinds)) {
    const { key } = await site.taken(await image.toBuffer(), `sample.${kind}`);
    const file = await site.file(key, 'original.jpg');
    const { channels, space } = await sharp(file).metadata();
    expect({ kind, channels, space }).toEqual({ kind, channels: 3, space: 'srgb' });
    if (kind === 'grey' || kind === 'cmyk') continue;
    await expectColour(file, 0.2, 0.2, quarters.aboveLeft);
    await expectColour(file, 0.8, 0.8, quarters.belowRight);
  }
  const { key } = await site.taken(await transparent.png().toBuffer());
  await expectColour(await site.file(key, 'original.jpg'), 0.5, 0.5, [255, 255, 255]);
});

test('only the first frame of an animation is kept', async () => {
  const frames = await sharp([await quadrants(40, 40).png().toBuffer(), await noisy(40, 40).png().toBuffer()], { join: { animated: true } }).gif().toBuffer();
  expect((await sharp(frames, { animated: true }).metadata()).pages).toBe(2);
  const { picture } = await site.taken(frames, 'turning.gif');
  expect([picture?.width, picture?.height]).toEqual([40, 40]);
});

test('HEIC is read with its own colour space, its own turn and the time taken', async () => {
  const upright = await site.taken(await heicSample('quadrants'), 'IMG_0001.HEIC');
  expect([upright.picture?.width, upright.picture?.height]).toEqual([120, 80]);
  const file = await site.file(upright.key, 'original.jpg');
  await expectColour(file, 0.2, 0.2, quarters.aboveLeft);
  await expectColour(file, 0.8, 0.2, quarters.aboveRight);
  const sent = (await sharp(await heicSample('quadrants')).metadata()).exif;
  expect(await exifr.gps(sent ?? Buffer.alloc(0))).toMatchObject({ latitude: 51.5 });
  expect((await sharp(file).metadata()).exif).toBeUndefined();
  expect((await site.row(upright.key)).takenAt?.toISOString()).toBe('2026-11-14T09:11:12.000Z');

  const turned = await site.taken(await heicSample('quadrants-turned'), 'IMG_0002.HEIC');
  expect([turned.picture?.width, turned.picture?.height]).toEqual([80, 120]);
  await expectColour(await site.file(turned.key, 'original.jpg'), 0.2, 0.2, quarters.aboveRight);
});

test('a picture can be asked for again, by those who write in the build', async () => {
  const { key } = await site.taken(await quadrants().jpeg().toBuffer());
  const input = { params: { build: site.build, key } };
  expect(await site.crew.ask(readPicture, input)).toMatchObject({ key, state: 'ready', problem: null });
  expect((await site.stranger.refused(readPicture, input)).code).toBe('not-found');
  expect((await site.restorer.refused(readPicture, { params: { build: site.build, key: 'none' } })).code).toBe('not-found');
});

test('nothing stays in quarantine or half made', async () => {
  expect(await site.left('quarantine')).toEqual([]);
  expect(await site.left('pictures/making')).toEqual([]);
});
