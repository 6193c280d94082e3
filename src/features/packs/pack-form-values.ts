import {
  packSpecSchema,
  type AreaForm,
  type PackForm,
  type PackSpec,
  type PouchForm,
  type TrayForm,
} from '../../../shared/contract/packs';
import type { DisplayKindName, DisplayUnitSystem } from '../../../shared/units/format';
import { FieldReader, fieldText } from '../../api/kept-forms/typed-quantity';
import { validateKeptForm } from '../../api/kept-forms/validate-kept-form';

type PouchLength = Exclude<keyof PouchForm, 'type'>;

/** Every number as the text that stands in its field. */
export interface PackFormValues {
  name: string;
  form: Record<PouchLength, string> & {
    type: PackForm['type'];
    area_m2: string;
    tray_area_m2: string;
    lid_area_m2: string;
    tray_laminate_id: string;
  };
  headspace_cm3: string;
  starting_headspace_oxygen_percent: string;
  has_seal_path: boolean;
  has_leaks: boolean;
  leaks: { count: string; length_mm: string; diameter_um: string };
}

/** A pillow pouch of 150 × 200 mm with 10 mm seals: a common size, to be overwritten. */
const USUAL_POUCH: PouchForm = {
  type: 'pouch',
  width_mm: 150,
  height_mm: 200,
  seal_left_mm: 10,
  seal_right_mm: 10,
  seal_top_mm: 10,
  seal_bottom_mm: 10,
  gusset_depth_mm: 0,
};

export const NEW_PACK: PackSpec = {
  name: '',
  form: USUAL_POUCH,
  headspace_cm3: 100,
  starting_headspace_oxygen_percent: 20.9,
  has_seal_path: false,
  leaks: null,
};

export function packFormValues(spec: PackSpec, unitSystem: DisplayUnitSystem): PackFormValues {
  const pouch = spec.form.type === 'pouch' ? spec.form : null;
  const tray = spec.form.type === 'tray' ? spec.form : null;
  const length = (key: PouchLength) => fieldText(pouch?.[key], 'length_mm', unitSystem);
  return {
    name: spec.name,
    form: {
      type: spec.form.type,
      width_mm: length('width_mm'),
      height_mm: length('height_mm'),
      seal_left_mm: length('seal_left_mm'),
      seal_right_mm: length('seal_right_mm'),
      seal_top_mm: length('seal_top_mm'),
      seal_bottom_mm: length('seal_bottom_mm'),
      gusset_depth_mm: length('gusset_depth_mm'),
      area_m2: spec.form.type === 'area' ? fieldText(spec.form.area_m2, 'area_m2', unitSystem) : '',
      tray_area_m2: fieldText(tray?.tray_area_m2, 'area_m2', unitSystem),
      lid_area_m2: fieldText(tray?.lid_area_m2, 'area_m2', unitSystem),
      tray_laminate_id: tray?.tray_laminate_id ?? '',
    },
    headspace_cm3: fieldText(spec.headspace_cm3, 'volume_cm3', unitSystem),
    starting_headspace_oxygen_percent: fieldText(
      spec.starting_headspace_oxygen_percent,
      'percent',
      unitSystem,
    ),
    has_seal_path: spec.has_seal_path,
    has_leaks: spec.leaks !== null,
    leaks: {
      count: fieldText(spec.leaks?.count, 'number', unitSystem),
      length_mm: fieldText(spec.leaks?.length_mm, 'length_mm', unitSystem),
      diameter_um: fieldText(spec.leaks?.diameter_um, 'number', unitSystem),
    },
  };
}

export interface PackFormContext {
  unitSystem: DisplayUnitSystem;
  /** The revision that the form was filled from. */
  before: PackSpec;
}

