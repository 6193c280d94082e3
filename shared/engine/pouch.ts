import { InputError } from './description/input-error';
import { LENGTH_MM } from './description/ranges';
import { readNumber, readOptional } from './description/read-number';

export interface PouchDescription {
  width_mm: number;
  height_mm: number;
  /** 0 or absent: a fold, not a seal. */
  seal_left_mm?: number;
  seal_right_mm?: number;
  seal_top_mm?: number;
  seal_bottom_mm?: number;
  /** Folded depth of a gusset; 0 if absent. */
  gusset_depth_mm?: number;
}

export interface PouchArea {
  area_m2: number;
  /** Along the inner edge of the sealed sides. */
  seal_length_m: number;
  /** Σ length over width of the seals. */
  seal_length_over_width: number;
}

/**
 * Area [m²] and seals [m] of a pouch: w = W − left − right, h = H − top − bottom, A = 2wh + 2gw.
 * Range: lengths up to 100 m; seals narrower than the pouch. Errors: InputError. Cost: none to speak of.
 */
export function pouchArea(pouch: PouchDescription): PouchArea {
  const words = (label: string): { label: string; unit: string } => ({ label, unit: 'mm' });
  const edge = (key: keyof PouchDescription, label: string): number =>
    readOptional(pouch[key], key, { range: { min: 0, max: LENGTH_MM.max }, ...words(label), otherwise: 0 });
  const width = readNumber(pouch.width_mm, 'width_mm', { range: LENGTH_MM, ...words('Width') });
  const height = readNumber(pouch.height_mm, 'height_mm', { range: LENGTH_MM, ...words('Height') });
  const left = edge('seal_left_mm', 'Left seal');
  const right = edge('seal_right_mm', 'Right seal');
  const top = edge('seal_top_mm', 'Top seal');
  const bottom = edge('seal_bottom_mm', 'Bottom seal');
  const gusset = edge('gusset_depth_mm', 'Gusset');
  const openWidth = width - left - right;
  const openHeight = height - top - bottom;
  if (!(openWidth > 0)) {
    throw new InputError(
      'width_mm',
      width,
      'The side seals leave no open width; widen the pouch or narrow the seals.',
    );
  }
  if (!(openHeight > 0)) {
    throw new InputError(
      'height_mm',
      height,
      'The seals leave no open height; lengthen the pouch or narrow the seals.',
    );
  }
  const seals: [number, number][] = [
    [left, openHeight],
    [right, openHeight],
    [top, openWidth],
    [bottom, openWidth],
  ];
  const sealed = seals.filter(([seal]) => seal > 0);
  return {
    area_m2: (2 * openWidth * openHeight + 2 * gusset * openWidth) * 1e-6,
    seal_length_m: sealed.reduce((sum, [, length]) => sum + length, 0) * 1e-3,
    seal_length_over_width: sealed.reduce((sum, [seal, length]) => sum + length / seal, 0),
  };
}
