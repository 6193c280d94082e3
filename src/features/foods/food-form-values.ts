import { foodSpecSchema } from '../../../shared/contract/foods';
import type { ProvenanceEntry } from '../../../shared/contract/materials';
import type { LimitName, OxygenMode } from '../../../shared/engine/description/storage-description';
import type { DisplayKindName, DisplayUnitSystem } from '../../../shared/units/format';
import type { FoodSpec } from '../../api/kept-things-queries';
import { FieldReader, fieldText } from '../../api/kept-forms/typed-quantity';
import { validateKeptForm } from '../../api/kept-forms/validate-kept-form';

export type MoistureModel = 'GAB' | 'linear' | 'held';

export interface FoodFormValues {
  name: string;
  moisture_model: MoistureModel;
  food: {
    mass_kg: string;
    oxygen_mode: OxygenMode;
    rate_constant_mol_per_kg_s_Pa: string;
    rate_activation_energy_J_per_mol: string;
    rate_reference_temperature_C: string;
    isotherm: { slope_g_per_g: string; intercept_g_per_g: string; Xm_g_per_g: string; C: string; K: string };
    initial_moisture_g_per_g: string;
    inside_relative_humidity: string;
  };
  limits: Record<LimitName, string>;
  absorber_capacity_cm3_STP: string;
  cautions: string;
  notes: string;
  ground: { kind: ProvenanceEntry['kind']; source: string };
}

/** The provenance entry that the form itself keeps: where the limits come from. */
const GROUND_FIELD = 'limits';
const LIMIT_ENTRY = /limit|max[A-Z]|min[A-Z]|_max_|_min_/;

export const NEW_FOOD: FoodSpec = {
  name: '',
  food: { mass_kg: 0.2, oxygen_mode: 'at_once', inside_relative_humidity: 0.3 },
  limits: {},
  absorber_capacity_cm3_STP: 0,
  cautions: [],
  notes: '',
  provenance: [],
};

export function foodFormValues(spec: FoodSpec, unitSystem: DisplayUnitSystem): FoodFormValues {
  const { food, limits } = spec;
  const text = (value: number | undefined, kind: DisplayKindName) => fieldText(value, kind, unitSystem);
  const linear = food.isotherm?.type === 'linear' ? food.isotherm : null;
  const gab = food.isotherm?.type === 'GAB' ? food.isotherm : null;
  const ground = groundOf(spec);
  return {
    name: spec.name,
    moisture_model: food.isotherm?.type ?? 'held',
    food: {
      mass_kg: text(food.mass_kg, 'mass_kg'),
      oxygen_mode: food.oxygen_mode,
      rate_constant_mol_per_kg_s_Pa: text(food.rate_constant_mol_per_kg_s_Pa, 'number'),
      rate_activation_energy_J_per_mol: text(food.rate_activation_energy_J_per_mol, 'energy_J_per_mol'),
      rate_reference_temperature_C: text(food.rate_reference_temperature_C, 'temperature_C'),
      isotherm: {
        slope_g_per_g: text(linear?.slope_g_per_g, 'number'),
        intercept_g_per_g: text(linear?.intercept_g_per_g, 'number'),
        Xm_g_per_g: text(gab?.Xm_g_per_g, 'moisture_g_per_g'),
        C: text(gab?.C, 'number'),
        K: text(gab?.K, 'number'),
      },
      initial_moisture_g_per_g: text(food.initial_moisture_g_per_g, 'moisture_g_per_g'),
      inside_relative_humidity: text(food.inside_relative_humidity, 'fraction_as_percent'),
    },
    limits: {
      oxygen_uptake_mg_per_kg: text(limits.oxygen_uptake_mg_per_kg, 'oxygen_uptake_mg_per_kg'),
      headspace_oxygen_percent: text(limits.headspace_oxygen_percent, 'percent'),
      moisture_max_g_per_g: text(limits.moisture_max_g_per_g, 'moisture_g_per_g'),
      moisture_min_g_per_g: text(limits.moisture_min_g_per_g, 'moisture_g_per_g'),
    },
    absorber_capacity_cm3_STP: text(spec.absorber_capacity_cm3_STP, 'gas_amount_cm3_STP'),
    cautions: spec.cautions.join('\n'),
    notes: spec.notes,
    ground: { kind: ground?.kind ?? 'own measurement', source: ground?.source ?? '' },
  };
}

/** Where the limits come from: the form's own entry, or the weakest that came with the library. */
export function groundOf(spec: Pick<FoodSpec, 'provenance'>): ProvenanceEntry | undefined {
  const entries = spec.provenance.filter((entry) => LIMIT_ENTRY.test(entry.field));
  return (
    spec.provenance.find((entry) => entry.field === GROUND_FIELD) ??
    entries.find((entry) => entry.kind === 'memory' || entry.kind === 'common-practice') ??
    entries[0]
  );
}

