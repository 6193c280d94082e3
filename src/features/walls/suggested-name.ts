import type { MaterialSpec } from '../../../shared/contract/materials';
import { formatExact, toDisplay, type DisplayUnitSystem } from '../../../shared/units/format';

export interface NamedLayer {
  material: Pick<MaterialSpec, 'name' | 'kind' | 'polymer_family'>;
  thicknessUm: number;
}

const LONGEST_SHORT_NAME = 14;
const LONGEST_NAME = 120;

/** 'PET 12 / EVOH 5 / LDPE 50': materials by their short names, gauges in the reader's unit, outside first. */
export function suggestedName(layers: NamedLayer[], unitSystem: DisplayUnitSystem): string {
  const parts = layers.map(({ material, thicknessUm }) => {
    const short = shortMaterialName(material);
    if (material.kind === 'coating' || !Number.isFinite(thicknessUm)) return short;
    const shown = toDisplay(thicknessUm, 'thickness_um', unitSystem);
    return `${short} ${unitSystem === 'metric' ? formatExact(shown) : formatExact(Number(shown.toPrecision(3)))}`;
  });
  const whole = parts.join(' / ');
  if (whole.length <= LONGEST_NAME) return whole;
  const first = parts[0] ?? '';
  const last = parts.at(-1) ?? '';
  return `${first} / … ${parts.length - 2} more / ${last}`.slice(0, LONGEST_NAME);
}

/** 'LDPE film' is LDPE, 'Aluminium foil 7 µm' is Aluminium foil, 'EVOH 32 mol% ethylene' is EVOH. */
export function shortMaterialName(material: NamedLayer['material']): string {
  const plain = material.name
    .replace(/\s+\d+([.,]\d+)?\s*(µm|um|mil)$/, '')
    .replace(/\s+film$/i, '')
    .split(/[,(]/)[0]!
    .trim();
  if (plain.length <= LONGEST_SHORT_NAME && plain !== '') return plain;
  if (material.kind === 'film' && material.polymer_family !== '') return material.polymer_family;
  const beforeOn = plain.split(/\s+on\s+/)[0] ?? plain;
  return beforeOn === '' ? material.name.trim() : beforeOn;
}
