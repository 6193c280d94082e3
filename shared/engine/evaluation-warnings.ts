import { GAS_CONSTANT, OXYGEN_MOLAR_MASS, ZERO_CELSIUS_K } from '../units';
import type { EngineWarning, WallAnswer } from './description/evaluation';
import { LIMIT_NAMES } from './description/read-storage';
import type { LimitName } from './description/storage-description';
import type { GasInLayer, Layer } from './layer';
import { isBeyondMeasured, isFarFromReference, TRUSTED_BEYOND_K } from './measured-range';
import { standardTests } from './standard-tests';
import type { StorageRun } from './storage-run';
import type { StorageSystem } from './storage-system';
import { WallAtTemperature } from './wall-at-temperature';
import { testWall } from './wall-in-test';
import { describeWall } from './wall-profile';

/** A layer's oxygen permeance must change by more than this, turned round, to be worth a sentence. */
const ORIENTATION_MATTERS_ABOVE = 0.01;

/** Temperatures closer than this count as the reference itself. */
const SAME_WITHIN_K = 1;

const LIMIT_WORDS: Record<LimitName, string> = {
  oxygen_uptake_mg_per_kg: 'oxygen uptake',
  headspace_oxygen_percent: 'headspace oxygen',
  moisture_max_g_per_g: 'highest moisture',
  moisture_min_g_per_g: 'lowest moisture',
};

/** What to be careful about, each said once. */
export function warningsOf(system: StorageSystem, run: StorageRun, walls: WallAnswer[]): EngineWarning[] {
  const warnings: EngineWarning[] = [
    ...passedAtPacking(run, system),
    ...system.pack.walls.flatMap((wall, w) =>
      wall.layers.flatMap((layer, l) =>
        layerWarnings(
          layer,
          { path: `pack.walls[${w}].layers[${l}]`, index: l, faces: facesOf(run, walls[w], w) },
          system,
        ),
      ),
    ),
    ...sealWarnings(system, run),
    ...walls.flatMap((wall, w) => belowMeasurable(wall, { index: w, layers: system.pack.walls[w].layers })),
    ...system.pack.walls.flatMap((wall, w) => orientation(wall.layers, { index: w, answer: walls[w] }, run)),
    ...rateWarnings(system),
  ];
  const seen = new Set<string>();
  return warnings.filter((warning) => {
    const key = `${warning.code} ${warning.path} ${warning.message}`;
    if (seen.has(key)) return false;
    seen.add(key);
    return true;
  });
}

function passedAtPacking(run: StorageRun, system: StorageSystem): EngineWarning[] {
  const at: Record<LimitName, number | null> = {
    oxygen_uptake_mg_per_kg: run.oxygen.uptakeReachedAtS,
    headspace_oxygen_percent: run.oxygen.headspaceReachedAtS,
    moisture_max_g_per_g: run.moisture.maxReachedAtS,
    moisture_min_g_per_g: run.moisture.minReachedAtS,
  };
  return LIMIT_NAMES.filter((name) => system.limits[name] !== undefined && at[name] === 0).map((name) => ({
    code: 'limit_passed_at_packing',
    path: `limits.${name}`,
    message: `The limit on ${LIMIT_WORDS[name]} is already passed when the pack is closed.${atPacking(name, run, system)}`,
  }));
}

/** What is there at closing, beside the limit, and what would help. */
function atPacking(
  name: LimitName,
  run: StorageRun,
  { pack, food, totalPressurePa, limits }: StorageSystem,
): string {
  const starting = pack.startingOxygenFraction;
  const shown = (value: number): string => String(Number(value.toPrecision(3)));
  if (name === 'headspace_oxygen_percent') {
    const limit = (100 * (limits.headspace_oxygen_percent ?? 0)) / totalPressurePa;
    return ` The headspace begins at ${shown(100 * starting)} % oxygen, the limit is ${shown(limit)} %: flush to less, or use an absorber.`;
  }
  if (name !== 'oxygen_uptake_mg_per_kg' || starting === 0) return '';
  const { temperatureK } = run.conditions[0];
  const startingMol = (starting * totalPressurePa * pack.headspaceM3) / (GAS_CONSTANT * temperatureK);
  const mgPerKg = (mol: number): number => (mol * OXYGEN_MOLAR_MASS * 1e6) / food.massKg;
  const limitMol = limits.oxygen_uptake_mg_per_kg ?? 0;
  return (
    ` The headspace begins with ${shown(mgPerKg(startingMol))} mg of oxygen per kg of food, the limit is ` +
    `${shown(mgPerKg(limitMol))} mg/kg: flush to below ${shown((100 * starting * limitMol) / startingMol)} % oxygen, ` +
    'close over less headspace, or use an absorber.'
  );
}

