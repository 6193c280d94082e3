import * as yup from 'yup';
import { closedObject, idField, noteField, nullableIdField, timeField } from './fields';

/**
 * What a study uses is kept and revisioned: materials, laminates, packs, foods, routes. All share one shape and one
 * set of paths, `/api/accounts/<id>/<collection>`:
 *
 * GET    …/<collection>?after=&limit=    a page, newest first, keyed by id
 * POST   …/<collection>                  {spec}; Idempotency-Key wanted; 201
 * GET    …/<collection>/<id>             the thing with its current revision; ETag is the revision id
 * PUT    …/<collection>/<id>             {spec, note?}; If-Match: "<revision id>"; a lost race answers 412 with `current`
 * GET    …/<collection>/<id>/revisions   all revisions, newest first
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

export function keptThingSchema<Spec extends yup.AnyObjectSchema>(spec: Spec) {
  return closedObject({
    id: idField('Id'),
    created_at: timeField(),
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

export interface KeptThing<Spec> {
  id: string;
  created_at: string;
  revision: Revision<Spec>;
}

export interface Page<Item> {
  items: Item[];
  next_after: string | null;
}
