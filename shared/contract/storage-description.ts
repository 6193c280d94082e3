import * as yup from 'yup';
import { closedObject, nameField, optionalQuantity, quantity } from './fields';
import { MOST_CURVE_POINTS, MOST_LAYERS, MOST_LEGS, MOST_WALLS, RULES } from './rules';

export const humidityCurveSchema = closedObject({
  relative_humidity: yup
    .array(quantity({ ...RULES.relativeHumidity, label: 'Humidity of the point' }))
    .strict()
    .required('Humidity curve: give its humidities.')
    .min(1, 'Humidity curve: give at least one point.')
    .max(MOST_CURVE_POINTS, `Humidity curve: at most ${MOST_CURVE_POINTS} points.`)
    .test('rising', 'Humidity curve: sort the points by rising humidity, each humidity once.', (points) =>
      (points ?? []).every((point, index, all) => index === 0 || point > (all[index - 1] ?? Infinity)),
    ),
  factor: yup
    .array(quantity(RULES.humidityFactor))
    .strict()
    .required('Humidity curve: give a factor for each humidity.'),
}).test(
  'paired',
  'Humidity curve: give one factor for each humidity.',
  (curve) => curve?.relative_humidity?.length === curve?.factor?.length,
);

const gasConditions = {
  reference_temperature_C: optionalQuantity({ ...RULES.temperature, label: 'Reference temperature' }),
  activation_energy_J_per_mol: optionalQuantity(RULES.activationEnergy),
  humidity_curve: humidityCurveSchema.optional().default(undefined),
  reference_relative_humidity: optionalQuantity({ ...RULES.relativeHumidity, label: 'Reference humidity' }),
  measured_temperature_min_C: optionalQuantity({
    ...RULES.temperature,
    label: 'Lowest measured temperature',
    min: -100,
    max: 200,
  }),
  measured_temperature_max_C: optionalQuantity({
    ...RULES.temperature,
    label: 'Highest measured temperature',
    min: -100,
    max: 200,
  }),
};

export const filmGasSchema = closedObject({
  permeability_mol_m_per_m2_s_Pa: quantity(RULES.permeability),
  ...gasConditions,
});

export const coatingGasSchema = closedObject({
  permeance_mol_per_m2_s_Pa: quantity(RULES.permeance),
  ...gasConditions,
});

export const defectsSchema = closedObject({
  density_per_m2: quantity(RULES.defectDensity),
  diameter_um: quantity(RULES.defectDiameter),
});

const filmSchema = closedObject({
  kind: yup
    .string()
    .strict()
    .oneOf(['film'] as const)
    .required(),
  name: nameField('Layer'),
  thickness_um: quantity(RULES.gauge),
  oxygen: filmGasSchema.required('Oxygen: give the permeability.'),
  water: filmGasSchema.required('Water: give the permeability.'),
});

const coatingSchema = closedObject({
  kind: yup
    .string()
    .strict()
    .oneOf(['coating'] as const)
    .required(),
  name: nameField('Layer'),
  thickness_um: optionalQuantity(RULES.ownThickness),
  oxygen: coatingGasSchema.required('Oxygen: give the permeance.'),
  water: coatingGasSchema.required('Water: give the permeance.'),
  defects: defectsSchema.optional().default(undefined),
});

const foilSchema = closedObject({
  kind: yup
    .string()
    .strict()
    .oneOf(['foil'] as const)
    .required(),
  name: nameField('Layer'),
  thickness_um: quantity(RULES.gauge),
  defects: defectsSchema.optional().default(undefined),
});

const LAYER_SCHEMA_BY_KIND = { film: filmSchema, coating: coatingSchema, foil: foilSchema };

/** The kinds side by side, for the OpenAPI document: a lazy schema does not describe itself. */
export const LAYER_SCHEMAS = [filmSchema, coatingSchema, foilSchema];

const unknownKindSchema = closedObject({
  kind: yup
    .string()
    .strict()
    .oneOf(['film', 'coating', 'foil'], 'Kind of layer: use film, coating or foil.')
    .required('Kind of layer: use film, coating or foil.'),
});

export const layerSchema = yup.lazy((layer: unknown) => {
  const kind = typeof layer === 'object' && layer !== null && 'kind' in layer ? layer.kind : undefined;
  return kind === 'film' || kind === 'coating' || kind === 'foil'
    ? LAYER_SCHEMA_BY_KIND[kind]
    : unknownKindSchema;
});

const wallSchema = closedObject({
  name: nameField('Wall'),
  area_m2: quantity(RULES.area),
  layers: yup
    .array(layerSchema)
    .strict()
    .required('Wall: add at least one layer.')
    .min(1, 'Wall: add at least one layer.')
    .max(MOST_LAYERS, `Wall: at most ${MOST_LAYERS} layers.`),
});

const sealSchema = closedObject({
  sealant_thickness_um: quantity({ ...RULES.gauge, label: 'Sealant thickness', max: 4000 }),
  length_mm: quantity({ ...RULES.packLength, label: 'Seal length', max: 100_000 }),
  width_mm: quantity({ ...RULES.sealWidth, label: 'Seal width', isMinExcluded: true }),
  oxygen: filmGasSchema.required(),
  water: filmGasSchema.required(),
});

