import * as yup from 'yup';
import type { EvaluationDescription } from '../engine/description/evaluation';
import { closedObject, optionalQuantity, quantity } from './fields';
import { RULES } from './rules';
import { storageDescriptionShape } from './storage-description';

/** POST: a whole description in, the whole answer out; nothing is stored. Wants an engineer's session. */
export const EVALUATIONS_PATH = '/api/evaluations';

export const oxygenTestSchema = closedObject({
  gas: yup
    .string()
    .strict()
    .oneOf(['oxygen'] as const)
    .required(),
  name: yup.string().strict().max(120).optional(),
  temperature_C: quantity(RULES.temperature),
  relative_humidity_outside: quantity({ ...RULES.relativeHumidity, label: 'Humidity outside' }),
  relative_humidity_inside: quantity({ ...RULES.relativeHumidity, label: 'Humidity inside' }),
  oxygen_mole_fraction_dry: quantity(RULES.oxygenMoleFraction),
});

export const waterTestSchema = closedObject({
  gas: yup
    .string()
    .strict()
    .oneOf(['water'] as const)
    .required(),
  name: yup.string().strict().max(120).optional(),
  temperature_C: quantity(RULES.temperature),
  relative_humidity_high: quantity({ ...RULES.relativeHumidity, label: 'Humidity of the moist side' }),
  relative_humidity_low: quantity({ ...RULES.relativeHumidity, label: 'Humidity of the dry side' }),
  moist_side: yup
    .string()
    .strict()
    .oneOf(['outside', 'inside'] as const)
    .optional(),
}).test(
  'gradient',
  'Test: the moist side must be moister than the dry side.',
  (test) => (test?.relative_humidity_high ?? 1) > (test?.relative_humidity_low ?? 0),
);

const unknownTestSchema = closedObject({
  gas: yup
    .string()
    .strict()
    .oneOf(['oxygen', 'water'], 'Test: the gas is oxygen or water.')
    .required('Test: the gas is oxygen or water.'),
});

export const TEST_SCHEMAS = [oxygenTestSchema, waterTestSchema];

export const transmissionTestSchema = yup.lazy((test: unknown) => {
  const gas = typeof test === 'object' && test !== null && 'gas' in test ? test.gas : undefined;
  if (gas === 'oxygen') return oxygenTestSchema;
  return gas === 'water' ? waterTestSchema : unknownTestSchema;
});

export const evaluationRequestSchema = closedObject({
  ...storageDescriptionShape,
  target_days: optionalQuantity(RULES.targetDays),
  tests: yup.array(transmissionTestSchema).strict().max(20, 'Tests: at most 20.').optional(),
}).required('Send the whole description as JSON.');

export type EvaluationRequest = EvaluationDescription;
