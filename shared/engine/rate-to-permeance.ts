import { ATMOSPHERE_PA, DAY_S, MOL_PER_CM3_STP, WATER_MOLAR_MASS } from '../units';
import { InputError } from './description/input-error';
import { OXYGEN_FRACTION, TOTAL_PRESSURE_PA } from './description/ranges';
import { readHumidity, readTemperatureK } from './description/read-conditions';
import { readChoice, readNumber, readOptional } from './description/read-number';
import { saturationPressureAtK } from './water-vapour';

/** A transmission rate with the test it belongs to. */
export type TransmissionRate =
  | {
      gas: 'oxygen';
      temperature_C: number;
      rate_cm3_STP_per_m2_day: number;
      oxygen_mole_fraction_dry: number;
      /** Both sides. */
      relative_humidity: number;
      total_pressure_Pa?: number;
    }
  | {
      gas: 'water';
      temperature_C: number;
      rate_g_per_m2_day: number;
      relative_humidity_high: number;
      relative_humidity_low: number;
    };

export interface PermeanceFromRate {
  permeance_mol_per_m2_s_Pa: number;
  pressure_difference_Pa: number;
}

const RATE = { min: 0, max: 1e12 };

/**
 * Permeance [mol/(m²·s·Pa)] from a transmission rate: the rate over the partial-pressure difference of its test [Pa].
 * Oxygen: Δp = y·(p_total − RH·p_sat); water: Δp = (high − low)·p_sat. Range: −30 to 60 °C. Errors: InputError, also
 * where the test has no difference. Cost: one saturation pressure.
 */
export function rateToPermeance(rate: TransmissionRate): PermeanceFromRate {
  const gas = readChoice(rate.gas, 'gas', { choices: ['oxygen', 'water'] as const, label: 'Gas' });
  const saturationPa = saturationPressureAtK(readTemperatureK(rate.temperature_C, 'temperature_C'));
  if (gas === 'oxygen' && rate.gas === 'oxygen') {
    const molar =
      (readNumber(rate.rate_cm3_STP_per_m2_day, 'rate_cm3_STP_per_m2_day', {
        range: RATE,
        label: 'Oxygen transmission rate',
        unit: 'cm³(STP)/(m²·day)',
      }) *
        MOL_PER_CM3_STP) /
      DAY_S;
    const fraction = readNumber(rate.oxygen_mole_fraction_dry, 'oxygen_mole_fraction_dry', {
      range: OXYGEN_FRACTION,
      label: 'Oxygen in the dry test gas',
    });
    const total = readOptional(rate.total_pressure_Pa, 'total_pressure_Pa', {
      range: TOTAL_PRESSURE_PA,
      label: 'Total pressure',
      unit: 'Pa',
      otherwise: ATMOSPHERE_PA,
    });
    const difference =
      fraction * (total - readHumidity(rate.relative_humidity, 'relative_humidity') * saturationPa);
    return { permeance_mol_per_m2_s_Pa: molar / difference, pressure_difference_Pa: difference };
  }
  if (rate.gas !== 'water') throw new InputError('gas', gas, 'Use oxygen or water.');
  const molar =
    readNumber(rate.rate_g_per_m2_day, 'rate_g_per_m2_day', {
      range: RATE,
      label: 'Water vapour transmission rate',
      unit: 'g/(m²·day)',
    }) /
    (1e3 * WATER_MOLAR_MASS * DAY_S);
  const high = readHumidity(rate.relative_humidity_high, 'relative_humidity_high');
  const low = readHumidity(rate.relative_humidity_low, 'relative_humidity_low');
  if (!(high > low)) {
    throw new InputError(
      'relative_humidity_low',
      low,
      'The dry side must be drier than the moist side; exchange them.',
    );
  }
  const difference = (high - low) * saturationPa;
  return { permeance_mol_per_m2_s_Pa: molar / difference, pressure_difference_Pa: difference };
}