export interface FoodFormContext {
  unitSystem: DisplayUnitSystem;
  before: FoodSpec;
}

export function foodSpecFrom(values: FoodFormValues, { unitSystem, before }: FoodFormContext): FoodSpec {
  const reader = new FieldReader(unitSystem);
  const food = foodDescriptionFrom(values, reader, before.food);
  const limits = limitsFrom(values, reader, before.limits);
  return {
    name: values.name.trim(),
    food,
    limits,
    absorber_capacity_cm3_STP: reader.readRequired(
      'absorber_capacity_cm3_STP',
      values.absorber_capacity_cm3_STP,
      {
        kind: 'gas_amount_cm3_STP',
        before: before.absorber_capacity_cm3_STP,
      },
    ),
    cautions: values.cautions
      .split('\n')
      .map((line) => line.trim())
      .filter((line) => line !== ''),
    notes: values.notes,
    provenance: provenanceFrom(values, { limits, food }, before),
    ...reader.typed(),
  };
}

function limitsFrom(
  values: FoodFormValues,
  reader: FieldReader,
  before: FoodSpec['limits'],
): FoodSpec['limits'] {
  return present({
    oxygen_uptake_mg_per_kg: reader.read(
      'limits.oxygen_uptake_mg_per_kg',
      values.limits.oxygen_uptake_mg_per_kg,
      {
        kind: 'oxygen_uptake_mg_per_kg',
        before: before.oxygen_uptake_mg_per_kg,
      },
    ),
    headspace_oxygen_percent: reader.read(
      'limits.headspace_oxygen_percent',
      values.limits.headspace_oxygen_percent,
      {
        kind: 'percent',
        before: before.headspace_oxygen_percent,
      },
    ),
    // Without an isotherm the food's moisture is not followed, so there is no moisture to limit.
    moisture_max_g_per_g:
      values.moisture_model === 'held'
        ? undefined
        : reader.read('limits.moisture_max_g_per_g', values.limits.moisture_max_g_per_g, {
            kind: 'moisture_g_per_g',
            before: before.moisture_max_g_per_g,
          }),
    moisture_min_g_per_g:
      values.moisture_model === 'held'
        ? undefined
        : reader.read('limits.moisture_min_g_per_g', values.limits.moisture_min_g_per_g, {
            kind: 'moisture_g_per_g',
            before: before.moisture_min_g_per_g,
          }),
  });
}

/** Entries stay with the numbers they speak of: a changed limit or isotherm is no longer its source's. */
function provenanceFrom(
  values: FoodFormValues,
  now: Pick<FoodSpec, 'limits' | 'food'>,
  before: FoodSpec,
): ProvenanceEntry[] {
  const source = values.ground.source.trim();
  const ground = groundOf(before);
  const isSameGround = ground?.kind === values.ground.kind && ground.source === source;
  const hasSameLimits = JSON.stringify(sorted(now.limits)) === JSON.stringify(sorted(before.limits));
  const hasSameIsotherm =
    JSON.stringify(sorted(now.food.isotherm)) === JSON.stringify(sorted(before.food.isotherm));
  const kept = before.provenance.filter(
    (entry) =>
      (hasSameLimits || !LIMIT_ENTRY.test(entry.field)) &&
      (hasSameIsotherm || !/isotherm/i.test(entry.field)),
  );
  if (hasSameLimits && isSameGround) return kept;
  const own: ProvenanceEntry = { field: GROUND_FIELD, kind: values.ground.kind, source, note: '' };
  return [...kept.filter((entry) => entry.field !== GROUND_FIELD), own];
}

/** Keys in one order, so that two specs compare by what they hold. */
function sorted(record: object | undefined): [string, unknown][] {
  return Object.entries(record ?? {}).sort(([a], [b]) => a.localeCompare(b, 'en'));
}

