import { readFileSync } from 'node:fs';
import { readCheckCases, runCase, type CheckCaseFile } from '../../test/reference/check-case-adaptor';

/** `npm run -s check-cases -- FILE`: exit 0 when nothing fails, 1 when a case does, 2 when the file cannot be read. */
function main(path: string | undefined): number {
  if (path === undefined) {
    process.stderr.write('Name a file of check cases: npm run -s check-cases -- FILE\n');
    return 2;
  }
  let file: CheckCaseFile;
  try {
    file = readCheckCases(readFileSync(path, 'utf8'));
  } catch (error) {
    process.stderr.write(`${path}: ${error instanceof Error ? error.message : String(error)}\n`);
    return 2;
  }
  const counts = { passed: 0, failed: 0, skipped: 0 };
  file.cases.forEach((given, i) => {
    const id = String(given?.id ?? `case ${i}`);
    let outcome: ReturnType<typeof runCase>;
    try {
      outcome = runCase(given, file.atol_by_key);
    } catch (error) {
      const got = error instanceof Error ? error.message : String(error);
      outcome = { status: 'failed', mismatches: [{ path: '', expected: 'a case of the known shape', got }] };
    }
    counts[outcome.status] += 1;
    if (outcome.status !== 'failed') return;
    for (const mismatch of outcome.mismatches) {
      process.stdout.write(
        `${id} ${mismatch.path || '(whole)'}: expected ${JSON.stringify(mismatch.expected)}, ` +
          `got ${JSON.stringify(mismatch.got)}\n`,
      );
    }
  });
  process.stdout.write(`${counts.passed} passed, ${counts.failed} failed, ${counts.skipped} skipped\n`);
  return counts.failed > 0 ? 1 : 0;
}

process.exitCode = main(process.argv[2]);
