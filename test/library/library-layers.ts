import { libraryMaterials } from '../../server/db/seed/library-materials';
import type { MaterialSpec } from '../../shared/contract/materials';
import type { LayerDescription } from '../../shared/engine';

const specs = new Map(libraryMaterials().map(({ libraryId, spec }) => [libraryId, spec]));

/** A material of the library by its own id. */
export function librarySpec(libraryId: string): MaterialSpec {
  const spec = specs.get(libraryId);
  if (!spec) throw new Error(`The library holds no "${libraryId}".`);
  return spec;
}

/** Every film of the library, in its order. */
export function libraryFilmIds(): string[] {
  return [...specs].filter(([, spec]) => spec.kind === 'film').map(([libraryId]) => libraryId);
}

/** A layer as the product makes it of a material, nothing changed; a coating's thickness never scales it. */
export function libraryLayer(libraryId: string, thicknessUm = 0): LayerDescription {
  const spec = librarySpec(libraryId);
  const common = { name: spec.name, thickness_um: thicknessUm };
  if (spec.kind === 'foil')
    return { ...common, kind: 'foil', ...(spec.defects && { defects: spec.defects }) };
  if (spec.kind === 'film')
    return { ...common, kind: 'film', oxygen: spec.oxygen.gas, water: spec.water.gas };
  return {
    ...common,
    kind: 'coating',
    oxygen: spec.oxygen.gas,
    water: spec.water.gas,
    ...(spec.defects && { defects: spec.defects }),
  };
}
