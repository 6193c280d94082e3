/**
 * A humidity curve two ways: factors on the value (what is kept), or values at each humidity in the unit of the
 * value (what data sheets print). Value at h = stated value · f(h) / f(humidity of the stated value).
 */
export interface CurvePoint {
  relative_humidity: number;
  factor: number;
}

/** f(h): ln f linear between points, flat beyond the ends. Range: rising humidities, positive factors. */
export function factorAt(points: CurvePoint[], relativeHumidity: number): number {
  const first = points[0];
  const last = points.at(-1);
  if (!first || !last) return 1;
  if (relativeHumidity <= first.relative_humidity) return first.factor;
  if (relativeHumidity >= last.relative_humidity) return last.factor;
  const upperIndex = points.findIndex((point) => point.relative_humidity >= relativeHumidity);
  const lower = points[upperIndex - 1] ?? first;
  const upper = points[upperIndex] ?? last;
  const share =
    (relativeHumidity - lower.relative_humidity) / (upper.relative_humidity - lower.relative_humidity);
  return Math.exp((1 - share) * Math.log(lower.factor) + share * Math.log(upper.factor));
}

export interface ValuePoint {
  relative_humidity: number;
  value: number;
}

/** Values at their humidities as factors of the stated value: 10, 90, 1000 with 10 stated give 1, 9, 100. */
export function factorsFromValues(points: ValuePoint[], statedValue: number): CurvePoint[] {
  return points.map((point) => ({
    relative_humidity: point.relative_humidity,
    factor: Number((point.value / statedValue).toPrecision(12)),
  }));
}

/** The way back: the values that a curve stands for, given the value stated at a humidity. */
export function valuesFromFactors(
  points: CurvePoint[],
  stated: { value: number; relative_humidity: number },
): ValuePoint[] {
  const atStated = factorAt(points, stated.relative_humidity);
  return points.map((point) => ({
    relative_humidity: point.relative_humidity,
    value: Number(((stated.value * point.factor) / atStated).toPrecision(12)),
  }));
}
