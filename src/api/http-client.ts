import { ApiError, apiErrorFromBody } from './api-error';

const REQUEST_TIMEOUT_MS = 20_000;

export interface RequestOptions {
  /** For creates: made once per attempt of a form (newIdempotencyKey) and kept through its retries. */
  idempotencyKey?: string;
  /** For edits: the id of the revision that was read. */
  ifMatch?: string;
  signal?: AbortSignal;
}

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/** JSON in, JSON out, with the session's cookie. Throws ApiError and nothing else. */
export const httpClient = {
  get: <Answer>(path: string, options?: RequestOptions) => send<Answer>('GET', path, options),
  post: <Answer>(path: string, body: unknown, options?: RequestOptions) =>
    send<Answer>('POST', path, { ...options, body }),
  put: <Answer>(path: string, body: unknown, options?: RequestOptions) =>
    send<Answer>('PUT', path, { ...options, body }),
  patch: <Answer>(path: string, body: unknown, options?: RequestOptions) =>
    send<Answer>('PATCH', path, { ...options, body }),
  delete: <Answer>(path: string, options?: RequestOptions) => send<Answer>('DELETE', path, options),
};

/** Random enough to be met once. `crypto.randomUUID` is missing on plain http except on localhost. */
export function newIdempotencyKey(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
}

async function send<Answer>(
  method: Method,
  path: string,
  options: RequestOptions & { body?: unknown } = {},
): Promise<Answer> {
  const response = await fetchInTime(path, {
    method,
    credentials: 'same-origin',
    headers: headersOf(options),
    body: options.body === undefined ? undefined : JSON.stringify(options.body),
    signal: options.signal,
  });
  const body = await readBody(response);
  if (!response.ok) throw apiErrorFromBody(response.status, body);
  // The shape is the contract's; both sides infer it from the same schema, which the server has applied.
  return body as Answer;
}

function headersOf(options: RequestOptions & { body?: unknown }): Record<string, string> {
  const headers: Record<string, string> = { Accept: 'application/json' };
  if (options.body !== undefined) headers['Content-Type'] = 'application/json';
  if (options.idempotencyKey !== undefined) headers['Idempotency-Key'] = options.idempotencyKey;
  if (options.ifMatch !== undefined) headers['If-Match'] = `"${options.ifMatch}"`;
  return headers;
}

async function fetchInTime(path: string, init: RequestInit): Promise<Response> {
  const timeout = AbortSignal.timeout(REQUEST_TIMEOUT_MS);
  const caller = init.signal ?? undefined;
  const signal = caller === undefined ? timeout : AbortSignal.any([timeout, caller]);
  try {
    return await fetch(path, { ...init, signal });
  } catch (error) {
    // TanStack cancels what nobody waits for any more and knows the browser's own error for that.
    if (caller?.aborted === true) throw error;
    throw new ApiError({
      code: 'offline',
      status: 0,
      message: timeout.aborted
        ? 'The server did not answer in time. What you entered is still here; try again.'
        : 'The server cannot be reached. What you entered is still here; check the connection and try again.',
    });
  }
}

async function readBody(response: Response): Promise<unknown> {
  const text = await response.text().catch(() => '');
  if (text === '') return undefined;
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return undefined;
  }
}