const celsius = (kelvin: number): string => `${Number((kelvin - ZERO_CELSIUS_K).toFixed(2))} °C`;
const percent = (fraction: number): string => `${Number((fraction * 100).toPrecision(4))} %`;

/** Where a warning belongs, in the description and in words. */
interface Place {
  path: string;
  words: string;
}

function temperatureWarning(
  gas: GasInLayer,
  { path, words }: Place,
  temperatures: number[],
): EngineWarning[] {
  const beyond = temperatures.filter((temperatureK) => isBeyondMeasured(gas, temperatureK));
  if (beyond.length > 0) {
    const low = gas.measuredMinK === null ? '' : `from ${celsius(gas.measuredMinK)} `;
    const high = gas.measuredMaxK === null ? '' : `to ${celsius(gas.measuredMaxK)}`;
    return [
      {
        code: 'temperature_outside_measured',
        path,
        message:
          `${words}: its activation energy was measured ${low}${high}`.trimEnd() +
          `; ${listed(beyond)} lies more than ${TRUSTED_BEYOND_K} K outside.`,
      },
    ];
  }
  if (gas.activationEnergyJPerMol === 0) {
    const other = temperatures.filter(
      (temperatureK) => Math.abs(temperatureK - gas.referenceK) > SAME_WITHIN_K,
    );
    if (other.length === 0) return [];
    return [
      {
        code: 'activation_energy_missing',
        path,
        message:
          `${words}: no activation energy is given, so its value at ${celsius(gas.referenceK)} is used unchanged ` +
          `at ${listed(other)}.`,
      },
    ];
  }
  const far = temperatures.filter((temperatureK) => isFarFromReference(gas, temperatureK));
  if (far.length === 0) return [];
  return [
    {
      code: 'temperature_range_unknown',
      path,
      message:
        `${words}: nobody says at which temperatures its activation energy holds; ${listed(far)} lies more than ` +
        `${TRUSTED_BEYOND_K} K from its reference, ${celsius(gas.referenceK)}.`,
    },
  ];
}

/** The coldest and the warmest of what is beyond. */
function listed(temperatures: number[]): string {
  const low = Math.min(...temperatures);
  const high = Math.max(...temperatures);
  return low === high ? celsius(low) : `${celsius(low)} to ${celsius(high)}`;
}

/** The humidities at a wall's interfaces, outside face first: on every leg begun, and in every test. */
interface WallFaces {
  onRoute: number[][];
  inTests: number[][];
}

function facesOf(run: StorageRun, wall: WallAnswer, index: number): WallFaces {
  return {
    onRoute: run.legStarts.map((start) => {
      const conditions = run.conditions[start.leg];
      return describeWall(conditions.pack.walls[index], {
        humidityOutside: conditions.humidity,
        humidityInside: start.insideHumidity,
        oxygenOutsidePa: conditions.outsideOxygenPa,
        oxygenInsidePa: start.insideOxygenPa,
      }).water.interface_relative_humidity;
    }),
    inTests: wall.tests.map((test) => test.interface_relative_humidity),
  };
}

function layerWarnings(
  layer: Layer,
  { path, index, faces }: { path: string; index: number; faces: WallFaces },
  system: StorageSystem,
): EngineWarning[] {
  const temperatures = [...new Set(system.legs.map((leg) => leg.temperatureK))];
  const ofLayer = (wall: number[][]) => wall.flatMap((interfaces) => interfaces.slice(index, index + 2));
  const warnings: EngineWarning[] = [];
  for (const name of ['oxygen', 'water'] as const) {
    const gas = layer[name];
    if (!gas) continue;
    const place = { path: `${path}.${name}`, words: `${layer.name}, ${name}` };
    warnings.push(...temperatureWarning(gas, place, temperatures));
    const onRoute = humidityWarning(gas, place, { seen: ofLayer(faces.onRoute), where: 'on this route' });
    const inTests = humidityWarning(gas, place, { seen: ofLayer(faces.inTests), where: 'in the tests' });
    warnings.push(...onRoute, ...inTests);
  }
  if (layer.defects) {
    warnings.push({
      code: 'pinholes_are_estimated',
      path: `${path}.defects`,
      message:
        `${layer.name}: what passes its ${Number(layer.defects.densityPerM2.toPrecision(3))} pinholes per m² of ` +
        `${Number((layer.defects.radiusM * 2e6).toPrecision(3))} µm is an estimate, good to some 8 % for single holes.`,
    });
  }
  return warnings;
}

