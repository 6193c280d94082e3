import { STATUS_BY_CODE } from '../../shared/errors/error-code';
import type { ErrorCode, ErrorEnvelope, FieldFault } from '../../shared/errors/error-code';

/** The server's codes, and two of the client's own: no answer came, or one that is not ours. */
export type ApiErrorCode = ErrorCode | 'offline' | 'answer_unreadable';

export interface ApiErrorParts {
  code: ApiErrorCode;
  /** 0 where no answer came. */
  status: number;
  message: string;
  fields?: FieldFault[];
  requestId?: string;
  current?: unknown;
  retryAfterS?: number;
}

export class ApiError extends Error {
  readonly code: ApiErrorCode;
  readonly status: number;
  readonly fields: FieldFault[];
  readonly requestId: string;
  /** With edited_meanwhile: the state that won the race. */
  readonly current: unknown;
  readonly retryAfterS: number | undefined;

  constructor(parts: ApiErrorParts) {
    super(parts.message);
    this.name = 'ApiError';
    this.code = parts.code;
    this.status = parts.status;
    this.fields = parts.fields ?? [];
    this.requestId = parts.requestId ?? '';
    this.current = parts.current;
    this.retryAfterS = parts.retryAfterS;
  }
}

export function isApiError(error: unknown, code?: ApiErrorCode): error is ApiError {
  return error instanceof ApiError && (code === undefined || error.code === code);
}

export function apiErrorFromBody(status: number, body: unknown): ApiError {
  if (!isErrorEnvelope(body)) {
    return new ApiError({
      code: 'answer_unreadable',
      status,
      message: 'The server gave an answer that this page cannot read. Reload the page and try again.',
    });
  }
  const { code, message, fields, request_id: requestId, current, retry_after_s: retryAfterS } = body.error;
  return new ApiError({ code, status, message, fields, requestId, current, retryAfterS });
}

function isErrorEnvelope(body: unknown): body is ErrorEnvelope {
  if (typeof body !== 'object' || body === null || !('error' in body)) return false;
  const { error } = body;
  return (
    typeof error === 'object' &&
    error !== null &&
    'code' in error &&
    typeof error.code === 'string' &&
    error.code in STATUS_BY_CODE &&
    'message' in error &&
    typeof error.message === 'string'
  );
}
