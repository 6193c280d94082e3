import type { LayerDescription } from '../../../shared/engine/description/storage-description';
import type { MaterialSpec } from '../../../shared/contract/materials';

/** A material at a gauge, as the engine takes it. */
export function layerDescription(material: MaterialSpec, thicknessUm: number): LayerDescription {
  if (material.kind === 'film') {
    return {
      kind: 'film',
      name: material.name,
      thickness_um: thicknessUm,
      oxygen: material.oxygen.gas,
      water: material.water.gas,
    };
  }
  const defects = material.defects === null ? {} : { defects: material.defects };
  if (material.kind === 'foil') {
    return { kind: 'foil', name: material.name, thickness_um: thicknessUm, ...defects };
  }
  return {
    kind: 'coating',
    name: material.name,
    thickness_um: thicknessUm,
    oxygen: material.oxygen.gas,
    water: material.water.gas,
    ...defects,
  };
}
