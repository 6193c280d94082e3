import { GAS_CONSTANT, OXYGEN_IN_DRY_AIR } from '../units';
import { arrheniusFactor } from './arrhenius';
import type { LimitName, OxygenMode } from './description/storage-description';
import type { Isotherm } from './isotherm';
import { PackAtTemperature, type Pack } from './pack-at-temperature';
import { saturationPressureAtK } from './water-vapour';

/** The food, SI: moisture in g water per g dry matter. */
export interface Food {
  massKg: number;
  oxygenMode: OxygenMode;
  /** mol/(kg·s·Pa) at rateReferenceK; 0 unless the mode is 'rate'. */
  rateConstantSi: number;
  rateEnergyJPerMol: number;
  rateReferenceK: number;
  isotherm: Isotherm | null;
  initialMoisture: number;
  /** Without an isotherm. */
  insideHumidity: number;
}

export interface Leg {
  name: string | undefined;
  temperatureK: number;
  humidity: number;
  durationS: number;
}

/** Pack, food and route, SI. */
export interface StorageSystem {
  pack: Pack;
  food: Food;
  absorberMol: number;
  totalPressurePa: number;
  legs: Leg[];
  isRepeated: boolean;
  /** mol of oxygen taken up, headspace pressure Pa, moisture. */
  limits: Partial<Record<LimitName, number>>;
  horizonS: number;
  /** Ascending. */
  reportS: number[];
}

/** Oxygen pressure of moist air outside [Pa]: 0.2095·(p_total − RH·p_sat). */
function oxygenInMoistAir(totalPressurePa: number, humidity: number, saturationPa: number): number {
  return OXYGEN_IN_DRY_AIR * (totalPressurePa - humidity * saturationPa);
}

/** What holds throughout one leg. */
export interface LegConditions {
  temperatureK: number;
  humidity: number;
  saturationPa: number;
  outsideOxygenPa: number;
  pack: PackAtTemperature;
  /** Uptake rate over headspace pressure, k·m, mol/(s·Pa). */
  reactionSi: number;
  /** RT/V, Pa/mol; 0 without a headspace. */
  pressurePerMol: number;
}

/** Conditions of every leg; legs at one temperature share their pack. `fluxTolerance`: see WallAtTemperature. */
export function conditionsOf(system: StorageSystem, fluxTolerance = 0): LegConditions[] {
  const packs = new Map<number, PackAtTemperature>();
  return system.legs.map((leg) => {
    const { temperatureK, humidity } = leg;
    let pack = packs.get(temperatureK);
    if (!pack) {
      pack = new PackAtTemperature(system.pack, temperatureK, fluxTolerance);
      packs.set(temperatureK, pack);
    }
    const { food } = system;
    const saturationPa = saturationPressureAtK(temperatureK);
    const volume = system.pack.headspaceM3;
    return {
      temperatureK,
      humidity,
      saturationPa,
      outsideOxygenPa: oxygenInMoistAir(system.totalPressurePa, humidity, saturationPa),
      pack,
      reactionSi:
        food.rateConstantSi *
        food.massKg *
        arrheniusFactor(food.rateEnergyJPerMol, temperatureK, food.rateReferenceK),
      pressurePerMol: volume > 0 ? (GAS_CONSTANT * temperatureK) / volume : 0,
    };
  });
}
