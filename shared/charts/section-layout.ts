import { placeLabels } from './label-lanes';

export interface SectionLayer {
  thicknessUm: number;
  kind: 'film' | 'coating' | 'foil';
  /** Adhesives, inks: drawn thin, never broken. */
  isThinLine?: boolean;
  /** Width of the dimension's text, px. */
  labelWidth: number;
}

export interface SectionLayerBox {
  x: number;
  width: number;
  /** Centre of the zigzag where the layer is cut short; null where it is whole. */
  breakX: number | null;
  /** Drawn wider than the scale says, so that it can be seen. */
  isWidened: boolean;
  label: { centre: number; lane: number };
}

export interface SectionLayout {
  boxes: SectionLayerBox[];
  /** Pixels per micrometre of what is drawn to scale; null where nothing is. */
  pxPerUm: number | null;
  laneCount: number;
  hasBreaks: boolean;
  hasWidened: boolean;
}

const LEAST_FILM_PX = 13;
const LEAST_THIN_LINE_PX = 6;
const LEAST_COATING_PX = 5;
const LEAST_BROKEN_PX = 52;
/** The least widths together take at most this part of the section, however many layers there are. */
const LEAST_SHARE = 0.8;

/**
 * Widths of the layers of a section `width` px wide, outside face first.
 *
 * To scale where that is possible with every film wide enough to show its hatch. Otherwise the thickest layers are
 * cut short and marked with a break, until the rest is to scale. Coatings and glue lines are widened to be seen.
 */
export function layoutSection(layers: SectionLayer[], width: number): SectionLayout {
  const least = leastWidths(layers, width);
  const { widths, brokenAt, pxPerUm } = chooseWidths(layers, least, width);

  let x = 0;
  const spans = widths.map((drawn) => {
    const span = { x, width: drawn };
    x += drawn;
    return span;
  });
  const labels = placeLabels(
    layers.map((layer, index) => {
      const span = spans[index] ?? { x: 0, width: 0 };
      return { centre: span.x + span.width / 2, width: layer.labelWidth };
    }),
    width,
  );

  const boxes = spans.map((span, index): SectionLayerBox => {
    const isBroken = brokenAt.has(index);
    const scaled = pxPerUm === null ? 0 : (layers[index]?.thicknessUm ?? 0) * pxPerUm;
    return {
      ...span,
      breakX: isBroken ? span.x + span.width / 2 : null,
      isWidened: !isBroken && span.width > scaled * 1.02,
      label: labels[index] ?? { centre: span.x, lane: 0 },
    };
  });
  return {
    boxes,
    pxPerUm,
    laneCount: Math.max(0, ...labels.map((label) => label.lane + 1)),
    hasBreaks: brokenAt.size > 0,
    hasWidened: boxes.some((box) => box.isWidened),
  };
}

function leastWidths(layers: SectionLayer[], width: number): number[] {
  const wished = layers.map((layer) => {
    if (layer.kind === 'coating') return LEAST_COATING_PX;
    return layer.isThinLine ? LEAST_THIN_LINE_PX : LEAST_FILM_PX;
  });
  const shrink = Math.min(1, (LEAST_SHARE * width) / Math.max(1e-9, sum(wished)));
  return wished.map((px) => px * shrink);
}

interface ChosenWidths {
  widths: number[];
  brokenAt: Set<number>;
  pxPerUm: number | null;
}

function chooseWidths(layers: SectionLayer[], least: number[], width: number): ChosenWidths {
  const whole = fillToWidth(layers, least, width);
  const isFilm = layers.map(
    (layer) => layer.kind !== 'coating' && !layer.isThinLine && layer.thicknessUm > 0,
  );
  const trueScale = Math.max(
    0,
    ...layers.map((layer, index) => (isFilm[index] ? (least[index] ?? 0) / layer.thicknessUm : 0)),
  );
  if (trueScale === 0 || whole.pxPerUm >= trueScale * 0.999) {
    return { widths: whole.widths, brokenAt: new Set(), pxPerUm: whole.pxPerUm };
  }

  const thickestFirst = layers
    .map((_, index) => index)
    .filter((index) => isFilm[index])
    .sort((a, b) => (layers[b]?.thicknessUm ?? 0) - (layers[a]?.thicknessUm ?? 0));
  const brokenAt = new Set<number>();
  for (const index of thickestFirst) {
    brokenAt.add(index);
    const kept = layers.map((layer, at) =>
      brokenAt.has(at) ? 0 : Math.max(least[at] ?? 0, layer.thicknessUm * trueScale),
    );
    const left = width - sum(kept);
    if (left < brokenAt.size * LEAST_BROKEN_PX) continue;
    // What is left goes to the cut layers by the root of their gauge, so that the thicker still looks thicker.
    const roots = layers.map((layer, at) => (brokenAt.has(at) ? Math.sqrt(layer.thicknessUm) : 0));
    const widths = kept.map((px, at) => (brokenAt.has(at) ? (left * (roots[at] ?? 0)) / sum(roots) : px));
    const isShorterThanTrue = [...brokenAt].every(
      (at) => (widths[at] ?? 0) < (layers[at]?.thicknessUm ?? 0) * trueScale,
    );
    if (!isShorterThanTrue) break;
    return { widths, brokenAt, pxPerUm: trueScale };
  }
  return { widths: whole.widths, brokenAt: new Set(), pxPerUm: whole.pxPerUm };
}

/** The scale at which max(least, gauge·scale) fills the width exactly; found by bisection, it is monotone. */
function fillToWidth(
  layers: SectionLayer[],
  least: number[],
  width: number,
): { widths: number[]; pxPerUm: number } {
  const total = sum(layers.map((layer) => layer.thicknessUm));
  if (total <= 0) {
    const leastTotal = Math.max(1e-9, sum(least));
    return { widths: least.map((px) => (px * width) / leastTotal), pxPerUm: 0 };
  }
  const widthsAt = (scale: number) =>
    layers.map((layer, at) => Math.max(least[at] ?? 0, layer.thicknessUm * scale));
  let low = 0;
  let high = width / total;
  for (let step = 0; step < 60; step += 1) {
    const middle = (low + high) / 2;
    if (sum(widthsAt(middle)) > width) high = middle;
    else low = middle;
  }
  const widths = widthsAt(low);
  // A section of coatings and glue lines alone may not fill the width: stretch it.
  const stretch = width / sum(widths);
  return { widths: widths.map((px) => px * stretch), pxPerUm: low * stretch };
}

/** A zigzag of two parallel lines across a cut layer, `gap` px apart: SVG path data of each, top to bottom. */
export function breakMark(
  x: number,
  top: number,
  height: number,
): { left: string; right: string; area: string } {
  const gap = 5;
  const swing = 5;
  const reach = 4;
  const points = (at: number): [number, number][] => [
    [at, top - reach],
    [at, top + height * 0.38],
    [at - swing, top + height * 0.44],
    [at + swing, top + height * 0.56],
    [at, top + height * 0.62],
    [at, top + height + reach],
  ];
  const left = points(x - gap / 2);
  const right = points(x + gap / 2);
  const line = (path: [number, number][]) =>
    path.map(([px, py], at) => `${at === 0 ? 'M' : 'L'}${px} ${py}`).join('');
  return {
    left: line(left),
    right: line(right),
    area: `${line([...left, ...right.reverse()])}Z`,
  };
}

function sum(values: number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
