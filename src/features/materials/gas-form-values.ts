import type { ProvenanceEntry, StatedValue } from '../../../shared/contract/materials';
import {
  gasFromStated,
  InputError,
  type CoatingGasDescription,
  type FilmGasDescription,
} from '../../../shared/engine';
import { parseNumber, type DisplayKindName, type DisplayUnitSystem } from '../../../shared/units/format';
import { FieldReader, fieldText } from '../../api/kept-forms/typed-quantity';
import { factorAt, factorsFromValues, valuesFromFactors, type CurvePoint } from './humidity-curve-values';
import { isRate, isSuitableUnit, needsGauge, usualUnit, type Gas, type LayerKind } from './unit-choice';

export type CurveMode = 'none' | 'values' | 'factors';

export interface CurveRow {
  key: string;
  relative_humidity: string;
  /** A value in the unit above or a factor on it, by the mode. */
  amount: string;
}

/** One gas of a material as its data sheet states it, every number as typed. */
export interface GasFormValues {
  stated: {
    value: string;
    unit: string;
    /** The gauge that was measured, where the unit does not hold for any. */
    thickness_um: string;
    temperature_C: string;
    relative_humidity: string;
    relative_humidity_high: string;
    relative_humidity_low: string;
    oxygen_mole_fraction_dry: string;
    activation_energy_J_per_mol: string;
    measured_temperature_min_C: string;
    measured_temperature_max_C: string;
  };
  curve_mode: CurveMode;
  curve: CurveRow[];
  nextKey: number;
  geometric_sd: string;
  ground: { kind: ProvenanceEntry['kind']; source: string };
}

export function emptyGas(gas: Gas, kind: LayerKind, unitSystem: DisplayUnitSystem): GasFormValues {
  const isOxygen = gas === 'oxygen';
  const celsius = (value: number) => fieldText(value, 'temperature_C', unitSystem);
  return {
    stated: {
      value: '',
      unit: usualUnit(gas, kind, unitSystem),
      thickness_um: '',
      temperature_C: celsius(isOxygen ? 23 : 38),
      // Nobody's value is dry until somebody says so.
      relative_humidity: '',
      relative_humidity_high: isOxygen ? '' : '90',
      relative_humidity_low: isOxygen ? '' : '0',
      oxygen_mole_fraction_dry: '100',
      activation_energy_J_per_mol: '',
      measured_temperature_min_C: '',
      measured_temperature_max_C: '',
    },
    curve_mode: 'none',
    curve: [],
    nextKey: 1,
    geometric_sd: '',
    ground: { kind: 'supplier statement', source: '' },
  };
}

export interface KeptGas {
  stated: StatedValue;
  geometric_sd?: number | undefined;
}

export function gasFormValues(
  kept: KeptGas,
  options: { gas: Gas; kind: LayerKind; unitSystem: DisplayUnitSystem; ground: ProvenanceEntry | undefined },
): GasFormValues {
  const { gas, kind, unitSystem, ground } = options;
  const { stated } = kept;
  const empty = emptyGas(gas, kind, unitSystem);
  const celsius = (value: number | undefined) => fieldText(value, 'temperature_C', unitSystem);
  const percent = (value: number | undefined) => fieldText(value, 'fraction_as_percent', unitSystem);
  const points = curvePoints(stated);
  const mode: CurveMode = points.length === 0 ? 'none' : 'factors';
  return {
    stated: {
      value: String(stated.value),
      unit: stated.unit,
      thickness_um: fieldText(stated.thickness_um, 'thickness_um', unitSystem),
      temperature_C: celsius(stated.temperature_C),
      relative_humidity: percent(stated.relative_humidity),
      relative_humidity_high: percent(stated.relative_humidity_high) || empty.stated.relative_humidity_high,
      relative_humidity_low: percent(stated.relative_humidity_low) || empty.stated.relative_humidity_low,
      oxygen_mole_fraction_dry: percent(stated.oxygen_mole_fraction_dry) || '100',
      activation_energy_J_per_mol: fieldText(
        stated.activation_energy_J_per_mol,
        'energy_J_per_mol',
        unitSystem,
      ),
      measured_temperature_min_C: celsius(stated.measured_temperature_min_C),
      measured_temperature_max_C: celsius(stated.measured_temperature_max_C),
    },
    curve_mode: mode,
    curve: points.map((point, index) => ({
      key: `point-${index + 1}`,
      relative_humidity: percent(point.relative_humidity),
      amount: String(point.factor),
    })),
    nextKey: points.length + 1,
    geometric_sd: fieldText(kept.geometric_sd, 'number', unitSystem),
    ground: { kind: ground?.kind ?? 'supplier statement', source: ground?.source ?? '' },
  };
}

export function curvePoints(stated: Pick<StatedValue, 'humidity_curve'>): CurvePoint[] {
  const curve = stated.humidity_curve;
  return (curve?.relative_humidity ?? []).map((relative_humidity, index) => ({
    relative_humidity,
    factor: curve?.factor[index] ?? NaN,
  }));
}

export interface GasReading {
  gas: Gas;
  kind: LayerKind;
  unitSystem: DisplayUnitSystem;
  before: StatedValue | undefined;
}

