import { saturationPressurePa, wallInTest, wallState } from '../../../shared/engine';
import type { LayerDescription } from '../../../shared/engine/description/storage-description';
import { quantity } from '../../../shared/contract/fields';
import { RULES } from '../../../shared/contract/rules';
import { ValidationError } from 'yup';
import { fromDisplay, parseNumber, type DisplayUnitSystem } from '../../../shared/units/format';

/** What a person types: temperature in their unit, humidities in percent. */
export interface ConditionText {
  temperature: string;
  humidityOutside: string;
  humidityInside: string;
}

export interface WallCondition {
  temperatureC: number;
  humidityOutside: number;
  humidityInside: number;
}

export type ConditionFaults = Partial<Record<keyof ConditionText, string>>;

/** The condition, or what is wrong with each field of it. */
export function readCondition(
  text: ConditionText,
  unitSystem: DisplayUnitSystem,
): { condition: WallCondition } | { faults: ConditionFaults } {
  const temperatureC = fromDisplay(parseNumber(text.temperature), 'temperature_C', unitSystem);
  const humidityOutside = fromDisplay(parseNumber(text.humidityOutside), 'fraction_as_percent', unitSystem);
  const humidityInside = fromDisplay(parseNumber(text.humidityInside), 'fraction_as_percent', unitSystem);
  const faults: ConditionFaults = {};
  const temperatureFault = faultOf(RULES.temperature, temperatureC);
  const outsideFault = faultOf({ ...RULES.relativeHumidity, label: 'Humidity outside' }, humidityOutside);
  const insideFault = faultOf({ ...RULES.relativeHumidity, label: 'Humidity inside' }, humidityInside);
  if (temperatureFault !== null) faults.temperature = temperatureFault;
  if (outsideFault !== null) faults.humidityOutside = outsideFault;
  if (insideFault !== null) faults.humidityInside = insideFault;
  if (Object.keys(faults).length > 0) return { faults };
  return { condition: { temperatureC, humidityOutside, humidityInside } };
}

function faultOf(rule: Parameters<typeof quantity>[0], value: number): string | null {
  try {
    quantity(rule).validateSync(value);
    return null;
  } catch (error) {
    if (error instanceof ValidationError) return error.message;
    throw error;
  }
}

export interface WallAtCondition {
  oxygenPermeanceSi: number;
  waterPermeanceSi: number;
  /** In pure oxygen at one atmosphere. */
  otrCm3PerM2Day: number;
  /** Between the two humidities; 0 where they are equal. */
  wvtrGPerM2Day: number;
  oxygenShare: number[];
  waterShare: number[];
}

const AIR_OXYGEN = 0.2095;
const ATMOSPHERE_PA = 101_325;

/** The same engine as the server's, run here: a preview. */
export function wallAtCondition(layers: LayerDescription[], condition: WallCondition): WallAtCondition {
  const { temperatureC, humidityOutside, humidityInside } = condition;
  const outsidePa = AIR_OXYGEN * (ATMOSPHERE_PA - humidityOutside * saturationPressurePa(temperatureC));
  const state = wallState(layers, {
    temperature_C: temperatureC,
    relative_humidity_outside: humidityOutside,
    relative_humidity_inside: humidityInside,
    oxygen_pressure_outside_Pa: outsidePa,
    oxygen_pressure_inside_Pa: 0,
  });
  const test = wallInTest(layers, {
    gas: 'oxygen',
    temperature_C: temperatureC,
    relative_humidity_outside: humidityOutside,
    relative_humidity_inside: humidityInside,
    oxygen_mole_fraction_dry: 1,
  });
  return {
    oxygenPermeanceSi: state.oxygen.permeance_mol_per_m2_s_Pa,
    waterPermeanceSi: state.water.permeance_mol_per_m2_s_Pa,
    otrCm3PerM2Day: test.rate_cm3_STP_per_m2_day ?? 0,
    wvtrGPerM2Day: Math.abs(state.water.flux_g_per_m2_day),
    oxygenShare: state.oxygen.resistance_share,
    waterShare: state.water.resistance_share,
  };
}
