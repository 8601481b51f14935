import { data, isRouteErrorResponse, UNSAFE_ErrorResponseImpl as RouteErrorResponse } from 'react-router-dom';
import { AppError, type ErrorCode } from '#contracts/errors.ts';

/** What an error page shows; travels with the page so that the browser draws the same one. */
export interface ShownError {
  status: number;
  code: ErrorCode;
  message: string;
  /** What stood in the form that was sent, where it is to be sent again. */
  values?: Readonly<Record<string, string>>;
}
export type FrozenErrors = Record<string, ShownError>;

const unexpected = 'Something went wrong here. It has been noted; try again in a moment.';

export function shownError(error: unknown): ShownError {
  if (isRouteErrorResponse(error)) {
    const known = error.data as Partial<ShownError> | null;
    if (known?.code && known.message) return { status: error.status, code: known.code, message: known.message, ...(known.values ? { values: known.values } : {}) };
    if (error.status === 404) return { status: 404, code: 'not-found', message: 'There is nothing at this address.' };
    return { status: error.status, code: 'broken', message: unexpected };
  }
  if (error instanceof AppError) return { status: error.status, code: error.code, message: error.message };
  return { status: 500, code: 'broken', message: unexpected };
}

/** Thrown from a loader: the page's status and words follow the outcome. */
export function pageError({ code, message, status }: AppError, values?: ShownError['values']) {
  return data({ code, message, ...(values ? { values } : {}) }, { status });
}

export function frozenErrors(errors: Record<string, unknown> | null): FrozenErrors | null {
  return errors && Object.fromEntries(Object.entries(errors).map(([route, error]) => [route, shownError(error)]));
}

export function thawedErrors(errors: FrozenErrors | null): Record<string, unknown> | null {
  return errors && Object.fromEntries(Object.entries(errors).map(([route, { status, ...said }]) => [route, new RouteErrorResponse(status, said.code, said)]));
}