function humidityWarning(
  gas: GasInLayer,
  { path, words }: Place,
  { seen, where }: { seen: number[]; where: string },
): EngineWarning[] {
  const { curve } = gas;
  if (!curve) return [];
  const beyond = seen.filter((humidity) => isClearlyBeyond(curve.humidity, humidity));
  if (beyond.length === 0) return [];
  const first = curve.humidity[0];
  const last = curve.humidity[curve.humidity.length - 1];
  const low = Math.min(...beyond);
  const high = Math.max(...beyond);
  const points = curve.factor.length;
  const isRising = points > 1 && curve.factor[points - 1] > curve.factor[points - 2];
  const lowerBound =
    high > last && isRising ? ': the curve rises there, so more passes than is computed' : '';
  return [
    {
      code: 'humidity_beyond_curve',
      path: `${path}.humidity_curve`,
      message:
        `${words}: its humidity curve runs from ${percent(first)} to ${percent(last)}; ${where} the layer sees ` +
        `${low === high ? percent(low) : `${percent(low)} to ${percent(high)}`}, where the last point is held${lowerBound}.`,
    },
  ];
}

/** Beyond the points by more than rounding of an interface. */
function isClearlyBeyond(points: Float64Array, humidity: number): boolean {
  return humidity < points[0] - 1e-9 || humidity > points[points.length - 1] + 1e-9;
}

function sealWarnings(system: StorageSystem, run: StorageRun): EngineWarning[] {
  const { seal } = system.pack;
  if (!seal || seal.areaM2 === 0) return [];
  const temperatures = [...new Set(system.legs.map((leg) => leg.temperatureK))];
  const faces = run.legStarts.flatMap((start) => [run.conditions[start.leg].humidity, start.insideHumidity]);
  return (['oxygen', 'water'] as const).flatMap((name) => {
    const gas = seal.film[name];
    if (!gas) return [];
    const place = { path: `pack.seal.${name}`, words: `Seal, ${name}` };
    return [
      ...temperatureWarning(gas, place, temperatures),
      ...humidityWarning(gas, place, { seen: faces, where: 'on this route' }),
    ];
  });
}

/** By the tests asked for; for a gas without one, by its standard tests. */
function belowMeasurable(
  wall: WallAnswer,
  { index, layers }: { index: number; layers: Layer[] },
): EngineWarning[] {
  return (['oxygen', 'water'] as const).flatMap((gas) => {
    const asked = wall.tests.filter((test) => test.test.gas === gas);
    const standard = () =>
      standardTests.filter((test) => test.gas === gas).map((test) => testWall(layers, test, ''));
    if (!(asked.length > 0 ? asked : standard()).some((test) => test.is_below_measurable)) return [];
    const unit = gas === 'oxygen' ? 'cm³' : 'g';
    return [
      {
        code: 'below_measurable' as const,
        path: `pack.walls[${index}]`,
        message:
          `${wall.name}: less ${gas === 'oxygen' ? 'oxygen' : 'water vapour'} passes than laboratories can measure ` +
          `(0.005 ${unit} per m² and day); seals, leaks and pinholes decide.`,
      },
    ];
  });
}

function orientation(
  layers: Layer[],
  { index, answer: wall }: { index: number; answer: WallAnswer },
  run: StorageRun,
): EngineWarning[] {
  if (!layers.some((layer) => layer.oxygen?.curve || layer.water?.curve)) return [];
  const turned = [...layers].reverse();
  let most = 0;
  let message = '';
  for (const leg of wall.legs) {
    const start = run.legStarts.find((candidate) => candidate.leg === leg.leg);
    if (!start) continue;
    const other = new WallAtTemperature(turned, run.conditions[leg.leg].temperatureK);
    other.solve(leg.relative_humidity_outside, leg.relative_humidity_inside);
    const as = leg.oxygen.permeance_mol_per_m2_s_Pa;
    if (!(as > 0)) continue;
    const change = other.oxygenPermeance / as - 1;
    if (Math.abs(change) <= Math.max(most, ORIENTATION_MATTERS_ABOVE)) continue;
    most = Math.abs(change);
    message =
      `${wall.name}: turned round it would let through ${Number((Math.abs(change) * 100).toPrecision(2))} % ` +
      `${change > 0 ? 'more' : 'less'} oxygen at ${celsius(run.conditions[leg.leg].temperatureK)}, ` +
      `${percent(leg.relative_humidity_outside)} outside and ${percent(leg.relative_humidity_inside)} inside: ` +
      `${as.toExponential(2)} mol/(m²·s·Pa) as laid, ${other.oxygenPermeance.toExponential(2)} turned, because its ` +
      'humidity-sensitive layer would sit at another humidity.';
  }
  return message === ''
    ? []
    : [{ code: 'orientation_matters', path: `pack.walls[${index}].layers`, message }];
}

function rateWarnings(system: StorageSystem): EngineWarning[] {
  const { food } = system;
  if (food.oxygenMode !== 'rate' || food.rateEnergyJPerMol !== 0) return [];
  return [
    {
      code: 'rate_constant_without_energy',
      path: 'food.rate_activation_energy_J_per_mol',
      message:
        'No activation energy is given for the oxygen uptake, so its rate is the same at every temperature.',
    },
  ];
}
