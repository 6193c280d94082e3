import * as yup from 'yup';
import { closedObject, idField, nameField, optionalIdField, quantity, typedValuesField } from './fields';
import { RULES } from './rules';
import { leaksSchema } from './storage-description';

const pouchFormSchema = closedObject({
  type: yup
    .string()
    .strict()
    .oneOf(['pouch'] as const)
    .required(),
  width_mm: quantity({ ...RULES.packLength, label: 'Width' }),
  height_mm: quantity({ ...RULES.packLength, label: 'Height' }),
  seal_left_mm: quantity({ ...RULES.sealWidth, label: 'Left seal' }),
  seal_right_mm: quantity({ ...RULES.sealWidth, label: 'Right seal' }),
  seal_top_mm: quantity({ ...RULES.sealWidth, label: 'Top seal' }),
  seal_bottom_mm: quantity({ ...RULES.sealWidth, label: 'Bottom seal' }),
  gusset_depth_mm: quantity({ ...RULES.packLength, label: 'Gusset depth', isMinExcluded: false }),
})
  .test(
    'open-width',
    'Seals: left and right together must be narrower than the pouch.',
    (form) => (form?.seal_left_mm ?? 0) + (form?.seal_right_mm ?? 0) < (form?.width_mm ?? Infinity),
  )
  .test(
    'open-height',
    'Seals: top and bottom together must be lower than the pouch.',
    (form) => (form?.seal_top_mm ?? 0) + (form?.seal_bottom_mm ?? 0) < (form?.height_mm ?? Infinity),
  );

const areaFormSchema = closedObject({
  type: yup
    .string()
    .strict()
    .oneOf(['area'] as const)
    .required(),
  area_m2: quantity(RULES.area),
});

/** A tray with a lid. The laminates of a study are candidates for the lid; the tray's belongs to the pack. */
const trayFormSchema = closedObject({
  type: yup
    .string()
    .strict()
    .oneOf(['tray'] as const)
    .required(),
  tray_area_m2: quantity({ ...RULES.area, label: 'Tray area' }),
  lid_area_m2: quantity({ ...RULES.area, label: 'Lid area' }),
  tray_laminate_id: idField('Wall of the tray'),
  /** Absent: its newest revision when a study is run. */
  tray_laminate_revision_id: optionalIdField('Revision of the tray’s wall'),
});

export const PACK_FORM_SCHEMAS = [pouchFormSchema, areaFormSchema, trayFormSchema];

const unknownFormSchema = closedObject({
  type: yup
    .string()
    .strict()
    .oneOf(['pouch', 'area', 'tray'], 'Form: use pouch, area or tray.')
    .required('Form: use pouch, area or tray.'),
}).required('Form: use pouch, area or tray.');

export const packFormSchema = yup.lazy((form: unknown) => {
  const type = typeof form === 'object' && form !== null && 'type' in form ? form.type : undefined;
  if (type === 'pouch') return pouchFormSchema;
  if (type === 'tray') return trayFormSchema;
  return type === 'area' ? areaFormSchema : unknownFormSchema;
});

export const packSpecSchema = closedObject({
  name: nameField('Name'),
  form: packFormSchema,
  headspace_cm3: quantity(RULES.headspace),
  starting_headspace_oxygen_percent: quantity({
    ...RULES.headspaceOxygen,
    label: 'Starting headspace oxygen',
  }),
  /** True: gas also creeps through the seal, edgewise through both sealant layers (pouches only). */
  has_seal_path: yup.boolean().strict().required('Seal path: say yes or no.'),
  leaks: leaksSchema.nullable().defined(),
  typed: typedValuesField(),
});

export type PouchForm = yup.InferType<typeof pouchFormSchema>;
export type AreaForm = yup.InferType<typeof areaFormSchema>;
export type TrayForm = yup.InferType<typeof trayFormSchema>;
export type PackForm = PouchForm | AreaForm | TrayForm;
export type PackSpec = Omit<yup.InferType<typeof packSpecSchema>, 'form'> & { form: PackForm };
