import { request } from 'node:http';
import { deflateRawSync } from 'node:zlib';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { Picture } from '#server/entities/index.ts';
import { megabyte } from '#server/features/media/picture-limits.ts';
import { pictureMaker } from '#server/features/media/picture-maker.ts';
import { blankPng, fromPhone, heicSample, holds, jpegClaiming, noisy, quadrants } from './picture-samples.ts';
import { startPictureSite, type PictureSite } from './picture-site.ts';

let site: PictureSite;
beforeAll(async () => {
  site = await startPictureSite();
});
afterAll(() => site.server.close());

const notAPicture = 'That is not a picture we can read. JPEG, PNG, WebP, HEIC or GIF.';
const damaged = 'That picture is damaged or cut short. Send it again, or save a fresh copy first.';

async function expectRefusal(file: Buffer, code: string, words: string, name?: string): Promise<void> {
  const problem = await site.refused(file, name);
  expect(problem).toMatchObject({ code, detail: words, fields: { picture: words } });
}

describe('what is no picture', () => {
  const svg = '<svg xmlns="http://www.w3.org/2000/svg" width="10" height="10"><script>alert(1)</script></svg>';
  const others: Readonly<Record<string, Buffer>> = {
    'a text file named .jpg': Buffer.from('Glued the garboard today.\n'.repeat(200)),
    'an SVG with a script': Buffer.from(svg),
    'an SVG with an XML head': Buffer.from(`<?xml version="1.0"?>${svg}`),
    'a page': Buffer.from('<!doctype html><script>alert(1)</script>'),
    'a PDF': Buffer.from('%PDF-1.7\n1 0 obj\n<<>>\nendobj\n'),
    'an empty file': Buffer.alloc(0),
    'a picture list of another program': Buffer.from('push graphic-context\nviewbox 0 0 640 480\nfill \'url(https://site.example/x.jpg)\'\n'),
  };
  test.each(Object.entries(others))('%s is refused', async (_what, file) => {
    await expectRefusal(file, 'wrong-type', notAPicture, 'bench.jpg');
  });

  test('TIFF is refused, as no browser shows it', async () => {
    await expectRefusal(await quadrants().tiff().toBuffer(), 'wrong-type', notAPicture);
  });

  test('an SVG behind the first bytes of a JPEG is refused', async () => {
    await expectRefusal(Buffer.concat([Buffer.from([0xff, 0xd8, 0xff, 0xe0]), Buffer.from(svg)]), 'bad-input', damaged);
  });
});

describe('what is too much', () => {
  test('a file of 60 MB is refused in words with its size, before it is read', async () => {
    const problem = await site.refused(Buffer.alloc(60 * megabyte), 'huge.jpg');
    expect(problem).toMatchObject({ code: 'too-large', status: 413, detail: 'That file is 60 MB; 40 MB is the most.', fields: { picture: 'That file is 60 MB; 40 MB is the most.' } });
  });

  test('a body that keeps its size to itself is stopped at 40 MB', async () => {
    const { status, body } = await sentInChunks(41);
    expect(status).toBe(413);
    expect(JSON.parse(body)).toMatchObject({ code: 'too-large', fields: { picture: 'That file is over 40 MB, which is the most.' } });
    expect(await site.left('quarantine')).toEqual([]);
  });

  test('30,000 by 30,000 pixels are refused from the head, in words with the size', async () => {
    const words = 'That picture is 30,000 by 30,000 pixels. The most is 50 megapixels and 12,000 pixels a side; save it smaller and try again.';
    await expectRefusal(blankPng(30_000, 30_000), 'too-large', words);
    await expectRefusal(blankPng(30_000, 30_000).subarray(0, 33), 'too-large', words);
    await expectRefusal(await jpegClaiming(30_000, 30_000), 'too-large', words);
  });

  test('a side over 12,000 and an area over 50 megapixels are refused, what is just inside is not', async () => {
    expect((await site.refused(blankPng(12_001, 10))).code).toBe('too-large');
    expect((await site.refused(blankPng(7100, 7100))).code).toBe('too-large');
    expect((await site.taken(blankPng(12_000, 10))).state).toBe('ready');
  });
});

const fileHead = '--plank\r\nContent-Disposition: form-data; name="picture"; filename="a.jpg"\r\nContent-Type: image/jpeg\r\n\r\n';
const formHeaders = () => ({ 'content-type': 'multipart/form-data; boundary=plank', cookie: site.restorer.cookies.header(), origin: site.server.url, 'sec-fetch-site': 'same-origin' });

