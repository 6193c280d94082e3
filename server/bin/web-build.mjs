import { existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { inProject } from './paths.mjs';
import { findRecordedProcess, forgetProcess, recordProcess } from './process-record.mjs';
import { cacheEnv, runProgram } from './run-program.mjs';
import { runScript, say } from './say.mjs';
import { hashWebInputs } from './web-inputs.mjs';
import { FIRST_SCREEN_BUDGET_KB, measureFirstScreen } from './web-size.mjs';

const BUILD = inProject('dist');
const STAMP = path.join(BUILD, '.inputs-hash');
/** Built here and swapped in when complete; inside .expo, which is ignored. */
const UNFINISHED = path.join('.expo', 'web-build');
const BUILD_RECORD = inProject('.expo', 'web-build-process.json');

/** Builds the web client when its inputs have changed since the last build. */
export async function ensureWebBuild() {
  await waitForOtherBuild();
  const hash = hashWebInputs();
  if (existsSync(STAMP) && readFileSync(STAMP, 'utf8') === hash) return;
  await buildWeb(hash);
}

/** @param {string} [hash] */
async function buildWeb(hash = hashWebInputs()) {
  say('Building the web client (about half a minute) …');
  recordProcess(BUILD_RECORD, process.pid);
  try {
    rmSync(inProject(UNFINISHED), { recursive: true, force: true });
    await runProgram(
      process.execPath,
      [inProject('node_modules', 'expo', 'bin', 'cli'), 'export', '-p', 'web', '--output-dir', UNFINISHED],
      { env: { ...cacheEnv(), CI: '1', EXPO_NO_TELEMETRY: '1', EXPO_OFFLINE: '1', NODE_ENV: 'production' } },
    );
    writeFileSync(path.join(inProject(UNFINISHED), '.inputs-hash'), hash);
    rmSync(BUILD, { recursive: true, force: true });
    renameSync(inProject(UNFINISHED), BUILD);
  } finally {
    rmSync(inProject(UNFINISHED), { recursive: true, force: true });
    forgetProcess(BUILD_RECORD);
  }
  const { kilobytes } = measureFirstScreen(BUILD);
  const verdict = kilobytes <= FIRST_SCREEN_BUDGET_KB ? 'within' : 'over';
  say(
    `The first screen loads ${kilobytes.toFixed(0)} kB of JavaScript gzipped, ${verdict} the ${FIRST_SCREEN_BUDGET_KB} kB allowed.`,
  );
}

/** Two test runs in one folder share one build. */
async function waitForOtherBuild() {
  while (findRecordedProcess(BUILD_RECORD)) await sleep(200);
}

if (process.argv[1] === inProject('server', 'bin', 'web-build.mjs')) await runScript(() => buildWeb());
