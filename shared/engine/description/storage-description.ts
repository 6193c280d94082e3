/**
 * What a person describes: one pack of one food on one route, every key ending in its unit.
 *
 * This is the shape of the API and of the files of check cases. The engine proper works in SI;
 * `evaluate` and its neighbours in this folder are the one edge where these keys are read.
 *
 * Units: `_C` °C · `_um` µm · `_cm3` volume · `_cm3_STP` amount of gas (0 °C, 101 325 Pa) · `_percent` 0 to 100 ·
 * relative humidity and water activity are fractions, 0 to 1 · moisture is g water per g dry matter.
 */

/** Factor f(h) on a permeability, linear in ln f between points, flat beyond the ends. */
export interface HumidityCurveDescription {
  relative_humidity: number[];
  factor: number[];
}

interface GasConditions {
  /** °C at which the value holds; 23 if absent. */
  reference_temperature_C?: number;
  /** Activation energy of permeation, J/mol; 0 if absent. May be negative. */
  activation_energy_J_per_mol?: number;
  humidity_curve?: HumidityCurveDescription;
  /** Humidity at which the value holds, fraction; 0 if absent. */
  reference_relative_humidity?: number;
  /** Temperatures between which the activation energy was measured, °C; absent: not known. */
  measured_temperature_min_C?: number;
  measured_temperature_max_C?: number;
}

export interface FilmGasDescription extends GasConditions {
  permeability_mol_m_per_m2_s_Pa: number;
}

export interface CoatingGasDescription extends GasConditions {
  permeance_mol_per_m2_s_Pa: number;
}

export interface DefectsDescription {
  density_per_m2: number;
  diameter_um: number;
}

export interface FilmDescription {
  kind: 'film';
  name: string;
  thickness_um: number;
  oxygen: FilmGasDescription;
  water: FilmGasDescription;
}

export interface CoatingDescription {
  kind: 'coating';
  name: string;
  /** The coating's own thickness; 0 if absent. Never scales its permeance. */
  thickness_um?: number;
  oxygen: CoatingGasDescription;
  water: CoatingGasDescription;
  defects?: DefectsDescription;
}

export interface FoilDescription {
  kind: 'foil';
  name: string;
  thickness_um: number;
  defects?: DefectsDescription;
}

export type LayerDescription = FilmDescription | CoatingDescription | FoilDescription;

export interface WallDescription {
  name: string;
  area_m2: number;
  /** Outside face first. */
  layers: LayerDescription[];
}

export interface SealDescription {
  /** Both sealant layers together. */
  sealant_thickness_um: number;
  length_mm: number;
  width_mm: number;
  oxygen: FilmGasDescription;
  water: FilmGasDescription;
}

export interface LeaksDescription {
  count: number;
  length_mm: number;
  diameter_um: number;
}

export interface PackDescription {
  walls: WallDescription[];
  headspace_cm3?: number;
  starting_headspace_oxygen_percent?: number;
  seal?: SealDescription;
  leaks?: LeaksDescription;
}

export type IsothermDescription =
  | { type: 'linear'; slope_g_per_g: number; intercept_g_per_g: number }
  | { type: 'GAB'; Xm_g_per_g: number; C: number; K: number };

export type OxygenMode = 'at_once' | 'none' | 'rate';

export interface FoodDescription {
  /** As packed. */
  mass_kg: number;
  oxygen_mode: OxygenMode;
  /** Mode 'rate' only: oxygen taken up per mass, time and headspace pressure. */
  rate_constant_mol_per_kg_s_Pa?: number;
  /** Mode 'rate' only: Arrhenius energy about rate_reference_temperature_C (23 if absent); 0 if absent. */
  rate_activation_energy_J_per_mol?: number;
  rate_reference_temperature_C?: number;
  isotherm?: IsothermDescription;
  /** With an isotherm. */
  initial_moisture_g_per_g?: number;
  /** Without an isotherm: held constant. */
  inside_relative_humidity?: number;
}

export interface LegDescription {
  name?: string;
  temperature_C: number;
  relative_humidity: number;
  days: number;
}

export interface RouteDescription {
  legs: LegDescription[];
  after_last: 'hold' | 'repeat';
}

export interface LimitsDescription {
  oxygen_uptake_mg_per_kg?: number;
  headspace_oxygen_percent?: number;
  moisture_max_g_per_g?: number;
  moisture_min_g_per_g?: number;
}

export type LimitName = keyof LimitsDescription;

export interface StorageDescription {
  pack: PackDescription;
  food: FoodDescription;
  absorber_capacity_cm3_STP?: number;
  total_pressure_Pa?: number;
  route: RouteDescription;
  limits: LimitsDescription;
  horizon_days: number;
  /** Days at which the courses are wanted; absent: no courses. */
  report_days?: number[];
}
