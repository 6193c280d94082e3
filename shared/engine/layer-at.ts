import { readHumidity, readTemperatureK } from './description/read-conditions';
import { readLayer } from './description/read-layer';
import type { LayerDescription } from './description/storage-description';
import { permeanceAt, type GasInLayer } from './layer';
import { isBeyondMeasured } from './measured-range';
import { WallAtTemperature } from './wall-at-temperature';

export interface GasAtConditions {
  permeance_mol_per_m2_s_Pa: number;
  /** Films only. */
  permeability_mol_m_per_m2_s_Pa?: number;
  /** True more than 15 K outside the temperatures at which the activation energy was measured. */
  temperature_warning: boolean;
  /** True where the humidity lies beyond the curve's points. */
  humidity_warning: boolean;
}

export interface LayerAtConditions {
  oxygen: GasAtConditions;
  water: GasAtConditions;
}

/**
 * One layer by itself at one temperature [°C] and humidity [0…1]: permeance [mol/(m²·s·Pa)] and, for a film,
 * permeability [mol·m/(m²·s·Pa)]. P(T, h) = P_ref · exp[−(E/R)(1/T − 1/T_ref)] · f(h)/f(h_ref). A foil or coating with
 * pinholes is taken bare on both sides.
 * Range: −30 to 60 °C. Errors: InputError. Cost: microseconds.
 */
export function layerAt(
  layer: LayerDescription,
  conditions: { temperature_C: number; relative_humidity: number },
): LayerAtConditions {
  const read = readLayer(layer, 'layer');
  const temperatureK = readTemperatureK(conditions.temperature_C, 'temperature_C');
  const humidity = readHumidity(conditions.relative_humidity, 'relative_humidity');
  const alone = new WallAtTemperature([read], temperatureK);
  alone.solve(humidity, humidity);
  const gasAt = (gas: GasInLayer | null, wallPermeance: number): GasAtConditions => {
    if (gas === null || read.defects) {
      return {
        permeance_mol_per_m2_s_Pa: wallPermeance,
        temperature_warning: gas !== null && isBeyondMeasured(gas, temperatureK),
        humidity_warning: gas?.curve?.isBeyond(humidity) ?? false,
      };
    }
    const permeance = permeanceAt(gas, temperatureK, humidity);
    return {
      permeance_mol_per_m2_s_Pa: permeance,
      ...(read.kind === 'film' ? { permeability_mol_m_per_m2_s_Pa: permeance * read.thicknessM } : {}),
      temperature_warning: isBeyondMeasured(gas, temperatureK),
      humidity_warning: gas.curve?.isBeyond(humidity) ?? false,
    };
  };
  return {
    oxygen: gasAt(read.oxygen, alone.oxygenPermeance),
    water: gasAt(read.water, alone.waterPermeance),
  };
}
