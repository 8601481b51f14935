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
  explain(error: unknown): void;
  close(): Promise<void>;
}

/** The built site: `dist/client` and `dist/ssr`. */
export async function builtShell(app: Express): Promise<PageShell> {
  const template = await readFile('dist/client/index.html', 'utf8');
  const entry = (await import(pathToFileURL(resolve('dist/ssr/entry-server.js')).href)) as EntryServer;
  app.use('/assets', express.static(resolve('dist/client/assets'), { immutable: true, maxAge: '1y', fallthrough: false, index: false }));
  return { template: async () => template, entry: async () => entry, explain: () => undefined, close: async () => undefined };
}

/** Vite in middleware mode on our own server, so that no second port is opened. */
export async function viteShell(app: Express, http: Server): Promise<PageShell> {
  const { createServer } = await import('vite');
  const vite: ViteDevServer = await createServer({ server: { middlewareMode: true, hmr: { server: http } }, appType: 'custom' });
  app.use(vite.middlewares);
  return {
    template: async (url) => vite.transformIndexHtml(url, await readFile('index.html', 'utf8')),
    entry: async () => (await vite.ssrLoadModule('/src/entry-server.tsx')) as EntryServer,
    explain: (error) => {
      if (error instanceof Error) vite.ssrFixStacktrace(error);
    },
    close: () => vite.close(),
  };
}
