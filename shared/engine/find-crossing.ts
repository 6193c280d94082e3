/** Where a search for a crossing ended: the last two arguments, on either side of it, and what it cost. */
export interface Crossing {
  below: number;
  above: number;
  evaluations: number;
}

/**
 * Narrows a bracket in which `value` goes from negative (at `below`) to zero or more (at `above`, which may be the
 * smaller number), to a width of `tolerance`. By ITP (Oliveira & Takahashi, ACM Trans. Math. Softw. 47 (2021) 5):
 * as quick as the secant where the function is smooth, and never slower than halving, whatever it is: shelf lives
 * jump where a step between legs reaches a limit, and are cut off at a horizon.
 * Range: value(below) < 0 ≤ value(above). Cost: at most one evaluation more than halving.
 */
export function narrowCrossing(
  value: (x: number) => number,
  bracket: { below: number; above: number; valueBelow: number; valueAbove: number },
  tolerance: number,
): Crossing {
  let { below, above, valueBelow, valueAbove } = bracket;
  const width = Math.abs(above - below);
  const halvings = Math.max(0, Math.ceil(Math.log2(width / tolerance)));
  const k1 = 0.2 / width;
  let evaluations = 0;
  for (let j = 0; Math.abs(above - below) > tolerance && j <= halvings + 1; j++) {
    const span = Math.abs(above - below);
    const middle = (below + above) / 2;
    const spare = Math.max(0, (tolerance / 2) * 2 ** (halvings + 1 - j) - span / 2);
    const falsi = (valueAbove * below - valueBelow * above) / (valueAbove - valueBelow);
    const side = Math.sign(middle - falsi);
    const reach = k1 * span * span;
    const truncated = reach <= Math.abs(middle - falsi) ? falsi + side * reach : middle;
    const x = Math.abs(truncated - middle) <= spare ? truncated : middle - side * spare;
    if (x === below || x === above) break;
    const at = value(x);
    evaluations += 1;
    if (at >= 0) {
      above = x;
      valueAbove = at;
    } else {
      below = x;
      valueBelow = at;
    }
  }
  return { below, above, evaluations };
}

/**
 * Every crossing of zero of a function on a grid, ascending, also where it is not monotone: between neighbours of
 * different sign, and at a summit or valley between grid points that the grid itself does not show (found by golden
 * section when it is within `near` of zero). `isUp`: from negative to zero or more.
 */
export function findCrossings(
  value: (x: number) => number,
  grid: number[],
  options: { tolerance: number; near: number },
): { at: number; isUp: boolean }[] {
  const { tolerance, near } = options;
  let points = grid.map((x) => ({ x, y: value(x) }));
  const hidden: typeof points = [];
  for (let i = 1; i + 1 < points.length; i++) {
    const [left, here, right] = [points[i - 1], points[i], points[i + 1]];
    const isNegative = here.y < 0;
    if ([left, right].some(({ y }) => y < 0 !== isNegative) || Math.abs(here.y) > near) continue;
    const sign = isNegative ? 1 : -1;
    if (sign * here.y < sign * left.y || sign * here.y < sign * right.y || left.y === right.y) continue;
    const summit = goldenSummit((x) => sign * value(x), left.x, right.x);
    if (summit.y >= 0 === isNegative) hidden.push({ x: summit.x, y: sign * summit.y });
  }
  points = [...points, ...hidden].sort((a, b) => a.x - b.x);
  const crossings: { at: number; isUp: boolean }[] = [];
  for (let i = 1; i < points.length; i++) {
    const [left, right] = [points[i - 1], points[i]];
    if (left.y < 0 === right.y < 0) continue;
    const isUp = left.y < 0;
    const [low, high] = isUp ? [left, right] : [right, left];
    const found = narrowCrossing(
      value,
      { below: low.x, above: high.x, valueBelow: low.y, valueAbove: high.y },
      tolerance,
    );
    crossings.push({ at: found.above, isUp });
  }
  return crossings;
}

/** Highest of a function with one summit in between. */
function goldenSummit(value: (x: number) => number, from: number, to: number): { x: number; y: number } {
  const ratio = (Math.sqrt(5) - 1) / 2;
  let a = from;
  let b = to;
  let x1 = b - ratio * (b - a);
  let x2 = a + ratio * (b - a);
  let y1 = value(x1);
  let y2 = value(x2);
  for (let section = 0; section < 25 && y1 < 0 && y2 < 0; section++) {
    if (y1 < y2) {
      a = x1;
      x1 = x2;
      y1 = y2;
      x2 = a + ratio * (b - a);
      y2 = value(x2);
    } else {
      b = x2;
      x2 = x1;
      y2 = y1;
      x1 = b - ratio * (b - a);
      y1 = value(x1);
    }
  }
  return y1 > y2 ? { x: x1, y: y1 } : { x: x2, y: y2 };
}
