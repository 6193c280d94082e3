import type { Candidate } from '../../../shared/contract/studies';
import type { DrawnLayer } from '../../charts';
import type { Figures } from './use-figures';

/** A candidate's layers as the drawings take them. */
export function drawnLayers(candidate: Candidate, show: Figures): DrawnLayer[] {
  return candidate.layers.map((layer) => ({
    name: layer.material_name,
    materialClass: layer.material_class,
    polymerFamily: layer.polymer_family,
    kind: layer.kind,
    thicknessUm: layer.thickness_um,
    gaugeLabel: show.exact(layer.thickness_um, 'thickness_um'),
  }));
}
