import { QueryClient } from '@tanstack/react-query';
import { ApiError } from './api';

const MOST_TRIES = 3;

/** Tries again only what trying again can mend: a server that was not reached, is busy or broke. */
export function worthRetrying(failures: number, error: Error): boolean {
  if (failures >= MOST_TRIES) return false;
  if (!(error instanceof ApiError)) return false;
  return error.code === 'unavailable' || error.code === 'broken';
}

/** One for the whole client. Answers are kept for a day, so that what was seen with signal can be read without. */
export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      retry: worthRetrying,
      retryDelay: (tries) => Math.min(500 * 2 ** tries, 5000),
      staleTime: 15_000,
      gcTime: 24 * 60 * 60 * 1000,
      // A call without signal should fail and say so, not wait unseen.
      networkMode: 'always',
    },
    mutations: { retry: false, networkMode: 'always' },
  },
});
