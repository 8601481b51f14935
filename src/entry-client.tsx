import { hydrate, type DehydratedState } from '@tanstack/react-query';
import { StrictMode, startTransition } from 'react';
import { hydrateRoot } from 'react-dom/client';
import { createBrowserRouter, matchRoutes, RouterProvider, type HydrationState, type RouteObject } from 'react-router-dom';
import { Providers } from './app/providers.tsx';
import { makeRoutes } from './app/routes.tsx';
import { thawedErrors, type FrozenErrors } from './app/route-errors.ts';
import { fetchTransport } from './lib/fetch-transport.ts';
import { makeQueryClient } from './lib/query-client.ts';
import { bindTransport } from './lib/transport.ts';

interface PageState {
  publicUrl: string;
  query: DehydratedState;
  router: { loaderData: HydrationState['loaderData']; actionData: HydrationState['actionData']; errors: FrozenErrors | null };
}

/** The page's own modules must be there before hydration, or the first render is a fallback that does not match. */
async function resolveLazy(routes: RouteObject[]): Promise<void> {
  for (const { route } of matchRoutes(routes, location) ?? []) {
    if (typeof route.lazy !== 'function') continue;
    Object.assign(route, await route.lazy(), { lazy: undefined });
  }
}

async function start(): Promise<void> {
  const root = document.getElementById('root');
  const state = JSON.parse(document.getElementById('state')?.textContent ?? 'null') as PageState | null;
  if (!root || !state) return;
  const client = makeQueryClient(false);
  bindTransport(client, fetchTransport);
  hydrate(client, state.query);
  const routes = makeRoutes(client, { onFault: (error) => console.error(error) });
  await resolveLazy(routes);
  const router = createBrowserRouter(routes, { hydrationData: { ...state.router, errors: thawedErrors(state.router.errors) } });
  startTransition(() => {
    hydrateRoot(
      root,
      <StrictMode>
        <Providers client={client} publicUrl={state.publicUrl}>
          <RouterProvider router={router} />
        </Providers>
      </StrictMode>,
      { onRecoverableError: (error) => console.error('Hydration', error) },
    );
  });
  document.documentElement.dataset['hydrated'] = 'true';
}

void start();
