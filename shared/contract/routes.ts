import * as yup from 'yup';
import { closedObject, nameField, noteField, quantity, typedValuesField } from './fields';
import { provenanceEntrySchema } from './materials';
import { RULES } from './rules';
import { routeDescriptionSchema } from './storage-description';

export const routeSpecSchema = closedObject({
  name: nameField('Name'),
  route: routeDescriptionSchema.required(),
  /** How far ahead is looked: a limit not reached by then is 'not reached'. */
  horizon_days: quantity(RULES.horizonDays),
  notes: noteField('Notes').defined(),
  provenance: yup.array(provenanceEntrySchema).strict().required().max(100),
  typed: typedValuesField(),
});

export type RouteSpec = yup.InferType<typeof routeSpecSchema>;
