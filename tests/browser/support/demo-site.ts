import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import type { TestProject } from 'vitest/node';
import { freePort } from '#tests/support/free-port.ts';

export interface DemoSite {
  readonly url: string;
  readonly password: string;
}

declare module 'vitest' {
  export interface ProvidedContext {
    demoSite: DemoSite;
  }
}

// The demo makes some four hundred picture files first: two minutes of two idle cores, far more of busy ones.
const READY_WITHIN_MS = 540_000;
const STOP_WITHIN_MS = 5_000; // what the site promises after SIGTERM
const KEPT_OUTPUT = 20_000; // characters

async function answersReady(url: string): Promise<boolean> {
  try {
    return (await fetch(`${url}/readyz`)).status === 200;
  } catch (error) {
    // Nothing listens yet.
    if (error instanceof TypeError) return false;
    throw error;
  }
}

async function untilReady(url: string, server: ChildProcess, output: () => string): Promise<void> {
  const deadline = Date.now() + READY_WITHIN_MS;
  while (!(await answersReady(url))) {
    if (server.exitCode !== null) throw new Error(`The site stopped with code ${server.exitCode}:\n${output()}`);
    if (Date.now() > deadline) throw new Error(`The site was not ready in ${READY_WITHIN_MS / 1000} s:\n${output()}`);
    await wait(100);
  }
}

async function stop(server: ChildProcess): Promise<void> {
  if (server.exitCode !== null) return;
  const gone = once(server, 'exit');
  server.kill('SIGTERM');
  const stopped = await Promise.race([gone.then(() => true), wait(STOP_WITHIN_MS, false)]);
  if (stopped) return;
  server.kill('SIGKILL');
  throw new Error(`The site did not stop within ${STOP_WITHIN_MS / 1000} s of SIGTERM.`);
}

/** Serves the built site with the demo in a folder of its own, for as long as the browser tests run. */
export async function setup(project: TestProject): Promise<() => Promise<void>> {
  const [dataDir, port] = await Promise.all([mkdtemp(join(tmpdir(), 'demo-site-')), freePort()]);
  const site = { url: `http://127.0.0.1:${port}`, password: 'twelve copper rivets' };
  const server = spawn(process.execPath, ['--enable-source-maps', 'scripts/start.mjs'], {
    env: { ...process.env, PORT: String(port), HOST: '127.0.0.1', PUBLIC_URL: site.url, DATA_DIR: dataDir, DEMO_PASSWORD: site.password },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let output = '';
  const keep = (chunk: Buffer) => { output = (output + chunk.toString()).slice(-KEPT_OUTPUT); };
  server.stdout.on('data', keep);
  server.stderr.on('data', keep);
  try {
    await untilReady(site.url, server, () => output);
  } catch (error) {
    server.kill('SIGKILL');
    await rm(dataDir, { recursive: true, force: true });
    throw error;
  }
  project.provide('demoSite', site);
  return async () => {
    await stop(server);
    await rm(dataDir, { recursive: true, force: true });
  };
}
