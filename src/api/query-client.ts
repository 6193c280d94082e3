import { QueryClient } from '@tanstack/react-query';
import { isApiError } from './api-error';
import { STALE_MS } from './stale-times';

const MOST_RETRIES = 2;

/** Tries again only where trying again can help: no answer, or a server that says it is unwell. */
export function shouldRetry(failureCount: number, error: unknown): boolean {
  if (failureCount >= MOST_RETRIES || !isApiError(error)) return false;
  return error.code === 'offline' || error.code === 'database_silent';
}

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { staleTime: STALE_MS.edited, retry: shouldRetry, networkMode: 'always' },
      // A write is repeated by the person, with the same idempotency key, never behind their back.
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}
