import type { Candidate } from '../../../shared/contract/studies';
import type {
  FoodDescription,
  IsothermDescription,
  LayerDescription,
  PackDescription,
} from '../../../shared/engine/description/storage-description';
import { LIMIT_ORDER, LIMIT_WORDS } from './answer-words';
import type { Figures } from './use-figures';

export interface InputRow {
  id: string;
  what: string;
  value: string;
}

/** Everything that went into one wall's answer, as the result pinned it. */
export function inputRows(candidate: Candidate, show: Figures): InputRow[] {
  const { description } = candidate;
  const rows = [
    ...foodRows(description.food, show),
    ...LIMIT_ORDER.flatMap((name): [string, string][] => {
      const limit = description.limits[name];
      return limit === undefined
        ? []
        : [[`Limit: ${LIMIT_WORDS[name].label.toLowerCase()}`, show.exact(limit, LIMIT_WORDS[name].kind)]];
    }),
    ...absorberRows(description.absorber_capacity_cm3_STP, show),
    ...packRows(description.pack, show),
    ...description.route.legs.map((leg, index): [string, string] => [
      `Leg ${index + 1}${leg.name === undefined ? '' : `: ${leg.name}`}`,
      `${show.exact(leg.temperature_C, 'temperature_C')}, ${show.exact(leg.relative_humidity, 'fraction_as_percent')}, ${show.exact(leg.days, 'days')}`,
    ]),
    ['After the last leg', description.route.after_last === 'hold' ? 'stays there' : 'the route repeats'],
    ['Looked ahead', show.exact(description.horizon_days, 'days')],
  ] as [string, string][];
  return rows.map(([what, value], index) => ({ id: String(index), what, value }));
}

const OXYGEN_MODE_WORDS = {
  at_once: 'reacts at once with all that enters',
  none: 'does not react',
  rate: 'reacts at a rate',
} as const;

function foodRows(food: FoodDescription, show: Figures): [string, string][] {
  const rows: [string, string][] = [
    ['Mass as packed', show.exact(food.mass_kg, 'mass_kg')],
    ['Oxygen', OXYGEN_MODE_WORDS[food.oxygen_mode]],
  ];
  if (food.rate_constant_mol_per_kg_s_Pa !== undefined) {
    rows.push(['Rate constant', `${show.text(food.rate_constant_mol_per_kg_s_Pa, 'number')} mol/(kg·s·Pa)`]);
  }
  if (food.isotherm !== undefined) rows.push(['Isotherm', isothermWords(food.isotherm, show)]);
  if (food.initial_moisture_g_per_g !== undefined) {
    rows.push(['Moisture as packed', show.exact(food.initial_moisture_g_per_g, 'moisture_g_per_g')]);
  }
  if (food.inside_relative_humidity !== undefined) {
    rows.push(['Humidity inside, held', show.exact(food.inside_relative_humidity, 'fraction_as_percent')]);
  }
  return rows;
}

function isothermWords(isotherm: IsothermDescription, show: Figures): string {
  if (isotherm.type === 'linear') {
    return `linear: ${show.exact(isotherm.slope_g_per_g, 'number')} · a + ${show.exact(isotherm.intercept_g_per_g, 'number')} g/g`;
  }
  return `GAB: Xm ${show.exact(isotherm.Xm_g_per_g, 'number')} g/g, C ${show.exact(isotherm.C, 'number')}, K ${show.exact(isotherm.K, 'number')}`;
}

function absorberRows(capacity: number | undefined, show: Figures): [string, string][] {
  return capacity === undefined || capacity === 0
    ? []
    : [['Oxygen absorber', show.exact(capacity, 'gas_amount_cm3_STP')]];
}

function packRows(pack: PackDescription, show: Figures): [string, string][] {
  const rows: [string, string][] = pack.walls.map((wall) => [
    `Area${pack.walls.length > 1 ? ` of ${wall.name}` : ''}`,
    show.text(wall.area_m2, 'area_m2'),
  ]);
  rows.push(['Headspace', show.exact(pack.headspace_cm3 ?? 0, 'volume_cm3')]);
  if (pack.starting_headspace_oxygen_percent !== undefined) {
    rows.push(['Oxygen in it at first', show.exact(pack.starting_headspace_oxygen_percent, 'percent')]);
  }
  if (pack.seal !== undefined) {
    const { length_mm, width_mm, sealant_thickness_um } = pack.seal;
    rows.push([
      'Seal',
      `${show.exact(length_mm, 'length_mm')} long, ${show.exact(width_mm, 'length_mm')} wide, ${show.exact(sealant_thickness_um, 'thickness_um')} of sealant`,
    ]);
  }
  if (pack.leaks !== undefined && pack.leaks.count > 0) {
    const { count, length_mm, diameter_um } = pack.leaks;
    rows.push([
      'Leak channels',
      `${show.exact(count, 'number')} of ${show.exact(diameter_um, 'thickness_um')} across, ${show.exact(length_mm, 'length_mm')} long`,
    ]);
  }
  return rows;
}

export interface LayerInputRow {
  id: string;
  layer: string;
  gauge: string;
  oxygen: string;
  water: string;
}

/** Per layer, outside first: gauge and both coefficients at their reference conditions. */
export function layerInputRows(layers: LayerDescription[], show: Figures): LayerInputRow[] {
  return layers.map((layer, index) => ({
    id: String(index),
    layer: `${index + 1} ${layer.name}`,
    gauge: layer.thickness_um === undefined ? '–' : show.exact(layer.thickness_um, 'thickness_um'),
    oxygen: coefficientWords(layer, 'oxygen', show),
    water: coefficientWords(layer, 'water', show),
  }));
}

function coefficientWords(layer: LayerDescription, gas: 'oxygen' | 'water', show: Figures): string {
  if (layer.kind === 'foil') return layer.defects === undefined ? 'tight' : 'through pinholes only';
  const coefficient = layer[gas];
  const value =
    'permeability_mol_m_per_m2_s_Pa' in coefficient
      ? show.text(coefficient.permeability_mol_m_per_m2_s_Pa, `${gas}_permeability_mol_m_per_m2_s_Pa`)
      : show.text(coefficient.permeance_mol_per_m2_s_Pa, `${gas}_permeance_mol_per_m2_s_Pa`);
  const temperature = show.exact(coefficient.reference_temperature_C ?? 23, 'temperature_C');
  const energy = show.exact(coefficient.activation_energy_J_per_mol ?? 0, 'energy_J_per_mol');
  const humidity =
    coefficient.humidity_curve === undefined
      ? ''
      : `, at ${show.exact(coefficient.reference_relative_humidity ?? 0, 'fraction_as_percent')}, with a humidity curve`;
  return `${value} at ${temperature}${humidity}; ${energy}`;
}
