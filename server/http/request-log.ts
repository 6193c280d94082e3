import type { RequestHandler } from 'express';
import type { Logger } from 'pino';
import { newId } from '../db/new-id';

/** Gives each request an id and logs how it ended: no bodies, no queries, no headers, so no secrets. */
export function logRequests(logger: Logger): RequestHandler {
  return (request, response, next) => {
    const requestId = newId();
    const startedMs = performance.now();
    response.locals.requestId = requestId;
    response.set('X-Request-Id', requestId);
    const { method, path } = request;
    response.on('finish', () => {
      logger.info({
        request_id: requestId,
        method,
        path,
        status: response.statusCode,
        duration_ms: Math.round(performance.now() - startedMs),
        user_id: response.locals.userId,
      });
    });
    next();
  };
}
