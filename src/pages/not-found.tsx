import { AppError } from '#contracts/errors.ts';

/** Any address that is no page of ours. */
export function makeLoader() {
  return () => {
    throw new AppError('not-found', 'There is nothing at this address.');
  };
}

export function Component() {
  return null;
}
