import * as yup from 'yup';
import { closedObject, idField, nameField, quantity, typedValuesField } from './fields';
import { MOST_LAYERS, RULES } from './rules';

/** One layer of a laminate: a material at one of its revisions, and its gauge (a coating's own thickness). */
const laminateLayerSchema = closedObject({
  material_id: idField('Material'),
  material_revision_id: idField('Material revision'),
  thickness_um: quantity({ ...RULES.gauge }),
});

/** Layers run from the outside face to the inside face. */
export const laminateSpecSchema = closedObject({
  name: nameField('Name'),
  layers: yup
    .array(laminateLayerSchema)
    .strict()
    .required('Layers: add at least one.')
    .min(1, 'Layers: add at least one.')
    .max(MOST_LAYERS, `Layers: at most ${MOST_LAYERS}; this wall has more.`),
  typed: typedValuesField(),
});

export type LaminateSpec = yup.InferType<typeof laminateSpecSchema>;
export type LaminateLayer = LaminateSpec['layers'][number];
