import { ATMOSPHERE_PA } from '../units';
import type { TransmissionTest, WallInTest } from './description/evaluation';
import { InputError } from './description/input-error';
import { OXYGEN_FRACTION } from './description/ranges';
import { readHumidity, readTemperatureK } from './description/read-conditions';
import { readLayers } from './description/read-layer';
import { readChoice, readNumber, readObject } from './description/read-number';
import type { LayerDescription } from './description/storage-description';
import type { Layer } from './layer';
import { WallAtTemperature } from './wall-at-temperature';
import { describeWall } from './wall-profile';
import { saturationPressureAtK } from './water-vapour';

/** What laboratories can measure at best: cm³(STP) or g per m² and day. */
export const SMALLEST_MEASURABLE_RATE = 0.005;

/** A test in SI, with the pressures that drive it. */
export interface TestConditions {
  gas: 'oxygen' | 'water';
  temperatureK: number;
  humidityOutside: number;
  humidityInside: number;
  oxygenOutsidePa: number;
}

/** Reads a test. Errors: InputError, also for a water test without a difference. */
export function readTest(value: unknown, path: string): TestConditions {
  const test = readObject<TransmissionTest>(value, path, 'Test');
  const gas = readChoice(test.gas, `${path}.gas`, {
    choices: ['oxygen', 'water'] as const,
    label: 'Gas of a test',
  });
  const temperatureK = readTemperatureK(test.temperature_C, `${path}.temperature_C`);
  if (test.gas === 'oxygen') {
    const humidityOutside = readHumidity(test.relative_humidity_outside, `${path}.relative_humidity_outside`);
    const humidityInside = readHumidity(test.relative_humidity_inside, `${path}.relative_humidity_inside`);
    const fraction = readNumber(test.oxygen_mole_fraction_dry, `${path}.oxygen_mole_fraction_dry`, {
      range: OXYGEN_FRACTION,
      label: 'Oxygen in the dry test gas',
    });
    const oxygenOutsidePa =
      fraction * (ATMOSPHERE_PA - humidityOutside * saturationPressureAtK(temperatureK));
    return { gas, temperatureK, humidityOutside, humidityInside, oxygenOutsidePa };
  }
  const high = readHumidity(
    test.relative_humidity_high,
    `${path}.relative_humidity_high`,
    'Humidity of the moist side',
  );
  const low = readHumidity(
    test.relative_humidity_low,
    `${path}.relative_humidity_low`,
    'Humidity of the dry side',
  );
  if (!(high > low)) {
    throw new InputError(
      `${path}.relative_humidity_low`,
      low,
      `The dry side (${low}) must be drier than the moist side (${high}); exchange or change them.`,
    );
  }
  const side = readChoice(test.moist_side ?? 'outside', `${path}.moist_side`, {
    choices: ['outside', 'inside'] as const,
    label: 'Moist side',
  });
  return {
    gas,
    temperatureK,
    humidityOutside: side === 'outside' ? high : low,
    humidityInside: side === 'outside' ? low : high,
    oxygenOutsidePa: 0,
  };
}

/** A wall of layers already read, in a test. */
export function testWall(layers: Layer[], test: TransmissionTest, path: string): WallInTest {
  const conditions = readTest(test, path);
  const wall = new WallAtTemperature(layers, conditions.temperatureK);
  const state = describeWall(wall, { ...conditions, oxygenInsidePa: 0 });
  const isOxygen = conditions.gas === 'oxygen';
  const rate = isOxygen ? state.oxygen.flux_cm3_STP_per_m2_day : Math.abs(state.water.flux_g_per_m2_day);
  return {
    test: { ...test },
    permeance_mol_per_m2_s_Pa: isOxygen
      ? state.oxygen.permeance_mol_per_m2_s_Pa
      : state.water.permeance_mol_per_m2_s_Pa,
    ...(isOxygen ? { rate_cm3_STP_per_m2_day: rate } : { rate_g_per_m2_day: rate }),
    is_below_measurable: rate < SMALLEST_MEASURABLE_RATE,
    resistance_share: isOxygen ? state.oxygen.resistance_share : state.water.resistance_share,
    interface_relative_humidity: state.water.interface_relative_humidity,
  };
}

/**
 * One wall in a transmission test: its permeance [mol/(m²·s·Pa)] and its rate [cm³(STP)/(m²·day) or g/(m²·day)] in the
 * gas of that test. Oxygen: Q · y·(101 325 Pa − RH_out·p_sat) against an oxygen-free side. Water: Q · p_sat·(high − low).
 * Range: −30 to 60 °C. Errors: InputError. Cost: as wallState.
 */
export function wallInTest(layers: LayerDescription[], test: TransmissionTest): WallInTest {
  return testWall(readLayers(layers, 'layers'), test, 'test');
}
