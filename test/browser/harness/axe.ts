import { readFileSync } from 'node:fs';
import type { AxeResults } from 'axe-core';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';

const AXE_SOURCE = readFileSync(require.resolve('axe-core/axe.min.js'), 'utf8');
const RULE_SETS = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/** Runs axe on the page as it stands; every violation is told with its elements and axe's remedy. */
export async function expectNoAxeViolations(page: Page): Promise<void> {
  await page.evaluate(AXE_SOURCE);
  const results = await page.evaluate(
    (ruleSets) =>
      (window as unknown as { axe: { run: (options: object) => Promise<AxeResults> } }).axe.run({
        runOnly: { type: 'tag', values: ruleSets },
        resultTypes: ['violations'],
      }),
    RULE_SETS,
  );
  const violations = results.violations.map(
    (one) =>
      `${one.id}: ${one.help}\n${one.nodes.map((node) => `    ${node.html}\n    ${node.failureSummary}`).join('\n')}`,
  );
  expect(violations, `axe at ${page.url()}`).toEqual([]);
}
