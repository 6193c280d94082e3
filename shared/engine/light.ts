import { InputError } from './description/input-error';
import { COATING_THICKNESS_UM, LAYER_COUNT, TRANSMISSION } from './description/ranges';
import { readDefects } from './description/read-layer';
import { readChoice, readList, readNumber, readObject } from './description/read-number';
import type { DefectsDescription } from './description/storage-description';

/** Fractions of the light that pass, 0 to 1. */
export interface Transmission {
  uv_350nm: number;
  visible_550nm: number;
}

/** A layer as light meets it: per µm (films) or as a whole (metal, print); a foil by its pinholes alone. */
export interface LightLayer {
  kind: 'film' | 'coating' | 'foil';
  thickness_um?: number;
  /** Fraction passed by 1 µm. */
  transmission_per_um?: Transmission;
  /** Fraction passed by the whole layer. */
  transmission?: Transmission;
  defects?: DefectsDescription;
}

const WAVES = ['uv_350nm', 'visible_550nm'] as const;

/**
 * Light through layers [fraction], ultraviolet (350 nm) and visible (550 nm): the product over layers. A film passes
 * τ^(ℓ/µm) (Beer–Lambert), a layer stated as a whole its own fraction, a foil its open area n·π·r². Reflection between
 * layers is left out. Range: fractions 0 to 1. Errors: InputError, also for a layer whose light is not known.
 * Cost: none to speak of.
 */
export function light(layers: LightLayer[]): Transmission {
  const list = readList<LightLayer>(layers, 'layers', { range: LAYER_COUNT, label: 'Layers of a wall' });
  const passed: Transmission = { uv_350nm: 1, visible_550nm: 1 };
  list.forEach((item, i) => {
    const through = lightThrough(item, `layers[${i}]`);
    for (const wave of WAVES) passed[wave] *= through[wave];
  });
  return passed;
}

function lightThrough(value: unknown, path: string): Transmission {
  const layer = readObject<LightLayer>(value, path, 'Layer');
  const kind = readChoice(layer.kind, `${path}.kind`, {
    choices: ['film', 'coating', 'foil'] as const,
    label: 'Kind of layer',
  });
  if (kind === 'foil') {
    const defects = readDefects(layer.defects, `${path}.defects`);
    const open = defects ? defects.densityPerM2 * Math.PI * defects.radiusM * defects.radiusM : 0;
    return { uv_350nm: open, visible_550nm: open };
  }
  if (layer.transmission !== undefined && layer.transmission !== null) {
    return readTransmission(layer.transmission, `${path}.transmission`);
  }
  if (layer.transmission_per_um === undefined || layer.transmission_per_um === null) {
    throw new InputError(
      `${path}.transmission`,
      null,
      'How much light this layer passes is not known: give transmission or transmission_per_um.',
    );
  }
  const perUm = readTransmission(layer.transmission_per_um, `${path}.transmission_per_um`);
  const thicknessUm = readNumber(layer.thickness_um, `${path}.thickness_um`, {
    range: COATING_THICKNESS_UM,
    label: 'Thickness',
    unit: 'µm',
  });
  return { uv_350nm: perUm.uv_350nm ** thicknessUm, visible_550nm: perUm.visible_550nm ** thicknessUm };
}

function readTransmission(value: unknown, path: string): Transmission {
  const given = readObject<Transmission>(value, path, 'Transmission');
  const read = (wave: (typeof WAVES)[number]): number =>
    readNumber(given[wave], `${path}.${wave}`, { range: TRANSMISSION, label: 'Light passed' });
  return { uv_350nm: read('uv_350nm'), visible_550nm: read('visible_550nm') };
}
