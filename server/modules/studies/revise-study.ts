import type { StudySpec } from '../../../shared/contract/studies';
import { canonicalJson } from '../../db/canonical-json';
import type { Database } from '../../db/client';
import { insertRevision, lockThing } from '../../db/kept-thing-store';
import { editedMeanwhile, notFound } from '../../http/app-error';
import type { Actor, Answer } from '../../http/route-definition';
import type { EnginePort } from '../../jobs/engine-workers';
import { recordAuditEntry } from '../audit/record-audit-entry';
import { checkTypedValues } from '../kept-things/check-typed-values';
import { withResult } from './get-study';
import { runStudy } from './run-study';
import { TABLES } from './study-tables';

interface Revising {
  actor: Actor;
  id: string;
  ifMatch: string;
  spec: StudySpec;
  note?: string;
}

/**
 * Keeps the new revision and its result, both or neither. What does not bear on the answer (name, notes, tags,
 * verdicts) leaves the last result standing.
 */
export async function reviseStudy(
  { db, engine }: { db: Database; engine: EnginePort },
  { actor, id, ifMatch, spec, note }: Revising,
): Promise<Answer> {
  checkTypedValues(spec);
  const { accountId, userId } = actor;
  return db.transaction(async (tx) => {
    const base = await lockThing(tx, TABLES.studies, { accountId, id });
    if (!base) throw notFound();
    if (base.revision.id !== ifMatch) throw editedMeanwhile(await withResult(tx, accountId, base));
    const study = await insertRevision(tx, TABLES.studies, {
      accountId,
      spec,
      note,
      createdBy: userId,
      base,
    });
    if (!isSameQuestion(base.revision.spec, spec)) {
      await runStudy(tx, engine, { actor, study, base: base.revision.spec });
    }
    await recordAuditEntry(tx, {
      accountId,
      actorUserId: userId,
      action: 'study.revised',
      subjectKind: 'study',
      subjectId: id,
    });
    return { status: 200, body: await withResult(tx, accountId, study), etag: study.revision.id };
  });
}

function isSameQuestion(one: StudySpec, other: StudySpec): boolean {
  const questionOf = ({ food_id, pack_id, route_id, target_days, laminate_ids }: StudySpec) =>
    canonicalJson({ food_id, pack_id, route_id, target_days, laminate_ids });
  return questionOf(one) === questionOf(other);
}
