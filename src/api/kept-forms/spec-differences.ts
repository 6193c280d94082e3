import { formatExact } from '../../../shared/units/format';

export interface SpecDifference {
  field: string;
  mine: string;
  theirs: string;
}

/** Leaves in which two specs differ, by their path in words; what was typed and where it came from are left aside. */
export function specDifferences(mine: unknown, theirs: unknown): SpecDifference[] {
  const own = leavesOf(mine);
  const other = leavesOf(theirs);
  const paths = [...new Set([...own.keys(), ...other.keys()])];
  return paths
    .filter((path) => own.get(path) !== other.get(path))
    .map((path) => ({
      field: pathInWords(path),
      mine: own.get(path) ?? '–',
      theirs: other.get(path) ?? '–',
    }));
}

const LEFT_ASIDE = new Set(['typed', 'provenance']);

function leavesOf(value: unknown, path = '', leaves = new Map<string, string>()): Map<string, string> {
  if (Array.isArray(value)) {
    value.forEach((entry, index) => leavesOf(entry, `${path} ${index + 1}`, leaves));
  } else if (typeof value === 'object' && value !== null) {
    for (const [key, entry] of Object.entries(value)) {
      if (!LEFT_ASIDE.has(key)) leavesOf(entry, path === '' ? key : `${path}, ${key}`, leaves);
    }
  } else if (value !== undefined && value !== null) {
    leaves.set(path, typeof value === 'number' ? formatExact(value) : String(value));
  }
  return leaves;
}

function pathInWords(path: string): string {
  return path.replace(/_/g, ' ');
}
