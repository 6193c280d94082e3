import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';

/**
 * What was started is written down as pid and start time, so that a later start can end orphans without ever
 * touching a stranger that happens to have the same number.
 * @typedef {{pid: number, bootId: string, startTicks: string, note?: string}} ProcessRecord
 */

/**
 * @param {string} file
 * @param {number} pid
 * @param {string} [note]
 */
export function recordProcess(file, pid, note) {
  const startTicks = startTicksOf(pid);
  if (startTicks === undefined) return;
  mkdirSync(path.dirname(file), { recursive: true });
  writeFileSync(file, JSON.stringify({ pid, bootId: bootId(), startTicks, note }));
}

/** The recorded process when it still runs. @param {string} file @returns {ProcessRecord | undefined} */
export function findRecordedProcess(file) {
  /** @type {ProcessRecord} */
  let record;
  try {
    record = JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
  const isSame = record.bootId === bootId() && startTicksOf(record.pid) === record.startTicks;
  return isSame ? record : undefined;
}

/** @param {string} file */
export function forgetProcess(file) {
  rmSync(file, { force: true });
}

/**
 * Ends a recorded process and its group: first politely, then not. Returns whether there was one.
 * @param {string} file
 * @param {{politeSignal: NodeJS.Signals, patienceMs: number}} manner
 */
export async function endRecordedProcess(file, { politeSignal, patienceMs }) {
  const record = findRecordedProcess(file);
  if (record) {
    signal(record.pid, politeSignal);
    const deadline = Date.now() + patienceMs;
    while (findRecordedProcess(file) && Date.now() < deadline) await sleep(50);
    signal(-record.pid, 'SIGKILL');
    while (findRecordedProcess(file)) await sleep(50);
  }
  forgetProcess(file);
  return record !== undefined;
}

/** @param {number} pid @param {NodeJS.Signals} name */
function signal(pid, name) {
  try {
    process.kill(pid, name);
  } catch {
    // It ended by itself in between.
  }
}

/**
 * Field 22 of /proc/<pid>/stat; undefined when the process is gone or only waits to be collected (state Z).
 * @param {number} pid
 */
function startTicksOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The second field is the program's name in brackets and may itself hold spaces.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' ? undefined : fields[19];
  } catch {
    return undefined;
  }
}

function bootId() {
  return readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim();
}
