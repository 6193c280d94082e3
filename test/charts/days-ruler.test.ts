import { describe, expect, it } from 'vitest';
import { layoutDaysRuler } from '../../shared/charts/days-ruler';

describe('layoutDaysRuler', () => {
  it('keeps the target and the longest bar on one scale, with round days numbered', () => {
    const ruler = layoutDaysRuler(
      [
        { id: 'a', days: 515 },
        { id: 'b', days: 48 },
      ],
      270,
      320,
    );
    expect(ruler.lastDay).toBeGreaterThan(515);
    expect(ruler.ticks.filter((tick) => tick.isLabelled).map((tick) => tick.day)).toEqual([
      0, 100, 200, 300, 400, 500,
    ]);
    expect(ruler.target.x / 320).toBeCloseTo(270 / ruler.lastDay, 9);
    expect(ruler.bars.map((bar) => bar.isMet)).toEqual([true, false]);
    expect(ruler.bars.every((bar) => bar.zoom === null)).toBe(true);
  });

  it('gives a bar of a few hours a ruler of its own', () => {
    const [bar] = layoutDaysRuler([{ id: 'a', days: 0.35 }], 270, 320).bars;
    expect(bar?.x).toBeLessThan(1);
    expect(bar?.zoom?.lastDay).toBeCloseTo(0.56, 6);
    expect(bar?.zoom?.x).toBeCloseTo(200, 6);
  });

  it('lets a wall that reaches no limit run off the end, past every other', () => {
    const ruler = layoutDaysRuler(
      [
        { id: 'a', days: null },
        { id: 'b', days: 900 },
      ],
      270,
      320,
    );
    expect(ruler.bars[0]).toMatchObject({ isOpenEnded: true, isMet: true, x: 320 });
    expect(ruler.bars[1]?.x).toBeLessThan(320);
  });

  it('ends at day 0 without a bar and without a zoom', () => {
    const [bar] = layoutDaysRuler([{ id: 'a', days: 0 }], 270, 320).bars;
    expect(bar).toMatchObject({ x: 0, isMet: false, zoom: null });
  });
});
