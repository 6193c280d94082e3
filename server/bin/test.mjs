import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { ensureDebianPackages } from './debian-packages.mjs';
import { checkNode, ensureNodeModules } from './node-modules.mjs';
import { inProject } from './paths.mjs';
import { PACKAGES_TO_TEST } from './required-packages.mjs';
import { tryProgram } from './run-program.mjs';
import { runScript, say } from './say.mjs';
import { listenForStopRequest } from './stop-request.mjs';
import { openTestCluster } from './test-cluster.mjs';
import { countTests, listForbiddenSkips, totalsLine } from './test-totals.mjs';
import { ensureWebBuild } from './web-build.mjs';

/**
 * npm test: all set-up, one PostgreSQL for the run, then every test. What follows `--` goes to vitest:
 * npm test -- --project http laminates
 */
const args = process.argv.slice(2);
const REPORT = inProject('test-results', 'report.json');
const stopRequest = listenForStopRequest();

await runScript(async () => {
  checkNode();
  await ensureDebianPackages(PACKAGES_TO_TEST);
  await ensureNodeModules();
  if (wants('browser') || wants('recovery')) await ensureWebBuild();
  if (stopRequest.isMade) return;
  const testCluster = wants('http') || wants('browser') ? await openTestCluster() : undefined;
  try {
    if (!stopRequest.isMade) await runTests(testCluster?.cluster.home);
  } finally {
    await testCluster?.close();
  }
});

/** Whether a project takes part: all do unless some are named. @param {string} project */
function wants(project) {
  const named = args.flatMap((arg, at) =>
    args[at - 1] === '--project' ? [arg] : (arg.match(/^--project=(.*)/)?.[1] ?? []),
  );
  return named.length === 0 || named.includes(project);
}

/** @param {string | undefined} clusterHome */
async function runTests(clusterHome) {
  mkdirSync(path.dirname(REPORT), { recursive: true });
  rmSync(REPORT, { force: true });
  const vitest = inProject('node_modules', 'vitest', 'vitest.mjs');
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${REPORT}`];
  const outcome = await tryProgram(process.execPath, [vitest, 'run', ...reporters, ...args], {
    isShown: true,
    env: { TEST_CLUSTER_HOME: clusterHome, VITE_CONFIG_NATIVE_IGNORE_WARNING: 'true' },
  });
  if (stopRequest.isMade) {
    process.exitCode = 130;
    return;
  }
  const report = JSON.parse(readFileSync(REPORT, 'utf8'));
  const counts = countTests(report);
  const forbidden = process.env.CI ? listForbiddenSkips(report) : [];
  for (const title of forbidden) say(`Skipped without naming a missing program: ${title}`);
  if (outcome.code !== 0 && counts.failed === 0)
    say('The run failed outside the tests; see the lines above.');
  if (outcome.code !== 0 || counts.failed > 0 || forbidden.length > 0) process.exitCode = 1;
  say('');
  say(totalsLine(counts));
}
