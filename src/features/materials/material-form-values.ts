import type { FormikErrors } from 'formik';
import {
  materialSpecSchema,
  type MaterialClass,
  type MaterialKind,
  type MaterialSpec,
  type ProvenanceEntry,
  type StatedValue,
} from '../../../shared/contract/materials';
import { parseNumber, type DisplayKindName, type DisplayUnitSystem } from '../../../shared/units/format';
import { FieldReader, fieldText } from '../../api/kept-forms/typed-quantity';
import { formikErrors, specFaults } from '../../api/kept-forms/spec-faults';
import { inTypedUnits } from '../../api/kept-forms/validate-kept-form';
import { computedGas, emptyGas, gasFormValues, statedFrom, type GasFormValues } from './gas-form-values';
import { faultInWords } from './material-field-labels';
import type { Gas } from './unit-choice';

export interface MaterialFormValues {
  name: string;
  material_class: MaterialClass;
  kind: MaterialKind;
  polymer_family: string;
  typical_gauges_um: string;
  density_kg_per_m3: string;
  price_per_kg: string;
  price_per_m2: string;
  oxygen: GasFormValues;
  water: GasFormValues;
  has_defects: boolean;
  defects: { density_per_m2: string; diameter_um: string };
  notes: string;
}

export interface MaterialFormContext {
  unitSystem: DisplayUnitSystem;
  before: MaterialSpec | null;
}

const GASES: readonly Gas[] = ['oxygen', 'water'];

export function materialFormValues({ unitSystem, before }: MaterialFormContext): MaterialFormValues {
  const gas = (name: Gas) => {
    if (before === null || before.kind === 'foil') return emptyGas(name, 'film', unitSystem);
    const ground = before.provenance.find((entry) => entry.field === `${name}.value`);
    return gasFormValues(before[name], { gas: name, kind: before.kind, unitSystem, ground });
  };
  const defects = before === null || before.kind === 'film' ? null : before.defects;
  return {
    name: before?.name ?? '',
    material_class: before?.material_class ?? 'polyester',
    kind: before?.kind ?? 'film',
    polymer_family: before?.polymer_family ?? '',
    typical_gauges_um: before?.typical_gauges_um.join('; ') ?? '',
    density_kg_per_m3: fieldText(before?.density_kg_per_m3, 'number', unitSystem),
    price_per_kg: fieldText(before?.price_per_kg, 'number', unitSystem),
    price_per_m2: fieldText(before?.price_per_m2, 'number', unitSystem),
    oxygen: gas('oxygen'),
    water: gas('water'),
    has_defects: defects !== null,
    defects: {
      density_per_m2: fieldText(defects?.density_per_m2, 'number', unitSystem),
      diameter_um: fieldText(defects?.diameter_um, 'number', unitSystem),
    },
    notes: before?.notes ?? '',
  };
}

/** The spec that would be sent, or the fields that keep a coefficient from being worked out. */
export interface MaterialReading {
  spec: unknown;
  faults: Record<string, string>;
}

