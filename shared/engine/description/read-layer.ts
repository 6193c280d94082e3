import { ZERO_CELSIUS_K } from '../../units';
import { HumidityCurve } from '../humidity-curve';
import { layerOf, type Defects, type GasInLayer, type Layer } from '../layer';
import { InputError } from './input-error';
import {
  ACTIVATION_ENERGY_J_PER_MOL,
  COATING_THICKNESS_UM,
  CURVE_FACTOR,
  CURVE_POINTS,
  CURVE_SPACING,
  DEFECT_DENSITY_PER_M2,
  HOLE_DIAMETER_UM,
  HUMIDITY,
  LAYER_COUNT,
  PERMEABILITY_SI,
  PERMEANCE_SI,
  REFERENCE_TEMPERATURE_C,
  THICKNESS_UM,
} from './ranges';
import { readChoice, readList, readNumber, readObject, readOptional } from './read-number';
import { copyOfLayer, isSameLayer, type LayerFields } from './same-layer';
import type {
  CoatingGasDescription,
  DefectsDescription,
  FilmGasDescription,
  HumidityCurveDescription,
  LayerDescription,
} from './storage-description';

type GasDescription = FilmGasDescription | CoatingGasDescription;

/** Layers, outside face first. Errors: InputError for none, too many, or any layer that cannot be computed with. */
export function readLayers(value: unknown, path: string): Layer[] {
  const list = readList<LayerDescription>(value, path, { range: LAYER_COUNT, label: 'Layers of a wall' });
  const layers: Layer[] = [];
  for (let i = 0; i < list.length; i++) {
    const before = READ_BEFORE.get(list[i]);
    const isKnown = before !== undefined && isSameLayer(list[i], before.copy);
    layers.push(isKnown ? before.layer : readLayer(list[i], `${path}[${i}]`));
  }
  return layers;
}

/** What was read from a description, and a copy of it: a layer that has not changed since need not be read again. */
const READ_BEFORE = new WeakMap<object, { copy: LayerFields; layer: Layer }>();

/**
 * One layer in SI. Errors: InputError. Cost: some 20 µs; a tenth of that when the same object was read before and
 * still holds the same (every value is compared, so a changed description is read anew).
 */
export function readLayer(value: unknown, path: string): Layer {
  const layer = readObject<LayerDescription>(value, path, 'Layer');
  const before = READ_BEFORE.get(layer);
  if (before && isSameLayer(layer, before.copy)) return before.layer;
  const read = readNewLayer(layer, path);
  READ_BEFORE.set(layer, { copy: copyOfLayer(layer), layer: read });
  return read;
}

function readNewLayer(layer: LayerDescription, path: string): Layer {
  const kind = readChoice(layer.kind, `${path}.kind`, {
    choices: ['film', 'coating', 'foil'] as const,
    label: 'Kind of layer',
  });
  const thicknessUm =
    kind === 'coating'
      ? readOptional(layer.thickness_um, `${path}.thickness_um`, {
          range: COATING_THICKNESS_UM,
          label: 'Thickness',
          unit: 'µm',
          otherwise: 0,
        })
      : readNumber(layer.thickness_um, `${path}.thickness_um`, {
          range: THICKNESS_UM,
          label: 'Thickness',
          unit: 'µm',
        });
  const thicknessM = thicknessUm * 1e-6;
  const name = typeof layer.name === 'string' && layer.name !== '' ? layer.name : kind;
  const given = layer as { oxygen?: unknown; water?: unknown; defects?: unknown };
  if (kind === 'film' && given.defects !== undefined && given.defects !== null) {
    throw new InputError(
      `${path}.defects`,
      given.defects,
      'Only foils and coatings carry pinholes; leave them out here.',
    );
  }
  const isFoil = kind === 'foil';
  return layerOf({
    kind,
    name,
    thicknessM,
    oxygen: isFoil ? null : readGas(given.oxygen, `${path}.oxygen`, { isFilm: kind === 'film', thicknessM }),
    water: isFoil ? null : readGas(given.water, `${path}.water`, { isFilm: kind === 'film', thicknessM }),
    defects: readDefects(given.defects, `${path}.defects`),
  });
}

