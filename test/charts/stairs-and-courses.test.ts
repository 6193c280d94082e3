import { describe, expect, it } from 'vitest';
import { legSpans } from '../../shared/charts/leg-spans';
import { layoutStair } from '../../shared/charts/pressure-stairs';
import { shareBarWidth, sharePercent } from '../../shared/charts/share-bars';
import { layoutTimeCourse } from '../../shared/charts/time-course';

describe('layoutStair', () => {
  it('stands level outside and inside and falls at the faces of the drawn layers', () => {
    const stair = layoutStair(
      [20_000, 15_000, 0],
      [
        { x: 0, width: 100 },
        { x: 100, width: 40 },
      ],
      { sectionX: 20, width: 200, height: 80 },
    );
    expect(stair.points).toEqual([
      { x: 0, y: 0 },
      { x: 20, y: 0 },
      { x: 120, y: 20 },
      { x: 160, y: 80 },
      { x: 200, y: 80 },
    ]);
  });

  it('draws no pressure at all as the base line', () => {
    const stair = layoutStair([0, 0], [{ x: 0, width: 100 }], { sectionX: 10, width: 120, height: 50 });
    expect(stair.points.every((point) => point.y === 50)).toBe(true);
  });
});

describe('legSpans', () => {
  it('holds the last leg to the end', () => {
    expect(legSpans([10, 5], 'hold', 40)).toEqual([
      { leg: 0, startDay: 0, endDay: 10 },
      { leg: 1, startDay: 10, endDay: 40 },
    ]);
  });

  it('repeats the route and stops on the last day', () => {
    expect(legSpans([10, 5], 'repeat', 32).map((span) => [span.leg, span.endDay])).toEqual([
      [0, 10],
      [1, 15],
      [0, 25],
      [1, 30],
      [0, 32],
    ]);
  });
});

describe('layoutTimeCourse', () => {
  const options = {
    limits: [100],
    lastDay: 10,
    legDays: [4, 6],
    afterLast: 'hold' as const,
    width: 200,
    height: 100,
  };

  it('keeps the limit inside the drawing and starts the value axis at zero', () => {
    const course = layoutTimeCourse({ ...options, days: [0, 5, 10], values: [0, 20, 40] });
    expect(course.limits[0]?.y).toBeGreaterThan(0);
    expect(course.toY(0)).toBeCloseTo(100, 6);
    expect(course.legs.map((leg) => [leg.x, leg.width])).toEqual([
      [0, 80],
      [80, 120],
    ]);
  });

  it('shows a narrow band far from zero as a band', () => {
    const course = layoutTimeCourse({ ...options, limits: [0.045], days: [0, 10], values: [0.04, 0.044] });
    expect(course.toY(0.04) - course.toY(0.044)).toBeGreaterThan(30);
  });
});

describe('shares', () => {
  it('keeps a sliver visible and calls it what it is', () => {
    const format = (value: number) => value.toPrecision(3);
    expect(shareBarWidth(0.0001, 200)).toBe(1.5);
    expect(shareBarWidth(0, 200)).toBe(0);
    expect([0, 0.0005, 0.985, 0.9996, 1].map((share) => sharePercent(share, format))).toEqual([
      '0',
      '<0.1',
      '98.5',
      '>99.9',
      '100',
    ]);
  });
});
