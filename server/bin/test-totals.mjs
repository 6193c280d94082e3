/**
 * The parts of vitest's JSON report that are read here.
 * @typedef {object} Report
 * @property {{name: string, status: string, assertionResults: {status: string, fullName: string}[]}[]} testResults
 */

/** @typedef {{passed: number, failed: number, skipped: number}} TestCounts */

const SKIPPED = ['pending', 'skipped', 'todo', 'disabled'];
/** A test may be skipped only when its title says which outside program is missing. */
const MISSING_PROGRAM = /\bneeds (chromium|python3-scipy|units|octave|r-base)\b/;

/**
 * A file that fails before any of its tests ran counts as one failure: it must not vanish from the totals.
 * @param {Report} report
 * @returns {TestCounts}
 */
export function countTests(report) {
  const results = report.testResults.flatMap((file) => file.assertionResults);
  const failedTests = results.filter((result) => result.status === 'failed').length;
  const brokenFiles = report.testResults.filter(
    (file) => file.status === 'failed' && !file.assertionResults.some((result) => result.status === 'failed'),
  ).length;
  return {
    passed: results.filter((result) => result.status === 'passed').length,
    failed: failedTests + brokenFiles,
    skipped: results.filter((result) => SKIPPED.includes(result.status)).length,
  };
}

/** @param {TestCounts} counts */
export function totalsLine({ passed, failed, skipped }) {
  return `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`;
}

/** @param {Report} report */
export function listForbiddenSkips(report) {
  return report.testResults
    .flatMap((file) => file.assertionResults)
    .filter((result) => SKIPPED.includes(result.status) && !MISSING_PROGRAM.test(result.fullName))
    .map((result) => result.fullName);
}
