import type { LayerDescription, LimitName, StorageDescription } from './storage-description';

/** An oxygen transmission test: pure oxygen or air against an oxygen-free side, each face at its own humidity. */
export interface OxygenTest {
  gas: 'oxygen';
  name?: string;
  temperature_C: number;
  relative_humidity_outside: number;
  relative_humidity_inside: number;
  /** 1 for pure oxygen, 0.2095 for air. */
  oxygen_mole_fraction_dry: number;
}

/** A water vapour transmission test between a moist and a drier side. */
export interface WaterTest {
  gas: 'water';
  name?: string;
  temperature_C: number;
  relative_humidity_high: number;
  relative_humidity_low: number;
  /** Which face of the wall meets the moist side; matters when a layer feels humidity. 'outside' if absent. */
  moist_side?: 'outside' | 'inside';
}

export type TransmissionTest = OxygenTest | WaterTest;

/** Body of POST /api/evaluations: a whole description. `tests` absent: the standard ones (standardTests). */
export interface EvaluationDescription extends StorageDescription {
  target_days?: number;
  tests?: TransmissionTest[];
}

export type LimitAnswer =
  | { status: 'reached'; days: number }
  /** settles_at only where the last leg is held; null where the value grows without end. */
  | { status: 'not reached'; value_at_horizon: number; settles_at?: number | null };

export interface CoursesAnswer {
  days: number[];
  oxygen_uptake_mg_per_kg: number[];
  headspace_oxygen_percent?: number[];
  moisture_g_per_g?: number[];
  absorber_left_cm3_STP?: number[];
}

export interface StorageAnswer {
  limits: Partial<Record<LimitName, LimitAnswer>>;
  first_limit: LimitName | null;
  shelf_life_days: number | null;
  absorber_exhausted_day?: number | null;
  courses?: CoursesAnswer;
  /** How the integration ended: where it says 'step limit reached', what is "not reached" is not known. */
  solver: SolverReport;
}

export interface WaterThroughWall {
  permeance_mol_per_m2_s_Pa: number;
  /** Positive inwards. */
  flux_mol_per_m2_s: number;
  flux_g_per_m2_day: number;
  /** Outside face to inside face: one more than layers. */
  interface_relative_humidity: number[];
  interface_pressure_Pa: number[];
  /** One per layer, adding to 1. */
  resistance_share: number[];
}

export interface OxygenThroughWall {
  permeance_mol_per_m2_s_Pa: number;
  flux_mol_per_m2_s: number;
  flux_cm3_STP_per_m2_day: number;
  interface_pressure_Pa: number[];
  resistance_share: number[];
}

/** One wall under one pair of environments. */
export interface WallState {
  temperature_C: number;
  relative_humidity_outside: number;
  relative_humidity_inside: number;
  oxygen_pressure_outside_Pa: number;
  oxygen_pressure_inside_Pa: number;
  water: WaterThroughWall;
  oxygen: OxygenThroughWall;
}

/** The wall as a leg of the route begins. */
export interface WallOnLeg extends WallState {
  leg: number;
  leg_name?: string;
  starts_day: number;
}

export interface WallInTest {
  test: TransmissionTest;
  /** The permeance to the gas of the test. */
  permeance_mol_per_m2_s_Pa: number;
  /** For an oxygen test; the rate in that test, so in its gas (pure oxygen or air). */
  rate_cm3_STP_per_m2_day?: number;
  /** For a water test. */
  rate_g_per_m2_day?: number;
  /** True below 0.005 cm³ or 0.005 g per m² and day: less than laboratories can measure. */
  is_below_measurable: boolean;
  resistance_share: number[];
  interface_relative_humidity: number[];
}

export interface WallAnswer {
  name: string;
  area_m2: number;
  layers: { name: string; kind: LayerDescription['kind']; thickness_um: number }[];
  legs: WallOnLeg[];
  tests: WallInTest[];
}

export interface GasConductance {
  walls_mol_per_s_Pa: number[];
  seal_mol_per_s_Pa: number;
  leaks_mol_per_s_Pa: number;
  total_mol_per_s_Pa: number;
}

export interface EngineWarning {
  code:
    | 'temperature_outside_measured'
    | 'temperature_range_unknown'
    | 'activation_energy_missing'
    | 'humidity_beyond_curve'
    | 'below_measurable'
    | 'pinholes_are_estimated'
    | 'rate_constant_without_energy'
    | 'orientation_matters'
    | 'limit_passed_at_packing';
  /** Path in the description of what is concerned, e.g. `pack.walls[0].layers[1].oxygen`. */
  path: string;
  message: string;
}

/** How the integration ended: data, never an exception. */
export interface SolverReport {
  /** Method, e.g. 'DOP853' or 'closed form'. */
  method: string;
  status: 'finished' | 'step limit reached';
  relative_tolerance: number;
  accepted_steps: number;
  rejected_steps: number;
  rate_evaluations: number;
  wall_solutions: number;
}

export interface EvaluationAnswer extends StorageAnswer {
  engine_version: string;
  target: { days: number; is_met: boolean; margin_days: number | null } | null;
  walls: WallAnswer[];
  /** Conductances of the pack as each leg begins. */
  pack: { leg: number; starts_day: number; oxygen: GasConductance; water: GasConductance }[];
  warnings: EngineWarning[];
}
