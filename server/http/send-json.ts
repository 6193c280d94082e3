import { promisify } from 'node:util';
import { constants, gzip } from 'node:zlib';
import type { Request, Response } from 'express';

const compress = promisify(gzip);
const WORTH_COMPRESSING = 4_000;

/**
 * Sends JSON text, compressed where that is worth it. Never from a cache: an ETag here names the revision for
 * If-Match, and a study's answer may change while its revision does not.
 */
export async function sendJson(request: Request, response: Response, json: string): Promise<void> {
  response.set('Content-Type', 'application/json; charset=utf-8');
  response.set('Cache-Control', 'no-store');
  response.vary('Accept-Encoding');
  if (json.length < WORTH_COMPRESSING || request.acceptsEncodings('gzip') !== 'gzip') {
    response.end(json);
    return;
  }
  const body = await compress(json, { level: constants.Z_BEST_SPEED });
  response.set('Content-Encoding', 'gzip');
  response.end(body);
}
