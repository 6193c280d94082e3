import { spawnSync } from 'node:child_process';
import { chownSync, mkdirSync } from 'node:fs';
import path from 'node:path';
import { Remedy } from './say.mjs';

/**
 * Who runs PostgreSQL. It refuses to run as root; then it is the `postgres` user that Debian's package makes.
 * @typedef {{uid?: number, gid?: number}} ClusterAccount
 */

/** @returns {ClusterAccount} */
export function clusterAccount() {
  if (process.getuid?.() !== 0) return {};
  return { uid: idOf('-u'), gid: idOf('-g') };
}

/** @param {'-u' | '-g'} which */
function idOf(which) {
  const answer = spawnSync('id', [which, 'postgres'], { encoding: 'utf8' });
  const id = Number.parseInt(answer.stdout, 10);
  if (answer.status !== 0 || !Number.isInteger(id)) {
    throw new Remedy('There is no user `postgres`. Install it with: apt-get install postgresql');
  }
  return id;
}

/**
 * Makes a folder that belongs to the account.
 * @param {string} folder
 * @param {ClusterAccount} account
 */
export function makeOwnFolder(folder, account) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  if (account.uid !== undefined && account.gid !== undefined) chownSync(folder, account.uid, account.gid);
}

/**
 * Whether the account can walk to a folder: a project under /root is closed to everybody else.
 * @param {string} folder
 * @param {ClusterAccount} account
 */
export function isReachable(folder, account) {
  if (account.uid === undefined) return true;
  mkdirSync(folder, { recursive: true });
  const answer = spawnSync('test', ['-x', path.join(folder, '.')], { ...account, stdio: 'ignore', cwd: '/' });
  return answer.status === 0;
}
