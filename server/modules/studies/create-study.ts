import type { StudySpec } from '../../../shared/contract/studies';
import type { Transaction } from '../../db/client';
import { insertThing } from '../../db/kept-thing-store';
import type { Actor, Answer } from '../../http/route-definition';
import type { EnginePort } from '../../jobs/engine-workers';
import { recordAuditEntry } from '../audit/record-audit-entry';
import { checkTypedValues } from '../kept-things/check-typed-values';
import { withResult } from './get-study';
import { runStudy } from './run-study';
import { TABLES } from './study-tables';

/** Keeps a study and its first result, both or neither. */
export async function createStudy(
  tx: Transaction,
  engine: EnginePort,
  { actor, spec }: { actor: Actor; spec: StudySpec },
): Promise<Answer> {
  checkTypedValues(spec);
  const { accountId, userId } = actor;
  const study = await insertThing(tx, TABLES.studies, { accountId, spec, createdBy: userId });
  await runStudy(tx, engine, { actor, study });
  await recordAuditEntry(tx, {
    accountId,
    actorUserId: userId,
    action: 'study.created',
    subjectKind: 'study',
    subjectId: study.id,
  });
  return { status: 201, body: await withResult(tx, accountId, study), etag: study.revision.id };
}
