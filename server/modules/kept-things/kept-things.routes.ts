import {
  archiveRequestSchema,
  collectionPath,
  usesResponseSchema,
  type ArchiveRequest,
} from '../../../shared/contract/kept-things';
import { keptListQuerySchema, pageQuerySchema } from '../../../shared/contract/fields';
import type { Database } from '../../db/client';
import { listRevisions, listThings } from '../../db/kept-thing-store';
import { createOnce } from '../../http/create-once';
import { accountRoute, schemaOf, type RouteDefinition } from '../../http/route-definition';
import { FOODS, LAMINATES, MATERIALS, PACKS, ROUTES, type CollectionDefinition } from './collections';
import { archiveThing } from './archive-thing';
import { createThing } from './create-thing';
import { findUses } from './find-uses';
import { getThing } from './get-thing';
import { reviseThing } from './revise-thing';

const READERS = ['engineer', 'admin'] as const;
const WRITERS = ['engineer'] as const;

export function keptThingRoutes({ db }: { db: Database }): RouteDefinition[] {
  return [
    ...routesOf(db, MATERIALS),
    ...routesOf(db, LAMINATES),
    ...routesOf(db, PACKS),
    ...routesOf(db, FOODS),
    ...routesOf(db, ROUTES),
  ];
}

function routesOf<Spec extends { name: string }>(
  db: Database,
  definition: CollectionDefinition<Spec>,
): RouteDefinition[] {
  const { collection, subjectKind, tables } = definition;
  const path = collectionPath(':account_id', collection);
  const onePath = `${path}/:id`;
  return [
    accountRoute({
      method: 'get',
      path,
      summary: `A page of ${collection}, newest first, those in use or those archived`,
      roles: READERS,
      querySchema: keptListQuerySchema,
      responses: { 200: definition.pageSchema },
      handle: async ({ actor, query }) => ({
        status: 200,
        body: await listThings(db, tables, { accountId: actor.accountId, ...query }),
      }),
    }),
    accountRoute({
      method: 'post',
      path,
      summary: `Keep a new ${subjectKind}`,
      roles: WRITERS,
      wants: 'idempotency-key',
      requestSchema: definition.createSchema,
      responses: { 201: definition.thingSchema },
      handle: ({ actor, body, once }) =>
        createOnce(db, once, (tx) => createThing(tx, definition, { actor, spec: body.spec })),
    }),
    accountRoute({
      method: 'get',
      path: onePath,
      summary: `One ${subjectKind} with its current revision`,
      roles: READERS,
      responses: { 200: definition.thingSchema },
      async handle({ actor, params }) {
        const thing = await getThing(db, tables, { accountId: actor.accountId, id: params.id ?? '' });
        return { status: 200, body: thing, etag: thing.revision.id };
      },
    }),
    accountRoute({
      method: 'put',
      path: onePath,
      summary: `Add a revision to a ${subjectKind}`,
      roles: WRITERS,
      wants: 'if-match',
      requestSchema: definition.reviseSchema,
      responses: { 200: definition.thingSchema },
      handle: ({ actor, params, body, ifMatch }) =>
        reviseThing(db, definition, {
          actor,
          id: params.id ?? '',
          ifMatch,
          spec: body.spec,
          note: body.note,
        }),
    }),
    accountRoute({
      method: 'put',
      path: `${onePath}/archived`,
      summary: `Archive a ${subjectKind} or bring it back`,
      roles: WRITERS,
      requestSchema: schemaOf<ArchiveRequest>(archiveRequestSchema),
      responses: { 200: definition.thingSchema },
      async handle({ actor, params, body }) {
        const archiving = { actor, id: params.id ?? '', isArchived: body.is_archived, subjectKind };
        const thing = await db.transaction((tx) => archiveThing(tx, tables, archiving));
        return { status: 200, body: thing, etag: thing.revision.id };
      },
    }),
    accountRoute({
      method: 'get',
      path: `${onePath}/uses`,
      summary: `What uses a ${subjectKind} now`,
      roles: READERS,
      responses: { 200: usesResponseSchema },
      async handle({ actor: { accountId }, params }) {
        const id = params.id ?? '';
        await getThing(db, tables, { accountId, id });
        return { status: 200, body: await findUses(db, { accountId, collection, id }) };
      },
    }),
    accountRoute({
      method: 'get',
      path: `${onePath}/revisions`,
      summary: `The revisions of a ${subjectKind}, newest first`,
      roles: READERS,
      querySchema: pageQuerySchema,
      responses: { 200: definition.revisionPageSchema },
      async handle({ actor, params, query }) {
        const key = { accountId: actor.accountId, id: params.id ?? '' };
        await getThing(db, tables, key);
        return { status: 200, body: await listRevisions(db, tables, { ...key, ...query }) };
      },
    }),
  ];
}
