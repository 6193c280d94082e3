import { createHash } from 'node:crypto';
import { readFile, stat } from 'node:fs/promises';
import path from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';
import type { Request, RequestHandler, Response } from 'express';

type Encoding = 'br' | 'gzip';

interface WebFile {
  version: string;
  bytes: Buffer;
  etag: string;
  /** Made when first asked for, then kept. */
  compressed: Partial<Record<Encoding, Promise<Buffer>>>;
}

const compressBrotli = promisify(brotliCompress);
const compressGzip = promisify(gzip);
const CONTENT_TYPES: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.map': 'application/json; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.txt': 'text/plain; charset=utf-8',
  '.ttf': 'font/ttf',
  '.ico': 'image/x-icon',
  '.png': 'image/png',
  '.jpg': 'image/jpeg',
  '.webp': 'image/webp',
};
const COMPRESSIBLE = /\.(html|js|css|json|map|svg|txt|ttf)$/;
/** The web build writes the hash of the content into these names. */
const HASHED_NAME = /[.-][0-9a-f]{20,}\./;
const NO_BUILD = 'The web page is not built yet. Run npm run web:build.';

/** Serves the web build; any path that is no file gets index.html, so that every screen has an address. */
export function serveWebFiles({ folder }: { folder: string }): RequestHandler {
  const root = path.resolve(folder);
  const known = new Map<string, WebFile>();

  async function open(place: string): Promise<WebFile | undefined> {
    const status = await stat(place).catch(() => undefined);
    if (!status?.isFile()) return undefined;
    const version = `${status.mtimeMs}-${status.size}`;
    const earlier = known.get(place);
    if (earlier?.version === version) return earlier;
    const bytes = await readFile(place);
    const etag = `"${createHash('sha256').update(bytes).digest('base64url').slice(0, 27)}"`;
    const file = { version, bytes, etag, compressed: {} };
    known.set(place, file);
    return file;
  }

  return async (request, response, next) => {
    if (request.method !== 'GET' && request.method !== 'HEAD') {
      next();
      return;
    }
    const asked = placeOf(root, request.path);
    const file = asked && (await open(asked));
    if (asked && file) {
      await send(request, response, { file, place: asked });
      return;
    }
    const page = path.join(root, 'index.html');
    const index = await open(page);
    if (index) await send(request, response, { file: index, place: page });
    else response.status(503).type('text/plain').send(NO_BUILD);
  };
}

/** Where a path lies in the build; undefined for the page itself and for anything outside. */
function placeOf(root: string, urlPath: string): string | undefined {
  let decoded: string;
  try {
    decoded = decodeURIComponent(urlPath);
  } catch {
    return undefined;
  }
  if (decoded.includes('\0')) return undefined;
  const place = path.join(root, decoded);
  return place.startsWith(root + path.sep) ? place : undefined;
}

async function send(request: Request, response: Response, { file, place }: { file: WebFile; place: string }) {
  const extension = path.extname(place);
  response.set('Content-Type', CONTENT_TYPES[extension] ?? 'application/octet-stream');
  response.set(
    'Cache-Control',
    HASHED_NAME.test(path.basename(place)) ? 'public, max-age=31536000, immutable' : 'no-cache',
  );
  response.set('ETag', file.etag);
  if (!COMPRESSIBLE.test(place)) {
    response.send(file.bytes);
    return;
  }
  response.vary('Accept-Encoding');
  const accepted = request.acceptsEncodings('br', 'gzip');
  if (accepted !== 'br' && accepted !== 'gzip') {
    response.send(file.bytes);
    return;
  }
  const compressed = await (file.compressed[accepted] ??= compress(file.bytes, accepted));
  response.set('Content-Encoding', accepted);
  response.send(compressed);
}

/** Brotli at 6: its highest level takes seconds for what is a few per cent. */
function compress(bytes: Buffer, encoding: Encoding): Promise<Buffer> {
  return encoding === 'br'
    ? compressBrotli(bytes, { params: { [constants.BROTLI_PARAM_QUALITY]: 6 } })
    : compressGzip(bytes, { level: 9 });
}
