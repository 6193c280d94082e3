import { closedObject, pageQuerySchema, studyListQuerySchema } from '../../../shared/contract/fields';
import {
  archiveRequestSchema,
  collectionPath,
  createRequestSchema,
  namedRevisionSchema,
  pageSchema,
  reviseRequestSchema,
  type ArchiveRequest,
} from '../../../shared/contract/kept-things';
import { studySpecSchema, type StudySpec } from '../../../shared/contract/studies';
import {
  studyPageSchema,
  studyResultPageSchema,
  studyResultSchema,
  studyWithResultSchema,
} from '../../../shared/contract/study-answers';
import type { Database } from '../../db/client';
import { findThing, listRevisions } from '../../db/kept-thing-store';
import { notFound } from '../../http/app-error';
import { createOnce } from '../../http/create-once';
import { accountRoute, schemaOf, type RouteDefinition } from '../../http/route-definition';
import type { EnginePort } from '../../jobs/engine-workers';
import { archiveThing } from '../kept-things/archive-thing';
import { createStudy } from './create-study';
import { getStudy, withResult } from './get-study';
import { listStudies } from './list-studies';
import { rerunStudy } from './rerun-study';
import { findResult, listResults } from './results.repository';
import { reviseStudy } from './revise-study';
import { TABLES } from './study-tables';

const READERS = ['engineer', 'admin'] as const;
const WRITERS = ['engineer'] as const;
const PATH = collectionPath(':account_id', 'studies');

export function studyRoutes(deps: { db: Database; engine: EnginePort }): RouteDefinition[] {
  const { db, engine } = deps;
  const createSchema = schemaOf<{ spec: StudySpec }>(createRequestSchema(studySpecSchema));
  const reviseSchema = schemaOf<{ spec: StudySpec; note?: string }>(reviseRequestSchema(studySpecSchema));
  return [
    accountRoute({
      method: 'get',
      path: PATH,
      summary: 'A page of studies in the wanted order, each with its answer',
      roles: READERS,
      querySchema: studyListQuerySchema,
      responses: { 200: studyPageSchema },
      handle: async ({ actor: { accountId }, query }) => ({
        status: 200,
        body: await listStudies(db, { accountId, ...query }),
      }),
    }),
    accountRoute({
      method: 'post',
      path: PATH,
      summary: 'Keep a new study and compute its first result',
      roles: WRITERS,
      wants: 'idempotency-key',
      requestSchema: createSchema,
      responses: { 201: studyWithResultSchema },
      handle: ({ actor, body, once }) =>
        createOnce(db, once, (tx) => createStudy(tx, engine, { actor, spec: body.spec })),
    }),
    accountRoute({
      method: 'get',
      path: `${PATH}/:id`,
      summary: 'One study with its latest result',
      roles: READERS,
      responses: { 200: studyWithResultSchema },
      async handle({ actor: { accountId }, params }) {
        const study = await getStudy(db, { accountId, id: params.id ?? '' });
        return { status: 200, body: study, etag: study.revision.id };
      },
    }),
    accountRoute({
      method: 'put',
      path: `${PATH}/:id`,
      summary: 'Add a revision to a study and compute it',
      roles: WRITERS,
      wants: 'if-match',
      requestSchema: reviseSchema,
      responses: { 200: studyWithResultSchema },
      handle: ({ actor, params, body, ifMatch }) =>
        reviseStudy(deps, { actor, id: params.id ?? '', ifMatch, spec: body.spec, note: body.note }),
    }),
    accountRoute({
      method: 'put',
      path: `${PATH}/:id/archived`,
      summary: 'Archive a study or bring it back',
      roles: WRITERS,
      requestSchema: schemaOf<ArchiveRequest>(archiveRequestSchema),
      responses: { 200: studyWithResultSchema },
      handle: ({ actor, params, body }) =>
        db.transaction(async (tx) => {
          const study = await archiveThing(tx, TABLES.studies, {
            actor,
            id: params.id ?? '',
            isArchived: body.is_archived,
            subjectKind: 'study',
          });
          return {
            status: 200,
            body: await withResult(tx, actor.accountId, study),
            etag: study.revision.id,
          };
        }),
    }),
    accountRoute({
      method: 'get',
      path: `${PATH}/:id/revisions`,
      summary: 'The revisions of a study, newest first',
      roles: READERS,
      querySchema: pageQuerySchema,
      responses: { 200: pageSchema(namedRevisionSchema(studySpecSchema)) },
      async handle({ actor: { accountId }, params, query }) {
        const key = { accountId, id: params.id ?? '' };
        if (!(await findThing(db, TABLES.studies, key))) throw notFound();
        return { status: 200, body: await listRevisions(db, TABLES.studies, { ...key, ...query }) };
      },
    }),
    accountRoute({
      method: 'post',
      path: `${PATH}/:id/results`,
      summary: 'Run a study again with the newest revisions of what it uses',
      roles: WRITERS,
      wants: 'idempotency-key',
      requestSchema: closedObject({}),
      responses: { 201: studyResultSchema },
      handle: ({ actor, params, once }) =>
        createOnce(db, once, (tx) => rerunStudy(tx, engine, { actor, id: params.id ?? '' })),
    }),
    accountRoute({
      method: 'get',
      path: `${PATH}/:id/results`,
      summary: 'The results of a study, newest first',
      roles: READERS,
      querySchema: pageQuerySchema,
      responses: { 200: studyResultPageSchema },
      async handle({ actor: { accountId }, params, query }) {
        const studyId = params.id ?? '';
        if (!(await findThing(db, TABLES.studies, { accountId, id: studyId }))) throw notFound();
        return { status: 200, body: await listResults(db, { accountId, studyId, ...query }) };
      },
    }),
    accountRoute({
      method: 'get',
      path: `${PATH}/:id/results/:result_id`,
      summary: 'One result, with everything that went in',
      roles: READERS,
      responses: { 200: studyResultSchema },
      async handle({ actor: { accountId }, params }) {
        const result = await findResult(db, {
          accountId,
          studyId: params.id ?? '',
          id: params.result_id ?? '',
        });
        if (!result) throw notFound();
        return { status: 200, body: result };
      },
    }),
  ];
}
