import { STATUS_BY_CODE, type ErrorCode, type FieldFault } from '../../shared/errors/error-code';

interface AppErrorDetails {
  fields?: FieldFault[];
  /** The state that won the race, for edited_meanwhile. */
  current?: unknown;
  retryAfterS?: number;
  cause?: unknown;
}

/** A request that ends badly in a way the API knows. The message is for people; the log gets the cause as well. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly details: AppErrorDetails;

  constructor(code: ErrorCode, message: string, details: AppErrorDetails = {}) {
    super(message, { cause: details.cause });
    this.name = 'AppError';
    this.code = code;
    this.details = details;
  }

  get status(): number {
    return STATUS_BY_CODE[this.code];
  }
}

/** Wrong role, another account, not there, malformed id: all the same, so that nothing can be told apart. */
export function notFound(): AppError {
  return new AppError('not_found', 'There is nothing here, or it is not yours to see.');
}

export function inputInvalid(fields: FieldFault[]): AppError {
  const message =
    fields.length === 1 ? (fields[0]?.message ?? '') : `${fields.length} fields need another value.`;
  return new AppError('input_invalid', message, { fields });
}

export function editedMeanwhile(current: unknown): AppError {
  return new AppError(
    'edited_meanwhile',
    'Somebody saved a newer revision meanwhile. Compare, then save on top of it.',
    {
      current,
    },
  );
}
