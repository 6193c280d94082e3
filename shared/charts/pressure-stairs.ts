import { scaleLinear } from 'd3-scale';
import type { SectionLayerBox } from './section-layout';

export interface StairOptions {
  /** Where the section stands in the chart. */
  sectionX: number;
  width: number;
  height: number;
}

export interface PressureStair {
  /** Outside edge, each interface from the outside face to the inside face, inside edge. */
  points: { x: number; y: number }[];
  line: string;
  area: string;
  baseY: number;
}

/**
 * A partial pressure falling (or rising) through the section: level in the air on both sides, straight within each
 * drawn layer. Only the interfaces are computed; inside a layer that feels humidity the true course is bent.
 */
export function layoutStair(
  interfacePressurePa: number[],
  boxes: Pick<SectionLayerBox, 'x' | 'width'>[],
  options: StairOptions,
): PressureStair {
  const highest = Math.max(...interfacePressurePa, 0);
  const toY = scaleLinear([0, highest > 0 ? highest : 1], [options.height, 0]);
  const xs = boxes.map((box) => options.sectionX + box.x);
  const last = boxes.at(-1);
  const faces = last === undefined ? [] : [...xs, options.sectionX + last.x + last.width];
  const points = faces.map((x, index) => ({ x, y: toY(interfacePressurePa[index] ?? 0) }));
  const first = points[0];
  const end = points.at(-1);
  if (first === undefined || end === undefined)
    return { points: [], line: '', area: '', baseY: options.height };
  const all = [{ x: 0, y: first.y }, ...points, { x: options.width, y: end.y }];
  const line = all
    .map((point, index) => `${index === 0 ? 'M' : 'L'}${round(point.x)} ${round(point.y)}`)
    .join('');
  return {
    points: all,
    line,
    area: `${line}L${round(options.width)} ${options.height}L0 ${options.height}Z`,
    baseY: options.height,
  };
}

function round(value: number): number {
  return Math.round(value * 100) / 100;
}
