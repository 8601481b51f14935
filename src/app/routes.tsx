import type { QueryClient } from '@tanstack/react-query';
import { redirect, type ActionFunction, type LoaderFunction, type RouteObject } from 'react-router-dom';
import type { ComponentType } from 'react';
import { AppError } from '#contracts/errors.ts';
import { SignedOutForm } from '#src/lib/signed-out-form.ts';
import { sessionQuery } from '#src/queries/session.ts';
import { ErrorPage } from './error-page.tsx';
import { Layout } from './layout.tsx';
import { pageError } from './route-errors.ts';

/** What a page module exports: its component, and a loader and an action made for one query client. */
export interface PageModule {
  readonly Component: ComponentType;
  readonly makeLoader?: (client: QueryClient) => LoaderFunction;
  readonly makeAction?: (client: QueryClient) => ActionFunction;
}
export interface RouteOptions {
  /** Told of every fault that is not an outcome. */
  readonly onFault: (error: unknown) => void;
}

function signInFrom(request: Request) {
  const { pathname, search } = new URL(request.url);
  return redirect(`/sign-in?next=${encodeURIComponent(pathname + search)}`);
}

/** Outcomes become the page's status; a page that needs somebody signed in sends to the sign-in first, but a form is kept. */
function guarded<F extends LoaderFunction | ActionFunction>(run: F, options: RouteOptions): F {
  const wrapped = async (args: Parameters<F>[0], context?: unknown) => {
    try {
      return await (run as LoaderFunction)(args, context) ?? null;
    } catch (error) {
      if (error instanceof Response) throw error;
      if (error instanceof SignedOutForm) throw pageError(new AppError('sign-in-needed', error.message), error.values);
      if (error instanceof AppError && error.code === 'sign-in-needed') throw signInFrom(args.request);
      if (error instanceof AppError) throw pageError(error);
      options.onFault(error);
      throw error;
    }
  };
  return wrapped as F;
}

const empty: LoaderFunction = () => null;

export function makeRoutes(client: QueryClient, options: RouteOptions): RouteObject[] {
  /** `name` is the page's file in `src/pages`, by which the server finds what to have fetched ahead. */
  const page = (path: string, name: string, load: () => Promise<PageModule>): RouteObject => ({
    path,
    handle: { page: name },
    lazy: async () => {
      const { Component, makeLoader, makeAction } = await load();
      return {
        Component,
        loader: guarded(makeLoader?.(client) ?? empty, options),
        ...(makeAction ? { action: guarded(makeAction(client), options) } : {}),
      };
    },
  });
  return [{
    id: 'site',
    path: '/',
    Component: Layout,
    ErrorBoundary: ErrorPage,
    loader: guarded(async () => {
      await client.ensureQueryData(sessionQuery());
      return null;
    }, options),
    children: [{
      ErrorBoundary: ErrorPage,
      children: [
        page('', 'home', () => import('#src/pages/home.tsx')),
        page('builds', 'builds', () => import('#src/pages/builds.tsx')),
        page('builds/new', 'start-build', () => import('#src/pages/start-build.tsx')),
        page('builds/:build', 'build', () => import('#src/pages/build.tsx')),
        page('builds/:build/settings', 'build-settings', () => import('#src/pages/build-settings.tsx')),
        page('builds/:build/plan', 'build-plan', () => import('#src/pages/build-plan.tsx')),
        page('builds/:build/edit/:number', 'edit-entry', () => import('#src/pages/edit-entry.tsx')),
        page('builds/:build/edit/:number/preview', 'preview-entry', () => import('#src/pages/preview-entry.tsx')),
        page('builds/:build/:entry', 'entry', () => import('#src/pages/entry.tsx')),
        page('write', 'write', () => import('#src/pages/write.tsx')),
        page('my-builds', 'my-builds', () => import('#src/pages/my-builds.tsx')),
        page('sign-in', 'sign-in', () => import('#src/pages/sign-in.tsx')),
        page('sign-up', 'sign-up', () => import('#src/pages/sign-up.tsx')),
        page('sign-out', 'sign-out', () => import('#src/pages/sign-out.tsx')),
        page('settings', 'settings', () => import('#src/pages/settings.tsx')),
        page('*', 'not-found', () => import('#src/pages/not-found.tsx')),
      ],
    }],
  }];
}
