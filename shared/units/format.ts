/**
 * The one number formatter of every screen: a stored value and its kind in, figures and unit out, in the reader's
 * unit system. Stored values are in the API's units (the kind's name says which).
 */
export type DisplayUnitSystem = 'metric' | 'us_customary';

interface DisplayUnit {
  unit: string;
  /** Shown = stored · factor + offset. */
  factor: number;
  offset?: number;
}

interface DisplayKind {
  metric: DisplayUnit;
  us_customary: DisplayUnit;
}

const CM3_STP_PER_MOL = 1 / 4.461503340547e-5;
const SECONDS_PER_DAY = 86_400;
const PA_PER_ATM = 101_325;
const M2_PER_100_IN2 = 0.064516;
const CM3_PER_M2_DAY_ATM_PER_SI = CM3_STP_PER_MOL * SECONDS_PER_DAY * PA_PER_ATM;
const GRAMS_PER_MOL_WATER = 18.01528;
/** 57.2135 ng/(m²·s·Pa), the 0 °C perm of GNU units. */
const KG_PER_M2_S_PA_PER_PERM = 5.721349e-11;

const same = (unit: string, factor = 1): DisplayKind => ({
  metric: { unit, factor },
  us_customary: { unit, factor },
});

const DISPLAY_KINDS = {
  number: same(''),
  days: same('days'),
  percent: same('%'),
  fraction_as_percent: same('%', 100),
  temperature_C: {
    metric: { unit: '°C', factor: 1 },
    us_customary: { unit: '°F', factor: 1.8, offset: 32 },
  },
  temperature_difference_K: {
    metric: { unit: 'K', factor: 1 },
    us_customary: { unit: '°F', factor: 1.8 },
  },
  thickness_um: {
    metric: { unit: 'µm', factor: 1 },
    us_customary: { unit: 'mil', factor: 1 / 25.4 },
  },
  length_mm: {
    metric: { unit: 'mm', factor: 1 },
    us_customary: { unit: 'in', factor: 1 / 25.4 },
  },
  area_m2: {
    metric: { unit: 'cm²', factor: 1e4 },
    us_customary: { unit: 'in²', factor: 1 / 0.00064516 },
  },
  volume_cm3: {
    metric: { unit: 'cm³', factor: 1 },
    us_customary: { unit: 'in³', factor: 1 / 16.387064 },
  },
  gas_amount_cm3_STP: same('cm³ (STP)'),
  mass_kg: {
    metric: { unit: 'g', factor: 1000 },
    us_customary: { unit: 'oz', factor: 1 / 0.028349523125 },
  },
  pressure_Pa: {
    metric: { unit: 'kPa', factor: 1e-3 },
    us_customary: { unit: 'psi', factor: 1 / 6894.757293168 },
  },
  oxygen_uptake_mg_per_kg: same('mg/kg'),
  moisture_g_per_g: same('g/100 g dry', 100),
  oxygen_rate_cm3_STP_per_m2_day: {
    metric: { unit: 'cm³/(m²·day)', factor: 1 },
    us_customary: { unit: 'cm³/(100 in²·day)', factor: M2_PER_100_IN2 },
  },
  water_rate_g_per_m2_day: {
    metric: { unit: 'g/(m²·day)', factor: 1 },
    us_customary: { unit: 'g/(100 in²·day)', factor: M2_PER_100_IN2 },
  },
  oxygen_permeance_mol_per_m2_s_Pa: {
    metric: { unit: 'cm³/(m²·day·atm)', factor: CM3_PER_M2_DAY_ATM_PER_SI },
    us_customary: { unit: 'cm³/(100 in²·day·atm)', factor: CM3_PER_M2_DAY_ATM_PER_SI * M2_PER_100_IN2 },
  },
  oxygen_permeability_mol_m_per_m2_s_Pa: {
    metric: { unit: 'cm³·µm/(m²·day·atm)', factor: CM3_PER_M2_DAY_ATM_PER_SI * 1e6 },
    us_customary: {
      unit: 'cm³·mil/(100 in²·day·atm)',
      factor: (CM3_PER_M2_DAY_ATM_PER_SI * M2_PER_100_IN2 * 1e6) / 25.4,
    },
  },
  water_permeance_mol_per_m2_s_Pa: {
    metric: { unit: 'g/(m²·day·kPa)', factor: GRAMS_PER_MOL_WATER * SECONDS_PER_DAY * 1000 },
    us_customary: { unit: 'perm (0 °C)', factor: GRAMS_PER_MOL_WATER / 1000 / KG_PER_M2_S_PA_PER_PERM },
  },
  water_permeability_mol_m_per_m2_s_Pa: {
    metric: { unit: 'g·µm/(m²·day·kPa)', factor: GRAMS_PER_MOL_WATER * SECONDS_PER_DAY * 1e9 },
    us_customary: {
      unit: 'perm·mil (0 °C)',
      factor: (GRAMS_PER_MOL_WATER / 1000 / KG_PER_M2_S_PA_PER_PERM) * (1e6 / 25.4),
    },
  },
  energy_J_per_mol: same('kJ/mol', 1e-3),
} as const satisfies Record<string, DisplayKind>;

