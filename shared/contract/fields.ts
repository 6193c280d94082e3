import * as yup from 'yup';

/** Bounds and wording of one kind of number, said once for form, API and OpenAPI. */
export interface QuantityRule {
  /** As the sentence begins: 'Gauge'. */
  label: string;
  /** As printed behind numbers: 'µm'; '' for a pure number. */
  unit: string;
  min: number;
  max: number;
  /** True where min itself is refused (a gauge of 0). */
  isMinExcluded?: boolean;
  /** A stored value is a shown one times this: 0.01 where percent is shown and a fraction stored. */
  shownFactor?: number;
}

/** '0 to 100 %' or 'more than 0 and at most 2000 µm': the remedy in every refusal. */
export function rangeInWords(rule: QuantityRule): string {
  const unit = rule.unit === '' ? '' : ` ${rule.unit}`;
  const min = formatBound(rule.min, rule);
  const max = formatBound(rule.max, rule);
  return rule.isMinExcluded ? `more than ${min} and at most ${max}${unit}` : `${min} to ${max}${unit}`;
}

/** A finite number within the rule's bounds; the message gives the value and the bounds. */
export function quantity(rule: QuantityRule) {
  const words = rangeInWords(rule);
  return boundedNumber(rule).required(`${rule.label}: enter a number, ${words}.`);
}

/** As quantity, but the key may be absent. */
export function optionalQuantity(rule: QuantityRule) {
  return boundedNumber(rule).optional();
}

/** As quantity, but null says 'none'. */
export function nullableQuantity(rule: QuantityRule) {
  return boundedNumber(rule).nullable().defined();
}

function boundedNumber(rule: QuantityRule) {
  const words = rangeInWords(rule);
  return yup
    .number()
    .strict()
    .typeError(`${rule.label}: enter a number, ${words}.`)
    .test({
      name: 'in-range',
      message: ({ value }) => `${rule.label}: ${formatShown(value, rule)} does not fit; use ${words}.`,
      test: (value) => {
        if (value === undefined || value === null) return true;
        if (!Number.isFinite(value)) return false;
        const isAboveMin = rule.isMinExcluded ? value > rule.min : value >= rule.min;
        return isAboveMin && value <= rule.max;
      },
    })
    .meta({
      minimum: rule.min,
      maximum: rule.max,
      isMinExcluded: rule.isMinExcluded ?? false,
      unit: rule.unit,
    });
}

function formatBound(value: number, rule: QuantityRule): string {
  return String(Number((value / (rule.shownFactor ?? 1)).toPrecision(6)));
}

function formatShown(value: unknown, rule: QuantityRule): string {
  if (typeof value !== 'number') return String(value);
  const unit = rule.unit === '' ? '' : ` ${rule.unit}`;
  return `${formatBound(value, rule)}${unit}`;
}

/** A name people read: 1 to 120 characters that are not only spaces. */
export function nameField(label: string) {
  return yup
    .string()
    .strict()
    .typeError(`${label}: enter some text.`)
    .required(`${label}: enter a name.`)
    .matches(/\S/, `${label}: enter a name, not only spaces.`)
    .max(120, `${label}: at most 120 characters.`);
}

export function noteField(label: string) {
  return yup.string().strict().max(2000, `${label}: at most 2000 characters.`);
}

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;

export function idField(label: string) {
  return yup
    .string()
    .strict()
    .required(`${label}: choose one.`)
    .matches(UUID, { message: `${label}: choose one.`, excludeEmptyString: false })
    .meta({ format: 'uuid' });
}

/** As idField, but the key may be absent. */
export function optionalIdField(label: string) {
  return yup.string().strict().matches(UUID, `${label}: choose one.`).optional().meta({ format: 'uuid' });
}

/** An id that may be absent: null says 'none'. */
export function nullableIdField() {
  return yup.string().strict().matches(UUID).nullable().defined().meta({ format: 'uuid' });
}

export function timeField() {
  return yup.string().strict().required().meta({ format: 'date-time' });
}

/** A time that may not have come: null. */
export function nullableTimeField() {
  return yup.string().strict().nullable().defined().meta({ format: 'date-time' });
}

/** An object whose unknown keys are refused by name. */
export function closedObject<Shape extends yup.ObjectShape>(shape: Shape) {
  return yup
    .object(shape)
    .noUnknown(({ unknown }) => `Unknown field: ${String(unknown)}. Remove it.`)
    .strict();
}

/** Only as people write it: no '1e1', no '0x2', no two values. */
function readWholeNumber(text: unknown): number {
  return typeof text === 'string' && /^\d{1,9}$/.test(text) ? Number(text) : NaN;
}

/** A list page by key: what follows after the last id seen. */
export const pageQuerySchema = yup
  .object({
    after: yup.string().matches(UUID, 'after: give the id that the previous page ended with.').optional(),
    limit: yup
      .number()
      .transform((_value, original: unknown) => readWholeNumber(original))
      .typeError('limit: use a whole number from 1 to 200.')
      .integer()
      .min(1, 'limit: use a whole number from 1 to 200.')
      .max(200, 'limit: use a whole number from 1 to 200.')
      .optional(),
  })
  .noUnknown();

const ARCHIVED_FILTERS = ['no', 'only'] as const;
export type ArchivedFilter = (typeof ARCHIVED_FILTERS)[number];

/** What a list of kept things may be asked for besides the page. */
const keptListFilters = {
  /** Part of the name, in any case; '%' and '_' stand for themselves. */
  search: yup.string().trim().max(120, 'search: at most 120 characters.').optional(),
  /** 'no' (if absent): what is in use; 'only': what is archived. */
  archived: yup.string().oneOf(ARCHIVED_FILTERS, 'archived: use no or only.').optional(),
};

export const keptListQuerySchema = yup.object({ ...pageQuerySchema.fields, ...keptListFilters }).noUnknown();

const STUDY_SORTS = ['newest', 'name', 'days'] as const;
/** 'newest' if absent; 'name': from A; 'days': the longest life first. */
export type StudySort = (typeof STUDY_SORTS)[number];

export const studyListQuerySchema = yup
  .object({
    ...pageQuerySchema.fields,
    ...keptListFilters,
    /** One tag, exactly as written. */
    tag: yup.string().max(30, 'tag: at most 30 characters.').optional(),
    sort: yup
      .string()
      .oneOf(STUDY_SORTS, `sort: use ${STUDY_SORTS.join(', ')}.`)
      .optional(),
  })
  .noUnknown();

export interface TypedValue {
  value: number;
  unit: string;
}

/**
 * What a person typed where that is not the stored unit: by path in the spec, e.g.
 * `layers[0].thickness_um: {value: 0.47, unit: 'mil'}`. The server checks that it converts to the stored number.
 */
export function typedValuesField() {
  return yup
    .mixed<Record<string, TypedValue>>((value): value is Record<string, TypedValue> => isTypedValues(value))
    .typeError('Typed values: give value and unit for each path.')
    .optional()
    .meta({ additionalProperties: 'typed value' });
}

function isTypedValues(value: unknown): boolean {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return false;
  return Object.values(value).every(
    (entry: unknown) =>
      typeof entry === 'object' &&
      entry !== null &&
      Object.keys(entry).length === 2 &&
      'value' in entry &&
      'unit' in entry &&
      typeof entry.value === 'number' &&
      Number.isFinite(entry.value) &&
      typeof entry.unit === 'string' &&
      entry.unit.length <= 60,
  );
}
