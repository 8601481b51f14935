import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import pino from 'pino';
import { createApp } from './app.ts';
import { ConfigFault, readConfig, type Config } from './config.ts';
import { openDatabase } from './database.ts';
import { clearInterruptedDemo, loadDemo } from './demo.ts';
import type { Parts } from './http/context.ts';
import { startJobs } from './jobs/runner.ts';
import { jobHandlers } from './features/jobs.ts';

const stopWithinMs = 4500;

function configOrExit(): Config {
  try {
    return readConfig(process.env);
  } catch (error) {
    if (!(error instanceof ConfigFault)) throw error;
    console.error(`These settings need mending:\n${error.message}`);
    process.exit(2);
  }
}

const config = configOrExit();
const dev = process.argv.includes('--dev');
const log = pino({ level: config.logLevel, redact: ['req.headers.cookie', 'req.headers.authorization'] });
await clearInterruptedDemo(config);
const orm = await openDatabase(join(config.dataDir, 'tallywright.sqlite'));
const parts: Parts = { config, orm, log, now: () => new Date(), limits: true };
let ready = false;

const http = createServer();
const site = await createApp({ parts, pages: dev ? 'dev' : 'built', http, ready: () => ready });
http.on('request', site.app);
await new Promise<void>((resolve, reject) => http.once('error', reject).listen(config.port, config.host, resolve));
const { port } = http.address() as AddressInfo;
if (!config.publicUrlGiven && config.port === 0) config.publicUrl = config.publicUrl.replace(/:0$/, `:${port}`);
console.log(`Tallywright listens on ${config.publicUrl}`);

const jobs = startJobs(parts, jobHandlers(parts));
let stopping = false;
async function stop(): Promise<void> {
  if (stopping) return;
  stopping = true;
  setTimeout(() => process.exit(1), stopWithinMs).unref();
  http.close();
  http.closeIdleConnections();
  await jobs.stop();
  await site.close();
  await orm.close(true);
  process.exit(0);
}
process.on('SIGTERM', () => void stop());
process.on('SIGINT', () => void stop());

try {
  if (config.local) await loadDemo(parts);
  ready = true;
} catch (error) {
  // stopped while the demo went in: the database was closed under it, and the next start begins it anew
  if (!stopping) throw error;
}
