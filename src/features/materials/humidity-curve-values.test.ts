import { describe, expect, it } from 'vitest';
import { factorAt, factorsFromValues, valuesFromFactors } from './humidity-curve-values';

const VALUES = [
  { relative_humidity: 0.6, value: 10 },
  { relative_humidity: 0.8, value: 90 },
  { relative_humidity: 0.9, value: 1000 },
];

describe('humidity curve as values and as factors', () => {
  it('reads 10, 90 and 1000 as factors 1, 9 and 100', () => {
    expect(factorsFromValues(VALUES, 10).map((point) => point.factor)).toEqual([1, 9, 100]);
  });

  it('gives the typed values back', () => {
    const stated = { value: 10, relative_humidity: 0.6 };
    expect(valuesFromFactors(factorsFromValues(VALUES, 10), stated)).toEqual(VALUES);
  });

  it('goes straight in the logarithm between points and flat beyond', () => {
    const points = factorsFromValues(VALUES, 10);
    expect(factorAt(points, 0.7)).toBeCloseTo(3, 12);
    expect(factorAt(points, 0.2)).toBe(1);
    expect(factorAt(points, 0.99)).toBe(100);
    expect(factorAt([], 0.5)).toBe(1);
  });
});
