/**
 * Section hatching: how a layer is filled so that its class is read without colour, on screen and in print.
 * Marks are plain geometry, clipped to their rectangle, because a PDF has no SVG patterns.
 */
export const HATCHES = [
  'polyester',
  'polyethylene',
  'polypropylene',
  'humidity-sensitive barrier',
  'polyamide',
  'chlorinated',
  'styrenic',
  'biopolymer',
  'cellulose',
  'paper',
  'metal',
  'oxide',
  'adhesive',
  'other',
] as const;
export type Hatch = (typeof HATCHES)[number];

export interface HatchedLayer {
  materialClass: string;
  /** Splits the polyolefins and the celluloses; '' where unknown. */
  polymerFamily?: string;
  /** Read for the family where the family is not known. */
  name?: string;
}

const POLYPROPYLENE_NAME = /polypropylene|\b(?:[bo]*o|c|met-?bo)?pp\b/i;
const PAPER_NAME = /\bpaper\b/i;

export function hatchOf(layer: HatchedLayer): Hatch {
  const family = (layer.polymerFamily ?? '').toLowerCase();
  const name = layer.name ?? '';
  switch (layer.materialClass) {
    case 'polyolefin':
      return family === 'pp' || (family === '' && POLYPROPYLENE_NAME.test(name))
        ? 'polypropylene'
        : 'polyethylene';
    case 'cellulose':
      return family === 'paper' || (family === '' && PAPER_NAME.test(name)) ? 'paper' : 'cellulose';
    case 'adhesive':
    case 'ink':
      return 'adhesive';
    default:
      return HATCHES.find((hatch) => hatch === layer.materialClass) ?? 'other';
  }
}

export interface ChartRect {
  x: number;
  y: number;
  width: number;
  height: number;
}

export interface HatchMarks {
  /** What the rectangle is filled with: nothing, ink, the second ink, or the tint of thin glue lines. */
  fill: 'none' | 'ink' | 'second' | 'tint';
  /** SVG path data of the hatch lines; '' where there are none. */
  lines: string;
  /** SVG path data of filled dots; '' where there are none. */
  dots: string;
}

type Segment = [x1: number, y1: number, x2: number, y2: number];

const NO_MARKS = { lines: '', dots: '' };

/** Marks of a hatch in a rectangle; `scale` below 1 for cards, where a layer is about 12 px high. */
export function hatchMarks(hatch: Hatch, rect: ChartRect, scale = 1): HatchMarks {
  switch (hatch) {
    case 'metal':
      return { fill: 'ink', ...NO_MARKS };
    case 'oxide':
      return { fill: 'second', ...NO_MARKS };
    case 'adhesive':
      return { fill: 'tint', ...NO_MARKS };
    case 'other':
      return { fill: 'none', ...NO_MARKS };
    case 'humidity-sensitive barrier':
      return { fill: 'none', lines: '', dots: staggeredDots(rect, 4 * scale, Math.max(0.75, 1 * scale)) };
    default:
      return { fill: 'none', lines: pathOf(segmentsOf(hatch, rect, scale), rect), dots: '' };
  }
}

function segmentsOf(hatch: Hatch, rect: ChartRect, scale: number): Segment[] {
  switch (hatch) {
    case 'polyester':
      return diagonals(rect, 8 * scale, 'rising');
    case 'polypropylene':
      return brokenDiagonals(rect, 8 * scale, { dash: 6 * scale, gap: 4 * scale });
    case 'polyethylene':
      return horizontals(rect, 5.5 * scale);
    case 'polyamide':
      return [...diagonals(rect, 9 * scale, 'rising'), ...diagonals(rect, 9 * scale, 'falling')];
    case 'chlorinated':
      return verticals(rect, 5 * scale);
    case 'styrenic':
      return [...horizontals(rect, 7 * scale), ...verticals(rect, 7 * scale)];
    case 'biopolymer':
      return plusSigns(rect, 8 * scale, 2.2 * scale);
    case 'cellulose':
      return waves(rect, { spacing: 6 * scale, halfPeriod: 4 * scale, amplitude: 1.6 * scale });
    case 'paper':
      return fibres(rect, 7 * scale, 5 * scale);
    default:
      return [];
  }
}

/** Lines x + y = constant (rising to the right) or x − y = constant, anchored at the rectangle's corner. */
function diagonals(rect: ChartRect, spacing: number, direction: 'rising' | 'falling'): Segment[] {
  const segments: Segment[] = [];
  const { x, y, width, height } = rect;
  for (let offset = spacing / 2; offset < width + height; offset += spacing) {
    segments.push(
      direction === 'rising'
        ? [x + offset - height, y + height, x + offset, y]
        : [x + offset - height, y, x + offset, y + height],
    );
  }
  return segments;
}

