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
 * GET   …/studies/<id>/results   its results, newest first, each whole: ask for few (limit=2 for the old beside the new)
 * GET   …/studies/<id>/results/<result id>
 */
export const MOST_LAMINATES_IN_STUDY = 8;
const MOST_TAGS = 10;
const LONGEST_TAG = 30;

const VERDICTS = ['open', 'chosen', 'dropped'] as const;
export type Verdict = (typeof VERDICTS)[number];

/** Why a laminate was chosen or dropped. */
const laminateNoteSchema = closedObject({
  laminate_id: idField('Wall'),
  verdict: yup
    .string()
    .strict()
    .oneOf(VERDICTS, `Verdict: use ${VERDICTS.join(', ')}.`)
    .required('Verdict: choose one.'),
  note: noteField('Note').defined(),
});
export type LaminateNote = yup.InferType<typeof laminateNoteSchema>;

const tagField = yup
  .string()
  .strict()
  .required('Tag: enter some text.')
  .matches(/^\S(.*\S)?$/, 'Tag: begin and end it without spaces.')
  .max(LONGEST_TAG, `Tag: at most ${LONGEST_TAG} characters.`);

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
  /** Absent: none. Editing tags, notes or verdicts computes nothing anew. */
  tags: yup
    .array(tagField)
    .strict()
    .max(MOST_TAGS, `Tags: at most ${MOST_TAGS}.`)
    .test('once', 'Tags: each once.', (tags) => new Set(tags).size === (tags ?? []).length)
    .optional(),
  /** Absent: none; at most one for each laminate of the study. */
  laminate_notes: yup
    .array(laminateNoteSchema)
    .strict()
    .max(MOST_LAMINATES_IN_STUDY, 'Notes on walls: one for each wall.')
    .test('once', 'Notes on walls: one for each wall.', (notes) => {
      const ids = (notes ?? []).map((note) => note.laminate_id);
      return new Set(ids).size === ids.length;
    })
    .optional(),
  typed: typedValuesField(),
}).test('notes-of-study', 'Notes on walls: only on walls of this study.', (spec, context) => {
  const stray = (spec?.laminate_notes ?? []).findIndex(
    (note) => !spec?.laminate_ids?.includes(note.laminate_id),
  );
  return (
    stray < 0 || context.createError({ path: joined(context.path, `laminate_notes[${stray}].laminate_id`) })
  );
});

function joined(path: string | undefined, field: string): string {
  return path ? `${path}.${field}` : field;
}

export type StudySpec = yup.InferType<typeof studySpecSchema>;

/** One laminate of a study as it was computed: the pinned revision, everything that went in, what came out. */
export interface Candidate {
  laminate_id: string;
  laminate_revision_id: string;
  name: string;
  /** Per layer, outside first: what the drawing needs. */
  layers: CandidateLayer[];
  /** Walls: the candidate's own first; a tray's second. */
  description: EvaluationDescription;
  answer: EvaluationAnswer;
  make_up: MakeUp;
}

/** What one pack is made of: the film cut for it, not what leaves the mill. Numbers are null where a layer lacks data. */
export interface MakeUp {
  /** Of the candidate's own wall. */
  mass_g_per_m2: number | null;
  /**
   * Film cut for the candidate's own wall: of a pouch 2·width·height + 2·gusset·width with its seals; of a tray the
   * lid; a given area as it is given.
   */
  cut_area_m2: number;
  /** All walls together: of a tray, lid and tray. */
  mass_g_per_pack: number | null;
  /** Materials without a density. */
  mass_missing: string[];
  price_per_pack: number | null;
  /** ISO 4217; the account's when it was computed. */
  currency: string;
  /** Materials without a price, or priced by mass and without a density. */
  price_missing: string[];
  /** Shares of the pack's mass, 0 to 1, the largest first; empty where the mass is not known. */
  family_shares: { family: string; share: number }[];
  /** Fractions passed by the candidate's own wall, 0 to 1. */
  light: { uv_350nm: number; visible_550nm: number } | null;
  /** Materials whose light is not known. */
  light_missing: string[];
}

export interface CandidateLayer {
  material_id: string;
  material_revision_id: string;
  material_name: string;
  material_class: string;
  polymer_family: string;
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
  pack: {
    id: string;
    revision_id: string;
    name: string;
    /** The tray's body, where the pack is a tray: the same behind every candidate's lid. */
    tray: {
      laminate_id: string;
      laminate_revision_id: string;
      name: string;
      layers: CandidateLayer[];
    } | null;
  };
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
  /** Each thing that has; empty unless is_outdated. */
  newer: NewerThing[];
}

export const NEWER_KINDS = ['material', 'laminate', 'pack', 'food', 'route'] as const;

export interface NewerThing {
  kind: (typeof NEWER_KINDS)[number];
  id: string;
  /** As it is called now. */
  name: string;
  /** Of a material: the study's laminates that still hold the older revision; run again after revising them. */
  laminates: { id: string; name: string }[];
}

export interface StudyWithResult extends Study {
  latest_result: StudyResult | null;
}