/** What the form states, with its units turned into those of the contract. */
export function statedFrom(
  values: GasFormValues,
  { gas, kind, unitSystem, before }: GasReading,
): StatedValue {
  const reader = new FieldReader(unitSystem);
  const { stated } = values;
  const read = (name: keyof GasFormValues['stated'], shownKind: DisplayKindName) =>
    reader.read(name, stated[name], { kind: shownKind, before: before?.[name as keyof NumbersOfStated] });
  const isWaterRate = gas === 'water' && isRate(gas, stated.unit);
  const isOxygenRate = gas === 'oxygen' && isRate(gas, stated.unit);
  const value = parseNumber(stated.value);
  const points = pointsFrom(values, { value, unitSystem });
  return present({
    value,
    unit: stated.unit,
    thickness_um: needsGauge(gas, kind, stated.unit)
      ? (read('thickness_um', 'thickness_um') ?? NaN)
      : undefined,
    temperature_C: read('temperature_C', 'temperature_C') ?? NaN,
    relative_humidity: read('relative_humidity', 'fraction_as_percent'),
    relative_humidity_high: isWaterRate
      ? (read('relative_humidity_high', 'fraction_as_percent') ?? NaN)
      : undefined,
    relative_humidity_low: isWaterRate
      ? (read('relative_humidity_low', 'fraction_as_percent') ?? NaN)
      : undefined,
    oxygen_mole_fraction_dry: isOxygenRate
      ? (read('oxygen_mole_fraction_dry', 'fraction_as_percent') ?? NaN)
      : undefined,
    activation_energy_J_per_mol: read('activation_energy_J_per_mol', 'energy_J_per_mol'),
    measured_temperature_min_C: read('measured_temperature_min_C', 'temperature_C'),
    measured_temperature_max_C: read('measured_temperature_max_C', 'temperature_C'),
    humidity_curve:
      values.curve_mode === 'none'
        ? undefined
        : {
            relative_humidity: points.map((point) => point.relative_humidity),
            factor: points.map((point) => point.factor),
          },
  });
}

type NumbersOfStated = Omit<StatedValue, 'unit' | 'humidity_curve'>;

function pointsFrom(
  values: GasFormValues,
  { value, unitSystem }: { value: number; unitSystem: DisplayUnitSystem },
): CurvePoint[] {
  const reader = new FieldReader(unitSystem);
  const rows = values.curve.map((row) => ({
    relative_humidity: reader.readRequired('', row.relative_humidity, { kind: 'fraction_as_percent' }),
    amount: parseNumber(row.amount),
  }));
  if (values.curve_mode === 'factors') {
    return rows.map(({ relative_humidity, amount }) => ({ relative_humidity, factor: amount }));
  }
  return factorsFromValues(
    rows.map(({ relative_humidity, amount }) => ({ relative_humidity, value: amount })),
    value,
  );
}

/** The same curve said the other way, so that changing the mode changes no physics. Null where it is not yet whole. */
export function curveInMode(
  values: GasFormValues,
  mode: CurveMode,
  unitSystem: DisplayUnitSystem,
): CurveRow[] | null {
  if (mode === values.curve_mode || mode === 'none' || values.curve_mode === 'none') return null;
  const value = parseNumber(values.stated.value);
  const points = pointsFrom(values, { value, unitSystem });
  if (points.length === 0 || points.some((point) => !(point.factor > 0)) || !(value > 0)) return null;
  if (mode === 'factors') {
    return values.curve.map((row, index) => ({ ...row, amount: String(points[index]?.factor ?? '') }));
  }
  const relative_humidity = statedHumidity(values, unitSystem);
  const asValues = valuesFromFactors(points, { value, relative_humidity });
  return values.curve.map((row, index) => ({ ...row, amount: String(asValues[index]?.value ?? '') }));
}

function statedHumidity(values: GasFormValues, unitSystem: DisplayUnitSystem): number {
  return (
    new FieldReader(unitSystem).read('', values.stated.relative_humidity, { kind: 'fraction_as_percent' }) ??
    0
  );
}

/**
 * Values typed for a curve may disagree with the stated value at its own humidity; then the stated value counts and
 * the curve gives the shape. '' where they agree.
 */
export function curveDisagreement(values: GasFormValues, unitSystem: DisplayUnitSystem): string {
  const value = parseNumber(values.stated.value);
  const points = pointsFrom(values, { value, unitSystem });
  if (values.curve_mode !== 'values' || points.some((point) => !(point.factor > 0))) return '';
  if (points.length === 0) return '';
  const humidity = statedHumidity(values, unitSystem);
  const factor = factorAt(points, humidity);
  if (!Number.isFinite(factor) || Math.abs(factor - 1) < 0.01) return '';
  const there = Number((value * factor).toPrecision(3));
  const percent = Number((humidity * 100).toPrecision(4));
  return (
    `The curve reads ${there} at ${percent} %, where the value above is ${values.stated.value.trim()}. ` +
    'The value above counts and the curve is scaled to it; set its humidity to where it was measured.'
  );
}

export type GasBlock = FilmGasDescription | CoatingGasDescription;

export type ComputedGas = { block: GasBlock } | { fault: { field: string; message: string } };

/** The SI coefficients by the engine; or which field keeps them from being worked out. */
export function computedGas(stated: StatedValue, { gas, kind }: { gas: Gas; kind: LayerKind }): ComputedGas {
  const { oxygen_mole_fraction_dry, ...rest } = stated;
  if (!isSuitableUnit(gas, kind, stated.unit)) {
    return { fault: { field: 'unit', message: `Unit: choose one that fits ${gas} in a ${kind}.` } };
  }
  try {
    return { block: gasFromStated({ ...rest, gas_mole_fraction_dry: oxygen_mole_fraction_dry, gas, kind }) };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const field = error.path === 'gas_mole_fraction_dry' ? 'oxygen_mole_fraction_dry' : error.path;
    return { fault: { field, message: error.message } };
  }
}

/** Without the keys that are absent, as JSON would drop them. */
function present<Shape extends object>(shape: Shape): Shape {
  return Object.fromEntries(Object.entries(shape).filter(([, value]) => value !== undefined)) as Shape;
}
