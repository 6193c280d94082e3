import { createHash } from 'node:crypto';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's own folder: everything else is found from here, so that two clones never meet. */
export const ROOT = path.resolve(fileURLToPath(new URL('../..', import.meta.url)));

if (existsSync(path.join(ROOT, '.env'))) process.loadEnvFile(path.join(ROOT, '.env'));

/** What outlives a run: the database, its passwords, backups, logs. DATA_DIR moves it elsewhere. */
export const DATA_FOLDER = path.resolve(ROOT, process.env.DATA_DIR ?? '.data');
export const BACKUP_FOLDER = path.join(DATA_FOLDER, 'backups');
export const LOG_FOLDER = path.join(DATA_FOLDER, 'logs');
/** Caches of tsx and Metro: kept here instead of in the machine's temporary folder, where clones would share them. */
export const CACHE_FOLDER = path.join(DATA_FOLDER, 'cache');
export const RUN_FOLDER = path.join(DATA_FOLDER, 'run');
export const TEST_FOLDER = path.join(DATA_FOLDER, 'postgres-test');

/** @param {string[]} parts */
export function inProject(...parts) {
  return path.join(ROOT, ...parts);
}

/** Names a folder outside the project after the project's place. @param {string} folder */
export function shortHash(folder) {
  return createHash('sha256').update(folder).digest('hex').slice(0, 12);
}
