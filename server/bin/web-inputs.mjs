import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, statSync } from 'node:fs';
import path from 'node:path';
import { inProject } from './paths.mjs';

/** Everything that ends up in the web build. */
export const WEB_INPUTS = [
  'app',
  'src',
  'shared',
  'assets',
  'package-lock.json',
  'app.json',
  'babel.config.js',
];

/** SHA-256 over the paths and bytes of the inputs; tests are no input. */
export function hashWebInputs() {
  const hash = createHash('sha256');
  for (const file of WEB_INPUTS.flatMap((name) => listFiles(inProject(name))).sort()) {
    hash.update(`${path.relative(inProject(), file)}\0`);
    hash.update(readFileSync(file));
    hash.update('\0');
  }
  return hash.digest('hex');
}

/** @param {string} place @returns {string[]} */
function listFiles(place) {
  if (!existsSync(place)) return [];
  if (!statSync(place).isDirectory()) return [place];
  return readdirSync(place)
    .filter((name) => !/\.test\.tsx?$/.test(name))
    .flatMap((name) => listFiles(path.join(place, name)));
}
