import { DAY_S, MOL_PER_CM3_STP, WATER_MOLAR_MASS, ZERO_CELSIUS_K } from '../units';
import type { WallState } from './description/evaluation';
import type { WallAtTemperature } from './wall-at-temperature';
import { saturationPressureAtK } from './water-vapour';

/** The two sides of a wall, SI. */
export interface WallSides {
  humidityOutside: number;
  humidityInside: number;
  oxygenOutsidePa: number;
  oxygenInsidePa: number;
}

/** Each layer's share of a resistance. Tight foils share it evenly, so that shares add to 1. */
function sharesOf(resistance: Float64Array): number[] {
  let tight = 0;
  let sum = 0;
  for (let i = 0; i < resistance.length; i++) {
    if (resistance[i] === Infinity) tight += 1;
    sum += resistance[i];
  }
  const shares: number[] = [];
  for (let i = 0; i < resistance.length; i++) {
    if (tight > 0) shares.push(resistance[i] === Infinity ? 1 / tight : 0);
    else shares.push(resistance[i] / sum);
  }
  return shares;
}

/** Values at the interfaces, outside first, falling by each layer's share of the difference. */
function stair(outside: number, inside: number, shares: number[]): number[] {
  const values = [outside];
  let fallen = 0;
  for (let i = 0; i < shares.length - 1; i++) {
    fallen += shares[i];
    values.push(outside + (inside - outside) * fallen);
  }
  values.push(inside);
  return values;
}

/** Everything a solved wall shows, in the units of the API. Shares and interfaces: see WallState. */
export function describeWall(wall: WallAtTemperature, sides: WallSides): WallState {
  const { humidityOutside, humidityInside, oxygenOutsidePa, oxygenInsidePa } = sides;
  wall.solve(humidityOutside, humidityInside);
  const saturationPa = saturationPressureAtK(wall.temperatureK);
  const difference = humidityOutside - humidityInside;
  const waterFlux = wall.waterPermeance * saturationPa * difference;
  const oxygenFlux = wall.oxygenPermeance * (oxygenOutsidePa - oxygenInsidePa);
  const waterShares = sharesOf(wall.waterResistance);
  const oxygenShares = sharesOf(wall.oxygenResistance);
  const humidities = stair(humidityOutside, humidityInside, waterShares);
  return {
    temperature_C: wall.temperatureK - ZERO_CELSIUS_K,
    relative_humidity_outside: humidityOutside,
    relative_humidity_inside: humidityInside,
    oxygen_pressure_outside_Pa: oxygenOutsidePa,
    oxygen_pressure_inside_Pa: oxygenInsidePa,
    water: {
      permeance_mol_per_m2_s_Pa: wall.waterPermeance,
      flux_mol_per_m2_s: waterFlux,
      flux_g_per_m2_day: waterFlux * WATER_MOLAR_MASS * 1e3 * DAY_S,
      interface_relative_humidity: humidities,
      interface_pressure_Pa: humidities.map((humidity) => humidity * saturationPa),
      resistance_share: waterShares,
    },
    oxygen: {
      permeance_mol_per_m2_s_Pa: wall.oxygenPermeance,
      flux_mol_per_m2_s: oxygenFlux,
      flux_cm3_STP_per_m2_day: (oxygenFlux * DAY_S) / MOL_PER_CM3_STP,
      interface_pressure_Pa: stair(oxygenOutsidePa, oxygenInsidePa, oxygenShares),
      resistance_share: oxygenShares,
    },
  };
}
