import { QueryClient } from '@tanstack/react-query';
import { AppError } from '#contracts/errors.ts';

/** One per request on the server, one per page in the browser. */
export function makeQueryClient(onServer: boolean): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        // what the server just rendered is not fetched again
        staleTime: onServer ? Infinity : 30_000,
        refetchOnWindowFocus: false,
        retry: onServer ? false : (failures, error) => error instanceof AppError && error.code === 'unreachable' && failures < 2,
      },
      mutations: { retry: false },
    },
  });
}
