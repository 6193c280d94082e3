/** The closed set of ways a request can end badly, and the only map from them to HTTP. */
export const STATUS_BY_CODE = {
  input_invalid: 400,
  session_missing: 401,
  sign_in_refused: 401,
  origin_refused: 403,
  not_found: 404,
  idempotency_key_reused: 409,
  edited_meanwhile: 412,
  file_too_large: 413,
  computation_too_long: 422,
  precondition_missing: 428,
  too_many_requests: 429,
  internal: 500,
  database_silent: 503,
} as const;

export type ErrorCode = keyof typeof STATUS_BY_CODE;

/** One fault of one field: where, what was given, what is wrong and what would do. */
export interface FieldFault {
  path: string;
  value?: unknown;
  message: string;
}

/** Every error body of the API. `current` accompanies edited_meanwhile only: the state that won the race. */
export interface ErrorEnvelope {
  error: {
    code: ErrorCode;
    message: string;
    request_id: string;
    fields?: FieldFault[];
    current?: unknown;
    retry_after_s?: number;
  };
}
