import { isApiError } from './api-error';

export interface ErrorWords {
  title: string;
  message: string;
  reference: string | undefined;
}

/** For FailedState: `what` as in 'The study could not be fetched'. */
export function describeError(error: unknown, what: string): ErrorWords {
  if (!isApiError(error)) {
    return {
      title: what,
      message: 'Something in this page went wrong. Reload it and try again.',
      reference: undefined,
    };
  }
  const title = error.code === 'offline' ? 'No connection to the server' : what;
  return { title, message: error.message, reference: error.requestId === '' ? undefined : error.requestId };
}
