import * as yup from 'yup';
import { evaluationAnswerSchema, LIMIT_NAMES } from './evaluation-answer';
import { evaluationRequestSchema } from './evaluations';
import { closedObject, idField, nullableIdField, nullableTimeField, timeField } from './fields';
import { pageSchema, revisionSchema } from './kept-things';
import { MATERIAL_KINDS } from './materials';
import { NEWER_KINDS, studySpecSchema } from './studies';

/** Response schemas of studies and results; their types stand in studies.ts. */

const text = () => yup.string().strict().defined();
const count = () => yup.number().strict().integer().min(1).required();

const candidateLayerSchema = closedObject({
  material_id: idField('Material'),
  material_revision_id: idField('Material revision'),
  material_name: text(),
  material_class: text(),
  polymer_family: text(),
  kind: yup.string().strict().oneOf(MATERIAL_KINDS).required(),
  thickness_um: yup.number().strict().required(),
  leans_on: yup
    .array(
      yup
        .string()
        .strict()
        .oneOf(['memory', 'invented', 'common-practice'] as const)
        .required(),
    )
    .strict()
    .required(),
});

const share = () => yup.number().strict().min(0).max(1).required();
const amount = () => yup.number().strict().min(0).nullable().defined();
const names = () => yup.array(text()).strict().required();

const makeUpSchema = closedObject({
  mass_g_per_m2: amount(),
  cut_area_m2: yup.number().strict().required(),
  mass_g_per_pack: amount(),
  mass_missing: names(),
  price_per_pack: amount(),
  currency: yup.string().strict().length(3).required(),
  price_missing: names(),
  family_shares: yup
    .array(closedObject({ family: text(), share: share() }))
    .strict()
    .required(),
  light: closedObject({ uv_350nm: share(), visible_550nm: share() }).nullable().defined(),
  light_missing: names(),
});

export const candidateSchema = closedObject({
  laminate_id: idField('Laminate'),
  laminate_revision_id: idField('Laminate revision'),
  name: text(),
  layers: yup.array(candidateLayerSchema).strict().required(),
  description: evaluationRequestSchema,
  answer: evaluationAnswerSchema.required(),
  make_up: makeUpSchema.required(),
});

const pinned = {
  id: idField('Id'),
  revision_id: idField('Revision'),
  name: text(),
};

export const studyResultSchema = closedObject({
  id: idField('Result'),
  number: count(),
  study_id: idField('Study'),
  study_revision_id: idField('Study revision'),
  created_at: timeField(),
  created_by: nullableIdField(),
  engine_version: text(),
  sha256: yup
    .string()
    .strict()
    .matches(/^[0-9a-f]{64}$/)
    .required(),
  target_days: yup.number().strict().required(),
  food: closedObject({ ...pinned, cautions: yup.array(text()).strict().required() }).required(),
  pack: closedObject({
    ...pinned,
    tray: closedObject({
      laminate_id: idField('Laminate'),
      laminate_revision_id: idField('Laminate revision'),
      name: text(),
      layers: yup.array(candidateLayerSchema).strict().required(),
    })
      .nullable()
      .defined(),
  }).required(),
  route: closedObject(pinned).required(),
  candidates: yup.array(candidateSchema).strict().required(),
});

const headlineSchema = closedObject({
  result_id: idField('Result'),
  created_at: timeField(),
  engine_version: text(),
  best_laminate_name: text(),
  shelf_life_days: yup.number().strict().nullable().defined(),
  horizon_days: yup.number().strict().required(),
  first_limit: yup.string().strict().oneOf(LIMIT_NAMES).nullable().defined(),
  is_met: yup.boolean().strict().required(),
});

const studyShape = {
  id: idField('Id'),
  created_at: timeField(),
  archived_at: nullableTimeField(),
  revision: revisionSchema(studySpecSchema).required(),
  food_name: text(),
  pack_name: text(),
  route_name: text(),
  laminate_names: yup.array(text()).strict().required(),
  headline: headlineSchema.nullable().defined(),
  is_outdated: yup.boolean().strict().required(),
  newer: yup
    .array(
      closedObject({
        kind: yup.string().strict().oneOf(NEWER_KINDS).required(),
        id: idField('Id'),
        name: text(),
        laminates: yup
          .array(closedObject({ id: idField('Laminate'), name: text() }))
          .strict()
          .required(),
      }),
    )
    .strict()
    .required(),
};

export const studySchema = closedObject(studyShape);
export const studyWithResultSchema = closedObject({
  ...studyShape,
  latest_result: studyResultSchema.nullable().defined(),
});
export const studyPageSchema = pageSchema(studySchema);
export const studyResultPageSchema = pageSchema(studyResultSchema);
