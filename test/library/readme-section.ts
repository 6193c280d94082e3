import { readFileSync } from 'node:fs';

const README = new URL('../../README.md', import.meta.url);

/** The README's section "How far to trust it", as written. */
export function readTrustSection(): string {
  const section = readFileSync(README, 'utf8')
    .split(/^## /m)
    .find((part) => part.startsWith('How far to trust it'));
  if (section === undefined) throw new Error('README.md has no section "How far to trust it".');
  return section;
}

/** Cells of the one table in that section whose header begins with these words; the header left out. */
export function readTrustTable(firstHeader: string): string[][] {
  const lines = readTrustSection().split('\n');
  const start = lines.findIndex((line) => line.startsWith('|') && cellsOf(line)[0] === firstHeader);
  if (start < 0) throw new Error(`README.md: no table headed "${firstHeader}" in "How far to trust it".`);
  const afterRule = lines.slice(start + 2);
  const end = afterRule.findIndex((line) => !line.startsWith('|'));
  return afterRule.slice(0, end < 0 ? undefined : end).map(cellsOf);
}

const cellsOf = (line: string): string[] =>
  line
    .replace(/^\||\|\s*$/g, '')
    .split('|')
    .map((cell) => cell.trim());
