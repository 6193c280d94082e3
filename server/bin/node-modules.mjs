import { createHash } from 'node:crypto';
import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { inProject } from './paths.mjs';
import { runProgram } from './run-program.mjs';
import { Remedy, say } from './say.mjs';

/** Written after our own npm ci: the lock file that node_modules belongs to. */
const STAMP = inProject('node_modules', '.larderline-lock-hash');
/** npm's own record, there after every complete installation. */
const NPM_RECORD = inProject('node_modules', '.package-lock.json');
const LOCK = inProject('package-lock.json');

export function checkNode() {
  const major = Number(process.versions.node.split('.')[0]);
  if (major !== 20) {
    throw new Remedy(
      `Larderline runs on Node 20; this is ${process.version}. Install Node 20 and run this again.`,
    );
  }
}

/** Installs when node_modules is missing, incomplete or older than the lock file. */
export async function ensureNodeModules() {
  if (isUpToDate()) return;
  say('Installing node_modules with npm ci (about half a minute) …');
  await runProgram('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], {
    env: { NODE_ENV: undefined },
  });
  writeFileSync(STAMP, lockHash());
}

function isUpToDate() {
  if (!existsSync(NPM_RECORD)) return false;
  if (existsSync(STAMP) && readFileSync(STAMP, 'utf8') === lockHash()) return true;
  return statSync(NPM_RECORD).mtimeMs >= statSync(LOCK).mtimeMs;
}

function lockHash() {
  return createHash('sha256').update(readFileSync(LOCK)).digest('hex');
}
