import { cpSync, existsSync, readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { CACHE_FOLDER, inProject } from './paths.mjs';
import { tryProgram } from './run-program.mjs';
import { Remedy, runScript, say } from './say.mjs';
import { listenForStopRequest } from './stop-request.mjs';
import { ensureNodeModules } from './node-modules.mjs';

/** npm run check: everything that needs neither database nor browser. Each step runs even when one before it failed. */
const stopRequest = listenForStopRequest();
/** @type {string[]} */
const failures = [];

await runScript(async () => {
  await ensureNodeModules();
  await check('types', ['typescript/bin/tsc', '--noEmit', '-p', 'tsconfig.json']);
  await check('lint', ['eslint/bin/eslint.js', '.', '--max-warnings=0']);
  await check('dead code', [inProject('server', 'bin', 'dead-code.mjs')]);
  await check('architecture and unit tests', [
    'vitest/vitest.mjs',
    'run',
    '--project',
    'unit',
    '--project',
    'component',
  ]);
  await checkMigrations();
  if (failures.length > 0) throw new Remedy(`check: ${failures.join(', ')} failed.`);
  say('check: all good.');
});

/** @param {string} name @param {string[]} script and its arguments; a relative one lies in node_modules */
async function check(name, [script = '', ...args]) {
  if (stopRequest.isMade) return;
  const started = Date.now();
  const outcome = await tryProgram(
    process.execPath,
    [path.resolve(inProject('node_modules'), script), ...args],
    {
      env: { VITE_CONFIG_NATIVE_IGNORE_WARNING: 'true' },
    },
  );
  const seconds = ((Date.now() - started) / 1000).toFixed(1);
  say(`${name}: ${outcome.code === 0 ? 'ok' : 'FAILED'} (${seconds} s)`);
  if (outcome.code === 0) return;
  failures.push(name);
  say((outcome.output + outcome.errors).trim());
}

/** Generating migrations from the schema must add nothing; tried in a copy, so that the folder stays as it is. */
async function checkMigrations() {
  if (stopRequest.isMade) return;
  const copy = path.join(CACHE_FOLDER, 'drizzle-check');
  rmSync(copy, { recursive: true, force: true });
  if (existsSync(inProject('drizzle'))) cpSync(inProject('drizzle'), copy, { recursive: true });
  const before = listMigrations(copy);
  const outcome = await tryProgram(process.execPath, [
    inProject('node_modules', 'drizzle-kit', 'bin.cjs'),
    'generate',
    '--dialect=postgresql',
    '--schema=server/db/schema/index.ts',
    `--out=${path.relative(inProject(), copy)}`,
  ]);
  const added = listMigrations(copy).filter((name) => !before.includes(name));
  rmSync(copy, { recursive: true, force: true });
  const isFine = outcome.code === 0 && added.length === 0;
  say(`migrations: ${isFine ? 'ok' : 'FAILED'}`);
  if (isFine) return;
  failures.push('migrations');
  say(
    added.length > 0
      ? 'The schema has changed. Run npm run db:generate and review the SQL.'
      : outcome.output + outcome.errors,
  );
}

/** @param {string} folder */
function listMigrations(folder) {
  return existsSync(folder) ? readdirSync(folder).filter((name) => name.endsWith('.sql')) : [];
}
