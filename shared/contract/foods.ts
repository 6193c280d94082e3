import * as yup from 'yup';
import { closedObject, nameField, noteField, quantity, typedValuesField } from './fields';
import { provenanceEntrySchema } from './materials';
import { RULES } from './rules';
import { foodDescriptionSchema, limitsSchema } from './storage-description';

export const foodSpecSchema = closedObject({
  name: nameField('Name'),
  food: foodDescriptionSchema.required(),
  limits: limitsSchema.required('Limits: give at least one, oxygen or moisture.'),
  absorber_capacity_cm3_STP: quantity(RULES.absorber),
  /** Said beside every answer about this food. */
  cautions: yup.array(yup.string().strict().required().max(1000)).strict().required().max(10),
  notes: noteField('Notes').defined(),
  provenance: yup.array(provenanceEntrySchema).strict().required().max(100),
  typed: typedValuesField(),
});

export type FoodSpec = yup.InferType<typeof foodSpecSchema>;
