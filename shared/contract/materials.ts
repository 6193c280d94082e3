import * as yup from 'yup';
import { closedObject, nameField, noteField, nullableQuantity, optionalQuantity, quantity } from './fields';
import { RULES } from './rules';
import { coatingGasSchema, defectsSchema, filmGasSchema, humidityCurveSchema } from './storage-description';

/** Classes as the section hatching tells them apart. */
export const MATERIAL_CLASSES = [
  'polyester',
  'polyolefin',
  'polyamide',
  'humidity-sensitive barrier',
  'chlorinated',
  'styrenic',
  'biopolymer',
  'cellulose',
  'metal',
  'oxide',
  'adhesive',
  'ink',
] as const;
export type MaterialClass = (typeof MATERIAL_CLASSES)[number];

export const MATERIAL_KINDS = ['film', 'coating', 'foil'] as const;
export type MaterialKind = (typeof MATERIAL_KINDS)[number];

export const PROVENANCE_KINDS = [
  'published',
  'memory',
  'common-practice',
  'derived',
  'invented',
  'supplier statement',
  'own measurement',
] as const;

/** A value as its data sheet states it: what the person typed, kept beside the SI coefficients worked out from it. */
const statedValueSchema = closedObject({
  value: quantity(RULES.statedValue),
  unit: yup.string().strict().required('Unit: choose one.').max(60),
  /** Films stated as a rate or permeance: the gauge that was measured. Absent where the unit holds for any gauge. */
  thickness_um: optionalQuantity({ ...RULES.gauge, label: 'Measured on' }),
  temperature_C: quantity({ ...RULES.temperature, label: 'Temperature of the value' }),
  /** Oxygen: on both sides. Water: the humidity at which the curve's factor equals its mean over the test. */
  relative_humidity: optionalQuantity({ ...RULES.relativeHumidity, label: 'Humidity of the value' }),
  /** Water rates only. */
  relative_humidity_high: optionalQuantity({
    ...RULES.relativeHumidity,
    label: 'Humidity of the moist side',
  }),
  relative_humidity_low: optionalQuantity({ ...RULES.relativeHumidity, label: 'Humidity of the dry side' }),
  /** Oxygen rates only: 1 for pure oxygen, 0.2095 for air. */
  oxygen_mole_fraction_dry: optionalQuantity(RULES.oxygenMoleFraction),
  activation_energy_J_per_mol: optionalQuantity(RULES.activationEnergy),
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
  humidity_curve: humidityCurveSchema.optional().default(undefined),
});

const transmissionSchema = closedObject({
  uv_350nm: quantity({ ...RULES.lightPassed, label: 'Ultraviolet passed' }),
  visible_550nm: quantity({ ...RULES.lightPassed, label: 'Visible light passed' }),
});

/**
 * Fraction of light that passes: `per_um` by 1 µm of a film, `whole` by the whole layer (coatings; a print as a film).
 * Null or absent: not known. A foil has none: light passes its pinholes alone.
 */
const filmLightSchema = closedObject({
  per_um: transmissionSchema.optional().default(undefined),
  whole: transmissionSchema.optional().default(undefined),
}).test(
  'one',
  'Light: give it per µm or for the whole layer, one of the two.',
  (light) => !light || (light.per_um === undefined) !== (light.whole === undefined),
);
const coatingLightSchema = closedObject({
  whole: transmissionSchema.required('Light: give it for the whole layer.'),
});

const gasShape = {
  stated: statedValueSchema.required('Give the value as its source states it.'),
  geometric_sd: optionalQuantity(RULES.geometricSd),
};

const filmMaterialGasSchema = closedObject({ ...gasShape, gas: filmGasSchema.required() });
const coatingMaterialGasSchema = closedObject({ ...gasShape, gas: coatingGasSchema.required() });

export const provenanceEntrySchema = closedObject({
  /** The field it speaks of, e.g. 'oxygen.value', 'density'. */
  field: yup.string().strict().required().max(120),
  kind: yup.string().strict().oneOf(PROVENANCE_KINDS).required(),
  source: yup.string().strict().defined().max(1000),
  note: yup.string().strict().defined().max(2000),
});

const commonShape = {
  name: nameField('Name'),
  material_class: yup
    .string()
    .strict()
    .oneOf(MATERIAL_CLASSES, `Class: use one of ${MATERIAL_CLASSES.join(', ')}.`)
    .required('Class: choose one.'),
  polymer_family: yup.string().strict().defined().max(60),
  typical_gauges_um: yup.array(quantity(RULES.ownThickness)).strict().required().max(30),
  density_kg_per_m3: nullableQuantity(RULES.density),
  price_per_kg: nullableQuantity(RULES.price),
  price_per_m2: nullableQuantity(RULES.price),
  notes: noteField('Notes').defined(),
  provenance: yup.array(provenanceEntrySchema).strict().required().max(100),
};

const filmMaterialSchema = closedObject({
  ...commonShape,
  kind: yup
    .string()
    .strict()
    .oneOf(['film'] as const)
    .required(),
  oxygen: filmMaterialGasSchema.required('Oxygen: give a permeability.'),
  water: filmMaterialGasSchema.required('Water: give a permeability.'),
  light: filmLightSchema.nullable().optional().default(undefined),
});

const coatingMaterialSchema = closedObject({
  ...commonShape,
  kind: yup
    .string()
    .strict()
    .oneOf(['coating'] as const)
    .required(),
  oxygen: coatingMaterialGasSchema.required('Oxygen: give a permeance.'),
  water: coatingMaterialGasSchema.required('Water: give a permeance.'),
  defects: defectsSchema.nullable().defined(),
  light: coatingLightSchema.nullable().optional().default(undefined),
});

const foilMaterialSchema = closedObject({
  ...commonShape,
  kind: yup
    .string()
    .strict()
    .oneOf(['foil'] as const)
    .required(),
  defects: defectsSchema.nullable().defined(),
});

export const MATERIAL_SCHEMAS = [filmMaterialSchema, coatingMaterialSchema, foilMaterialSchema];

const unknownMaterialSchema = closedObject({
  kind: yup
    .string()
    .strict()
    .oneOf(MATERIAL_KINDS, 'Kind: use film, coating or foil.')
    .required('Kind: use film, coating or foil.'),
}).required('Send the spec.');

export const materialSpecSchema = yup.lazy((spec: unknown) => {
  const kind = typeof spec === 'object' && spec !== null && 'kind' in spec ? spec.kind : undefined;
  if (kind === 'film') return filmMaterialSchema;
  if (kind === 'coating') return coatingMaterialSchema;
  return kind === 'foil' ? foilMaterialSchema : unknownMaterialSchema;
});

export type FilmMaterialSpec = yup.InferType<typeof filmMaterialSchema>;
export type CoatingMaterialSpec = yup.InferType<typeof coatingMaterialSchema>;
export type FoilMaterialSpec = yup.InferType<typeof foilMaterialSchema>;
export type MaterialSpec = FilmMaterialSpec | CoatingMaterialSpec | FoilMaterialSpec;
export type FilmLight = yup.InferType<typeof filmLightSchema>;
export type CoatingLight = yup.InferType<typeof coatingLightSchema>;
export type StatedValue = yup.InferType<typeof statedValueSchema>;
export type ProvenanceEntry = yup.InferType<typeof provenanceEntrySchema>;