export function packSpecFrom(values: PackFormValues, { unitSystem, before }: PackFormContext): PackSpec {
  const reader = new FieldReader(unitSystem);
  return {
    name: values.name.trim(),
    form: formFrom(values, reader, before),
    headspace_cm3: reader.readRequired('headspace_cm3', values.headspace_cm3, {
      kind: 'volume_cm3',
      before: before.headspace_cm3,
    }),
    starting_headspace_oxygen_percent: reader.readRequired(
      'starting_headspace_oxygen_percent',
      values.starting_headspace_oxygen_percent,
      { kind: 'percent', before: before.starting_headspace_oxygen_percent },
    ),
    has_seal_path: values.form.type === 'pouch' && values.has_seal_path,
    leaks: values.has_leaks
      ? {
          count: reader.readRequired('leaks.count', values.leaks.count, {
            kind: 'number',
            before: before.leaks?.count,
          }),
          length_mm: reader.readRequired('leaks.length_mm', values.leaks.length_mm, {
            kind: 'length_mm',
            before: before.leaks?.length_mm,
          }),
          diameter_um: reader.readRequired('leaks.diameter_um', values.leaks.diameter_um, {
            kind: 'number',
            before: before.leaks?.diameter_um,
          }),
        }
      : null,
    ...reader.typed(),
  };
}

export function pouchFrom(
  values: Pick<PackFormValues, 'form'>,
  reader: FieldReader,
  before: Pick<PackSpec, 'form'>,
): PouchForm {
  const pouchBefore = before.form.type === 'pouch' ? before.form : null;
  const length = (key: PouchLength) =>
    reader.readRequired(`form.${key}`, values.form[key], { kind: 'length_mm', before: pouchBefore?.[key] });
  return {
    type: 'pouch',
    width_mm: length('width_mm'),
    height_mm: length('height_mm'),
    seal_left_mm: length('seal_left_mm'),
    seal_right_mm: length('seal_right_mm'),
    seal_top_mm: length('seal_top_mm'),
    seal_bottom_mm: length('seal_bottom_mm'),
    gusset_depth_mm: length('gusset_depth_mm'),
  };
}

function formFrom(values: PackFormValues, reader: FieldReader, before: PackSpec): PackForm {
  if (values.form.type === 'area') return areaFrom(values, reader, before);
  return values.form.type === 'tray' ? trayFrom(values, reader, before) : pouchFrom(values, reader, before);
}

/** The revision of the tray's wall is left open: each run of a study takes the newest. */
function trayFrom(values: PackFormValues, reader: FieldReader, before: PackSpec): TrayForm {
  const trayBefore = before.form.type === 'tray' ? before.form : null;
  const area = (key: 'tray_area_m2' | 'lid_area_m2') =>
    reader.readRequired(`form.${key}`, values.form[key], { kind: 'area_m2', before: trayBefore?.[key] });
  return {
    type: 'tray',
    tray_area_m2: area('tray_area_m2'),
    lid_area_m2: area('lid_area_m2'),
    tray_laminate_id: values.form.tray_laminate_id,
  };
}

function areaFrom(values: PackFormValues, reader: FieldReader, before: PackSpec): AreaForm {
  const areaBefore = before.form.type === 'area' ? before.form.area_m2 : undefined;
  return {
    type: 'area',
    area_m2: reader.readRequired('form.area_m2', values.form.area_m2, {
      kind: 'area_m2',
      before: areaBefore,
    }),
  };
}

export function validatePackForm(context: PackFormContext) {
  return validateKeptForm<PackFormValues>({
    schema: packSpecSchema,
    toSpec: (values) => packSpecFrom(values, context),
    kindAt: kindOfPackField,
    labelAt: (path) => LABELS[path],
    unitSystem: context.unitSystem,
  });
}

/** Fields that the page calls otherwise than the contract does. */
const LABELS: Partial<Record<string, string>> = {
  'form.gusset_depth_mm': 'Gusset, folded depth',
  'form.tray_laminate_id': 'Wall of the tray',
  starting_headspace_oxygen_percent: 'Oxygen in it at the start',
  'leaks.count': 'How many',
  'leaks.length_mm': 'Length',
  'leaks.diameter_um': 'Diameter',
};

function kindOfPackField(path: string): DisplayKindName | null {
  if (path === 'leaks.count' || path === 'leaks.diameter_um') return 'number';
  if (path.endsWith('_mm')) return 'length_mm';
  if (path.endsWith('area_m2')) return 'area_m2';
  if (path === 'headspace_cm3') return 'volume_cm3';
  return path === 'starting_headspace_oxygen_percent' ? 'percent' : null;
}
