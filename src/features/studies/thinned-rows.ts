const MOST_TABLE_ROWS = 24;

/** Indices of a course's points for a table: the first, the last, and evenly between. */
export function thinned(count: number): number[] {
  if (count <= MOST_TABLE_ROWS) return Array.from({ length: count }, (_, index) => index);
  const step = (count - 1) / (MOST_TABLE_ROWS - 1);
  return Array.from({ length: MOST_TABLE_ROWS }, (_, row) => Math.round(row * step));
}
