import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { randomBytes } from 'node:crypto';
import { join, resolve } from 'node:path';
import { z } from 'zod';

// The one reader of the environment. Every setting is optional; every fault is listed at once.

const loopback = new Set(['127.0.0.1', 'localhost', '::1', '[::1]']);
const blankIsAbsent = (value: unknown) => (value === '' ? undefined : value);
const optional = <S extends z.ZodType>(schema: S) => z.preprocess(blankIsAbsent, schema.optional());

/** Addresses, cookies and links all start at the top: a site under a path of another would lead out of itself. */
function isWholeSite(text: string): boolean {
  // what is no address is said by the check before
  if (!URL.canParse(text)) return true;
  const { pathname, search, hash, username, password } = new URL(text);
  return pathname === '/' && search + hash + username + password === '';
}

const environment = z.object({
  PORT: z.preprocess(blankIsAbsent, z.coerce.number('PORT is a number from 0 to 65535').int().min(0).max(65_535).default(3000)),
  HOST: z.preprocess(blankIsAbsent, z.string().default('127.0.0.1')),
  DATA_DIR: z.preprocess(blankIsAbsent, z.string().default('./data')),
  PUBLIC_URL: optional(z.url({ protocol: /^https?$/, error: 'PUBLIC_URL is a whole address, such as https://log.example' }).refine(isWholeSite, 'PUBLIC_URL is a host with nothing behind it, such as https://log.example: the site stands at the top of its address')),
  TRUST_PROXY: optional(z.string()),
  SESSION_SECRET: optional(z.string().min(32, 'SESSION_SECRET has 32 letters or more')),
  DEMO_PASSWORD: optional(z.string().min(10, 'DEMO_PASSWORD has ten letters or more')),
  MAIL_URL: optional(z.url({ protocol: /^smtps?$/, error: 'MAIL_URL is an smtp:// or smtps:// address' })),
  GITHUB_CLIENT_ID: optional(z.string()),
  GITHUB_CLIENT_SECRET: optional(z.string()),
  LOG_LEVEL: z.preprocess(blankIsAbsent, z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent'], 'LOG_LEVEL is fatal, error, warn, info, debug, trace or silent').default('warn')),
}).superRefine((env, context) => {
  if (env.PUBLIC_URL?.startsWith('https:') && env.TRUST_PROXY === undefined) {
    context.addIssue({ code: 'custom', path: ['TRUST_PROXY'], message: 'PUBLIC_URL is https, and TLS ends before this server: say which proxies to trust, such as TRUST_PROXY=1' });
  }
  if (Boolean(env.GITHUB_CLIENT_ID) !== Boolean(env.GITHUB_CLIENT_SECRET)) {
    context.addIssue({ code: 'custom', path: ['GITHUB_CLIENT_ID'], message: 'GITHUB_CLIENT_ID and GITHUB_CLIENT_SECRET are set together or not at all' });
  }
});

export interface Config {
  readonly port: number;
  readonly host: string;
  readonly dataDir: string;
  /** No slash at the end. With PORT 0 and no PUBLIC_URL it is set once the port is known. */
  publicUrl: string;
  readonly publicUrlGiven: boolean;
  readonly trustProxy: string | number | boolean;
  readonly sessionSecret: string;
  readonly demoPassword: string | null;
  readonly mailUrl: string | null;
  readonly github: { readonly clientId: string; readonly clientSecret: string } | null;
  readonly logLevel: string;
  /** Demo people, demo content and every local fake: only while both HOST and PUBLIC_URL are on loopback. */
  readonly local: boolean;
}

export class ConfigFault extends Error {}

/** Reads and checks all settings. @throws ConfigFault naming every setting that is wrong */
export function readConfig(env: NodeJS.ProcessEnv): Config {
  const parsed = environment.safeParse(env);
  if (!parsed.success) {
    throw new ConfigFault(parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join('\n'));
  }
  const settings = parsed.data;
  const dataDir = resolve(settings.DATA_DIR);
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
  const publicUrl = (settings.PUBLIC_URL ?? `http://${settings.HOST.includes(':') ? `[${settings.HOST}]` : settings.HOST}:${settings.PORT}`).replace(/\/+$/, '');
  return {
    port: settings.PORT, host: settings.HOST, dataDir, publicUrl, publicUrlGiven: settings.PUBLIC_URL !== undefined,
    trustProxy: trustProxyOf(settings.TRUST_PROXY),
    sessionSecret: settings.SESSION_SECRET ?? keptSecret(dataDir),
    demoPassword: settings.DEMO_PASSWORD ?? null,
    mailUrl: settings.MAIL_URL ?? null, logLevel: settings.LOG_LEVEL,
    github: settings.GITHUB_CLIENT_ID && settings.GITHUB_CLIENT_SECRET ? { clientId: settings.GITHUB_CLIENT_ID, clientSecret: settings.GITHUB_CLIENT_SECRET } : null,
    local: loopback.has(settings.HOST) && loopback.has(new URL(publicUrl).hostname),
  };
}

function trustProxyOf(text: string | undefined): string | number | boolean {
  if (text === undefined || text === 'false') return false;
  return /^\d+$/.test(text) ? Number(text) : text === 'true' ? true : text;
}

function keptSecret(dataDir: string): string {
  const file = join(dataDir, 'session-secret');
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600 });
  return readFileSync(file, 'utf8').trim();
}
