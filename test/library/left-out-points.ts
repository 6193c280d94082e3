import { layerAt, type FilmDescription, type HumidityCurveDescription } from '../../shared/engine';
import { fromSi, toSi } from '../../shared/units';
import { librarySpec } from './library-layers';
import type { PublishedCurve } from './published-humidity';

const UNIT = 'cm3(STP)*20um/(m2*day*atm)';

/** A film of these points: the engine's own interpolation, with its own warning beyond them. */
function filmThrough(curve: HumidityCurveDescription, value: number, atHumidity: number): FilmDescription {
  return {
    kind: 'film',
    name: 'film with a point left out',
    thickness_um: 20,
    oxygen: {
      permeability_mol_m_per_m2_s_Pa: toSi(value, UNIT),
      reference_temperature_C: 23,
      reference_relative_humidity: atHumidity,
      humidity_curve: curve,
    },
    water: { permeability_mol_m_per_m2_s_Pa: 1e-14 },
  };
}

function engineAt(film: FilmDescription, humidity: number): { value: number; isWarned: boolean } {
  const { oxygen } = layerAt(film, { temperature_C: 23, relative_humidity: humidity });
  return {
    value: fromSi(oxygen.permeability_mol_m_per_m2_s_Pa ?? NaN, UNIT),
    isWarned: oxygen.humidity_warning,
  };
}

type Point = readonly [humidity: number, value: number];

/** The engine's value at a humidity from two points: log-linear between them, flat beyond. */
export function engineFromTwo(
  [low, high]: readonly [Point, Point],
  humidity: number,
): ReturnType<typeof engineAt> {
  const curve = { relative_humidity: [low[0], high[0]], factor: [1, high[1] / low[1]] };
  return engineAt(filmThrough(curve, low[1], low[0]), humidity);
}

/** The straight line through two logarithms, carried on; the engine does not do this. */
export function logLinearFromTwo([low, high]: readonly [Point, Point], humidity: number): number {
  return low[1] * (high[1] / low[1]) ** ((humidity - low[0]) / (high[0] - low[0]));
}

export interface LeftOut {
  name: string;
  /** Each predicted over measured. */
  at80Between: number;
  at90Flat: number;
  at90LogLinear: number;
  at60Flat: number;
  at60LogLinear: number;
  /** 60 % between the library's next lower point (remembered) and 80 %; where the library holds such a curve. */
  at60InLibrary: number | null;
  isWarnedBeyond: boolean;
  isWarnedBetween: boolean;
}

export function leaveOut(curve: PublishedCurve): LeftOut {
  const at60: Point = [0.6, curve.at60];
  const at80: Point = [0.8, curve.at80];
  const at90: Point = [0.9, curve.at90];
  const between = engineFromTwo([at60, at90], 0.8);
  const above = engineFromTwo([at60, at80], 0.9);
  const below = engineFromTwo([at80, at90], 0.6);
  return {
    name: curve.name,
    at80Between: between.value / curve.at80,
    at90Flat: above.value / curve.at90,
    at90LogLinear: logLinearFromTwo([at60, at80], 0.9) / curve.at90,
    at60Flat: below.value / curve.at60,
    at60LogLinear: logLinearFromTwo([at80, at90], 0.6) / curve.at60,
    at60InLibrary: curve.libraryId === undefined ? null : inLibrary(curve.libraryId, curve) / curve.at60,
    isWarnedBeyond: above.isWarned && below.isWarned,
    isWarnedBetween: between.isWarned,
  };
}

/** The library's own curve without its point at 60 %, held to the published value at 80 %. */
function inLibrary(libraryId: string, { at80 }: PublishedCurve): number {
  const spec = librarySpec(libraryId);
  const curve = spec.kind === 'foil' ? undefined : spec.oxygen.gas.humidity_curve;
  if (!curve?.relative_humidity.includes(0.6)) throw new Error(`${libraryId} has no point at 60 %.`);
  const kept = curve.relative_humidity.flatMap((humidity, index) => (humidity === 0.6 ? [] : [index]));
  const without = {
    relative_humidity: kept.map((index) => curve.relative_humidity[index] ?? NaN),
    factor: kept.map((index) => curve.factor[index] ?? NaN),
  };
  return engineAt(filmThrough(without, at80, 0.8), 0.6).value;
}
