import { describe, expect, it } from 'vitest';
import { evaluate } from '../../shared/engine';
import { description } from '../engine/descriptions';
import { engineFromTwo, leaveOut, logLinearFromTwo, type LeftOut } from './left-out-points';
import { libraryLayer } from './library-layers';
import { publishedCurves } from './published-humidity';
import { readTrustSection, readTrustTable } from './readme-section';
import { twoDigits } from './structure-rows';

const leftOut = publishedCurves.map(leaveOut);

function rowOf(one: LeftOut): string[] {
  const ratios = [one.at80Between, one.at90Flat, one.at90LogLinear, one.at60Flat, one.at60LogLinear];
  return [
    one.name,
    ...ratios.map(twoDigits),
    one.at60InLibrary === null ? '–' : twoDigits(one.at60InLibrary),
  ];
}

describe('a humidity curve with a point left out', () => {
  it('stands in the README with the errors the engine makes today', () => {
    expect(readTrustTable('point left out')).toEqual(leftOut.map(rowOf));
  });

  it('is read log-linear between its points, and held flat beyond them', () => {
    for (const { at60, at80, at90 } of publishedCurves) {
      const outer = [
        [0.6, at60],
        [0.9, at90],
      ] as const;
      expect(engineFromTwo(outer, 0.8).value / logLinearFromTwo(outer, 0.8)).toBeCloseTo(1, 9);
      const lower = [
        [0.6, at60],
        [0.8, at80],
      ] as const;
      expect(engineFromTwo(lower, 0.9).value / at80).toBeCloseTo(1, 9);
    }
  });

  it('errs to the safe side between points and to the unsafe side beyond the last: what the warning is for', () => {
    for (const { at60, at90, ...curve } of publishedCurves) {
      if (at60 !== at90) expect(leaveOut({ at60, at90, ...curve }).at90LogLinear, curve.name).toBeLessThan(1);
    }
    for (const one of leftOut) {
      expect(one.at80Between, one.name).toBeGreaterThanOrEqual(1 - 1e-9);
      expect(one.at90Flat, one.name).toBeLessThanOrEqual(1 + 1e-9);
      expect(one.at90LogLinear, one.name).toBeLessThanOrEqual(1 + 1e-9);
      expect(one.at90LogLinear, one.name).toBeGreaterThanOrEqual(one.at90Flat - 1e-9);
    }
    const worst = (of: (one: LeftOut) => number) => twoDigits(Math.max(...leftOut.map((one) => 1 / of(one))));
    const between = twoDigits(Math.max(...leftOut.map(({ at80Between }) => at80Between)));
    const text = readTrustSection().replace(/\s+/g, ' ');
    const below = twoDigits(Math.max(...leftOut.map(({ at60Flat }) => at60Flat)));
    expect(text).toContain(`at most ${between} times too high`);
    expect(text).toContain(`flat is safe, at most ${below} times too high`);
    expect(text).toContain(`up to ${worst(({ at90Flat }) => at90Flat)} times too low`);
    expect(text).toContain(`up to ${worst(({ at90LogLinear }) => at90LogLinear)} times too low`);
  });

  it('is warned of beyond its points and not between them', () => {
    for (const one of leftOut) {
      expect([one.name, one.isWarnedBeyond, one.isWarnedBetween]).toEqual([one.name, true, false]);
    }
  });

  it.each([
    { humidity: 0.95, isWarned: true },
    { humidity: 0.85, isWarned: false },
  ])(
    'puts humidity_beyond_curve on the answer of an EVOH wall at $humidity: $isWarned',
    ({ humidity, isWarned }) => {
      const { warnings } = evaluate(
        description({
          layers: [libraryLayer('ldpe', 30), libraryLayer('evoh-32', 5), libraryLayer('ldpe', 30)],
          food: { inside_relative_humidity: humidity },
          route: {
            legs: [{ temperature_C: 23, relative_humidity: humidity, days: 10 }],
            after_last: 'hold',
          },
        }),
      );
      expect(warnings.some(({ code }) => code === 'humidity_beyond_curve')).toBe(isWarned);
    },
  );
});
