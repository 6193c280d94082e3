import { readFileSync, readdirSync, readlinkSync } from 'node:fs';

/** State of a listening socket in /proc/net/tcp. */
const LISTENING = '0A';

/**
 * Whether this very process listens on the port: another clone's server may answer there just as well.
 * @param {number} pid
 * @param {number} port
 */
export function isListeningOn(pid, port) {
  const inodes = listeningInodes(port);
  try {
    const folder = `/proc/${pid}/fd`;
    return readdirSync(folder).some((name) => inodes.has(inodeOf(`${folder}/${name}`)));
  } catch {
    return false;
  }
}

/** @param {number} port @returns {Set<string | undefined>} */
function listeningInodes(port) {
  const wanted = `:${port.toString(16).toUpperCase().padStart(4, '0')}`;
  const rows = ['/proc/net/tcp', '/proc/net/tcp6']
    .flatMap((file) => readLines(file))
    .map((line) => line.trim().split(/\s+/));
  return new Set(rows.filter((row) => row[1]?.endsWith(wanted) && row[3] === LISTENING).map((row) => row[9]));
}

/** @param {string} descriptor */
function inodeOf(descriptor) {
  try {
    return /^socket:\[(\d+)\]$/.exec(readlinkSync(descriptor))?.[1] ?? 'none';
  } catch {
    return 'none';
  }
}

/** @param {string} file */
function readLines(file) {
  try {
    return readFileSync(file, 'utf8').split('\n').slice(1);
  } catch {
    return [];
  }
}
