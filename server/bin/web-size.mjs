import { readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';

/** The most JavaScript, gzipped, that the first screen may load. */
export const FIRST_SCREEN_BUDGET_KB = 450;

/** What a stranger's first visit walks through: the start redirects to the sign-in page. */
const FIRST_ROUTES = ['./_layout.tsx', './index.tsx', './(outside)/_layout.tsx', './(outside)/sign-in.tsx'];
const CHUNK_FOLDER = path.join('_expo', 'static', 'js', 'web');

/**
 * Gzipped size of what the first screen loads: the scripts of index.html and the chunks of the first routes.
 * A browser test measures the same in Chromium.
 * @param {string} folder the web build
 * @returns {{kilobytes: number, files: {name: string, kilobytes: number}[]}} in units of 1000 bytes
 */
export function measureFirstScreen(folder) {
  const page = readFileSync(path.join(folder, 'index.html'), 'utf8');
  const named = [...page.matchAll(/<script[^>]+src="\/?([^"]+\.js)"/g)].flatMap((match) => match[1] ?? []);
  const files = [...new Set([...named, ...findRouteChunks(folder)])].map((name) => ({
    name: path.basename(name),
    kilobytes: gzipSync(readFileSync(path.join(folder, name))).length / 1000,
  }));
  return { kilobytes: files.reduce((sum, file) => sum + file.kilobytes, 0), files };
}

/**
 * The entry holds a map from route files to places in a dependency list, and with the list the addresses of chunks.
 * @param {string} folder
 * @returns {string[]}
 */
function findRouteChunks(folder) {
  const entryName =
    readdirSync(path.join(folder, CHUNK_FOLDER)).find((name) => /^entry-.*\.js$/.test(name)) ?? '';
  const entry = readFileSync(path.join(folder, CHUNK_FOLDER, entryName), 'utf8');
  const list = /\{"0":[^{}]*"paths":\{[^{}]*\}\}/.exec(entry)?.[0];
  if (list === undefined)
    throw new Error('The web build names no route chunks; server/bin/web-size.mjs reads another format.');
  const { paths, ...modules } = JSON.parse(list);
  const routes = [
    ...entry.matchAll(/"(\.\/[^"]+\.tsx)":\{enumerable:!0,get:\(\)=>\w+\(\w+\[\d+\]\)\(\w+\[(\d+)\]/g),
  ];
  return routes
    .filter(([, route]) => FIRST_ROUTES.includes(route ?? ''))
    .flatMap(([, , place]) => paths[modules[place ?? '']] ?? [])
    .map((address) => address.replace(/^\//, ''));
}
