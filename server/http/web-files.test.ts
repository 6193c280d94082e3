import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import express from 'express';
import request from 'supertest';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { serveWebFiles } from './web-files';

const HASHED = '/_expo/static/js/web/entry-0123456789abcdef0123456789abcdef.js';
let outside: string;
let app: express.Express;

beforeAll(() => {
  outside = mkdtempSync(path.join(tmpdir(), 'web-files-'));
  const folder = path.join(outside, 'dist');
  mkdirSync(path.join(folder, path.dirname(HASHED)), { recursive: true });
  writeFileSync(path.join(folder, 'index.html'), '<title>page</title>');
  writeFileSync(path.join(folder, HASHED), 'x'.repeat(10_000));
  writeFileSync(path.join(outside, 'secret.txt'), 'secret');
  mkdirSync(path.join(outside, 'dist-other'));
  writeFileSync(path.join(outside, 'dist-other', 'secret.txt'), 'secret');
  app = express();
  app.use(serveWebFiles({ folder }));
});
afterAll(() => rmSync(outside, { recursive: true }));

it('lets hashed files be kept for ever and asks each time for the page', async () => {
  const hashed = await request(app).get(HASHED);
  expect(hashed.headers['cache-control']).toBe('public, max-age=31536000, immutable');
  const page = await request(app).get('/');
  expect(page.headers['cache-control']).toBe('no-cache');
  const again = await request(app)
    .get('/')
    .set('If-None-Match', page.headers.etag ?? '');
  expect(again.status).toBe(304);
});

it('compresses', async () => {
  for (const encoding of ['br', 'gzip']) {
    const answer = await request(app)
      .get(HASHED)
      .set('Accept-Encoding', encoding)
      .buffer(true)
      .parse((_response, done) => done(null, ''));
    expect(answer.headers['content-encoding']).toBe(encoding);
    expect(Number(answer.headers['content-length'])).toBeLessThan(200);
  }
});

it('answers unknown paths with the page and never leaves its folder', async () => {
  for (const asked of [
    '/a/tannhollow/studies',
    '/..%2fsecret.txt',
    '/%2e%2e/secret.txt',
    '/..%2fdist-other/secret.txt',
    '/%00',
    '/%E0%A4%A',
  ]) {
    const answer = await request(app).get(asked);
    expect(answer.text, asked).toBe('<title>page</title>');
  }
});
