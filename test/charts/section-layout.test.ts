import { describe, expect, it } from 'vitest';
import { layoutSection, type SectionLayer } from '../../shared/charts/section-layout';

const film = (thicknessUm: number): SectionLayer => ({ thicknessUm, kind: 'film', labelWidth: 40 });
const glue = (thicknessUm: number): SectionLayer => ({ ...film(thicknessUm), isThinLine: true });
const coating = (thicknessUm: number): SectionLayer => ({ ...film(thicknessUm), kind: 'coating' });

describe('layoutSection', () => {
  it('draws a wall to scale where every film can be seen at that scale', () => {
    const { boxes, pxPerUm, hasBreaks } = layoutSection([film(12), film(5), film(50)], 268);
    expect(hasBreaks).toBe(false);
    expect(pxPerUm).toBeCloseTo(4, 6);
    expect(boxes.map((box) => box.width)).toEqual([
      expect.closeTo(48, 4),
      expect.closeTo(20, 4),
      expect.closeTo(200, 4),
    ]);
  });

  it('cuts thick layers short, with a break, where gauges differ a hundredfold', () => {
    const { boxes, pxPerUm } = layoutSection([film(400), film(4), film(300)], 280);
    expect(boxes.map((box) => box.breakX !== null)).toEqual([true, false, true]);
    expect(boxes[1]?.width).toBeCloseTo(4 * (pxPerUm ?? 0), 6);
    // The thicker still looks thicker, and neither is drawn as long as it would be to scale.
    expect(boxes[0]?.width).toBeGreaterThan(boxes[2]?.width ?? Infinity);
    expect(boxes[0]?.width).toBeLessThan(400 * (pxPerUm ?? 0));
  });

  it('widens a coating and a glue line so that they are seen, and says so', () => {
    const { boxes } = layoutSection([film(12), coating(0.03), glue(2), film(60)], 280);
    expect(boxes[1]?.width).toBeGreaterThanOrEqual(4);
    expect(boxes.map((box) => box.isWidened)).toEqual([false, true, false, false]);
  });

  it.each([1, 2, 3, 7, 20, 50])(
    'fills the width exactly with %i layers, none overlapping or vanishing',
    (count) => {
      const layers = Array.from({ length: count }, (_, index) =>
        index % 3 === 2 ? coating(0.02) : film(index % 3 === 0 ? 2 : 300),
      );
      const { boxes } = layoutSection(layers, 280);
      let edge = 0;
      for (const box of boxes) {
        expect(box.x).toBeCloseTo(edge, 6);
        expect(box.width).toBeGreaterThan(0.5);
        edge += box.width;
      }
      expect(edge).toBeCloseTo(280, 6);
    },
  );

  it('gives labels that never overlap within a lane and stay inside', () => {
    const layers = Array.from({ length: 30 }, (_, index) => film(3 + index));
    const { boxes } = layoutSection(layers, 300);
    const placed = boxes.map((box) => box.label);
    for (const label of placed) {
      expect(label.centre - 20).toBeGreaterThanOrEqual(-1e-9);
      expect(label.centre + 20).toBeLessThanOrEqual(300 + 1e-9);
    }
    for (const [index, label] of placed.entries()) {
      for (const other of placed.slice(index + 1)) {
        if (other.lane === label.lane)
          expect(Math.abs(other.centre - label.centre)).toBeGreaterThanOrEqual(40);
      }
    }
  });
});
