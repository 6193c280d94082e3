import { existsSync, readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { Remedy } from './say.mjs';

const DEBIAN_FOLDER = '/usr/lib/postgresql';

/** Majors of PostgreSQL whose server is installed, newest first. */
export function installedMajors() {
  if (!existsSync(DEBIAN_FOLDER)) return [];
  return readdirSync(DEBIAN_FOLDER)
    .map(Number)
    .filter((major) => existsSync(path.join(DEBIAN_FOLDER, String(major), 'bin', 'postgres')))
    .sort((one, other) => other - one);
}

/**
 * The folder of programs that fits an existing cluster, or the newest for a new one.
 * @param {string} clusterFolder
 */
export function programFolder(clusterFolder) {
  const majors = installedMajors();
  const versionFile = path.join(clusterFolder, 'PG_VERSION');
  if (!existsSync(versionFile)) {
    if (majors[0] === undefined) {
      throw new Remedy('PostgreSQL is missing. Install it with: apt-get install postgresql');
    }
    return path.join(DEBIAN_FOLDER, String(majors[0]), 'bin');
  }
  const wanted = Number(readFileSync(versionFile, 'utf8'));
  if (!majors.includes(wanted)) {
    throw new Remedy(
      `The data in ${clusterFolder} belong to PostgreSQL ${wanted}. Install it: apt-get install postgresql-${wanted}`,
    );
  }
  return path.join(DEBIAN_FOLDER, String(wanted), 'bin');
}
