import type { Request } from 'express';
import type { AppError } from '#contracts/errors.ts';

const heldBack = new WeakMap<Request, AppError>();

/** Lets a page's form come back as it was typed, with the reason why nothing was done. */
export function holdBack(req: Request, reason: AppError): void {
  heldBack.set(req, reason);
}

export function refusalOf(req: Request): AppError | null {
  return heldBack.get(req) ?? null;
}
