import { MOST_LAMINATES_IN_STUDY, studySpecSchema, type StudySpec } from '../../../shared/contract/studies';
import { parseNumber } from '../../../shared/units/format';
import { formikErrors, specFaults } from '../../api/kept-forms/spec-faults';
import type { FormikErrors } from 'formik';

/** What stands in the form: the target as typed, '' where nothing is chosen yet. */
export interface StudyFormValues {
  name: string;
  food_id: string;
  pack_id: string;
  route_id: string;
  target_days: string;
  laminate_ids: string[];
  notes: string;
}

export const NEW_STUDY: StudyFormValues = {
  name: '',
  food_id: '',
  pack_id: '',
  route_id: '',
  target_days: '',
  laminate_ids: [''],
  notes: '',
};

export function studyFormValues(spec: StudySpec): StudyFormValues {
  const { name, food_id, pack_id, route_id, target_days, laminate_ids, notes } = spec;
  return {
    name,
    food_id,
    pack_id,
    route_id,
    target_days: String(target_days),
    laminate_ids: [...laminate_ids],
    notes,
  };
}

/** What would be sent, same paths as in the form. */
export function studySpec(values: StudyFormValues): StudySpec {
  return { ...values, target_days: parseNumber(values.target_days) };
}

/** By the contract's own schema; what is said of the walls as a whole lands on the last of them. */
export function studyFaults(values: StudyFormValues): FormikErrors<StudyFormValues> {
  const faults = specFaults(studySpecSchema, studySpec(values));
  const ofAllWalls = faults.laminate_ids;
  if (ofAllWalls !== undefined) {
    delete faults.laminate_ids;
    faults[`laminate_ids[${Math.max(0, values.laminate_ids.length - 1)}]`] ??= ofAllWalls;
  }
  const errors = formikErrors<StudyFormValues>(faults);
  // In the order of the fields, as they are listed above the button.
  return Object.fromEntries(
    FIELD_ORDER.flatMap((name) => (errors[name] === undefined ? [] : [[name, errors[name]]])),
  );
}

const FIELD_ORDER = [
  'name',
  'food_id',
  'pack_id',
  'route_id',
  'target_days',
  'laminate_ids',
  'notes',
] as const;

/** Where the server's path stands in the form. */
export function studyFieldName(path: string): string {
  const name = path.replace(/^spec\./, '');
  return name === 'laminate_ids' ? 'laminate_ids[0]' : name;
}

const FIELD_BY_COLLECTION = { foods: 'food_id', packs: 'pack_id', routes: 'route_id' } as const;

/** The form with what was made for it chosen: `created` as the forms of the other things send it back. */
export function withCreated(values: StudyFormValues, created: string | undefined): StudyFormValues {
  const [collection, id] = (created ?? '').split(':');
  if (id === undefined || id === '') return values;
  if (collection === 'foods' || collection === 'packs' || collection === 'routes') {
    return { ...values, [FIELD_BY_COLLECTION[collection]]: id };
  }
  if (collection !== 'laminates' || values.laminate_ids.includes(id)) return values;
  const blank = values.laminate_ids.indexOf('');
  if (blank !== -1) return { ...values, laminate_ids: values.laminate_ids.with(blank, id) };
  return values.laminate_ids.length < MOST_LAMINATES_IN_STUDY
    ? { ...values, laminate_ids: [...values.laminate_ids, id] }
    : values;
}

/** What is kept on the device while a study is unsaved, with the revision it began from; null for a new one. */
export interface StudyDraft {
  values: StudyFormValues;
  baseRevisionId: string | null;
}

export function isStudyDraft(stored: unknown): stored is StudyDraft {
  return (
    typeof stored === 'object' &&
    stored !== null &&
    'baseRevisionId' in stored &&
    (stored.baseRevisionId === null || typeof stored.baseRevisionId === 'string') &&
    'values' in stored &&
    isStudyFormValues(stored.values)
  );
}

function isStudyFormValues(value: unknown): boolean {
  if (typeof value !== 'object' || value === null) return false;
  const entries = new Map(Object.entries(value));
  const hasTexts = (['name', 'food_id', 'pack_id', 'route_id', 'target_days', 'notes'] as const).every(
    (key) => typeof entries.get(key) === 'string',
  );
  const walls: unknown = entries.get('laminate_ids');
  return hasTexts && Array.isArray(walls) && walls.length > 0 && walls.every((id) => typeof id === 'string');
}