export type DisplayKindName = keyof typeof DISPLAY_KINDS;

export interface ShownQuantity {
  figures: string;
  unit: string;
  /** Figures and unit with a no-break space between. */
  text: string;
}

const NO_BREAK_SPACE = '\u00a0';
const SUPERSCRIPT = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** A computed value, to three significant figures unless asked otherwise: 1.97, 15.8, 515, 12 300, 3.2×10⁻⁵. */
export function formatNumber(value: number, significant = 3): string {
  if (!Number.isFinite(value)) return '–';
  if (value === 0) return '0';
  const magnitude = Math.floor(Math.log10(Math.abs(value)));
  if (magnitude < -4 || magnitude > 6) return formatPower(value, significant);
  const rounded = Number(value.toPrecision(significant));
  const decimals = Math.max(0, significant - 1 - Math.floor(Math.log10(Math.abs(rounded))));
  return withMinus(groupThousands(rounded.toFixed(decimals)));
}

/** A value somebody gave: up to six significant figures, no zeros added. */
export function formatExact(value: number): string {
  if (!Number.isFinite(value)) return '–';
  const rounded = Number(value.toPrecision(6));
  const magnitude = Math.abs(rounded);
  if (magnitude !== 0 && (magnitude < 1e-4 || magnitude >= 1e7)) return formatPower(rounded, 3);
  return withMinus(groupThousands(String(rounded)));
}

/** Whether a conversion only moves the point, so that a given value keeps all its figures. */
function isPowerOfTen(factor: number): boolean {
  const power = Math.log10(factor);
  return Math.abs(power - Math.round(power)) < 1e-9;
}

/** A stored value as shown in the reader's unit system. */
export function formatQuantity(
  value: number,
  kind: DisplayKindName,
  options: { unitSystem: DisplayUnitSystem; significant?: number; isExact?: boolean },
): ShownQuantity {
  const { unit } = displayUnit(kind, options.unitSystem);
  const shown = toDisplay(value, kind, options.unitSystem);
  const isAsGiven = options.isExact && isPowerOfTen(displayUnit(kind, options.unitSystem).factor);
  const figures = isAsGiven
    ? formatExact(shown)
    : options.isExact
      ? formatExact(Number(shown.toPrecision(3)))
      : formatNumber(shown, options.significant ?? 3);
  return { figures, unit, text: unit === '' ? figures : `${figures}${NO_BREAK_SPACE}${unit}` };
}

export function displayUnit(kind: DisplayKindName, unitSystem: DisplayUnitSystem): DisplayUnit {
  return DISPLAY_KINDS[kind][unitSystem];
}

export function toDisplay(value: number, kind: DisplayKindName, unitSystem: DisplayUnitSystem): number {
  const { factor, offset } = displayUnit(kind, unitSystem);
  return value * factor + (offset ?? 0);
}

/** The stored value of a shown one; rounded to 12 figures so that what was typed comes back as typed. */
export function fromDisplay(shown: number, kind: DisplayKindName, unitSystem: DisplayUnitSystem): number {
  const { factor, offset } = displayUnit(kind, unitSystem);
  return Number(((shown - (offset ?? 0)) / factor).toPrecision(12));
}

/**
 * Reads what a person typed: decimal point or comma, spaces between thousands; NaN where it is no number. "1,500" is
 * refused: it is one thousand five hundred to some and one and a half to others.
 */
export function parseNumber(text: string): number {
  const compact = text.replace(/[\s\u00a0\u202f]/g, '').replace('−', '-');
  if (compact === '' || /^[+-]?[1-9]\d{0,2},\d{3}$/.test(compact)) return NaN;
  const pointed = /^[^.]*,[^,.]*$/.test(compact) ? compact.replace(',', '.') : compact;
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(pointed) ? Number(pointed) : NaN;
}

function formatPower(value: number, significant: number): string {
  const [mantissa = '0', exponent = '0'] = value.toExponential(significant - 1).split('e');
  const power = Number(exponent);
  const digits = [...String(Math.abs(power))].map((digit) => SUPERSCRIPT[Number(digit)]).join('');
  return `${withMinus(mantissa)}×10${power < 0 ? '⁻' : ''}${digits}`;
}

function groupThousands(plain: string): string {
  const [whole = '', decimals] = plain.split('.');
  const grouped =
    whole.replace('-', '').length > 4 ? whole.replace(/\B(?=(\d{3})+(?!\d))/g, NO_BREAK_SPACE) : whole;
  return decimals === undefined ? grouped : `${grouped}.${decimals}`;
}

function withMinus(text: string): string {
  return text.replace('-', '−');
}
