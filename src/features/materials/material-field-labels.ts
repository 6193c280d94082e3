import { faultWithin, relabelled } from '../../api/kept-forms/spec-faults';
import type { MaterialFormValues } from './material-form-values';
import type { Gas } from './unit-choice';

export const GAS_TITLES: Record<Gas, string> = { oxygen: 'Oxygen', water: 'Water vapour' };

export const VALUE_LABELS: Record<Gas, string> = { oxygen: 'Oxygen value', water: 'Water value' };

/** What stands above each field, so that a message calls it the same. */
const STATED_LABELS: Partial<Record<string, string>> = {
  unit: 'Unit',
  thickness_um: 'Measured on',
  temperature_C: 'Measured at',
  relative_humidity_high: 'Moist side',
  relative_humidity_low: 'Dry side',
  oxygen_mole_fraction_dry: 'Oxygen in the test gas',
  activation_energy_J_per_mol: 'Activation energy',
  measured_temperature_min_C: 'Measured from',
  measured_temperature_max_C: 'Measured up to',
};

const OTHER_LABELS: Partial<Record<string, string>> = {
  name: 'Name',
  material_class: 'Class',
  polymer_family: 'Polymer',
  typical_gauges_um: 'Usual gauges, µm',
  density_kg_per_m3: 'Density',
  price_per_kg: 'Price',
  price_per_m2: 'Price, coatings',
  'defects.density_per_m2': 'How many',
  'defects.diameter_um': 'Diameter',
  notes: 'Notes',
};

/** The bound that a stated value in any unit has: nobody needs to read it. */
const ASTRONOMIC_RANGE = /(enter|use)(?: a number,)? more than 0 and at most 10{12,}/;

/** A message as the form says it: the field by its label, and which gas where both have such a field. */
export function faultInWords(path: string, message: string, values: MaterialFormValues): string {
  const gas = (['oxygen', 'water'] as const).find((name) => path.startsWith(`${name}.`));
  if (gas === undefined) return relabelled(message, OTHER_LABELS[path]);
  const field = path.slice(gas.length + 1);
  if (field === 'stated.value')
    return relabelled(message.replace(ASTRONOMIC_RANGE, '$1 a number above 0'), VALUE_LABELS[gas]);
  const isWholeSentence = message.startsWith('The ');
  return isWholeSentence
    ? message
    : faultWithin(GAS_TITLES[gas], relabelled(message, gasFieldLabel(gas, field, values)));
}

function gasFieldLabel(gas: Gas, field: string, values: MaterialFormValues): string | undefined {
  if (field === 'geometric_sd') return 'Spread';
  if (field === 'stated.relative_humidity') return humidityLabel(gas);
  const point = /^curve\[(\d+)\]\.(\w+)$/.exec(field);
  if (point !== null) {
    const amount = values[gas].curve_mode === 'values' ? 'Value' : 'Factor';
    return `${point[2] === 'amount' ? amount : 'Humidity'} ${Number(point[1]) + 1}`;
  }
  return STATED_LABELS[field.replace(/^stated\./, '')];
}

export function humidityLabel(gas: Gas): string {
  return gas === 'oxygen' ? 'Both sides at' : 'Humidity of the value';
}
