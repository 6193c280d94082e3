/** Molar gas constant, J/(mol·K); exact since the SI of 2019. */
export const GAS_CONSTANT = 8.314462618;

/** Standard atmosphere, Pa; exact. */
export const ATMOSPHERE_PA = 101_325;

/** 0 °C in K; exact. */
export const ZERO_CELSIUS_K = 273.15;

/** Seconds in a day. */
export const DAY_S = 86_400;

/** Molar mass of water, kg/mol (memory). */
export const WATER_MOLAR_MASS = 18.01528e-3;

/** Molar mass of oxygen, kg/mol (memory). */
export const OXYGEN_MOLAR_MASS = 31.9988e-3;

/** Mole fraction of oxygen in dry air. */
export const OXYGEN_IN_DRY_AIR = 0.2095;

/** Amount in 1 cm³(STP), mol: STP is 0 °C and 101 325 Pa, as the oxygen test methods have it. */
export const MOL_PER_CM3_STP = (ATMOSPHERE_PA * 1e-6) / (GAS_CONSTANT * ZERO_CELSIUS_K);
