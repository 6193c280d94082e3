/** A closed interval; `isMinExcluded` where the lower end itself is refused. */
export interface NumericRange {
  readonly min: number;
  readonly max: number;
  readonly isMinExcluded?: boolean;
}

/** What the engine computes with. Forms may offer less, never more. */
export const TEMPERATURE_C: NumericRange = { min: -30, max: 60 };
export const HUMIDITY: NumericRange = { min: 0, max: 1 };
export const THICKNESS_UM: NumericRange = { min: 1e-9, max: 1e6 };
/** A coating's own thickness; 0: not known. */
export const COATING_THICKNESS_UM: NumericRange = { min: 0, max: 1e6 };
export const AREA_M2: NumericRange = { min: 0, max: 1e4, isMinExcluded: true };
export const PERMEABILITY_SI: NumericRange = { min: 1e-30, max: 1e-6 };
export const PERMEANCE_SI: NumericRange = { min: 1e-30, max: 1 };
export const ACTIVATION_ENERGY_J_PER_MOL: NumericRange = { min: -300_000, max: 500_000 };
/** Where a material was measured may lie outside what a route may have. */
export const REFERENCE_TEMPERATURE_C: NumericRange = { min: -100, max: 200 };
export const CURVE_FACTOR: NumericRange = { min: 1e-12, max: 1e12 };
/** Least distance between two humidities of a curve: a step for all purposes, and still no rounding. */
export const CURVE_SPACING = 1e-9;
export const CURVE_POINTS: NumericRange = { min: 1, max: 200 };
export const LAYER_COUNT: NumericRange = { min: 1, max: 50 };
export const WALL_COUNT: NumericRange = { min: 1, max: 20 };
export const LEG_COUNT: NumericRange = { min: 1, max: 10_000 };
export const DEFECT_DENSITY_PER_M2: NumericRange = { min: 0, max: 1e13 };
export const HOLE_DIAMETER_UM: NumericRange = { min: 0, max: 1e4, isMinExcluded: true };
export const LEAK_COUNT: NumericRange = { min: 0, max: 1e6 };
export const LENGTH_MM: NumericRange = { min: 0, max: 1e5, isMinExcluded: true };
export const HEADSPACE_CM3: NumericRange = { min: 0, max: 1e9 };
export const PERCENT: NumericRange = { min: 0, max: 100 };
export const MASS_KG: NumericRange = { min: 0, max: 1e5, isMinExcluded: true };
export const MOISTURE_G_PER_G: NumericRange = { min: 0, max: 100 };
export const ISOTHERM_SLOPE: NumericRange = { min: 0, max: 1000, isMinExcluded: true };
export const ISOTHERM_INTERCEPT: NumericRange = { min: -100, max: 100 };
export const GAB_MONOLAYER: NumericRange = { min: 0, max: 100, isMinExcluded: true };
export const GAB_C: NumericRange = { min: 0, max: 1e6, isMinExcluded: true };
export const GAB_K: NumericRange = { min: 0, max: 1, isMinExcluded: true };
export const RATE_CONSTANT: NumericRange = { min: 0, max: 1, isMinExcluded: true };
export const ABSORBER_CM3_STP: NumericRange = { min: 0, max: 1e9 };
/** Above the saturation pressure of water at 60 °C, so that air always has oxygen in it. */
export const TOTAL_PRESSURE_PA: NumericRange = { min: 20_000, max: 1e6 };
export const LEG_DAYS: NumericRange = { min: 0, max: 36_500, isMinExcluded: true };
export const HORIZON_DAYS: NumericRange = { min: 0, max: 1_000_000, isMinExcluded: true };
export const TARGET_DAYS: NumericRange = { min: 0, max: 1_000_000, isMinExcluded: true };
export const UPTAKE_LIMIT_MG_PER_KG: NumericRange = { min: 0, max: 1e6, isMinExcluded: true };
export const OXYGEN_FRACTION: NumericRange = { min: 0, max: 1, isMinExcluded: true };
export const REPORT_DAY_COUNT: NumericRange = { min: 0, max: 10_000 };
export const DIFFUSIVITY_M2_PER_S: NumericRange = { min: 1e-30, max: 1e-3 };
/** D0 of D = D0·exp(−Q/(R·T)): far above any D, as Q may be large. */
export const DIFFUSIVITY_PREFACTOR_M2_PER_S: NumericRange = { min: 1e-30, max: 1e30 };
export const TRANSMISSION: NumericRange = { min: 0, max: 1 };
export const GEOMETRIC_SD: NumericRange = { min: 1, max: 100 };
export const RELATIVE_SD: NumericRange = { min: 0, max: 1 };
export const TEMPERATURE_SD_K: NumericRange = { min: 0, max: 30 };
export const HUMIDITY_SD: NumericRange = { min: 0, max: 0.5 };
/** Draws are numbered by 32-bit whole numbers, and seeds are such. */
export const DRAW_NUMBER: NumericRange = { min: 0, max: 0xffffffff };
export const DRAW_COUNT: NumericRange = { min: 1, max: 1_000_000 };
