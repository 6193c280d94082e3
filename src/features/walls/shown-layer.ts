import type { DrawnLayer } from '../../charts/section-geometry';
import type { MaterialSpec } from '../../../shared/contract/materials';
import { formatQuantity, type DisplayUnitSystem } from '../../../shared/units/format';

/** A layer as the drawings take it. */
export function shownLayer(
  material: MaterialSpec,
  thicknessUm: number,
  unitSystem: DisplayUnitSystem,
): DrawnLayer {
  return {
    name: material.name,
    materialClass: material.material_class,
    polymerFamily: material.polymer_family,
    kind: material.kind,
    thicknessUm,
    gaugeLabel: formatQuantity(thicknessUm, 'thickness_um', { unitSystem, isExact: unitSystem === 'metric' })
      .text,
  };
}

/** '67 µm in all': coatings count with their own thickness. */
export function totalGauge(thicknessesUm: number[], unitSystem: DisplayUnitSystem): string {
  const sum = thicknessesUm.reduce((total, each) => total + each, 0);
  return formatQuantity(Number(sum.toPrecision(12)), 'thickness_um', {
    unitSystem,
    isExact: unitSystem === 'metric',
  }).text;
}
