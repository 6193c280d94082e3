import * as yup from 'yup';
import { closedObject, nameField, quantity, typedValuesField } from './fields';
import { RULES } from './rules';
import { leaksSchema } from './storage-description';

const pouchFormSchema = closedObject({
  type: yup.string().strict().oneOf(['pouch'] as const).required(),
  width_mm: quantity({ ...RULES.packLength, label: 'Width' }),
  height_mm: quantity({ ...RULES.packLength, label: 'Height' }),
  seal_left_mm: quantity({ ...RULES.sealWidth, label: 'Left seal' }),
  seal_right_mm: quantity({ ...RULES.sealWidth, label: 'Right seal' }),
  seal_top_mm: quantity({ ...RULES.sealWidth, label: 'Top seal' }),
  seal_bottom_mm: quantity({ ...RULES.sealWidth, label: 'Bottom seal' }),
  gusset_depth_mm: quantity({ ...RULES.packLength, label: 'Gusset depth', isMinExcluded: false }),
})
  .test('open-width', 'Seals: left and right together must be narrower than the pouch.', (form) =>
    (form?.seal_left_mm ?? 0) + (form?.seal_right_mm ?? 0) < (form?.width_mm ?? Infinity),
  )
  .test('open-height', 'Seals: top and bottom together must be lower than the pouch.', (form) =>
    (form?.seal_top_mm ?? 0) + (form?.seal_bottom_mm ?? 0) < (form?.height_mm ?? Infinity),
  );

const areaFormSchema = closedObject({
  type: yup.string().strict().oneOf(['area'] as const).required(),
  area_m2: quantity(RULES.area),
});

export const PACK_FORM_SCHEMAS = [pouchFormSchema, areaFormSchema];

const unknownFormSchema = closedObject({
  type: yup
    .string()
    .strict()
    .oneOf(['pouch', 'area'], 'Form: use pouch or area.')
    .required('Form: use pouch or area.'),
}).required('Form: use pouch or area.');

export const packFormSchema = yup.lazy((form: unknown) => {
  const type = typeof form === 'object' && form !== null && 'type' in form ? form.type : undefined;
  if (type === 'pouch') return pouchFormSchema;
  return type === 'area' ? areaFormSchema : unknownFormSchema;
});

export const packSpecSchema = closedObject({
  name: nameField('Name'),
  form: packFormSchema,
  headspace_cm3: quantity(RULES.headspace),
  starting_headspace_oxygen_percent: quantity({ ...RULES.headspaceOxygen, label: 'Starting headspace oxygen' }),
  /** True: gas also creeps through the seal, edgewise through both sealant layers (pouches only). */
  has_seal_path: yup.boolean().strict().required('Seal path: say yes or no.'),
  leaks: leaksSchema.nullable().defined(),
  typed: typedValuesField(),
});

export type PouchForm = yup.InferType<typeof pouchFormSchema>;
export type AreaForm = yup.InferType<typeof areaFormSchema>;
export type PackSpec = Omit<yup.InferType<typeof packSpecSchema>, 'form'> & { form: PouchForm | AreaForm };