function brokenDiagonals(
  rect: ChartRect,
  spacing: number,
  { dash, gap }: { dash: number; gap: number },
): Segment[] {
  const segments: Segment[] = [];
  const { x, y, width, height } = rect;
  let isShifted = false;
  for (let offset = spacing / 2; offset < width + height; offset += spacing) {
    // Run up the diagonal from the bottom edge; every second line starts half a dash later.
    for (let run = isShifted ? -(dash + gap) / 2 : 0; run < height; run += dash + gap) {
      const end = run + dash;
      segments.push([
        x + offset - height + run,
        y + height - run,
        x + offset - height + end,
        y + height - end,
      ]);
    }
    isShifted = !isShifted;
  }
  return segments;
}

function horizontals(rect: ChartRect, spacing: number): Segment[] {
  return centredSteps(rect.y, rect.height, spacing).map((at) => [rect.x, at, rect.x + rect.width, at]);
}

function verticals(rect: ChartRect, spacing: number): Segment[] {
  return centredSteps(rect.x, rect.width, spacing).map((at) => [at, rect.y, at, rect.y + rect.height]);
}

function plusSigns(rect: ChartRect, spacing: number, arm: number): Segment[] {
  return staggeredGrid(rect, spacing).flatMap(([cx, cy]): Segment[] => [
    [cx - arm, cy, cx + arm, cy],
    [cx, cy - arm, cx, cy + arm],
  ]);
}

function waves(
  rect: ChartRect,
  { spacing, halfPeriod, amplitude }: { spacing: number; halfPeriod: number; amplitude: number },
): Segment[] {
  const segments: Segment[] = [];
  for (const at of centredSteps(rect.y, rect.height, spacing)) {
    let isUp = true;
    for (let x = rect.x; x < rect.x + rect.width; x += halfPeriod) {
      segments.push([
        x,
        isUp ? at + amplitude : at - amplitude,
        x + halfPeriod,
        isUp ? at - amplitude : at + amplitude,
      ]);
      isUp = !isUp;
    }
  }
  return segments;
}

/** Short strokes in three directions by turns, like fibres under a glass. */
function fibres(rect: ChartRect, spacing: number, length: number): Segment[] {
  const half = length / 2;
  return staggeredGrid(rect, spacing).map(([cx, cy], index): Segment => {
    if (index % 3 === 0) return [cx - half, cy, cx + half, cy];
    const rise = index % 3 === 1 ? half * 0.8 : -half * 0.8;
    return [cx - half * 0.6, cy + rise, cx + half * 0.6, cy - rise];
  });
}

function staggeredDots(rect: ChartRect, spacing: number, radius: number): string {
  return staggeredGrid(rect, spacing)
    .filter(
      ([cx, cy]) =>
        cx - radius >= rect.x &&
        cx + radius <= rect.x + rect.width &&
        cy - radius >= rect.y &&
        cy + radius <= rect.y + rect.height,
    )
    .map(
      ([cx, cy]) =>
        `M${short(cx - radius)} ${short(cy)}${arc(radius, 2 * radius)}${arc(radius, -2 * radius)}`,
    )
    .join('');
}

function arc(radius: number, dx: number): string {
  return `a${short(radius)} ${short(radius)} 0 1 0 ${short(dx)} 0`;
}

function staggeredGrid(rect: ChartRect, spacing: number): [number, number][] {
  const points: [number, number][] = [];
  centredSteps(rect.y, rect.height, spacing).forEach((cy, row) => {
    const columns = centredSteps(rect.x, rect.width, spacing);
    for (const cx of columns) points.push([row % 2 === 1 ? cx + spacing / 2 : cx, cy]);
  });
  return points;
}

/** Evenly spaced positions centred in a length, so that a thin layer still shows its mark in the middle. */
function centredSteps(start: number, length: number, spacing: number): number[] {
  const count = Math.max(1, Math.round(length / spacing));
  const first = start + (length - (count - 1) * spacing) / 2;
  return Array.from({ length: count }, (_, index) => first + index * spacing);
}

function pathOf(segments: Segment[], rect: ChartRect): string {
  return segments
    .map((segment) => clip(segment, rect))
    .filter((segment) => segment !== null)
    .map(([x1, y1, x2, y2]) => `M${short(x1)} ${short(y1)}L${short(x2)} ${short(y2)}`)
    .join('');
}

/** Liang–Barsky: the part of a segment inside a rectangle, null where there is none. */
function clip([x1, y1, x2, y2]: Segment, rect: ChartRect): Segment | null {
  const dx = x2 - x1;
  const dy = y2 - y1;
  let from = 0;
  let to = 1;
  const edges: [p: number, q: number][] = [
    [-dx, x1 - rect.x],
    [dx, rect.x + rect.width - x1],
    [-dy, y1 - rect.y],
    [dy, rect.y + rect.height - y1],
  ];
  for (const [p, q] of edges) {
    if (p === 0) {
      if (q < 0) return null;
      continue;
    }
    const at = q / p;
    if (p < 0) from = Math.max(from, at);
    else to = Math.min(to, at);
  }
  return from < to ? [x1 + from * dx, y1 + from * dy, x1 + to * dx, y1 + to * dy] : null;
}

function short(value: number): string {
  return String(Math.round(value * 100) / 100);
}
