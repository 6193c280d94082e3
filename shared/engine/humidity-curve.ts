/** (e^x − 1)/x without loss of digits near 0. */
function meanExponential(x: number): number {
  return Math.abs(x) < 1e-5 ? 1 + x * (0.5 + x * (1 / 6)) : Math.expm1(x) / x;
}

/** A layer on a walk: its conductance beside its holes' (mol/(m²·s·Pa)), and the factors the walk leaves behind. */
export interface Span {
  own: number;
  parallel: number;
  startFactor: number;
  endFactor: number;
}

/**
 * Factor f(h) on a permeability: linear in ln f between knots, flat beyond the ends, scaled to 1 at the humidity at
 * which the reference value holds. Knots ascend strictly and factors are positive (the readers see to it).
 */
export class HumidityCurve {
  readonly humidity: Float64Array;
  readonly factor: Float64Array;
  /** d ln f / dh of the segment that begins at each knot; the last is 0. */
  private readonly slope: Float64Array;
  readonly minFactor: number;
  readonly maxFactor: number;

  constructor(humidity: ArrayLike<number>, logFactor: ArrayLike<number>) {
    const count = humidity.length;
    this.humidity = Float64Array.from(humidity);
    this.factor = new Float64Array(count);
    this.slope = new Float64Array(count);
    let min = Infinity;
    let max = 0;
    for (let k = 0; k < count; k++) {
      const factor = Math.exp(logFactor[k]);
      this.factor[k] = factor;
      if (factor < min) min = factor;
      if (factor > max) max = factor;
      if (k + 1 < count) this.slope[k] = (logFactor[k + 1] - logFactor[k]) / (humidity[k + 1] - humidity[k]);
    }
    this.minFactor = min;
    this.maxFactor = max;
  }

  /** A curve from stated points, scaled so that f = 1 at the reference humidity. */
  static fromPoints(
    humidity: readonly number[],
    factor: readonly number[],
    referenceHumidity: number,
  ): HumidityCurve {
    const logs = factor.map(Math.log);
    const atReference = interpolate(humidity, logs, referenceHumidity);
    return new HumidityCurve(
      humidity,
      logs.map((log) => log - atReference),
    );
  }

  /** f_a / f_b, exact, on the knots of both; a null curve is 1 everywhere. */
  static quotient(a: HumidityCurve | null, b: HumidityCurve | null): HumidityCurve {
    const knots = [...(a ? a.humidity : []), ...(b ? b.humidity : [])].sort((x, y) => x - y);
    const distinct = knots.filter((knot, index) => index === 0 || knot !== knots[index - 1]);
    const logs = distinct.map((knot) => (a ? Math.log(a.at(knot)) : 0) - (b ? Math.log(b.at(knot)) : 0));
    return new HumidityCurve(distinct, logs);
  }

  /** Index of the segment that holds h: −1 before the first knot, last index from the last knot on. */
  private segmentAt(h: number): number {
    const knots = this.humidity;
    let low = -1;
    let high = knots.length;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (knots[middle] <= h) low = middle;
      else high = middle;
    }
    return low;
  }

  private inSegment(segment: number, h: number): number {
    if (segment < 0) return this.factor[0];
    const slope = this.slope[segment];
    return slope === 0
      ? this.factor[segment]
      : this.factor[segment] * Math.exp(slope * (h - this.humidity[segment]));
  }

  /** f(h) [-]. */
  at(h: number): number {
    return this.inSegment(this.segmentAt(h), h);
  }

  /** True where h lies beyond the measured points. */
  isBeyond(h: number): boolean {
    return h < this.humidity[0] || h > this.humidity[this.humidity.length - 1];
  }

  /**
   * ∫ f dh from `from` upwards over `width` ≥ 0 [-]: closed form per segment, so that narrow spans keep their digits.
   * Cost: one exponential per segment crossed.
   */
  integral(from: number, width: number): number {
    const last = this.humidity.length - 1;
    let segment = this.segmentAt(from);
    let factor = this.inSegment(segment, from);
    let h = from;
    let left = width;
    let sum = 0;
    while (segment < last) {
      const toKnot = this.humidity[segment + 1] - h;
      const slope = segment < 0 ? 0 : this.slope[segment];
      if (left <= toKnot) return sum + factor * left * meanExponential(slope * left);
      sum += factor * toKnot * meanExponential(slope * toKnot);
      left -= toKnot;
      segment += 1;
      h = this.humidity[segment];
      factor = this.factor[segment];
    }
    return sum + factor * left;
  }

  /**
   * The rise in humidity [-] from `from` at which own·∫f dh + parallel·rise = flux: what a layer spans when it lets
   * through that flux (all in mol/(m²·s·Pa), flux over the saturation pressure).
   * Closed form per segment where nothing runs in parallel; else Newton's method, which is monotone here because the
   * left side is convex or concave within a segment. Always ends: the curve is flat beyond its last knot.
   */
  riseFor(span: Span, from: number, flux: number): number {
    const { own, parallel } = span;
    const last = this.humidity.length - 1;
    let segment = this.segmentAt(from);
    let factor = this.inSegment(segment, from);
    span.startFactor = factor;
    let h = from;
    let left = flux;
    let rise = 0;
    while (segment < last) {
      const toKnot = this.humidity[segment + 1] - h;
      const slope = segment < 0 ? 0 : this.slope[segment];
      const toNext = own * factor * toKnot * meanExponential(slope * toKnot) + parallel * toKnot;
      if (left <= toNext) {
        const step = riseWithin({ own, parallel, factor, slope, toKnot }, left);
        const end = parallel === 0 ? factor + (slope * left) / own : 0;
        span.endFactor = end > 1e-3 * factor ? end : factor * Math.exp(slope * step);
        return rise + step;
      }
      left -= toNext;
      rise += toKnot;
      segment += 1;
      h = this.humidity[segment];
      factor = this.factor[segment];
    }
    span.endFactor = factor;
    return rise + left / (own * factor + parallel);
  }
}

interface Segment {
  own: number;
  parallel: number;
  /** f at its start, and d ln f / dh. */
  factor: number;
  slope: number;
  toKnot: number;
}

/** The rise within one segment; the flux is known not to need more than the segment. */
function riseWithin({ own, parallel, factor, slope, toKnot }: Segment, flux: number): number {
  if (parallel === 0) {
    const flat = flux / (own * factor);
    const x = slope * flat;
    if (Math.abs(x) < 1e-5) return Math.min(toKnot, flat * (1 - x * (0.5 - x * (1 / 3))));
    return x <= -1 ? toKnot : Math.min(toKnot, Math.log1p(x) / slope);
  }
  let step = Math.min(toKnot, flux / (own * factor + parallel));
  for (let iteration = 0; iteration < 200; iteration++) {
    const value = own * factor * step * meanExponential(slope * step) + parallel * step;
    const correction = (value - flux) / (own * factor * Math.exp(slope * step) + parallel);
    step = Math.min(toKnot, step - correction);
    if (Math.abs(correction) <= 4e-16 * Math.abs(step)) break;
  }
  return step;
}

/** Linear between points that ascend, flat beyond them. */
function interpolate(x: readonly number[], y: readonly number[], at: number): number {
  const last = x.length - 1;
  if (at <= x[0]) return y[0];
  if (at >= x[last]) return y[last];
  let k = 0;
  while (x[k + 1] < at) k++;
  return y[k] + ((y[k + 1] - y[k]) * (at - x[k])) / (x[k + 1] - x[k]);
}
