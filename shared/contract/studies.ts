import * as yup from 'yup';
import type { EvaluationAnswer, EvaluationDescription } from '../engine/description/evaluation';
import type { LimitName } from '../engine/description/storage-description';
import { closedObject, idField, nameField, noteField, quantity, typedValuesField } from './fields';
import type { KeptThing } from './kept-things';
import { RULES } from './rules';

/**
 * Studies are kept like the other things (shared/contract/kept-things.ts); creating or revising one computes and
 * stores its result in the same transaction. Besides:
 *
 * POST  …/studies/<id>/results   run again with the newest revisions; Idempotency-Key wanted; 201 with the result
 * GET   …/studies/<id>/results   its results, newest first
 * GET   …/studies/<id>/results/<result id>
 */
export const MOST_LAMINATES_IN_STUDY = 8;

export const studySpecSchema = closedObject({
  name: nameField('Name'),
  food_id: idField('Food'),
  pack_id: idField('Pack'),
  route_id: idField('Route'),
  target_days: quantity(RULES.targetDays),
  laminate_ids: yup
    .array(idField('Wall'))
    .strict()
    .required('Walls: choose at least one.')
    .min(1, 'Walls: choose at least one.')
    .max(MOST_LAMINATES_IN_STUDY, `Walls: at most ${MOST_LAMINATES_IN_STUDY}.`)
    .test('once', 'Walls: choose each wall once.', (ids) => new Set(ids).size === (ids ?? []).length),
  notes: noteField('Notes').defined(),
  typed: typedValuesField(),
});

export type StudySpec = yup.InferType<typeof studySpecSchema>;

/** One laminate of a study as it was computed: the pinned revision, everything that went in, what came out. */
export interface Candidate {
  laminate_id: string;
  laminate_revision_id: string;
  name: string;
  /** Per layer, outside first: what the drawing needs. */
  layers: CandidateLayer[];
  description: EvaluationDescription;
  answer: EvaluationAnswer;
}

export interface CandidateLayer {
  material_id: string;
  material_revision_id: string;
  material_name: string;
  material_class: string;
  kind: 'film' | 'coating' | 'foil';
  thickness_um: number;
  /** True where a coefficient of the material is from memory, invented, or common practice, not read at a source. */
  leans_on: ('memory' | 'invented' | 'common-practice')[];
}

export interface StudyResult {
  id: string;
  number: number;
  study_id: string;
  study_revision_id: string;
  created_at: string;
  created_by: string | null;
  engine_version: string;
  /** Of the canonical JSON (RFC 8785) that is stored. */
  sha256: string;
  target_days: number;
  food: { id: string; revision_id: string; name: string; cautions: string[] };
  pack: { id: string; revision_id: string; name: string };
  route: { id: string; revision_id: string; name: string };
  candidates: Candidate[];
}

/** What a study's card says of its answer. */
export interface StudyHeadline {
  result_id: string;
  created_at: string;
  engine_version: string;
  best_laminate_name: string;
  /** null: no limit is reached by the horizon. */
  shelf_life_days: number | null;
  horizon_days: number;
  first_limit: LimitName | null;
  is_met: boolean;
}

export interface Study extends KeptThing<StudySpec> {
  food_name: string;
  pack_name: string;
  route_name: string;
  laminate_names: string[];
  headline: StudyHeadline | null;
  /** True where something the study uses has a newer revision than its latest result pins. */
  is_outdated: boolean;
}

export interface StudyWithResult extends Study {
  latest_result: StudyResult | null;
}