/** A multipart body of so many MiB in chunks, with no length announced. */
function sentInChunks(size: number): Promise<{ status: number; body: string }> {
  return new Promise((resolve, reject) => {
    const sending = request(`${site.server.url}/api/builds/${site.build}/pictures`, { method: 'POST', headers: formHeaders() }, (res) => {
      let body = '';
      res.setEncoding('utf8').on('data', (text: string) => (body += text)).on('end', () => resolve({ status: res.statusCode ?? 0, body }));
    });
    sending.on('error', reject);
    sending.write(fileHead);
    for (let sent = 0; sent < size; sent++) sending.write(Buffer.alloc(megabyte, 7));
    sending.end('\r\n--plank--\r\n');
  });
}

describe('what is cut short', () => {
  const kinds = { jpeg: () => noisy(400, 300).jpeg(), png: () => noisy(400, 300).png(), webp: () => noisy(400, 300).webp(), avif: () => noisy(400, 300).avif({ effort: 0 }), gif: () => noisy(200, 150).gif() };
  test.each(Object.entries(kinds))('%s is refused at a third and at its last fiftieth', async (_kind, image) => {
    const whole = await image().toBuffer();
    for (const part of [0.34, 0.98]) await expectRefusal(whole.subarray(0, Math.floor(whole.length * part)), 'bad-input', damaged);
  });

  test('HEIC is refused as well', async () => {
    const whole = await heicSample('quadrants');
    await expectRefusal(whole.subarray(0, 700), 'bad-input', damaged);
    await expectRefusal(whole.subarray(0, whole.length - 200), 'bad-input', damaged);
  });
});

describe('what is two things at once', () => {
  const script = '<script>alert("planed")</script>';
  const zipped = deflateRawSync(Buffer.from('stolen tools'));
  const zip = Buffer.concat([Buffer.from('PK\x03\x04', 'latin1'), Buffer.alloc(26), zipped, Buffer.from('PK\x05\x06', 'latin1'), Buffer.alloc(18)]);

  async function comment(text: string): Promise<Buffer> {
    const jpeg = await quadrants().jpeg().toBuffer();
    const length = Buffer.alloc(2);
    length.writeUInt16BE(text.length + 2);
    return Buffer.concat([jpeg.subarray(0, 2), Buffer.from([0xff, 0xfe]), length, Buffer.from(text), jpeg.subarray(2)]);
  }

  const doubles: Readonly<Record<string, () => Promise<{ file: Buffer; trace: string }>>> = {
    'a JPEG with a page in a comment': async () => ({ file: await comment(`<html>${script}</html>`), trace: 'alert(' }),
    'a JPEG with a page behind it': async () => ({ file: Buffer.concat([await quadrants().jpeg().toBuffer(), Buffer.from(`<html>${script}`)]), trace: 'alert(' }),
    'a GIF with a script behind it': async () => ({ file: Buffer.concat([await quadrants().gif().toBuffer(), Buffer.from(`/*${script}*/`)]), trace: 'alert(' }),
    'a PNG with an archive behind it': async () => ({ file: Buffer.concat([await quadrants().png().toBuffer(), zip]), trace: 'PK\x03\x04' }),
  };
  test.each(Object.entries(doubles))('%s is drawn afresh, with nothing of the other left', async (_what, make) => {
    const { file, trace } = await make();
    expect(holds(file, trace)).toBe(true);
    const { key } = await site.taken(file, 'page.html');
    for (const name of ['original.jpg', '120.jpg', '120.webp', '120.avif']) expect(holds(await site.file(key, name), trace), name).toBe(false);
  });

  test('the files go out as pictures only, whatever the sender called them', async () => {
    const { key } = await site.taken(await comment(script), 'page.html');
    const answer = await site.restorer.get(`/pictures/${key}/original.jpg`);
    expect(Object.fromEntries(['content-type', 'x-content-type-options', 'content-disposition'].map((name) => [name, answer.headers.get(name)]))).toEqual({
      'content-type': 'image/jpeg', 'x-content-type-options': 'nosniff', 'content-disposition': 'inline',
    });
  });
});

