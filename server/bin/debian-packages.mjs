import { spawn, spawnSync } from 'node:child_process';
import { Remedy, say } from './say.mjs';

/**
 * @typedef {object} DebianPackage
 * @property {string} name
 * @property {() => boolean} isThere
 * @property {boolean} isOptional when it cannot be installed, what needs it is skipped
 */

/**
 * Installs what is missing when we may; otherwise stops with the command to type.
 * @param {DebianPackage[]} packages
 */
export async function ensureDebianPackages(packages) {
  const missing = packages.filter((one) => !one.isThere());
  if (missing.length === 0) return;
  const names = missing.map((one) => one.name);
  const prefix = privilegePrefix();
  if (prefix === undefined || !hasAptGet()) {
    const remedy = `Install what is missing, then run this again:\n  sudo apt-get install -y ${names.join(' ')}`;
    if (missing.some((one) => !one.isOptional)) throw new Remedy(remedy);
    say(`Going on without ${names.join(', ')}: tests that use them are skipped. ${remedy}`);
    return;
  }
  say(`Installing from Debian: ${names.join(', ')} …`);
  await aptGet(prefix, ['update', '-q']);
  await aptGet(prefix, ['install', '-y', '-q', '--no-install-recommends', ...names]);
}

/** @param {string} name */
export function isInstalled(name) {
  const answer = spawnSync('dpkg-query', ['-W', '-f', '${db:Status-Status}', name], { encoding: 'utf8' });
  return answer.stdout === 'installed';
}

/** Empty for root, sudo when it asks no password, undefined when neither. @returns {string[] | undefined} */
function privilegePrefix() {
  if (process.getuid?.() === 0) return [];
  return spawnSync('sudo', ['-n', 'true'], { stdio: 'ignore' }).status === 0 ? ['sudo', '-n'] : undefined;
}

function hasAptGet() {
  return spawnSync('apt-get', ['--version'], { stdio: 'ignore' }).status === 0;
}

/**
 * In a group of its own and never cut short: half an installation would be left behind.
 * RUNLEVEL=1 keeps a package from starting its service, which we do not use.
 * @param {string[]} prefix
 * @param {string[]} args
 * @returns {Promise<void>}
 */
function aptGet(prefix, args) {
  const [program = 'apt-get', ...rest] = [
    ...prefix,
    'env',
    'DEBIAN_FRONTEND=noninteractive',
    'RUNLEVEL=1',
    'apt-get',
    ...args,
  ];
  return new Promise((resolve, reject) => {
    const child = spawn(program, rest, { detached: true, stdio: ['ignore', 'pipe', 'pipe'] });
    let output = '';
    child.stdout.on('data', (chunk) => (output += chunk));
    child.stderr.on('data', (chunk) => (output += chunk));
    child.on('error', reject);
    child.on('close', (code) => {
      const lastLines = output.trim().split('\n').slice(-12).join('\n');
      if (code === 0) resolve();
      else reject(new Remedy(`apt-get ${args.join(' ')} ended with code ${code}.\n${lastLines}`));
    });
  });
}
