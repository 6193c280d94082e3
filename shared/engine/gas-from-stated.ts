import { kindOf, toSi, UnitError, WATER_MOLAR_MASS, type QuantityKind } from '../units';
import { InputError } from './description/input-error';
import {
  OXYGEN_FRACTION,
  PERMEABILITY_SI,
  PERMEANCE_SI,
  REFERENCE_TEMPERATURE_C,
  THICKNESS_UM,
} from './description/ranges';
import { readHumidity, readTemperatureK } from './description/read-conditions';
import { readCurve } from './description/read-layer';
import { readChoice, readNumber } from './description/read-number';
import type {
  CoatingGasDescription,
  FilmGasDescription,
  HumidityCurveDescription,
} from './description/storage-description';
import type { HumidityCurve } from './humidity-curve';
import { ATMOSPHERE_PA } from '../units';
import { saturationPressureAtK } from './water-vapour';

/** One gas in one material as a data sheet states it. */
export interface StatedGas {
  gas: 'oxygen' | 'water';
  kind: 'film' | 'coating';
  value: number;
  /** A name of UNITS. */
  unit: string;
  /** The gauge of the film that was measured: for a film stated in a unit that is not per thickness, and only then. */
  thickness_um?: number;
  temperature_C: number;
  /**
   * Oxygen: the humidity on both sides, 0 if absent. Water: the humidity at which the curve's factor equals its mean
   * over the test; where absent and a curve is given it is worked out, so that computing the test gives the value back.
   */
  relative_humidity?: number;
  /** Of the test behind a water rate. */
  relative_humidity_high?: number;
  relative_humidity_low?: number;
  /** Of the test behind an oxygen rate: 1 for pure oxygen, 0.2095 for air. */
  gas_mole_fraction_dry?: number;
  activation_energy_J_per_mol?: number;
  humidity_curve?: HumidityCurveDescription;
  measured_temperature_min_C?: number;
  measured_temperature_max_C?: number;
}

const SUITABLE: Record<StatedGas['gas'], Record<StatedGas['kind'], QuantityKind[]>> = {
  oxygen: {
    film: ['gas permeability', 'gas transmission rate', 'gas permeance'],
    coating: ['gas permeance', 'gas transmission rate'],
  },
  water: {
    film: [
      'water vapour transmission rate times thickness',
      'water vapour permeability',
      'gas permeability',
      'water vapour transmission rate',
      'water vapour permeance',
      'gas permeance',
    ],
    coating: ['water vapour transmission rate', 'water vapour permeance', 'gas permeance'],
  },
};

/**
 * The gas block of a layer from a stated value: permeability [mol·m/(m²·s·Pa)] of a film, permeance [mol/(m²·s·Pa)] of
 * a coating. A rate is divided by the partial-pressure difference of its test; what was measured on a film of one gauge
 * is multiplied by that gauge.
 * Range: any unit of a suitable kind; rates −30 to 60 °C. Errors: InputError for a unit that cannot say it, for a film's
 * rate or permeance without the gauge it was measured on, for a rate without its test, and for values out of range. Cost: microseconds.
 */
export function gasFromStated(stated: StatedGas & { kind: 'film' }): FilmGasDescription;
export function gasFromStated(stated: StatedGas & { kind: 'coating' }): CoatingGasDescription;
export function gasFromStated(stated: StatedGas): FilmGasDescription | CoatingGasDescription;
export function gasFromStated(stated: StatedGas): FilmGasDescription | CoatingGasDescription {
  const gas = readChoice(stated.gas, 'gas', { choices: ['oxygen', 'water'] as const, label: 'Gas' });
  const layerKind = readChoice(stated.kind, 'kind', {
    choices: ['film', 'coating'] as const,
    label: 'Kind of layer',
  });
  const unitKind = suitableKind(stated, gas, layerKind);
  readNumber(stated.value, 'value', {
    range: { min: 0, max: Number.MAX_VALUE, isMinExcluded: true },
    label: 'Value',
  });
  readNumber(stated.temperature_C, 'temperature_C', {
    range: REFERENCE_TEMPERATURE_C,
    label: 'Temperature',
    unit: '°C',
  });
  const inUnit = toSi(stated.value, stated.unit);
  const isInKg = unitKind.startsWith('water');
  const molar = isInKg ? inUnit / WATER_MOLAR_MASS : inUnit;
  const si = (molar / drivingPressure(stated, unitKind)) * measuredThicknessM(stated, unitKind);
  const isFilm = layerKind === 'film';
  readNumber(si, 'value', {
    range: isFilm ? PERMEABILITY_SI : PERMEANCE_SI,
    label: isFilm ? 'Permeability' : 'Permeance',
    unit: isFilm ? 'mol·m/(m²·s·Pa)' : 'mol/(m²·s·Pa)',
  });
  const shared = {
    reference_temperature_C: stated.temperature_C,
    ...given('activation_energy_J_per_mol', stated.activation_energy_J_per_mol),
    ...given('humidity_curve', stated.humidity_curve),
    ...given('reference_relative_humidity', referenceHumidity(stated, unitKind)),
    ...given('measured_temperature_min_C', stated.measured_temperature_min_C),
    ...given('measured_temperature_max_C', stated.measured_temperature_max_C),
  };
  return isFilm
    ? { permeability_mol_m_per_m2_s_Pa: si, ...shared }
    : { permeance_mol_per_m2_s_Pa: si, ...shared };
}

