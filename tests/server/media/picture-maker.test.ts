import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { readFileSync } from 'node:fs';
import { mkdtemp, readdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, afterEach, beforeAll, expect, test } from 'vitest';
import { megabyte } from '#server/features/media/picture-limits.ts';
import { PictureMaker } from '#server/features/media/picture-maker.ts';
import type { MadePicture } from '#server/features/media/picture-messages.ts';
import { noisy, quadrants } from './picture-samples.ts';

let folder: string;
let large: string;
let small: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'picture-maker-'));
  [large, small] = [join(folder, 'large'), join(folder, 'small')];
  await writeFile(large, await noisy(4000, 3000).jpeg({ quality: 70 }).toBuffer());
  await writeFile(small, await quadrants(64, 48).jpeg().toBuffer());
});
afterAll(() => rm(folder, { recursive: true, force: true }));

let number = 0;
function make(maker: PictureMaker, source: string): Promise<MadePicture> {
  number += 1;
  return maker.make({ source, making: join(folder, 'making', String(number)), folder: join(folder, 'made', String(number)) });
}
const makers: PictureMaker[] = [];
function newMaker(limitMs?: number): PictureMaker {
  const maker = new PictureMaker(limitMs);
  makers.push(maker);
  return maker;
}
function kill(maker: PictureMaker): void {
  if (maker.pid !== null) process.kill(maker.pid, 'SIGKILL');
}
afterEach(() => {
  for (const maker of makers.splice(0)) kill(maker);
});

/** Waits until a picture is being made. */
async function underWay(): Promise<void> {
  while ((await readdir(join(folder, 'making')).catch(() => [])).length === 0) await new Promise((go) => setTimeout(go, 5));
}
function isAlive(pid: number): boolean {
  try {
    return process.kill(pid, 0);
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ESRCH') return false;
    throw error;
  }
}
/** Resident memory of a process, in bytes, as Linux tells it. */
function residentBytes(pid: number): number {
  return Number(/VmRSS:\s+(\d+) kB/.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1]) * 1024;
}

test('a process killed in the middle refuses that picture in words, and the next is made by a new one', async () => {
  const maker = newMaker();
  await make(maker, small);
  const first = maker.pid;
  const lost = make(maker, large);
  const next = make(maker, small);
  await underWay();
  kill(maker);
  await expect(lost).rejects.toMatchObject({ refusal: { code: 'bad-input', problem: 'This picture could not be made: it took more memory than there is. Save it smaller and try again.' } });
  expect((await next).width).toBe(64);
  expect(maker.pid).not.toBe(first);
});

test('one killed while idle is not noticed by the next picture', async () => {
  const maker = newMaker();
  await make(maker, small);
  kill(maker);
  await new Promise((go) => setTimeout(go, 200));
  expect((await make(maker, small)).width).toBe(64);
});

test('a picture that takes too long is given up, in words', async () => {
  const maker = newMaker(400);
  const slow = make(maker, large);
  await expect(slow).rejects.toMatchObject({ refusal: { problem: 'This picture could not be made: it took longer than a minute. Save it smaller and try again.' } });
});

test('the process ends with the site, even in the middle of a picture', async () => {
  const maker = fileURLToPath(new URL('../../../server/features/media/picture-maker.ts', import.meta.url));
  const tasks = { small: { source: small, making: join(folder, 'making', 'a'), folder: join(folder, 'made', 'a') }, large: { source: large, making: join(folder, 'making', 'b'), folder: join(folder, 'made', 'b') } };
  const program = `import { pictureMaker } from ${JSON.stringify(maker)}; const { small, large } = ${JSON.stringify(tasks)};
    pictureMaker.make(small).then(() => { void pictureMaker.make(large); process.stdout.write(String(pictureMaker.pid)); });`;
  const site = spawn(process.execPath, ['--import', 'tsx', '--input-type=module', '--eval', program], { stdio: ['ignore', 'pipe', 'inherit'] });
  const pid = Number(String(await once(site.stdout, 'data')));
  expect(isAlive(pid)).toBe(true);
  site.kill('SIGKILL');
  await expect.poll(() => isAlive(pid), { timeout: 3000 }).toBe(false);
});

test('a fault of ours is an error, not a refusal', async () => {
  const maker = newMaker();
  await expect(make(maker, join(folder, 'never-there'))).rejects.toThrow(/picture process: .*ENOENT/);
  expect((await make(maker, small)).width).toBe(64);
});

test.runIf(process.platform === 'linux')('memory stays bounded over forty photographs', { timeout: 120_000 }, async () => {
  const maker = newMaker();
  const middling = join(folder, 'middling');
  await writeFile(middling, await quadrants(1000, 750).jpeg().toBuffer());
  await make(maker, middling);
  const sizes: number[] = [];
  for (let index = 0; index < 40; index++) {
    await make(maker, middling);
    sizes.push(residentBytes(maker.pid ?? 0));
  }
  const mean = (some: readonly number[]) => some.reduce((sum, one) => sum + one, 0) / some.length;
  expect(Math.max(...sizes)).toBeLessThan(500 * megabyte);
  // no leak: the last ten stand no higher than the second ten, give or take
  expect(mean(sizes.slice(-10))).toBeLessThan(mean(sizes.slice(10, 20)) + 40 * megabyte);
});

test('sixty small ones at once are all made, one after the other', { timeout: 60_000 }, async () => {
  const maker = newMaker();
  const made = await Promise.all(Array.from({ length: 60 }, () => make(maker, small)));
  expect(made.every(({ width, widths }) => width === 64 && widths.join() === '64')).toBe(true);
});
