import {
  ATMOSPHERE_PA,
  DAY_S,
  MOL_PER_CM3_STP,
  OXYGEN_MOLAR_MASS,
  WATER_MOLAR_MASS,
  ZERO_CELSIUS_K,
} from './constants';

/** What a unit measures. Values convert within a kind and never between kinds. */
export type QuantityKind =
  | 'gas permeability'
  | 'gas permeance'
  | 'gas transmission rate'
  | 'water vapour transmission rate'
  | 'water vapour transmission rate times thickness'
  | 'water vapour permeance'
  | 'water vapour permeability'
  | 'length'
  | 'area'
  | 'volume'
  | 'mass'
  | 'temperature'
  | 'pressure'
  | 'time'
  | 'amount of gas'
  | 'fraction'
  | 'energy per amount';

export interface Unit {
  kind: QuantityKind;
  /** Value in SI = value · factorToSi + offsetToSi. */
  factorToSi: number;
  offsetToSi?: number;
}

const MIL_M = 25.4e-6;
const INCH_M = 0.0254;
const SQUARE_INCHES_100_M2 = 100 * INCH_M * INCH_M;
const FOOT_M = 0.3048;
const POUND_KG = 0.45359237;
const GRAIN_KG = POUND_KG / 7000;
const GRAVITY = 9.80665;
/** Density of mercury at 0 °C and 23 °C, kg/m³, as in GNU units. */
const MERCURY_0C = 13_595.1;
const MERCURY_23C = 13_538.6;
const MM_HG_PA = MERCURY_0C * GRAVITY * 1e-3;
const BAR_PA = 1e5;

const perm = (mercuryDensity: number): number =>
  GRAIN_KG / (3600 * FOOT_M * FOOT_M * mercuryDensity * GRAVITY * INCH_M);

/**
 * 1e-10 cm³(STP)·cm/(cm²·s·cmHg) with 76 cmHg to the atmosphere, so that 1 barrer is 65 664 cm³·µm/(m²·day·atm) exactly.
 * Mercury's density at 0 °C would make it smaller by 1.4e-7.
 */
const BARRER = (1e-10 * MOL_PER_CM3_STP * 1e-2) / (1e-4 * (ATMOSPHERE_PA / 76));

/** SI behind each kind: mol·m/(m²·s·Pa), mol/(m²·s·Pa), mol/(m²·s), kg/(m²·s), kg·m/(m²·s), kg/(m²·s·Pa), kg·m/(m²·s·Pa). */
const gasPermeability = (factorToSi: number): Unit => ({ kind: 'gas permeability', factorToSi });
const gasPermeance = (factorToSi: number): Unit => ({ kind: 'gas permeance', factorToSi });
const gasRate = (factorToSi: number): Unit => ({ kind: 'gas transmission rate', factorToSi });
const waterRate = (factorToSi: number): Unit => ({ kind: 'water vapour transmission rate', factorToSi });
const waterRateThickness = (factorToSi: number): Unit => ({
  kind: 'water vapour transmission rate times thickness',
  factorToSi,
});
const waterPermeance = (factorToSi: number): Unit => ({ kind: 'water vapour permeance', factorToSi });
const waterPermeability = (factorToSi: number): Unit => ({ kind: 'water vapour permeability', factorToSi });

