import type { LayerDescription, WallState } from '../../../shared/engine';
import type { TurnedRoundComparison, WayRound } from './turned-round-words';
import { stateBetween, type SidesOfWall } from './wall-preview';

/** The same wall both ways round between the same two sides. */
export function turnedRoundOf(layers: LayerDescription[], sides: SidesOfWall): TurnedRoundComparison {
  const asBuilt = stateBetween(layers, sides);
  return {
    asBuilt: wayRound(asBuilt),
    turned: wayRound(stateBetween([...layers].reverse(), sides)),
    sensitive: mostSensitive(layers, asBuilt),
  };
}

function wayRound(state: WallState): WayRound {
  return {
    oxygenPermeanceSi: state.oxygen.permeance_mol_per_m2_s_Pa,
    interfaceHumidity: state.water.interface_relative_humidity,
  };
}

function mostSensitive(layers: LayerDescription[], state: WallState): TurnedRoundComparison['sensitive'] {
  let found: { name: string; index: number; share: number } | null = null;
  layers.forEach((layer, index) => {
    const feelsHumidity = layer.kind !== 'foil' && layer.oxygen.humidity_curve !== undefined;
    const share = state.oxygen.resistance_share[index] ?? 0;
    if (feelsHumidity && (found === null || share > found.share)) found = { name: layer.name, index, share };
  });
  return found;
}