describe('names and forms', () => {
  const tricks = {
    'a way up': '../../../etc/passwd', 'a way up by backslash': '..\\..\\session-secret', 'a whole path': '/etc/passwd', 'a nought': 'a\0b.jpg', 'a dot': '.', 'two dots': '..',
    'five thousand letters': 'x'.repeat(5000), 'markup': '<img src=x onerror=alert(1)>.jpg',
  };
  test.each(Object.entries(tricks))('a file whose name is %s is stored under a key of ours, or not at all', async (_what, name) => {
    const before = (await site.left('.')).toSorted();
    const sent = await site.send(site.restorer, await quadrants(16, 16).jpeg().toBuffer(), name);
    if (sent.ok) expect(sent.reply.key).toMatch(/^[a-z0-9]{24}$/);
    else expect(sent.problem.code).toMatch(/^(malformed|bad-input)$/);
    expect((await site.left('.')).toSorted()).toEqual(before);
    expect(await site.left('quarantine')).toEqual([]);
  });

  async function sendForm(form: FormData) {
    return (await site.restorer.upload(`/api/builds/${site.build}/pictures`, form)).json();
  }

  test('no file, two files and a file in another field are answered in words', async () => {
    const file = new Blob([new Uint8Array(await quadrants().jpeg().toBuffer())]);
    expect(await sendForm(new FormData())).toMatchObject({ code: expect.stringMatching(/bad-input|malformed/) });
    const two = new FormData();
    two.append('picture', file, 'a.jpg');
    two.append('picture', file, 'b.jpg');
    expect(await sendForm(two)).toMatchObject({ code: expect.stringMatching(/bad-input|malformed/) });
    const astray = new FormData();
    astray.append('photo', file, 'a.jpg');
    expect(await sendForm(astray)).toMatchObject({ code: 'bad-input', fields: { picture: 'Send one picture at a time, in a field called picture.' } });
    expect((await site.restorer.send('POST', `/api/builds/${site.build}/pictures`, {})).json()).toMatchObject({ code: 'bad-input', fields: { picture: 'Choose a picture.' } });
    expect(await site.left('quarantine')).toEqual([]);
  });

  test('what is refused only after it arrived leaves nothing either', async () => {
    const form = new FormData();
    form.append('picture', new Blob([new Uint8Array(await quadrants().jpeg().toBuffer())]), 'a.jpg');
    expect((await site.restorer.upload(`/api/builds/${site.build}/pictures?size=large`, form)).json()).toMatchObject({ code: 'bad-input' });
    await expect.poll(() => site.left('quarantine')).toEqual([]);
  });

  test('a form that breaks off is answered in words and leaves nothing', async () => {
    const answer = await site.restorer.fetch(`/api/builds/${site.build}/pictures`, {
      method: 'POST', headers: { 'content-type': 'multipart/form-data; boundary=plank' },
      body: '--plank\r\nContent-Disposition: form-data; name="picture"; filename="a.jpg"\r\n\r\n\xff\xd8\xff',
    });
    expect(answer.json()).toMatchObject({ code: 'malformed', detail: 'The picture did not arrive whole. Send it again.' });
    expect(await site.left('quarantine')).toEqual([]);
  });
});

test('an upload its sender walks away from leaves nothing', async () => {
  const sending = request(`${site.server.url}/api/builds/${site.build}/pictures`, { method: 'POST', headers: formHeaders() });
  sending.on('error', () => undefined);
  sending.write(`${fileHead}half of it`);
  await expect.poll(() => site.left('quarantine')).toHaveLength(1);
  sending.destroy();
  await expect.poll(() => site.left('quarantine')).toEqual([]);
});

test('a refused picture is on record with its words, and nothing of it is kept', async () => {
  const rows = await site.server.orm.em.fork().find(Picture, { state: 'refused' });
  expect(rows.length).toBeGreaterThan(10);
  expect(rows.every((row) => row.problem !== null && row.bytes === 0)).toBe(true);
  expect(await site.left('quarantine')).toEqual([]);
  expect(await site.left('pictures/making')).toEqual([]);
  for (const { key } of rows) expect((await site.restorer.get(`/pictures/${key}/original.jpg`)).status).toBe(404);
});

test('after all of this the same process still makes pictures', async () => {
  const before = pictureMaker.pid;
  expect((await sharp(await site.file((await site.taken(await fromPhone())).key, 'original.jpg')).metadata()).format).toBe('jpeg');
  expect(pictureMaker.pid).toBe(before);
});
