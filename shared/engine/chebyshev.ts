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