export function readMaterial(values: MaterialFormValues, context: MaterialFormContext): MaterialReading {
  const { unitSystem, before } = context;
  const reader = new FieldReader(unitSystem);
  const number = (name: string, text: string, old?: number | null) =>
    reader.read(name, text, { kind: 'number', before: old });
  const common = {
    name: values.name.trim(),
    material_class: values.material_class,
    polymer_family: values.polymer_family.trim(),
    typical_gauges_um: gaugesFrom(values.typical_gauges_um),
    density_kg_per_m3:
      number('density_kg_per_m3', values.density_kg_per_m3, before?.density_kg_per_m3) ?? null,
    price_per_kg: number('price_per_kg', values.price_per_kg, before?.price_per_kg) ?? null,
    price_per_m2: number('price_per_m2', values.price_per_m2, before?.price_per_m2) ?? null,
    notes: values.notes,
  };
  const defects = values.has_defects
    ? {
        density_per_m2: number('defects.density_per_m2', values.defects.density_per_m2) ?? NaN,
        diameter_um: number('defects.diameter_um', values.defects.diameter_um) ?? NaN,
      }
    : null;
  if (values.kind === 'foil') {
    const provenance = provenanceFrom(values, {}, before);
    return { spec: { ...common, provenance, kind: 'foil', defects }, faults: {} };
  }

  const kind = values.kind;
  const faults: Record<string, string> = {};
  const readGas = (gas: Gas) => {
    const keptBefore = before !== null && before.kind !== 'foil' ? before[gas] : undefined;
    const stated = statedFrom(values[gas], { gas, kind, unitSystem, before: keptBefore?.stated });
    const computed = computedGas(stated, { gas, kind });
    if ('fault' in computed) faults[`${gas}.stated.${computed.fault.field}`] = computed.fault.message;
    // The engine stops at the first fault; these two are said in any case.
    const { relative_humidity_high: high, relative_humidity_low: low } = stated;
    if (high !== undefined && low !== undefined && low >= high)
      faults[`${gas}.stated.relative_humidity_low`] = 'The dry side must be drier than the moist side.';
    const isOldWithoutHumidity =
      keptBefore !== undefined && keptBefore.stated.relative_humidity === undefined;
    if (gas === 'oxygen' && stated.relative_humidity === undefined && !isOldWithoutHumidity)
      faults[`${gas}.stated.relative_humidity`] =
        'Both sides at: enter the humidity of the test, 0 to 100 %; 0 only where it was dry.';
    const spread = number(`${gas}.geometric_sd`, values[gas].geometric_sd, keptBefore?.geometric_sd);
    return {
      stated,
      gas: 'block' in computed ? computed.block : undefined,
      ...(spread === undefined ? {} : { geometric_sd: spread }),
    };
  };
  const gases = { oxygen: readGas('oxygen'), water: readGas('water') };
  const provenance = provenanceFrom(values, gases, before);
  const shared = { ...common, provenance, ...gases };
  const spec = kind === 'film' ? { ...shared, kind } : { ...shared, kind, defects };
  return { spec, faults };
}

/** A reading that the schema has passed. */
export function materialSpecFrom(values: MaterialFormValues, context: MaterialFormContext): MaterialSpec {
  return materialSpecSchema.validateSync(readMaterial(values, context).spec, {
    strict: true,
  }) as MaterialSpec;
}

/** '10; 12; 15' or '10 12 15': a comma may be a decimal comma, so it separates only before a space. */
export function gaugesFrom(text: string): number[] {
  return text
    .split(/;|,\s|\s+/)
    .map((part) => part.trim())
    .filter((part) => part !== '')
    .map(parseNumber);
}

/** Which entries of a gas speak of which part of what is stated. */
const ENTRY_OF_PART: { part: keyof StatedValue; entry: RegExp }[] = [
  { part: 'activation_energy_J_per_mol', entry: /activation/i },
  { part: 'humidity_curve', entry: /humidity_?curve/i },
  { part: 'measured_temperature_min_C', entry: /measured/i },
  { part: 'measured_temperature_max_C', entry: /measured/i },
  { part: 'thickness_um', entry: /conditions/i },
  { part: 'temperature_C', entry: /conditions/i },
  { part: 'relative_humidity', entry: /conditions/i },
  { part: 'relative_humidity_high', entry: /conditions/i },
  { part: 'relative_humidity_low', entry: /conditions/i },
];

interface StatedGases {
  oxygen?: { stated: StatedValue };
  water?: { stated: StatedValue };
}

