import type { QuantityRule } from './fields';

/** What people may enter. The engine's own bounds are wider; these are the sensible ones, with room. */
export const RULES = {
  temperature: { label: 'Temperature', unit: '°C', min: -30, max: 60 },
  relativeHumidity: { label: 'Relative humidity', unit: '%', min: 0, max: 1, shownFactor: 0.01 },
  waterActivity: { label: 'Water activity', unit: '', min: 0, max: 1 },
  gauge: { label: 'Gauge', unit: 'µm', min: 0, max: 2000, isMinExcluded: true },
  ownThickness: { label: 'Thickness', unit: 'µm', min: 0, max: 2000 },
  permeability: { label: 'Permeability', unit: 'mol·m/(m²·s·Pa)', min: 0, max: 1e-6, isMinExcluded: true },
  permeance: { label: 'Permeance', unit: 'mol/(m²·s·Pa)', min: 0, max: 1e-2, isMinExcluded: true },
  statedValue: { label: 'Value', unit: '', min: 0, max: 1e15, isMinExcluded: true },
  activationEnergy: {
    label: 'Activation energy',
    unit: 'kJ/mol',
    min: -100_000,
    max: 200_000,
    shownFactor: 1000,
  },
  humidityFactor: { label: 'Factor', unit: '', min: 0, max: 1e9, isMinExcluded: true },
  geometricSd: { label: 'Spread (geometric SD)', unit: '', min: 1, max: 10 },
  oxygenMoleFraction: {
    label: 'Oxygen in the dry gas',
    unit: '%',
    min: 0,
    max: 1,
    isMinExcluded: true,
    shownFactor: 0.01,
  },
  defectDensity: { label: 'Pinholes', unit: 'per m²', min: 0, max: 1e12 },
  defectDiameter: { label: 'Pinhole diameter', unit: 'µm', min: 0, max: 1000 },
  area: { label: 'Area', unit: 'm²', min: 0, max: 100, isMinExcluded: true },
  packLength: { label: 'Length', unit: 'mm', min: 0, max: 5000, isMinExcluded: true },
  sealWidth: { label: 'Seal', unit: 'mm', min: 0, max: 200 },
  headspace: { label: 'Headspace', unit: 'cm³', min: 0, max: 1e6 },
  headspaceOxygen: { label: 'Headspace oxygen', unit: '%', min: 0, max: 100 },
  leakCount: { label: 'Leak channels', unit: '', min: 0, max: 10_000 },
  channelLength: { label: 'Channel length', unit: 'mm', min: 0, max: 1000, isMinExcluded: true },
  channelDiameter: { label: 'Channel diameter', unit: 'µm', min: 0, max: 5000, isMinExcluded: true },
  mass: { label: 'Mass', unit: 'kg', min: 0, max: 10_000, isMinExcluded: true },
  rateConstant: { label: 'Rate constant', unit: 'mol/(kg·s·Pa)', min: 0, max: 1, isMinExcluded: true },
  moisture: { label: 'Moisture', unit: 'g/g dry', min: 0, max: 10 },
  isothermSlope: { label: 'Slope', unit: 'g/g', min: 0, max: 100, isMinExcluded: true },
  isothermIntercept: { label: 'Intercept', unit: 'g/g', min: -10, max: 10 },
  gabMonolayer: { label: 'Monolayer moisture Xm', unit: 'g/g', min: 0, max: 10, isMinExcluded: true },
  gabC: { label: 'C', unit: '', min: 0, max: 1e6, isMinExcluded: true },
  gabK: { label: 'K', unit: '', min: 0, max: 1, isMinExcluded: true },
  absorber: { label: 'Absorber capacity', unit: 'cm³', min: 0, max: 1e6 },
  oxygenUptake: { label: 'Oxygen limit', unit: 'mg/kg', min: 0, max: 1e6, isMinExcluded: true },
  headspaceLimit: { label: 'Headspace oxygen limit', unit: '%', min: 0, max: 100, isMinExcluded: true },
  moistureLimit: { label: 'Moisture limit', unit: 'g/g dry', min: 0, max: 10 },
  legDays: { label: 'Days', unit: 'days', min: 0, max: 36_500, isMinExcluded: true },
  targetDays: { label: 'Target', unit: 'days', min: 0, max: 36_500, isMinExcluded: true },
  horizonDays: { label: 'Horizon', unit: 'days', min: 0, max: 36_500, isMinExcluded: true },
  totalPressure: { label: 'Total pressure', unit: 'Pa', min: 20_000, max: 1e6 },
  density: { label: 'Density', unit: 'kg/m³', min: 0, max: 25_000, isMinExcluded: true },
  lightPassed: { label: 'Light passed', unit: '%', min: 0, max: 1, shownFactor: 0.01 },
  price: { label: 'Price', unit: '', min: 0, max: 1e6 },
} as const satisfies Record<string, QuantityRule>;

export const MOST_LAYERS = 50;
export const MOST_LEGS = 400;
export const MOST_WALLS = 8;
export const MOST_CURVE_POINTS = 60;
/** What a page of a list holds unless asked. */
export const PAGE_SIZE = 50;
