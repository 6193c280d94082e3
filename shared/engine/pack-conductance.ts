import type { GasConductance } from './description/evaluation';
import { readHumidity, readTemperatureK } from './description/read-conditions';
import { readPack } from './description/read-pack';
import type { PackDescription } from './description/storage-description';
import { PackAtTemperature } from './pack-at-temperature';

export interface PackConditions {
  temperature_C: number;
  relative_humidity_outside: number;
  relative_humidity_inside: number;
}

export interface PackConductance {
  oxygen: GasConductance;
  water: GasConductance;
}

/** What a pack shows once it has been asked to conduct. */
export function describePack(pack: PackAtTemperature): PackConductance {
  const oxygenWalls = pack.walls.map((wall, i) => wall.oxygenPermeance * pack.areas[i]);
  const waterWalls = pack.walls.map((wall, i) => wall.waterPermeance * pack.areas[i]);
  return {
    oxygen: {
      walls_mol_per_s_Pa: oxygenWalls,
      seal_mol_per_s_Pa: pack.seal ? pack.seal.oxygenPermeance * pack.sealAreaM2 : 0,
      leaks_mol_per_s_Pa: pack.leaksOxygen,
      total_mol_per_s_Pa: pack.oxygen,
    },
    water: {
      walls_mol_per_s_Pa: waterWalls,
      seal_mol_per_s_Pa: pack.seal ? pack.seal.waterPermeance * pack.sealAreaM2 : 0,
      leaks_mol_per_s_Pa: pack.leaksWater,
      total_mol_per_s_Pa: pack.water,
    },
  };
}

/**
 * Conductance of a pack to each gas [mol/(s·Pa)]: K = Σ Q·A + K_seal + K_leak.
 * Range: −30 to 60 °C. Errors: InputError. Cost: that of its walls.
 */
export function packConductance(pack: PackDescription, conditions: PackConditions): PackConductance {
  const read = readPack(pack, 'pack');
  const temperatureK = readTemperatureK(conditions.temperature_C, 'temperature_C');
  const outside = readHumidity(conditions.relative_humidity_outside, 'relative_humidity_outside');
  const inside = readHumidity(conditions.relative_humidity_inside, 'relative_humidity_inside');
  const at = new PackAtTemperature(read, temperatureK);
  at.conduct(outside, inside);
  return describePack(at);
}
