import type { Request } from 'express';
import { AppError } from './app-error';

/** A write that carries a cookie must come from our own pages: Origin must be there and match. */
export function checkOrigin(request: Request, allowedOrigins: readonly string[]): void {
  const origin = request.get('Origin');
  const hasCookie = request.headers.cookie !== undefined;
  const isRefused = origin === undefined ? hasCookie : !allowedOrigins.includes(origin);
  if (isRefused) {
    throw new AppError(
      'origin_refused',
      `This page may not write here. Open ${allowedOrigins[0] ?? 'the product'} and try again.`,
    );
  }
}

/** The public address; on loopback also its other names, since people type either. */
export function originsOf(publicUrl: string): string[] {
  const url = new URL(publicUrl);
  const loopback = ['127.0.0.1', 'localhost', '[::1]'];
  if (!loopback.includes(url.hostname)) return [url.origin];
  const port = url.port === '' ? '' : `:${url.port}`;
  const others = loopback.map((host) => `${url.protocol}//${host}${port}`);
  return [url.origin, ...others.filter((other) => other !== url.origin)];
}
