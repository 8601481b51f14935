import type { Request as ExpressRequest, RequestHandler } from 'express';
import type { Transport } from '#src/entry-server.tsx';
import { invoke, type EndpointTable } from './endpoint-table.ts';
import type { Context, Parts } from './context.ts';
import type { PageShell } from './page-shell.ts';
import { contextOf } from './request-context.ts';

/** The request as the page's loaders and actions see it; a form's body is already parsed. */
function pageRequest(req: ExpressRequest, publicUrl: string, signal: AbortSignal): Request {
  const url = new URL(req.originalUrl, publicUrl);
  if (req.method === 'GET' || req.method === 'HEAD') return new Request(url, { signal });
  const form = new URLSearchParams();
  for (const [name, value] of Object.entries((req.body ?? {}) as Record<string, unknown>)) {
    for (const one of Array.isArray(value) ? value : [value]) form.append(name, String(one));
  }
  return new Request(url, { method: 'POST', body: form, signal });
}

function inPlace(table: EndpointTable, context: Context): Transport {
  // an action may sign somebody in: what follows in the same request sees the new person only after its redirect
  return (method, path, input) => invoke(table, method, path, input, context);
}

/** The page, or nothing where the browser has gone meanwhile: that its drawing was broken off is no fault. */
async function unlessGone<T>(drawn: Promise<T>, gone: AbortSignal): Promise<T | null> {
  try {
    return await drawn;
  } catch (error) {
    if (gone.aborted) return null;
    throw error;
  }
}

/** Public and signed-in pages, rendered here and hydrated in the browser. Forms post to their page's own address. */
export function pageHandler(table: EndpointTable, parts: Parts, shell: PageShell): RequestHandler {
  return async (req, res) => {
    const gone = new AbortController();
    res.on('close', () => gone.abort());
    const context = await contextOf(req, parts);
    const { render } = await shell.entry();
    const drawn = render(pageRequest(req, parts.config.publicUrl, gone.signal), inPlace(table, context), {
      publicUrl: parts.config.publicUrl,
      // a bug in a loader is logged here, once; its text stays here
      onFault: (error) => {
        shell.explain(error);
        req.log.error({ err: error }, 'page fault');
      },
    });
    const page = await unlessGone(drawn, gone.signal);
    if (!page) return;
    res.set('Cache-Control', context.viewer ? 'private, no-store' : 'no-cache').vary('Cookie');
    if (page instanceof Response) {
      const code = req.method === 'POST' ? 303 : page.status;
      res.redirect(code, page.headers.get('location') ?? '/');
      return;
    }
    const template = await shell.template(req.originalUrl);
    // functions as replacers: "$&" in somebody's text must not be read as a pattern
    res.status(page.status).type('html').send(template
      .replace('<!--app-head-->', () => page.head + shell.preloads(page.pages))
      .replace('<!--app-html-->', () => page.html)
      .replace('<!--app-state-->', () => `<script id="state" type="application/json">${page.state}</script>`));
  };
}