function given<Key extends string, Value>(key: Key, value: Value | undefined): Partial<Record<Key, Value>> {
  const entry: Partial<Record<Key, Value>> = {};
  if (value !== undefined) entry[key] = value;
  return entry;
}

function suitableKind(stated: StatedGas, gas: StatedGas['gas'], layerKind: StatedGas['kind']): QuantityKind {
  const suitable = SUITABLE[gas][layerKind];
  let kind: QuantityKind;
  try {
    kind = kindOf(stated.unit);
  } catch (error) {
    if (!(error instanceof UnitError)) throw error;
    throw new InputError(
      'unit',
      stated.unit,
      `"${stated.unit}" is not a unit known here; use one of ${suitable.join(' or ')}.`,
    );
  }
  if (!suitable.includes(kind)) {
    throw new InputError(
      'unit',
      stated.unit,
      `${stated.unit} is a unit of ${kind}; ${gas} in a ${layerKind} needs one of ${suitable.join(' or ')}.`,
    );
  }
  return kind;
}

const PER_LAYER: readonly QuantityKind[] = [
  'gas permeance',
  'gas transmission rate',
  'water vapour permeance',
  'water vapour transmission rate',
];

/** What makes a film's permeance its permeability [m]; 1 where the unit already is times thickness, and for coatings. */
function measuredThicknessM(stated: StatedGas, unitKind: QuantityKind): number {
  if (stated.kind === 'film' && PER_LAYER.includes(unitKind)) {
    const thicknessUm = readNumber(stated.thickness_um, 'thickness_um', {
      range: THICKNESS_UM,
      label: 'Gauge of the film that was measured',
      unit: 'µm',
    });
    return toSi(thicknessUm, 'um');
  }
  if (stated.thickness_um === undefined) return 1;
  throw new InputError(
    'thickness_um',
    stated.thickness_um,
    stated.kind === 'film'
      ? `${stated.unit} holds for any gauge; leave out the one that was measured.`
      : 'A coating has one value for the whole of it; leave out the gauge that was measured.',
  );
}

/** The partial-pressure difference [Pa] by which a rate is divided; 1 where the unit already is per pressure. */
function drivingPressure(stated: StatedGas, unitKind: QuantityKind): number {
  if (unitKind === 'gas transmission rate') {
    const saturationPa = saturationPressureAtK(readTemperatureK(stated.temperature_C, 'temperature_C'));
    const fraction = readNumber(stated.gas_mole_fraction_dry, 'gas_mole_fraction_dry', {
      range: OXYGEN_FRACTION,
      label: 'Oxygen in the dry test gas (1 for pure oxygen, 0.2095 for air)',
    });
    return (
      fraction *
      (ATMOSPHERE_PA - readHumidity(stated.relative_humidity ?? 0, 'relative_humidity') * saturationPa)
    );
  }
  if (!isWaterRate(unitKind)) return 1;
  const saturationPa = saturationPressureAtK(readTemperatureK(stated.temperature_C, 'temperature_C'));
  const { high, low } = testHumidities(stated);
  return (high - low) * saturationPa;
}

const isWaterRate = (kind: QuantityKind): boolean =>
  kind === 'water vapour transmission rate' || kind === 'water vapour transmission rate times thickness';

function testHumidities(stated: StatedGas): { high: number; low: number } {
  const high = readHumidity(
    stated.relative_humidity_high,
    'relative_humidity_high',
    'Humidity of the moist side',
  );
  const low = readHumidity(stated.relative_humidity_low, 'relative_humidity_low', 'Humidity of the dry side');
  if (!(high > low)) {
    throw new InputError('relative_humidity_low', low, 'The dry side must be drier than the moist side.');
  }
  return { high, low };
}

function referenceHumidity(stated: StatedGas, unitKind: QuantityKind): number | undefined {
  const curve = readCurve(stated.humidity_curve, 'humidity_curve', 0);
  if (stated.relative_humidity !== undefined)
    return readHumidity(stated.relative_humidity, 'relative_humidity');
  if (!curve || !isWaterRate(unitKind)) return undefined;
  const { high, low } = testHumidities(stated);
  return humidityOfMean(curve, low, high);
}

/** A humidity between the two at which the factor equals its mean over them; the lowest there is. */
function humidityOfMean(curve: HumidityCurve, low: number, high: number): number {
  const mean = curve.integral(low, high - low) / (high - low);
  const knots = [low, ...Array.from(curve.humidity).filter((h) => h > low && h < high), high];
  for (let k = 0; k + 1 < knots.length; k++) {
    const from = curve.at(knots[k]) - mean;
    const to = curve.at(knots[k + 1]) - mean;
    if (from === 0) return knots[k];
    if (from * to > 0) continue;
    let below = knots[k];
    let above = knots[k + 1];
    for (let halving = 0; halving < 60; halving++) {
      const middle = (below + above) / 2;
      if ((curve.at(middle) - mean) * from > 0) below = middle;
      else above = middle;
    }
    return (below + above) / 2;
  }
  return (low + high) / 2;
}
