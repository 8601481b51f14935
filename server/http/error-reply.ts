import type { ErrorRequestHandler, Request, Response } from 'express';
import { AppError, type ErrorCode, type ProblemDetails } from '#contracts/errors.ts';

/** Faults that Express and its parsers throw with a status of their own. */
function ofParser(error: unknown): AppError | null {
  const fault = error as { status?: unknown; type?: unknown };
  if (typeof fault.status !== 'number' || fault.status < 400 || fault.status >= 500) return null;
  const code: ErrorCode = fault.status === 413 ? 'too-large' : fault.status === 415 ? 'wrong-type' : 'malformed';
  return new AppError(code, code === 'too-large' ? 'That is more than this address takes.' : 'The request could not be read.');
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
  sendProblem(res, outcomeOf(error, req), String(req.id));
};
