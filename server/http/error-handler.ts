import type { ErrorRequestHandler, RequestHandler, Response } from 'express';
import type { Logger } from 'pino';
import { InputError } from '../../shared/engine';
import type { ErrorEnvelope } from '../../shared/errors/error-code';
import { isDatabaseSilent } from '../db/database-trouble';
import { AppError, inputInvalid, notFound } from './app-error';

/** Unknown paths under /api: JSON, never the page. */
export const answerUnknownPath: RequestHandler = () => {
  throw notFound();
};

/** The one place where an error becomes an answer. */
export function handleErrors(logger: Logger): ErrorRequestHandler {
  // Express tells an error handler by its four parameters.
  // eslint-disable-next-line max-params
  return (error: unknown, request, response, next) => {
    const appError = asAppError(error);
    if (appError.code === 'internal' || appError.code === 'database_silent') {
      logger.error({ err: error, request_id: response.locals.requestId, path: request.path }, appError.code);
    }
    if (response.headersSent) {
      next(error);
      return;
    }
    sendError(response, appError);
  };
}

function sendError(response: Response, { code, status, message, details }: AppError) {
  const envelope: ErrorEnvelope = {
    error: {
      code,
      message,
      request_id: String(response.locals.requestId),
      ...(details.fields && { fields: details.fields }),
      ...(details.current !== undefined && { current: details.current }),
      ...(details.retryAfterS !== undefined && { retry_after_s: details.retryAfterS }),
    },
  };
  if (details.retryAfterS !== undefined) response.set('Retry-After', String(details.retryAfterS));
  response.removeHeader('ETag');
  response.set('Cache-Control', 'no-store');
  response.status(status).json(envelope);
}

function asAppError(error: unknown): AppError {
  if (error instanceof AppError) return error;
  if (error instanceof InputError) {
    const value = typeof error.value === 'object' ? undefined : error.value;
    return inputInvalid([{ path: error.path, value, message: error.message }]);
  }
  if (isDatabaseSilent(error)) {
    return new AppError(
      'database_silent',
      'The database does not answer. Nothing was lost; try again in a moment.',
      {
        cause: error,
      },
    );
  }
  return (
    fromBodyParser(error) ??
    new AppError('internal', 'Something went wrong on our side. Try again in a moment.', { cause: error })
  );
}

/** What Express and its body parser throw about the request itself. */
function fromBodyParser(error: unknown): AppError | undefined {
  if (!(error instanceof Error)) return undefined;
  if (error instanceof URIError) return notFound();
  const status = 'status' in error ? error.status : undefined;
  if (status === 413)
    return new AppError(
      'file_too_large',
      'The request is larger than this address takes (1 MB, or 10 kB before signing in). Send less at once.',
    );
  const type = 'type' in error ? error.type : undefined;
  if (type === 'entity.parse.failed') {
    return inputInvalid([
      { path: '', message: 'This is not JSON. Numbers must be finite, names in double quotes.' },
    ]);
  }
  const isClientFault = typeof status === 'number' && status >= 400 && status < 500;
  return isClientFault
    ? inputInvalid([{ path: '', message: 'The request could not be read. Send JSON in UTF-8.' }])
    : undefined;
}
