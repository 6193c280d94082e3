import { afterEach, describe, expect, it, vi } from 'vitest';
import { ApiError } from './api-error';
import { httpClient, newIdempotencyKey } from './http-client';
import { shouldRetry } from './query-client';

function answerWith(status: number, body: string) {
  const fetchMock = vi.fn<typeof fetch>(() =>
    Promise.resolve(new Response(status === 204 ? null : body, { status })),
  );
  vi.stubGlobal('fetch', fetchMock);
  return fetchMock;
}

async function failureOf(request: Promise<unknown>): Promise<ApiError> {
  const error: unknown = await request.then(
    () => new Error('It should have failed.'),
    (reason: unknown) => reason,
  );
  if (!(error instanceof ApiError)) throw error;
  return error;
}

afterEach(() => vi.unstubAllGlobals());

describe('httpClient', () => {
  it('sends JSON, the key and the revision, and reads JSON', async () => {
    const fetchMock = answerWith(200, '{"id":"1"}');
    const answer = await httpClient.put<{ id: string }>(
      '/api/x',
      { spec: 1 },
      { idempotencyKey: 'k', ifMatch: 'r' },
    );
    expect(answer).toEqual({ id: '1' });
    const [path, init] = fetchMock.mock.calls[0] ?? [];
    expect(path).toBe('/api/x');
    expect(init?.body).toBe('{"spec":1}');
    expect(init?.headers).toMatchObject({
      'Idempotency-Key': 'k',
      'If-Match': '"r"',
      'Content-Type': 'application/json',
    });
  });

  it('reads an answer without a body', async () => {
    answerWith(204, '');
    expect(await httpClient.delete('/api/session')).toBeUndefined();
  });

  it('turns the envelope into an ApiError', async () => {
    const fields = [{ path: 'layers[0].thickness_um', message: 'Gauge: 0 µm does not fit.' }];
    answerWith(
      400,
      JSON.stringify({
        error: { code: 'input_invalid', message: 'Look at one field.', request_id: 'r1', fields },
      }),
    );
    const error = await failureOf(httpClient.post('/api/x', {}));
    expect(error).toMatchObject({
      code: 'input_invalid',
      status: 400,
      message: 'Look at one field.',
      requestId: 'r1',
      fields,
    });
  });

  it('keeps the state that won a race', async () => {
    answerWith(
      412,
      JSON.stringify({
        error: { code: 'edited_meanwhile', message: 'Changed.', request_id: 'r', current: { id: '2' } },
      }),
    );
    expect((await failureOf(httpClient.put('/api/x', {}))).current).toEqual({ id: '2' });
  });

  it('names an answer that is not ours', async () => {
    answerWith(502, '<html>Bad gateway</html>');
    expect((await failureOf(httpClient.get('/api/x'))).code).toBe('answer_unreadable');
  });

  it('names a network that is gone', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    expect(await failureOf(httpClient.get('/api/x'))).toMatchObject({ code: 'offline', status: 0 });
  });
});

describe('newIdempotencyKey', () => {
  it('is another each time', () => {
    expect(newIdempotencyKey()).toMatch(/^[0-9a-f]{32}$/);
    expect(newIdempotencyKey()).not.toBe(newIdempotencyKey());
  });
});

describe('shouldRetry', () => {
  it('tries twice again where that can help', () => {
    const offline = new ApiError({ code: 'offline', status: 0, message: '' });
    expect(shouldRetry(1, offline)).toBe(true);
    expect(shouldRetry(2, offline)).toBe(false);
    expect(shouldRetry(0, new ApiError({ code: 'not_found', status: 404, message: '' }))).toBe(false);
    expect(shouldRetry(0, new TypeError('a mistake'))).toBe(false);
  });
});
