import { ATMOSPHERE_PA, DAY_S, MOL_PER_CM3_STP, OXYGEN_MOLAR_MASS, ZERO_CELSIUS_K } from '../../units';
import type { Food, Leg, StorageSystem } from '../storage-system';
import { InputError } from './input-error';
import {
  ABSORBER_CM3_STP,
  ACTIVATION_ENERGY_J_PER_MOL,
  HORIZON_DAYS,
  LEG_COUNT,
  LEG_DAYS,
  MASS_KG,
  MOISTURE_G_PER_G,
  PERCENT,
  RATE_CONSTANT,
  REFERENCE_TEMPERATURE_C,
  REPORT_DAY_COUNT,
  TOTAL_PRESSURE_PA,
  UPTAKE_LIMIT_MG_PER_KG,
} from './ranges';
import { readHumidity, readTemperatureK } from './read-conditions';
import { readIsotherm } from './read-isotherm';
import { readChoice, readList, readNumber, readObject, readOptional } from './read-number';
import { readPack } from './read-pack';
import type {
  FoodDescription,
  LegDescription,
  LimitName,
  LimitsDescription,
  RouteDescription,
  StorageDescription,
} from './storage-description';

/** In the order in which a tie is settled. */
export const LIMIT_NAMES: readonly LimitName[] = [
  'oxygen_uptake_mg_per_kg',
  'headspace_oxygen_percent',
  'moisture_max_g_per_g',
  'moisture_min_g_per_g',
];

/** A repeated route may begin this many legs within its horizon. */
const MOST_LEGS_BEGUN = 100_000;

/** Amount of oxygen [mol] that is so many mg per kg of food. */
export const uptakeMol = (mgPerKg: number, massKg: number): number =>
  (mgPerKg * 1e-6 * massKg) / OXYGEN_MOLAR_MASS;

/** The reverse of uptakeMol. */
export const uptakeMgPerKg = (mol: number, massKg: number): number =>
  (mol * OXYGEN_MOLAR_MASS * 1e6) / massKg;

/** A storage description in SI. Errors: InputError with path, value and remedy; nothing is corrected silently. */
export function readStorage(description: StorageDescription): StorageSystem {
  const given = readObject<StorageDescription>(description, '', 'Description');
  const totalPressurePa = readOptional(given.total_pressure_Pa, 'total_pressure_Pa', {
    range: TOTAL_PRESSURE_PA,
    label: 'Total pressure',
    unit: 'Pa',
    otherwise: ATMOSPHERE_PA,
  });
  const pack = readPack(given.pack, 'pack');
  const food = readFood(given.food);
  const horizonDays = readNumber(given.horizon_days, 'horizon_days', {
    range: HORIZON_DAYS,
    label: 'Horizon',
    unit: 'days',
  });
  const { legs, isRepeated } = readRoute(given.route, horizonDays);
  return {
    pack,
    food,
    absorberMol:
      readOptional(given.absorber_capacity_cm3_STP, 'absorber_capacity_cm3_STP', {
        range: ABSORBER_CM3_STP,
        label: 'Absorber capacity',
        unit: 'cm³(STP)',
        otherwise: 0,
      }) * MOL_PER_CM3_STP,
    totalPressurePa,
    legs,
    isRepeated,
    limits: readLimits(given.limits, { food, totalPressurePa, hasHeadspace: pack.headspaceM3 > 0 }),
    horizonS: horizonDays * DAY_S,
    reportS: readReportDays(given.report_days, horizonDays)
      .map((day) => day * DAY_S)
      .sort((a, b) => a - b),
  };
}

/** Days at which courses are wanted, as given. */
export function readReportDays(value: unknown, horizonDays: number): number[] {
  if (value === undefined || value === null) return [];
  const days = readList<number>(value, 'report_days', { range: REPORT_DAY_COUNT, label: 'Report days' });
  return days.map((day, i) =>
    readNumber(day, `report_days[${i}]`, {
      range: { min: 0, max: horizonDays },
      label: 'Report day',
      unit: 'days',
    }),
  );
}

function readFood(value: unknown): Food {
  const food = readObject<FoodDescription>(value, 'food', 'Food');
  const mode = readChoice(food.oxygen_mode, 'food.oxygen_mode', {
    choices: ['at_once', 'none', 'rate'] as const,
    label: 'Oxygen mode',
  });
  const hasIsotherm = food.isotherm !== undefined && food.isotherm !== null;
  const referenceC = readOptional(food.rate_reference_temperature_C, 'food.rate_reference_temperature_C', {
    range: REFERENCE_TEMPERATURE_C,
    label: 'Reference temperature of the rate',
    unit: '°C',
    otherwise: 23,
  });
  return {
    massKg: readNumber(food.mass_kg, 'food.mass_kg', { range: MASS_KG, label: 'Food mass', unit: 'kg' }),
    oxygenMode: mode,
    rateConstantSi:
      mode === 'rate'
        ? readNumber(food.rate_constant_mol_per_kg_s_Pa, 'food.rate_constant_mol_per_kg_s_Pa', {
            range: RATE_CONSTANT,
            label: 'Rate constant of oxygen uptake',
            unit: 'mol/(kg·s·Pa)',
          })
        : 0,
    rateEnergyJPerMol: readOptional(
      food.rate_activation_energy_J_per_mol,
      'food.rate_activation_energy_J_per_mol',
      {
        range: ACTIVATION_ENERGY_J_PER_MOL,
        label: 'Activation energy of the rate',
        unit: 'J/mol',
        otherwise: 0,
      },
    ),
    rateReferenceK: referenceC + ZERO_CELSIUS_K,
    isotherm: hasIsotherm ? readIsotherm(food.isotherm, 'food.isotherm') : null,
    initialMoisture: hasIsotherm
      ? readNumber(food.initial_moisture_g_per_g, 'food.initial_moisture_g_per_g', {
          range: MOISTURE_G_PER_G,
          label: 'Moisture at packing',
          unit: 'g/g',
        })
      : 0,
    insideHumidity: hasIsotherm
      ? 0
      : readHumidity(food.inside_relative_humidity, 'food.inside_relative_humidity', 'Inside humidity'),
  };
}

