import { readFile } from 'node:fs/promises';
import { pathToFileURL } from 'node:url';
import { resolve } from 'node:path';
import type { Server } from 'node:http';
import express, { type Express } from 'express';
import type { ViteDevServer } from 'vite';

export type EntryServer = typeof import('#src/entry-server.tsx');

/** Where page markup comes from: the built site, or Vite while developing. */
export interface PageShell {
  template(url: string): Promise<string>;
  entry(): Promise<EntryServer>;
  /** Links by which a browser fetches the scripts of these pages at once, rather than one after the other. */
  preloads(pages: readonly string[]): string;
  explain(error: unknown): void;
  close(): Promise<void>;
}

type Manifest = Readonly<Record<string, { readonly file: string; readonly imports?: readonly string[] }>>;

function filesOf(manifest: Manifest, module: string, files: Set<string>): void {
  const chunk = manifest[module];
  if (!chunk || files.has(chunk.file)) return;
  files.add(chunk.file);
  for (const next of chunk.imports ?? []) filesOf(manifest, next, files);
}

function preloadLinks(manifest: Manifest, pages: readonly string[]): string {
  const files = new Set<string>();
  for (const module of ['index.html', ...pages.map((page) => `src/pages/${page}.tsx`)]) filesOf(manifest, module, files);
  return [...files].map((file) => `<link rel="modulepreload" href="/${file}">`).join('');
}

/** The built site: `dist/client` and `dist/ssr`. */
export async function builtShell(app: Express): Promise<PageShell> {
  const template = await readFile('dist/client/index.html', 'utf8');
  const manifest = JSON.parse(await readFile('dist/client/.vite/manifest.json', 'utf8')) as Manifest;
  const links = new Map<string, string>();
  const preloads = (pages: readonly string[]) => {
    const key = pages.join(' ');
    const known = links.get(key) ?? preloadLinks(manifest, pages);
    links.set(key, known);
    return known;
  };
  const entry = (await import(pathToFileURL(resolve('dist/ssr/entry-server.js')).href)) as EntryServer;
  app.use('/assets', express.static(resolve('dist/client/assets'), { immutable: true, maxAge: '1y', fallthrough: false, index: false }));
  return { template: async () => template, entry: async () => entry, preloads, explain: () => undefined, close: async () => undefined };
}

/** Vite in middleware mode on our own server, so that no second port is opened. */
export async function viteShell(app: Express, http: Server): Promise<PageShell> {
  const { createServer } = await import('vite');
  const vite: ViteDevServer = await createServer({ server: { middlewareMode: true, hmr: { server: http } }, appType: 'custom' });
  app.use(vite.middlewares);
  return {
    template: async (url) => vite.transformIndexHtml(url, await readFile('index.html', 'utf8')),
    entry: async () => (await vite.ssrLoadModule('/src/entry-server.tsx')) as EntryServer,
    preloads: () => '',
    explain: (error) => {
      if (error instanceof Error) vite.ssrFixStacktrace(error);
    },
    close: () => vite.close(),
  };
}
