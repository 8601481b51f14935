import { dehydrate } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { renderToString } from 'react-dom/server';
import { createStaticHandler, createStaticRouter, StaticRouterProvider, type StaticHandlerContext } from 'react-router-dom';
import { Providers } from './app/providers.tsx';
import { makeRoutes } from './app/routes.tsx';
import { frozenErrors } from './app/route-errors.ts';
import { makeQueryClient } from './lib/query-client.ts';
import { bindTransport, type Transport } from './lib/transport.ts';

export type { Transport };

export interface RenderOptions {
  readonly publicUrl: string;
  readonly onFault: (error: unknown) => void;
}
export interface RenderedPage {
  readonly status: number;
  /** Page modules drawn, by their names in `src/pages`. */
  readonly pages: readonly string[];
  readonly head: string;
  readonly html: string;
  /** JSON that is safe inside a script element. */
  readonly state: string;
}

const safeJson = (value: unknown) => JSON.stringify(value).replace(/[<>&\u2028\u2029]/g, (c) => `\\u${c.charCodeAt(0).toString(16).padStart(4, '0')}`);

/** React writes titles, metas and links first when there is no head in the tree: the leading run belongs into the head. */
const leadingRun = /^(?:<title[^>]*>[^<]*<\/title>|<meta [^>]*>|<link [^>]*>)*/;

/** Renders one page: loaders fill the query cache through the transport, nothing goes over a socket. */
export async function render(request: Request, transport: Transport, options: RenderOptions): Promise<RenderedPage | Response> {
  const client = makeQueryClient(true);
  bindTransport(client, transport);
  try {
    const handler = createStaticHandler(makeRoutes(client, options));
    const context = await handler.query(request);
    if (context instanceof Response) return context;
    return markup(handler.dataRoutes, context, client, options);
  } finally {
    client.clear();
  }
}

function markup(routes: Parameters<typeof createStaticRouter>[0], context: StaticHandlerContext, client: ReturnType<typeof makeQueryClient>, options: RenderOptions): RenderedPage {
  const router = createStaticRouter(routes, context);
  const html = renderToString(
    <StrictMode>
      <Providers client={client} publicUrl={options.publicUrl}>
        <StaticRouterProvider router={router} context={context} hydrate={false} />
      </Providers>
    </StrictMode>,
  );
  const head = leadingRun.exec(html)?.[0] ?? '';
  return {
    status: context.statusCode,
    pages: context.matches.flatMap(({ route }) => (route.handle as { page?: string } | undefined)?.page ?? []),
    head,
    html: html.slice(head.length),
    state: safeJson({
      publicUrl: options.publicUrl,
      query: dehydrate(client),
      router: { loaderData: context.loaderData, actionData: context.actionData, errors: frozenErrors(context.errors) },
    }),
  };
}
