import * as yup from 'yup';
import type { LimitName } from '../engine/description/storage-description';
import { closedObject } from './fields';
import { oxygenTestSchema, waterTestSchema } from './evaluations';

/** The answer as the engine gives it (shared/engine/description/evaluation.ts), for OpenAPI and for tests. */

const number = () => yup.number().strict().required();
const text = () => yup.string().strict().defined();
const numbers = () => yup.array(number()).strict().required();

const reachedLimitSchema = closedObject({
  status: yup
    .string()
    .strict()
    .oneOf(['reached'] as const)
    .required(),
  days: number(),
});

const unreachedLimitSchema = closedObject({
  status: yup
    .string()
    .strict()
    .oneOf(['not reached'] as const)
    .required(),
  value_at_horizon: number(),
  settles_at: yup.number().strict().nullable().optional(),
});

export const LIMIT_ANSWER_SCHEMAS = [reachedLimitSchema, unreachedLimitSchema];

export const limitAnswerSchema = yup.lazy((limit: unknown) => {
  if (limit === undefined) return yup.mixed().optional();
  const status = typeof limit === 'object' && limit !== null && 'status' in limit ? limit.status : undefined;
  return status === 'reached' ? reachedLimitSchema.required() : unreachedLimitSchema.required();
});

export const LIMIT_NAMES = [
  'oxygen_uptake_mg_per_kg',
  'headspace_oxygen_percent',
  'moisture_max_g_per_g',
  'moisture_min_g_per_g',
] as const satisfies readonly LimitName[];

const limitNameField = () => yup.string().strict().oneOf(LIMIT_NAMES).nullable().defined();

const coursesSchema = closedObject({
  days: numbers(),
  oxygen_uptake_mg_per_kg: numbers(),
  headspace_oxygen_percent: yup.array(number()).strict().optional(),
  moisture_g_per_g: yup.array(number()).strict().optional(),
  absorber_left_cm3_STP: yup.array(number()).strict().optional(),
});

const waterThroughWallSchema = closedObject({
  permeance_mol_per_m2_s_Pa: number(),
  flux_mol_per_m2_s: number(),
  flux_g_per_m2_day: number(),
  interface_relative_humidity: numbers(),
  interface_pressure_Pa: numbers(),
  resistance_share: numbers(),
});

const oxygenThroughWallSchema = closedObject({
  permeance_mol_per_m2_s_Pa: number(),
  flux_mol_per_m2_s: number(),
  flux_cm3_STP_per_m2_day: number(),
  interface_pressure_Pa: numbers(),
  resistance_share: numbers(),
});

const wallOnLegSchema = closedObject({
  leg: number(),
  leg_name: yup.string().strict().optional(),
  starts_day: number(),
  temperature_C: number(),
  relative_humidity_outside: number(),
  relative_humidity_inside: number(),
  oxygen_pressure_outside_Pa: number(),
  oxygen_pressure_inside_Pa: number(),
  water: waterThroughWallSchema.required(),
  oxygen: oxygenThroughWallSchema.required(),
});

export const TEST_IN_ANSWER_SCHEMAS = [oxygenTestSchema, waterTestSchema];

export const testInAnswerSchema = yup.lazy((test: unknown) => {
  const isOxygen = typeof test === 'object' && test !== null && 'gas' in test && test.gas === 'oxygen';
  return isOxygen ? oxygenTestSchema.required() : waterTestSchema.required();
});

const wallInTestSchema = closedObject({
  test: testInAnswerSchema,
  permeance_mol_per_m2_s_Pa: number(),
  rate_cm3_STP_per_m2_day: yup.number().strict().optional(),
  rate_g_per_m2_day: yup.number().strict().optional(),
  is_below_measurable: yup.boolean().strict().required(),
  resistance_share: numbers(),
  interface_relative_humidity: numbers(),
});

export const wallAnswerSchema = closedObject({
  name: text(),
  area_m2: number(),
  layers: yup
    .array(
      closedObject({
        name: text(),
        kind: yup
          .string()
          .strict()
          .oneOf(['film', 'coating', 'foil'] as const)
          .required(),
        thickness_um: number(),
      }),
    )
    .strict()
    .required(),
  legs: yup.array(wallOnLegSchema).strict().required(),
  tests: yup.array(wallInTestSchema).strict().required(),
});

const gasConductanceSchema = closedObject({
  walls_mol_per_s_Pa: numbers(),
  seal_mol_per_s_Pa: number(),
  leaks_mol_per_s_Pa: number(),
  total_mol_per_s_Pa: number(),
});

const warningSchema = closedObject({
  code: yup
    .string()
    .strict()
    .oneOf([
      'temperature_outside_measured',
      'temperature_range_unknown',
      'activation_energy_missing',
      'humidity_beyond_curve',
      'below_measurable',
      'pinholes_are_estimated',
      'rate_constant_without_energy',
      'orientation_matters',
      'limit_passed_at_packing',
    ] as const)
    .required(),
  path: text(),
  message: text(),
});

const solverReportSchema = closedObject({
  method: text(),
  status: yup
    .string()
    .strict()
    .oneOf(['finished', 'step limit reached'] as const)
    .required(),
  relative_tolerance: number(),
  accepted_steps: number(),
  rejected_steps: number(),
  rate_evaluations: number(),
  wall_solutions: number(),
});

export const evaluationAnswerSchema = closedObject({
  engine_version: text(),
  limits: closedObject({
    oxygen_uptake_mg_per_kg: limitAnswerSchema,
    headspace_oxygen_percent: limitAnswerSchema,
    moisture_max_g_per_g: limitAnswerSchema,
    moisture_min_g_per_g: limitAnswerSchema,
  }).required(),
  first_limit: limitNameField(),
  shelf_life_days: yup.number().strict().nullable().defined(),
  absorber_exhausted_day: yup.number().strict().nullable().optional(),
  courses: coursesSchema.optional().default(undefined),
  target: closedObject({
    days: number(),
    is_met: yup.boolean().strict().required(),
    margin_days: yup.number().strict().nullable().defined(),
  })
    .nullable()
    .defined(),
  walls: yup.array(wallAnswerSchema).strict().required(),
  pack: yup
    .array(
      closedObject({
        leg: number(),
        starts_day: number(),
        oxygen: gasConductanceSchema.required(),
        water: gasConductanceSchema.required(),
      }),
    )
    .strict()
    .required(),
  warnings: yup.array(warningSchema).strict().required(),
  solver: solverReportSchema.required(),
});
