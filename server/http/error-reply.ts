import type { ErrorRequestHandler, Request, Response } from 'express';
import { AppError, type ErrorCode, type ProblemDetails } from '#contracts/errors.ts';

const statusMeans: Readonly<Record<number, { code: ErrorCode; words: string }>> = {
  404: { code: 'not-found', words: 'There is nothing at this address.' },
  413: { code: 'too-large', words: 'That is more than this address takes.' },
  415: { code: 'wrong-type', words: 'The request could not be read.' },
};

/** Faults that Express, its parsers and its files throw with a status of their own. */
function ofParser(error: unknown): AppError | null {
  const { status } = error as { status?: unknown };
  if (typeof status !== 'number' || status < 400 || status >= 500) return null;
  const { code, words } = statusMeans[status] ?? { code: 'malformed', words: 'The request could not be read.' };
  return new AppError(code, words);
}

export function problemOf(error: AppError, requestId: string): ProblemDetails {
  return {
    type: `urn:tallywright:problem:${error.code}`, title: error.code.replaceAll('-', ' '), status: error.status, detail: error.message, code: error.code,
    ...(error.fields ? { fields: error.fields } : {}), ...(error.newer === undefined ? {} : { newer: error.newer }), requestId,
  };
}

/** What a thrown thing means to the caller; a bug is logged once, with its request, and its text is never sent. */
export function outcomeOf(error: unknown, req: Request): AppError {
  if (error instanceof AppError) return error;
  const translated = ofParser(error);
  if (translated) return translated;
  req.log.error({ err: error }, 'unexpected fault');
  return new AppError('broken', 'Something went wrong here. It has been noted; try again in a moment.');
}

export function sendProblem(res: Response, error: AppError, requestId: string): void {
  res.status(error.status).type('application/problem+json').set('Cache-Control', 'no-store').send(JSON.stringify(problemOf(error, requestId)));
}

export const problemReply: ErrorRequestHandler = (error: unknown, req, res, next) => {
  if (res.headersSent) {
    next(error);
    return;
  }
  sendProblem(res, outcomeOf(error, req), typeof req.id === 'object' ? '' : String(req.id));
};

/** The page a browser gets for a fault outside the page tree; the API answers problem details. */
export const pageFault: ErrorRequestHandler = (error: unknown, req, res, next) => {
  if (req.path.startsWith('/api/') || !req.accepts('html') || res.headersSent) {
    problemReply(error, req, res, next);
    return;
  }
  const { status, message } = outcomeOf(error, req);
  const escaped = message.replace(/[&<>"]/g, (c) => `&#${c.charCodeAt(0)};`);
  res.status(status).type('html').set('Cache-Control', 'no-store').send(`<!doctype html><html lang="en"><meta charset="utf-8"><title>Tallywright</title><h1>That did not work</h1><p>${escaped}</p><p><a href="/">Back to the start</a></p></html>`);
};