/** The form's own words on each value; entries of other numbers stay as long as their number stays. */
function provenanceFrom(
  values: MaterialFormValues,
  now: StatedGases,
  before: MaterialSpec | null,
): ProvenanceEntry[] {
  const own = GASES.flatMap((gas): ProvenanceEntry[] => {
    if (now[gas] === undefined) return [];
    const { kind, source } = values[gas].ground;
    const kept = before?.provenance.find((entry) => entry.field === `${gas}.value`);
    const isSame = kept?.kind === kind && kept.source === source.trim();
    return [{ field: `${gas}.value`, kind, source: source.trim(), note: isSame ? kept.note : '' }];
  });
  const others = (before?.provenance ?? []).filter((entry) => {
    const gas = GASES.find((name) => entry.field.startsWith(`${name}.`));
    if (gas === undefined) return true;
    if (entry.field === `${gas}.value` || before === null || before.kind === 'foil') return false;
    const stated = now[gas]?.stated;
    if (stated === undefined) return false;
    return ENTRY_OF_PART.every(
      ({ part, entry: words }) =>
        !words.test(entry.field) || JSON.stringify(stated[part]) === JSON.stringify(before[gas].stated[part]),
    );
  });
  return [...own, ...others];
}

export function validateMaterialForm(context: MaterialFormContext) {
  return (values: MaterialFormValues): FormikErrors<MaterialFormValues> => {
    const { spec, faults: computing } = readMaterial(values, context);
    const bySchema = specFaults(materialSpecSchema, spec);
    const faults: Record<string, string> = {};
    for (const [path, message] of Object.entries(bySchema)) {
      if (/^(oxygen|water)\.gas\b/.test(path)) continue;
      const field = materialFieldName(path);
      faults[field] ??= inTypedUnits(
        { path, message: curveWords(message, field, values), spec, text: textAt(values, field) },
        { schema: materialSpecSchema, kindAt: kindOfMaterialField, unitSystem: context.unitSystem },
      );
    }
    // The engine's word counts only where the schema has none on that field.
    for (const [path, message] of Object.entries(computing)) faults[materialFieldName(path)] ??= message;
    for (const [path, message] of Object.entries(faults)) faults[path] = faultInWords(path, message, values);
    return formikErrors<MaterialFormValues>(faults);
  };
}

/** Who types values at humidities is not told about factors. */
function curveWords(message: string, field: string, values: MaterialFormValues): string {
  const gas = GASES.find((name) => field.startsWith(`${name}.curve[`));
  if (gas === undefined || values[gas].curve_mode === 'factors') return message;
  return /^Factor:/.test(message)
    ? 'Value at this humidity: enter a number above 0, in the unit of the value above.'
    : message;
}

/** Where a path of the spec stands in the form. */
export function materialFieldName(path: string): string {
  return path
    .replace(/^spec\./, '')
    .replace(
      /^(oxygen|water)\.stated\.humidity_curve\.relative_humidity\[(\d+)\]/,
      '$1.curve[$2].relative_humidity',
    )
    .replace(/^(oxygen|water)\.stated\.humidity_curve\.factor\[(\d+)\]/, '$1.curve[$2].amount')
    .replace(/^(oxygen|water)\.stated\.humidity_curve.*/, '$1.curve_mode')
    .replace(/^typical_gauges_um.*/, 'typical_gauges_um');
}

function textAt(values: MaterialFormValues, field: string): unknown {
  const steps = field.split(/[.[\]]+/).filter((step) => step !== '');
  return steps.reduce<unknown>(
    (value, step) =>
      typeof value === 'object' && value !== null ? (value as Record<string, unknown>)[step] : undefined,
    values,
  );
}

function kindOfMaterialField(path: string): DisplayKindName | null {
  if (/temperature_(min_|max_)?C$/.test(path)) return 'temperature_C';
  if (path.endsWith('thickness_um')) return 'thickness_um';
  if (/relative_humidity/.test(path)) return 'fraction_as_percent';
  if (path.endsWith('oxygen_mole_fraction_dry')) return 'fraction_as_percent';
  if (path.endsWith('activation_energy_J_per_mol')) return 'energy_J_per_mol';
  if (/\.(value|geometric_sd|density_per_m2|diameter_um)$/.test(path) || /^(density|price)_/.test(path))
    return 'number';
  return null;
}