export const leaksSchema = closedObject({
  count: quantity(RULES.leakCount).integer('Leak channels: use a whole number.'),
  length_mm: quantity(RULES.channelLength),
  diameter_um: quantity(RULES.channelDiameter),
});

const packDescriptionSchema = closedObject({
  walls: yup
    .array(wallSchema)
    .strict()
    .required('Pack: give at least one wall.')
    .min(1, 'Pack: give at least one wall.')
    .max(MOST_WALLS, `Pack: at most ${MOST_WALLS} walls.`),
  headspace_cm3: optionalQuantity(RULES.headspace),
  starting_headspace_oxygen_percent: optionalQuantity({
    ...RULES.headspaceOxygen,
    label: 'Starting headspace oxygen',
  }),
  seal: sealSchema.optional().default(undefined),
  leaks: leaksSchema.optional().default(undefined),
});

const linearIsothermSchema = closedObject({
  type: yup
    .string()
    .strict()
    .oneOf(['linear'] as const)
    .required(),
  slope_g_per_g: quantity(RULES.isothermSlope),
  intercept_g_per_g: quantity(RULES.isothermIntercept),
});

const gabIsothermSchema = closedObject({
  type: yup
    .string()
    .strict()
    .oneOf(['GAB'] as const)
    .required(),
  Xm_g_per_g: quantity(RULES.gabMonolayer),
  C: quantity(RULES.gabC),
  K: quantity(RULES.gabK),
});

export const ISOTHERM_SCHEMAS = [linearIsothermSchema, gabIsothermSchema];

const unknownIsothermSchema = closedObject({
  type: yup
    .string()
    .strict()
    .oneOf(['linear', 'GAB'], 'Isotherm: use linear or GAB.')
    .required('Isotherm: use linear or GAB.'),
});

const absentSchema = yup.mixed().optional();

export const isothermSchema = yup.lazy((isotherm: unknown) => {
  if (isotherm === undefined) return absentSchema;
  if (isotherm === null) return unknownIsothermSchema.nullable();
  const type = typeof isotherm === 'object' && 'type' in isotherm ? isotherm.type : undefined;
  if (type === 'linear') return linearIsothermSchema;
  return type === 'GAB' ? gabIsothermSchema : unknownIsothermSchema;
});

export const OXYGEN_MODES = ['at_once', 'none', 'rate'] as const;

export const foodDescriptionSchema = closedObject({
  mass_kg: quantity(RULES.mass),
  oxygen_mode: yup
    .string()
    .strict()
    .oneOf(OXYGEN_MODES, 'Oxygen: use at_once, none or rate.')
    .required('Oxygen: use at_once, none or rate.'),
  rate_constant_mol_per_kg_s_Pa: optionalQuantity(RULES.rateConstant),
  rate_activation_energy_J_per_mol: optionalQuantity(RULES.activationEnergy),
  rate_reference_temperature_C: optionalQuantity({ ...RULES.temperature, label: 'Reference temperature' }),
  isotherm: isothermSchema,
  initial_moisture_g_per_g: optionalQuantity({ ...RULES.moisture, label: 'Moisture as packed' }),
  inside_relative_humidity: optionalQuantity({ ...RULES.relativeHumidity, label: 'Humidity inside' }),
});

const legSchema = closedObject({
  name: yup.string().strict().max(120).optional(),
  temperature_C: quantity(RULES.temperature),
  relative_humidity: quantity(RULES.relativeHumidity),
  days: quantity(RULES.legDays),
});

export const routeDescriptionSchema = closedObject({
  legs: yup
    .array(legSchema)
    .strict()
    .required('Route: give at least one leg.')
    .min(1, 'Route: give at least one leg.')
    .max(MOST_LEGS, `Route: at most ${MOST_LEGS} legs.`),
  after_last: yup
    .string()
    .strict()
    .oneOf(['hold', 'repeat'] as const, 'After the last leg: use hold or repeat.')
    .required('After the last leg: use hold or repeat.'),
});

export const limitsSchema = closedObject({
  oxygen_uptake_mg_per_kg: optionalQuantity(RULES.oxygenUptake),
  headspace_oxygen_percent: optionalQuantity(RULES.headspaceLimit),
  moisture_max_g_per_g: optionalQuantity({ ...RULES.moistureLimit, label: 'Highest moisture' }),
  moisture_min_g_per_g: optionalQuantity({ ...RULES.moistureLimit, label: 'Lowest moisture' }),
}).test('some', 'Limits: give at least one, oxygen or moisture.', (limits) =>
  Object.values(limits ?? {}).some((limit) => limit !== undefined),
);

export const storageDescriptionShape = {
  pack: packDescriptionSchema.required('Pack: describe it.'),
  food: foodDescriptionSchema.required('Food: describe it.'),
  absorber_capacity_cm3_STP: optionalQuantity(RULES.absorber),
  total_pressure_Pa: optionalQuantity(RULES.totalPressure),
  route: routeDescriptionSchema.required('Route: describe it.'),
  limits: limitsSchema.required('Limits: give at least one, oxygen or moisture.'),
  horizon_days: quantity(RULES.horizonDays),
  report_days: yup
    .array(quantity({ label: 'Day to report', unit: 'days', min: 0, max: 36_500 }))
    .strict()
    .max(2000, 'Days to report: at most 2000.')
    .optional(),
};
