/**
 * Polynomials of degree 8 through the Chebyshev–Lobatto points of [0, 1]: interpolation, integration from 0,
 * differentiation. A step of the moisture march is one such interval. Source: Clenshaw & Curtis, Numer. Math. 2
 * (1960) 197. Tables are worked out once.
 */
export const DEGREE = 8;
const COUNT = DEGREE + 1;

/** Points of [0, 1], ascending. */
export const NODES = Float64Array.from(
  { length: COUNT },
  (_, k) => (1 - Math.cos((Math.PI * k) / DEGREE)) / 2,
);

/** Values at the nodes → Chebyshev coefficients. */
const TO_COEFFICIENTS = new Float64Array(COUNT * COUNT);
for (let j = 0; j < COUNT; j++) {
  for (let k = 0; k < COUNT; k++) {
    const halves = (j === 0 || j === DEGREE ? 0.5 : 1) * (k === 0 || k === DEGREE ? 0.5 : 1);
    // Node k of [0, 1] is cos(π(DEGREE − k)/DEGREE) on [−1, 1].
    TO_COEFFICIENTS[j * COUNT + k] =
      ((2 * halves) / DEGREE) * Math.cos((Math.PI * j * (DEGREE - k)) / DEGREE);
  }
}

/** Derivatives at node k = Σ DIFFERENTIATION[k·9 + j] · value at node j, on [0, 1]. */
export const DIFFERENTIATION = new Float64Array(COUNT * COUNT);
{
  const weight = (k: number): number => (k === 0 || k === DEGREE ? 0.5 : 1) * (k % 2 === 0 ? 1 : -1);
  for (let k = 0; k < COUNT; k++) {
    let sum = 0;
    for (let j = 0; j < COUNT; j++) {
      if (j === k) continue;
      const entry = weight(j) / weight(k) / (NODES[k] - NODES[j]);
      DIFFERENTIATION[k * COUNT + j] = entry;
      sum += entry;
    }
    DIFFERENTIATION[k * COUNT + k] = -sum;
  }
}

/** Coefficients of the polynomial through `values` at the nodes. */
export function fit(values: Float64Array, coefficients: Float64Array): void {
  for (let j = 0; j < COUNT; j++) {
    let sum = 0;
    for (let k = 0; k < COUNT; k++) sum += TO_COEFFICIENTS[j * COUNT + k] * values[k];
    coefficients[j] = sum;
  }
}

/** What the last two coefficients leave open: how far the polynomial may be from the function. */
export function openEnd(coefficients: Float64Array): number {
  return Math.abs(coefficients[DEGREE]) + Math.abs(coefficients[DEGREE - 1]);
}

/**
 * The points of degree 4 (every second one) and of degree 2 (every fourth) are among those of degree 8, so a step may
 * be tried with few of them and the others filled in by the polynomial through those few.
 */
function fillMatrix(known: readonly number[], wanted: readonly number[]): Float64Array {
  const matrix = new Float64Array(known.length * wanted.length);
  wanted.forEach((node, row) => {
    known.forEach((through, column) => {
      let product = 1;
      for (const other of known) {
        if (other !== through) product *= (NODES[node] - NODES[other]) / (NODES[through] - NODES[other]);
      }
      matrix[row * known.length + column] = product;
    });
  });
  return matrix;
}

const OF_TWO = [0, 4, 8];
const BESIDE_TWO = [1, 2, 3, 5, 6, 7];
const OF_FOUR = [0, 2, 4, 6, 8];
const BESIDE_FOUR = [1, 3, 5, 7];
const FROM_TWO = fillMatrix(OF_TWO, BESIDE_TWO);
const FROM_FOUR = fillMatrix(OF_FOUR, BESIDE_FOUR);

/** Fills the other nodes from nodes 0, 4 and 8. */
export function fillFromTwo(values: Float64Array): void {
  for (let row = 0; row < 6; row++) {
    values[BESIDE_TWO[row]] =
      FROM_TWO[row * 3] * values[0] + FROM_TWO[row * 3 + 1] * values[4] + FROM_TWO[row * 3 + 2] * values[8];
  }
}

/** Fills the odd nodes from the even ones. */
export function fillFromFour(values: Float64Array): void {
  for (let row = 0; row < 4; row++) {
    let sum = 0;
    for (let column = 0; column < 5; column++) sum += FROM_FOUR[row * 5 + column] * values[2 * column];
    values[BESIDE_FOUR[row]] = sum;
  }
}

/** Last coefficient of the parabola through nodes 0, 4 and 8. */
export function openEndOfTwo(values: Float64Array): number {
  return Math.abs(values[0] - 2 * values[4] + values[8]) / 4;
}

/** Sum of the last two coefficients of the polynomial of degree 4 through the even nodes. */
export function openEndOfFour(values: Float64Array): number {
  const half = Math.SQRT1_2;
  const third = (0.5 * (values[8] - values[0]) + half * (values[2] - values[6])) / 2;
  const fourth = (0.5 * (values[0] + values[8]) - values[2] + values[4] - values[6]) / 4;
  return Math.abs(third) + Math.abs(fourth);
}

/** Coefficients (ten) of the integral from 0 of a polynomial on [0, 1] given by nine. */
export function integrate(coefficients: Float64Array, integral: Float64Array): void {
  const c = coefficients;
  // On [−1, 1]: ∫T_0 = T_1, ∫T_1 = T_2/4, ∫T_n = T_{n+1}/(2(n+1)) − T_{n−1}/(2(n−1)); half of it on [0, 1].
  integral.fill(0);
  integral[1] += c[0];
  integral[2] += c[1] / 4;
  for (let n = 2; n < COUNT; n++) {
    integral[n + 1] += c[n] / (2 * (n + 1));
    integral[n - 1] -= c[n] / (2 * (n - 1));
  }
  let atZero = 0;
  for (let n = 1; n <= COUNT; n++) {
    integral[n] /= 2;
    atZero += n % 2 === 0 ? integral[n] : -integral[n];
  }
  integral[0] = -atZero;
}

/** Value at x of [0, 1]. Clenshaw's recurrence. */
export function valueAt(coefficients: Float64Array, x: number): number {
  const t = 2 * x - 1;
  let b1 = 0;
  let b2 = 0;
  for (let k = coefficients.length - 1; k > 0; k--) {
    const b0 = coefficients[k] + 2 * t * b1 - b2;
    b2 = b1;
    b1 = b0;
  }
  return coefficients[0] + t * b1 - b2;
}

/**
 * x of [0, 1] at which an increasing polynomial reaches `target`, by safeguarded secants (regula falsi with the
 * Illinois weight). Range: target within the values at 0 and 1; beyond them the end is given.
 */
export function whereReaches(valueOf: (x: number) => number, target: number): number {
  let low = 0;
  let high = 1;
  let below = valueOf(0) - target;
  let above = valueOf(1) - target;
  if (below >= 0) return 0;
  if (above <= 0) return 1;
  let side = 0;
  for (let iteration = 0; iteration < 200; iteration++) {
    const x = Math.min(high, Math.max(low, high - (above * (high - low)) / (above - below)));
    if (high - low <= 1e-15 || x === low || x === high) return x;
    const value = valueOf(x) - target;
    if (value === 0) return x;
    if (value > 0) {
      high = x;
      above = value;
      if (side === 1) below /= 2;
      side = 1;
    } else {
      low = x;
      below = value;
      if (side === -1) above /= 2;
      side = -1;
    }
  }
  return (low + high) / 2;
}
