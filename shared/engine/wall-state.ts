import type { WallState } from './description/evaluation';
import { readHumidity, readTemperatureK } from './description/read-conditions';
import { readLayers } from './description/read-layer';
import { readNumber } from './description/read-number';
import type { LayerDescription } from './description/storage-description';
import { describeWall } from './wall-profile';
import { WallAtTemperature } from './wall-at-temperature';

export interface WallConditions {
  temperature_C: number;
  relative_humidity_outside: number;
  relative_humidity_inside: number;
  oxygen_pressure_outside_Pa: number;
  oxygen_pressure_inside_Pa: number;
}

const OXYGEN_PRESSURE = { min: 0, max: 1e7 };

/**
 * One wall under one pair of environments: permeances [mol/(m²·s·Pa)], fluxes, interfaces and shares of the resistance.
 * Layers in series at steady state; equations at WallAtTemperature. Range: −30 to 60 °C, humidities 0 to 1.
 * Errors: InputError. Cost: about 10 µs for seven layers, two of them humidity-dependent.
 */
export function wallState(layers: LayerDescription[], conditions: WallConditions): WallState {
  const read = readLayers(layers, 'layers');
  const temperatureK = readTemperatureK(conditions.temperature_C, 'temperature_C');
  const label = { label: 'Oxygen pressure', unit: 'Pa' };
  const state = describeWall(new WallAtTemperature(read, temperatureK), {
    humidityOutside: readHumidity(conditions.relative_humidity_outside, 'relative_humidity_outside'),
    humidityInside: readHumidity(conditions.relative_humidity_inside, 'relative_humidity_inside'),
    oxygenOutsidePa: readNumber(conditions.oxygen_pressure_outside_Pa, 'oxygen_pressure_outside_Pa', {
      range: OXYGEN_PRESSURE,
      ...label,
    }),
    oxygenInsidePa: readNumber(conditions.oxygen_pressure_inside_Pa, 'oxygen_pressure_inside_Pa', {
      range: OXYGEN_PRESSURE,
      ...label,
    }),
  });
  // As given, not by way of K and back.
  state.temperature_C = conditions.temperature_C;
  return state;
}
