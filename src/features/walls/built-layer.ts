import type { LayerDescription } from '../../../shared/engine';
import type { MaterialSpec } from '../../../shared/contract/materials';
import type { DisplayUnitSystem } from '../../../shared/units/format';
import type { DrawnLayer } from '../../charts/section-geometry';
import { layerDescription } from './layer-descriptions';
import { shownLayer } from './shown-layer';
import { gaugeUm, type WallDraft } from './wall-draft';
import type { MaterialBook } from './material-book';

/** A layer of the draft whose material is at hand and whose gauge can be computed with. */
export interface BuiltLayer {
  material: MaterialSpec;
  drawn: DrawnLayer;
  description: LayerDescription;
}

const THICKEST_UM = 2000;

/** Null as long as one layer is not ready: half a wall would answer for another wall. */
export function builtLayers(
  wall: WallDraft,
  book: Pick<MaterialBook, 'revisionOf'>,
  unitSystem: DisplayUnitSystem,
): BuiltLayer[] | null {
  const built: BuiltLayer[] = [];
  for (const layer of wall.layers) {
    const material = book.revisionOf(layer)?.spec;
    const thicknessUm = gaugeUm(layer.gauge);
    if (material === undefined || !(thicknessUm > 0) || thicknessUm > THICKEST_UM) return null;
    built.push({
      material,
      drawn: shownLayer(material, thicknessUm, unitSystem),
      description: layerDescription(material, thicknessUm),
    });
  }
  return built;
}