/** Every unit by the name it has in files and in the API. */
export const UNITS = {
  'mol*m/(m2*s*Pa)': gasPermeability(1),
  barrer: gasPermeability(BARRER),
  'cm3(STP)*um/(m2*day*atm)': gasPermeability((MOL_PER_CM3_STP * 1e-6) / (DAY_S * ATMOSPHERE_PA)),
  'cm3(STP)*um/(m2*day*bar)': gasPermeability((MOL_PER_CM3_STP * 1e-6) / (DAY_S * BAR_PA)),
  'cm3(STP)*mm/(m2*day*atm)': gasPermeability((MOL_PER_CM3_STP * 1e-3) / (DAY_S * ATMOSPHERE_PA)),
  'cm3(STP)*20um/(m2*day*atm)': gasPermeability((MOL_PER_CM3_STP * 20e-6) / (DAY_S * ATMOSPHERE_PA)),
  'cm3(STP)*25um/(m2*day*atm)': gasPermeability((MOL_PER_CM3_STP * 25e-6) / (DAY_S * ATMOSPHERE_PA)),
  'cm3(STP)*100um/(m2*day*bar)': gasPermeability((MOL_PER_CM3_STP * 100e-6) / (DAY_S * BAR_PA)),
  'cm3(STP)*mil/(100in2*day*atm)': gasPermeability(
    (MOL_PER_CM3_STP * MIL_M) / (SQUARE_INCHES_100_M2 * DAY_S * ATMOSPHERE_PA),
  ),
  '1e-13cm3(STP)*cm/(cm2*s*Pa)': gasPermeability(1e-13 * MOL_PER_CM3_STP * 1e2),

  'mol/(m2*s*Pa)': gasPermeance(1),
  'cm3(STP)/(m2*day*atm)': gasPermeance(MOL_PER_CM3_STP / (DAY_S * ATMOSPHERE_PA)),
  'cm3(STP)/(m2*day*bar)': gasPermeance(MOL_PER_CM3_STP / (DAY_S * BAR_PA)),
  'cm3(STP)/(100in2*day*atm)': gasPermeance(MOL_PER_CM3_STP / (SQUARE_INCHES_100_M2 * DAY_S * ATMOSPHERE_PA)),
  GPU: gasPermeance(BARRER / 1e-6),

  'mol/(m2*s)': gasRate(1),
  'cm3(STP)/(m2*day)': gasRate(MOL_PER_CM3_STP / DAY_S),
  'cm3(STP)/(100in2*day)': gasRate(MOL_PER_CM3_STP / (SQUARE_INCHES_100_M2 * DAY_S)),

  'kg/(m2*s)': waterRate(1),
  'g/(m2*day)': waterRate(1e-3 / DAY_S),
  'g/(100in2*day)': waterRate(1e-3 / (SQUARE_INCHES_100_M2 * DAY_S)),
  'grain/(h*ft2)': waterRate(GRAIN_KG / (3600 * FOOT_M * FOOT_M)),

  'kg*m/(m2*s)': waterRateThickness(1),
  'g*um/(m2*day)': waterRateThickness(1e-9 / DAY_S),
  'g*mm/(m2*day)': waterRateThickness(1e-6 / DAY_S),
  'g*mil/(100in2*day)': waterRateThickness((1e-3 * MIL_M) / (SQUARE_INCHES_100_M2 * DAY_S)),

  'kg/(m2*s*Pa)': waterPermeance(1),
  'ng/(m2*s*Pa)': waterPermeance(1e-12),
  'g/(m2*day*kPa)': waterPermeance(1e-3 / (DAY_S * 1e3)),
  perm: waterPermeance(perm(MERCURY_0C)),
  perm_0C: waterPermeance(perm(MERCURY_0C)),
  perm_23C: waterPermeance(perm(MERCURY_23C)),
  metric_perm: waterPermeance(1e-3 / (DAY_S * MM_HG_PA)),
  'mol_water/(m2*s*Pa)': waterPermeance(WATER_MOLAR_MASS),

  'kg*m/(m2*s*Pa)': waterPermeability(1),
  'ng*m/(m2*s*Pa)': waterPermeability(1e-12),
  perm_inch: waterPermeability(perm(MERCURY_0C) * INCH_M),
  'mol_water*m/(m2*s*Pa)': waterPermeability(WATER_MOLAR_MASS),

  m: { kind: 'length', factorToSi: 1 },
  mm: { kind: 'length', factorToSi: 1e-3 },
  um: { kind: 'length', factorToSi: 1e-6 },
  nm: { kind: 'length', factorToSi: 1e-9 },
  mil: { kind: 'length', factorToSi: MIL_M },
  in: { kind: 'length', factorToSi: INCH_M },

  m2: { kind: 'area', factorToSi: 1 },
  cm2: { kind: 'area', factorToSi: 1e-4 },
  in2: { kind: 'area', factorToSi: INCH_M * INCH_M },
  '100in2': { kind: 'area', factorToSi: SQUARE_INCHES_100_M2 },

  m3: { kind: 'volume', factorToSi: 1 },
  cm3: { kind: 'volume', factorToSi: 1e-6 },
  ml: { kind: 'volume', factorToSi: 1e-6 },
  in3: { kind: 'volume', factorToSi: INCH_M ** 3 },
  fl_oz: { kind: 'volume', factorToSi: 29.5735295625e-6 },

  kg: { kind: 'mass', factorToSi: 1 },
  g: { kind: 'mass', factorToSi: 1e-3 },
  mg: { kind: 'mass', factorToSi: 1e-6 },
  lb: { kind: 'mass', factorToSi: POUND_KG },
  oz: { kind: 'mass', factorToSi: POUND_KG / 16 },
  grain: { kind: 'mass', factorToSi: GRAIN_KG },

  K: { kind: 'temperature', factorToSi: 1 },
  C: { kind: 'temperature', factorToSi: 1, offsetToSi: ZERO_CELSIUS_K },
  F: { kind: 'temperature', factorToSi: 5 / 9, offsetToSi: ZERO_CELSIUS_K - (32 * 5) / 9 },

  Pa: { kind: 'pressure', factorToSi: 1 },
  hPa: { kind: 'pressure', factorToSi: 100 },
  kPa: { kind: 'pressure', factorToSi: 1e3 },
  bar: { kind: 'pressure', factorToSi: BAR_PA },
  mbar: { kind: 'pressure', factorToSi: 100 },
  atm: { kind: 'pressure', factorToSi: ATMOSPHERE_PA },
  mmHg: { kind: 'pressure', factorToSi: MM_HG_PA },
  inHg: { kind: 'pressure', factorToSi: MERCURY_0C * GRAVITY * INCH_M },
  psi: { kind: 'pressure', factorToSi: (POUND_KG * GRAVITY) / (INCH_M * INCH_M) },

  s: { kind: 'time', factorToSi: 1 },
  h: { kind: 'time', factorToSi: 3600 },
  day: { kind: 'time', factorToSi: DAY_S },

  mol: { kind: 'amount of gas', factorToSi: 1 },
  umol: { kind: 'amount of gas', factorToSi: 1e-6 },
  'cm3(STP)': { kind: 'amount of gas', factorToSi: MOL_PER_CM3_STP },
  mg_oxygen: { kind: 'amount of gas', factorToSi: 1e-6 / OXYGEN_MOLAR_MASS },

  fraction: { kind: 'fraction', factorToSi: 1 },
  percent: { kind: 'fraction', factorToSi: 0.01 },

  'J/mol': { kind: 'energy per amount', factorToSi: 1 },
  'kJ/mol': { kind: 'energy per amount', factorToSi: 1e3 },
  'kcal/mol': { kind: 'energy per amount', factorToSi: 4184 },
} as const satisfies Record<string, Unit>;

export type UnitName = keyof typeof UNITS;
