import * as yup from 'yup';
import { closedObject, idField, noteField, nullableIdField, nullableTimeField, timeField } from './fields';

/**
 * What a study uses is kept and revisioned: materials, laminates, packs, foods, routes. All share one shape and one
 * set of paths, `/api/accounts/<id>/<collection>`:
 *
 * GET    …/<collection>?after=&limit=&search=&archived=no|only   a page, newest first, keyed by id
 * POST   …/<collection>                  {spec}; Idempotency-Key wanted; 201
 * GET    …/<collection>/<id>             the thing with its current revision; ETag is the revision id
 * PUT    …/<collection>/<id>             {spec, note?}; If-Match: "<revision id>"; a lost race answers 412 with `current`
 * PUT    …/<collection>/<id>/archived    {is_archived}; 200 with the thing; saying it twice changes nothing
 * GET    …/<collection>/<id>/revisions   all revisions, newest first, each with its author's name
 * GET    …/<collection>/<id>/uses        what uses the thing now: laminates, packs and studies by their current revision
 *
 * What is archived leaves the lists and may not be chosen anew; where it is used or pinned, it goes on working.
 */
export const COLLECTIONS = ['materials', 'laminates', 'packs', 'foods', 'routes'] as const;
export type Collection = (typeof COLLECTIONS)[number];

export function collectionPath(accountId: string, collection: Collection | 'studies'): string {
  return `/api/accounts/${accountId}/${collection}`;
}

export function createRequestSchema<Spec extends yup.AnyObjectSchema>(spec: Spec) {
  return closedObject({ spec: spec.required('Send the spec.') });
}

export function reviseRequestSchema<Spec extends yup.AnyObjectSchema>(spec: Spec) {
  return closedObject({ spec: spec.required('Send the spec.'), note: noteField('Note').optional() });
}

export function revisionSchema<Spec extends yup.AnyObjectSchema>(spec: Spec) {
  return closedObject({
    id: idField('Revision'),
    number: yup.number().strict().integer().min(1).required(),
    created_at: timeField(),
    /** The user who made it; null for what came with the product. */
    created_by: nullableIdField(),
    note: yup.string().strict().defined(),
    spec: spec.required(),
  });
}

/** As a list of revisions has it. Names are read from the one table of people at every request and never stored. */
export function namedRevisionSchema<Spec extends yup.AnyObjectSchema>(spec: Spec) {
  return closedObject({
    ...revisionSchema(spec).fields,
    created_by_name: yup.string().strict().nullable().defined(),
  });
}

export const archiveRequestSchema = closedObject({
  is_archived: yup.boolean().strict().required('Archived: say true or false.'),
});

const usesListSchema = () =>
  yup
    .array(closedObject({ id: idField('Id'), name: yup.string().strict().defined() }))
    .strict()
    .required();

export const usesResponseSchema = closedObject({
  laminates: usesListSchema(),
  packs: usesListSchema(),
  studies: usesListSchema(),
});

export function keptThingSchema<Spec extends yup.AnyObjectSchema>(spec: Spec) {
  return closedObject({
    id: idField('Id'),
    created_at: timeField(),
    archived_at: nullableTimeField(),
    revision: revisionSchema(spec).required(),
  });
}

export function pageSchema<Item extends yup.AnyObjectSchema>(item: Item) {
  return closedObject({
    items: yup.array(item).strict().required(),
    /** Give it as `after` for the next page; null at the end. */
    next_after: nullableIdField(),
  });
}

export interface Revision<Spec> {
  id: string;
  number: number;
  created_at: string;
  created_by: string | null;
  note: string;
  spec: Spec;
}

export interface NamedRevision<Spec> extends Revision<Spec> {
  /** Null for what came with the product, and once the person is erased. */
  created_by_name: string | null;
}

export interface ArchiveRequest {
  is_archived: boolean;
}

/** At most MOST_USES of each, newest first. */
export interface Uses {
  /** Of a material: laminates whose current revision has it. Else none. */
  laminates: { id: string; name: string }[];
  /** Of a laminate: packs whose tray is made of it. Else none. */
  packs: { id: string; name: string }[];
  studies: { id: string; name: string }[];
}
export const MOST_USES = 100;

export interface KeptThing<Spec> {
  id: string;
  created_at: string;
  /** Null: in use. */
  archived_at: string | null;
  revision: Revision<Spec>;
}

export interface Page<Item> {
  items: Item[];
  next_after: string | null;
}
