import { describe, expect, it } from 'vitest';
import { countTests, listForbiddenSkips, totalsLine } from './test-totals.mjs';

function report(...files: { status: string; tests: [title: string, status: string][] }[]) {
  return {
    testResults: files.map(({ status, tests }, at) => ({
      name: `file-${at}`,
      status,
      assertionResults: tests.map(([fullName, result]) => ({ fullName, status: result })),
    })),
  };
}

describe('totals of a test run', () => {
  it('counts what passed, failed and was skipped', () => {
    const counts = countTests(
      report({
        status: 'failed',
        tests: [
          ['a', 'passed'],
          ['b', 'failed'],
          ['c', 'skipped'],
          ['d', 'todo'],
        ],
      }),
    );
    expect(totalsLine(counts)).toBe('1 passed, 1 failed, 2 skipped');
  });

  it('counts a file that broke before its tests as a failure', () => {
    expect(totalsLine(countTests(report({ status: 'failed', tests: [] })))).toBe('0 passed, 1 failed');
  });

  it('leaves skipped out of the line when nothing was', () => {
    expect(totalsLine(countTests(report({ status: 'passed', tests: [['a', 'passed']] })))).toBe(
      '1 passed, 0 failed',
    );
  });

  it('lets a skipped test stand only when it names the program that is missing', () => {
    const skips = report({
      status: 'passed',
      tests: [
        ['agrees (needs python3-scipy)', 'skipped'],
        ['later', 'skipped'],
      ],
    });
    expect(listForbiddenSkips(skips)).toEqual(['later']);
  });
});