/** One gas in one layer; a film's permeability is divided by its thickness here. */
export function readGas(
  value: unknown,
  path: string,
  layer: { isFilm: boolean; thicknessM: number },
): GasInLayer {
  const gas = readObject<GasDescription>(value, path, path.endsWith('water') ? 'Water' : 'Oxygen');
  const permeanceSi = layer.isFilm
    ? readNumber(
        (gas as FilmGasDescription).permeability_mol_m_per_m2_s_Pa,
        `${path}.permeability_mol_m_per_m2_s_Pa`,
        { range: PERMEABILITY_SI, label: 'Permeability', unit: 'mol·m/(m²·s·Pa)' },
      ) / layer.thicknessM
    : readNumber(
        (gas as CoatingGasDescription).permeance_mol_per_m2_s_Pa,
        `${path}.permeance_mol_per_m2_s_Pa`,
        { range: PERMEANCE_SI, label: 'Permeance', unit: 'mol/(m²·s·Pa)' },
      );
  const referenceC = readOptional(gas.reference_temperature_C, `${path}.reference_temperature_C`, {
    range: REFERENCE_TEMPERATURE_C,
    label: 'Reference temperature',
    unit: '°C',
    otherwise: 23,
  });
  const referenceHumidity = readOptional(
    gas.reference_relative_humidity,
    `${path}.reference_relative_humidity`,
    { range: HUMIDITY, label: 'Reference humidity', otherwise: 0 },
  );
  const minK = readMeasured(gas.measured_temperature_min_C, `${path}.measured_temperature_min_C`);
  const maxK = readMeasured(gas.measured_temperature_max_C, `${path}.measured_temperature_max_C`);
  if (minK !== null && maxK !== null && minK > maxK) {
    throw new InputError(
      `${path}.measured_temperature_max_C`,
      gas.measured_temperature_max_C,
      'The measured range ends below its beginning; exchange the two temperatures.',
    );
  }
  return {
    permeanceSi,
    referenceK: referenceC + ZERO_CELSIUS_K,
    activationEnergyJPerMol: readOptional(
      gas.activation_energy_J_per_mol,
      `${path}.activation_energy_J_per_mol`,
      { range: ACTIVATION_ENERGY_J_PER_MOL, label: 'Activation energy', unit: 'J/mol', otherwise: 0 },
    ),
    curve: readCurve(gas.humidity_curve, `${path}.humidity_curve`, referenceHumidity),
    measuredMinK: minK,
    measuredMaxK: maxK,
  };
}

function readMeasured(value: unknown, path: string): number | null {
  if (value === undefined || value === null) return null;
  return (
    readNumber(value, path, { range: REFERENCE_TEMPERATURE_C, label: 'Measured temperature', unit: '°C' }) +
    ZERO_CELSIUS_K
  );
}

/** A humidity curve scaled to 1 at the reference humidity; null where none is given. */
export function readCurve(value: unknown, path: string, referenceHumidity: number): HumidityCurve | null {
  if (value === undefined || value === null) return null;
  const curve = readObject<HumidityCurveDescription>(value, path, 'Humidity curve');
  const humidity = readList<number>(curve.relative_humidity, `${path}.relative_humidity`, {
    range: CURVE_POINTS,
    label: 'Humidities',
  });
  const factor = readList<number>(curve.factor, `${path}.factor`, { range: CURVE_POINTS, label: 'Factors' });
  if (humidity.length !== factor.length) {
    throw new InputError(
      `${path}.factor`,
      factor.length,
      `The curve has ${humidity.length} humidities and ${factor.length} factors; give one factor for each humidity.`,
    );
  }
  humidity.forEach((point, k) => {
    readNumber(point, `${path}.relative_humidity[${k}]`, { range: HUMIDITY, label: 'Humidity of the curve' });
    readNumber(factor[k], `${path}.factor[${k}]`, { range: CURVE_FACTOR, label: 'Factor of the curve' });
    if (k > 0 && !(point - humidity[k - 1] >= CURVE_SPACING * (1 - 1e-6))) {
      throw new InputError(
        `${path}.relative_humidity[${k}]`,
        point,
        `Humidities of the curve must rise, by ${CURVE_SPACING} at least: ${point} follows ${humidity[k - 1]}. ` +
          'Put them in order, each once.',
      );
    }
  });
  return HumidityCurve.fromPoints(humidity, factor, referenceHumidity);
}

/** Null where there are none, so that a density of 0 is a tight foil. */
export function readDefects(value: unknown, path: string): Defects | null {
  if (value === undefined || value === null) return null;
  const defects = readObject<DefectsDescription>(value, path, 'Pinholes');
  const densityPerM2 = readNumber(defects.density_per_m2, `${path}.density_per_m2`, {
    range: DEFECT_DENSITY_PER_M2,
    label: 'Pinholes',
    unit: 'per m²',
  });
  const diameterUm = readNumber(defects.diameter_um, `${path}.diameter_um`, {
    range: HOLE_DIAMETER_UM,
    label: 'Pinhole diameter',
    unit: 'µm',
  });
  const radiusM = diameterUm * 0.5e-6;
  if (densityPerM2 * Math.PI * radiusM * radiusM >= 1) {
    throw new InputError(
      `${path}.density_per_m2`,
      densityPerM2,
      `${densityPerM2} holes of ${diameterUm} µm per m² leave no foil; use fewer or smaller ones.`,
    );
  }
  return densityPerM2 === 0 ? null : { densityPerM2, radiusM };
}