function foodDescriptionFrom(
  values: FoodFormValues,
  reader: FieldReader,
  before: FoodSpec['food'],
): FoodSpec['food'] {
  const { food } = values;
  const isRate = food.oxygen_mode === 'rate';
  const isFollowed = values.moisture_model !== 'held';
  return {
    mass_kg: reader.readRequired('food.mass_kg', food.mass_kg, { kind: 'mass_kg', before: before.mass_kg }),
    oxygen_mode: food.oxygen_mode,
    ...(isRate
      ? present({
          rate_constant_mol_per_kg_s_Pa: reader.readRequired(
            'food.rate_constant_mol_per_kg_s_Pa',
            food.rate_constant_mol_per_kg_s_Pa,
            { kind: 'number', before: before.rate_constant_mol_per_kg_s_Pa },
          ),
          rate_activation_energy_J_per_mol: reader.read(
            'food.rate_activation_energy_J_per_mol',
            food.rate_activation_energy_J_per_mol,
            { kind: 'energy_J_per_mol', before: before.rate_activation_energy_J_per_mol },
          ),
          rate_reference_temperature_C: reader.read(
            'food.rate_reference_temperature_C',
            food.rate_reference_temperature_C,
            { kind: 'temperature_C', before: before.rate_reference_temperature_C },
          ),
        })
      : {}),
    ...(isFollowed
      ? {
          isotherm: isothermFrom(values, reader, before.isotherm),
          initial_moisture_g_per_g: reader.readRequired(
            'food.initial_moisture_g_per_g',
            food.initial_moisture_g_per_g,
            { kind: 'moisture_g_per_g', before: before.initial_moisture_g_per_g },
          ),
        }
      : {
          inside_relative_humidity: reader.readRequired(
            'food.inside_relative_humidity',
            food.inside_relative_humidity,
            { kind: 'fraction_as_percent', before: before.inside_relative_humidity },
          ),
        }),
  };
}

function isothermFrom(
  values: FoodFormValues,
  reader: FieldReader,
  before: FoodSpec['food']['isotherm'],
): NonNullable<FoodSpec['food']['isotherm']> {
  const { isotherm } = values.food;
  const number = (key: keyof typeof isotherm, kind: DisplayKindName, old?: number) =>
    reader.readRequired(`food.isotherm.${key}`, isotherm[key], { kind, before: old });
  if (values.moisture_model === 'linear') {
    const linear = before?.type === 'linear' ? before : undefined;
    return {
      type: 'linear',
      slope_g_per_g: number('slope_g_per_g', 'number', linear?.slope_g_per_g),
      intercept_g_per_g: number('intercept_g_per_g', 'number', linear?.intercept_g_per_g),
    };
  }
  const gab = before?.type === 'GAB' ? before : undefined;
  return {
    type: 'GAB',
    Xm_g_per_g: number('Xm_g_per_g', 'moisture_g_per_g', gab?.Xm_g_per_g),
    C: number('C', 'number', gab?.C),
    K: number('K', 'number', gab?.K),
  };
}

/** Without the keys that are absent: the schema tells an absent field from an undefined one only by its key. */
function present<Shape extends object>(shape: Shape): Shape {
  return Object.fromEntries(Object.entries(shape).filter(([, value]) => value !== undefined)) as Shape;
}

export function validateFoodForm(context: FoodFormContext) {
  return validateKeptForm<FoodFormValues>({
    schema: foodSpecSchema,
    toSpec: (values) => foodSpecFrom(values, context),
    kindAt: (path) => KIND_BY_FIELD[path.split('.').at(-1) ?? ''] ?? null,
    labelAt: (path) => LABELS[path],
    unitSystem: context.unitSystem,
  });
}

/** Fields that the page calls otherwise than the contract does. */
const LABELS: Partial<Record<string, string>> = {
  'food.mass_kg': 'Mass as packed',
  'food.rate_reference_temperature_C': 'Holds at',
  'food.isotherm.intercept_g_per_g': 'Moisture at activity 0',
  'limits.oxygen_uptake_mg_per_kg': 'Oxygen taken up',
  'limits.headspace_oxygen_percent': 'Oxygen in the headspace',
  absorber_capacity_cm3_STP: 'Oxygen absorber in the pack',
};

const KIND_BY_FIELD: Partial<Record<string, DisplayKindName>> = {
  mass_kg: 'mass_kg',
  rate_constant_mol_per_kg_s_Pa: 'number',
  rate_activation_energy_J_per_mol: 'energy_J_per_mol',
  rate_reference_temperature_C: 'temperature_C',
  slope_g_per_g: 'number',
  intercept_g_per_g: 'number',
  Xm_g_per_g: 'moisture_g_per_g',
  C: 'number',
  K: 'number',
  initial_moisture_g_per_g: 'moisture_g_per_g',
  inside_relative_humidity: 'fraction_as_percent',
  oxygen_uptake_mg_per_kg: 'oxygen_uptake_mg_per_kg',
  headspace_oxygen_percent: 'percent',
  moisture_max_g_per_g: 'moisture_g_per_g',
  moisture_min_g_per_g: 'moisture_g_per_g',
  absorber_capacity_cm3_STP: 'gas_amount_cm3_STP',
};