function readRoute(value: unknown, horizonDays: number): { legs: Leg[]; isRepeated: boolean } {
  const route = readObject<RouteDescription>(value, 'route', 'Route');
  const after = readChoice(route.after_last, 'route.after_last', {
    choices: ['hold', 'repeat'] as const,
    label: 'What follows the last leg',
  });
  const list = readList<LegDescription>(route.legs, 'route.legs', {
    range: LEG_COUNT,
    label: 'Legs of a route',
  });
  let cycleDays = 0;
  const legs = list.map((item, i): Leg => {
    const path = `route.legs[${i}]`;
    const leg = readObject<LegDescription>(item, path, 'Leg');
    const days = readNumber(leg.days, `${path}.days`, {
      range: LEG_DAYS,
      label: 'Length of a leg',
      unit: 'days',
    });
    cycleDays += days;
    return {
      name: typeof leg.name === 'string' && leg.name !== '' ? leg.name : undefined,
      temperatureK: readTemperatureK(leg.temperature_C, `${path}.temperature_C`),
      humidity: readHumidity(leg.relative_humidity, `${path}.relative_humidity`),
      durationS: days * DAY_S,
    };
  });
  const begun = (horizonDays / cycleDays) * legs.length;
  if (after === 'repeat' && begun > MOST_LEGS_BEGUN) {
    throw new InputError(
      'route.legs',
      cycleDays,
      `Repeated every ${cycleDays} days, the route begins ${Math.round(begun)} legs within ${horizonDays} days; ` +
        `at most ${MOST_LEGS_BEGUN} are computed. Use longer legs or a nearer horizon.`,
    );
  }
  return { legs, isRepeated: after === 'repeat' };
}

function readLimits(
  value: unknown,
  pack: { food: Food; totalPressurePa: number; hasHeadspace: boolean },
): StorageSystem['limits'] {
  const given = readObject<LimitsDescription>(value, 'limits', 'Limits');
  const { food } = pack;
  const isGiven = (name: LimitName): boolean => given[name] !== undefined && given[name] !== null;
  const unknown = Object.keys(given).find((name) => !LIMIT_NAMES.some((known) => known === name));
  if (unknown !== undefined) {
    throw new InputError(
      `limits.${unknown}`,
      null,
      `"${unknown}" is no limit; use ${LIMIT_NAMES.join(', ')}.`,
    );
  }
  const limits: StorageSystem['limits'] = {};
  if (isGiven('oxygen_uptake_mg_per_kg')) {
    const mgPerKg = readNumber(given.oxygen_uptake_mg_per_kg, 'limits.oxygen_uptake_mg_per_kg', {
      range: UPTAKE_LIMIT_MG_PER_KG,
      label: 'Oxygen uptake limit',
      unit: 'mg/kg',
    });
    limits.oxygen_uptake_mg_per_kg = uptakeMol(mgPerKg, food.massKg);
  }
  if (isGiven('headspace_oxygen_percent')) {
    const percent = readNumber(given.headspace_oxygen_percent, 'limits.headspace_oxygen_percent', {
      range: PERCENT,
      label: 'Headspace oxygen limit',
      unit: '%',
    });
    if (!pack.hasHeadspace) {
      throw new InputError(
        'limits.headspace_oxygen_percent',
        percent,
        'There is no headspace to hold oxygen: give pack.headspace_cm3, or leave this limit out.',
      );
    }
    limits.headspace_oxygen_percent = (percent / 100) * pack.totalPressurePa;
  }
  for (const name of ['moisture_max_g_per_g', 'moisture_min_g_per_g'] as const) {
    if (!isGiven(name)) continue;
    const label = name === 'moisture_max_g_per_g' ? 'Upper moisture limit' : 'Lower moisture limit';
    const moisture = readNumber(given[name], `limits.${name}`, {
      range: MOISTURE_G_PER_G,
      label,
      unit: 'g/g',
    });
    if (!food.isotherm) {
      throw new InputError(
        `limits.${name}`,
        moisture,
        'Without an isotherm the moisture is not followed: give food.isotherm, or leave this limit out.',
      );
    }
    limits[name] = moisture;
  }
  return limits;
}
